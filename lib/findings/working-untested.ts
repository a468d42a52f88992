import type { BaseAnswer, Policy } from './check-types';
import type { ReleaseUntestedFields, ReleaseUntestedReason } from './judge-types';
import { VERDICT_WORDS } from './working-verdict';
import { figure, type WorkingStep } from './working-step';

const RULES: Record<ReleaseUntestedReason, string> = {
  'no-sample-size': 'a sample size is needed',
  'no-sampling-basis': 'a random sample, a modelled interval, or a comparison basis of the desk is needed',
  'too-small': 'the effective sample size is at least the smallest that the policy tests',
  'few-clusters': 'the design effect rests on at least 8 degrees of freedom',
  'not-comparable': 'both releases are random samples or neither is, and both have the option',
  'not-disclosed': 'every share in the estimate is disclosed',
  'shared-waves': 'it is known which waves both averages share, and one at least is not shared',
  'same-people': 'different people were asked, or the cross-tabulation of both answers is known',
  'rebased-size': 'it is disclosed how many people the re-based shares stand on',
  'other-base': 'the shares count the people that the rule counts',
  'below-presentation-standard': 'no share of a subgroup is suppressed by the presentation standard',
};

/** What stands against a test, rule by rule. */
export function untestedSteps(
  { estimatePp, reasons }: Pick<ReleaseUntestedFields, 'estimatePp' | 'reasons'>,
  bases: readonly BaseAnswer[],
  policy: Policy,
): WorkingStep[] {
  const sizes = bases.map(({ nEff }) => (nEff === null ? 'none' : figure(nEff))).join(', ');
  const particulars: Partial<Record<ReleaseUntestedReason, string>> = {
    'too-small': `${sizes}; smallest ${figure(policy.minimumNEff)}`,
  };
  return [
    {
      label: 'Estimate',
      formula: 'difference of the printed figures',
      substituted: estimatePp === null ? 'a share is missing' : 'as printed',
      result: estimatePp === null ? 'none' : figure(estimatePp),
      unit: estimatePp === null ? '' : 'points',
    },
    ...reasons.map((reason): WorkingStep => ({
      label: 'Needed for a test',
      formula: RULES[reason],
      substituted: particulars[reason] ?? 'not so here',
      result: 'no',
      unit: '',
    })),
    {
      label: 'Verdict',
      formula: 'tested only where nothing stands against it',
      substituted: reasons.join(', '),
      result: VERDICT_WORDS['cannot-be-tested'],
      unit: '',
    },
  ];
}
