import { ENGINE_VERSION } from '../engine-version';
import { assemble, type Section } from './assemble';
import type { AskedInR } from './asked-in-r';
import { functionsFor, type FunctionName } from './functions';
import type { InputsInR } from './inputs';
import { TESTED_NEEDS, testedOutput, testedSections } from './tested';

/** Everything a script is made of but the figures of the engine. */
export type ScriptPlan = {
  kind: string;
  asked: AskedInR;
  /** Every question of the family, the finding's own at `place`. */
  family: readonly AskedInR[];
  place: number;
  isTested: boolean;
  inputs: InputsInR;
};

/** The script of a finding with a verdict. */
export function findingScript(plan: ScriptPlan): string {
  const { asked, family, place, isTested } = plan;
  const own: readonly FunctionName[] = isTested
    ? [...TESTED_NEEDS, ...asked.secondNeeds, ...family.flatMap(({ needs }) => needs)]
    : asked.needs;
  const steps = isTested ? testedSections(asked, family, place) : [untestedSection(asked)];
  return assemble({
    words: asked.words,
    engine: ENGINE_VERSION,
    functions: functionsFor([...plan.inputs.needs, ...own, 'reasonsUntested', 'show']),
    sections: [...plan.inputs.sections, ...steps],
    output: [
      `show("kind", "${plan.kind}")`,
      ...plan.inputs.output,
      isTested ? testedOutput(asked) : untestedOutput(asked),
      ...(asked.further?.output ? [asked.further.output] : []),
    ].join('\n'),
  });
}

function untestedSection({ call, further }: AskedInR): Section {
  const code = `finding <- ${call}
estimate_pp <- finding$estimate_pp
reasons <- reasons_untested(finding, policy)
stopifnot(length(reasons) > 0)`;
  return {
    title: 'What stands against a test',
    code: further?.untested ? `${code}\n\n${further.untested}` : code,
  };
}

function untestedOutput({ further }: AskedInR): string {
  return [
    'show("estimatePp", estimate_pp)',
    'show("verdict", "cannot-be-tested")',
    'show_list("reasons", reasons)',
    ...(further?.untestedOutput ? [further.untestedOutput] : []),
  ].join('\n');
}
