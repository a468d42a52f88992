import type {
  BaseAnswer,
  CheckAnswer,
  DeffSource,
  SecondTest,
  ShareFinding,
} from '@/lib/findings/check-types';
import type { ReleaseUntestedReason } from '@/lib/findings/judge-types';
import { formatP, formatPoints, formatTrimmed } from '@/lib/format/number';
import type { DraftFinding, TestedDraft as Tested } from './draft-finding';
import { isOfTwoReleases } from './draft-input';
import { EN } from './messages/en';
import { familySize, isPlausibleBreaking } from './test-facts';

const LOCALE = 'en-GB';

/**
 * Why a finding has its verdict, in plain sentences for staff; nothing here is meant for print.
 *
 * @param finding a finding of `answer`
 * @param answer the whole answer: its bases say where the design effects come from
 * @returns at least one sentence
 */
export function explain(finding: ShareFinding | DraftFinding, answer: CheckAnswer): string[] {
  if (finding.kind === 'share') return [explainShare(finding)];
  if (finding.verdict === 'cannot-be-tested') return finding.reasons.map((reason) => UNTESTED[reason]);
  if (finding.verdict === 'does-not-hold') return explainNotShown(finding, answer);
  return [
    passSentence(finding, answer),
    ...breakingSentence(finding),
    roundingSentence(finding),
    ...finding.secondTests.filter((test) => !test.significant).map(disagreement),
    ...doubtSentences(finding),
    ...(finding.verdict === 'holds' ? [totalErrorSentence(finding)] : []),
  ];
}

function explainShare({ estimatePct, intervalPct, method }: ShareFinding): string {
  if (estimatePct === null) return 'This share is not disclosed.';
  if (!intervalPct) return 'No margin: the sample is not random, or its size is not disclosed.';
  const [low, high] = intervalPct.map((end) => formatPoints(end, 1, LOCALE));
  const name = method === 'clopper-pearson' ? 'Clopper–Pearson' : 'Wilson';
  return `The range runs from ${low}% to ${high}% (${name}, on effective counts).`;
}

const UNTESTED: Record<ReleaseUntestedReason, string> = {
  'no-sample-size': 'The number of people asked is not disclosed, so no margin can be worked out.',
  'no-sampling-basis':
    'The sample is not known to be random and no modelled interval is stated: there is no recognised margin for it. That is no sign that the figures are wrong.',
  'too-small': 'Counted at its design effect, the sample is smaller than the desk’s policy tests.',
  'few-clusters':
    'The design effect rests on fewer than eight degrees of freedom: too few places to judge it by.',
  'not-comparable':
    'The two samples differ in being random, or the earlier release does not have this answer, so they are not compared.',
  'not-disclosed': 'A share that this needs is not disclosed.',
  'shared-waves':
    'The two releases share interviews, and which waves they share is not known or leaves nothing to compare.',
  'same-people': 'The same people were asked both times, and how many changed their answer is not disclosed.',
  'rebased-size': 'How many people the re-based shares stand on is not disclosed.',
  'other-base': 'The rule counts another base than the shares do.',
  'below-presentation-standard': 'A share of a subgroup is below the presentation standard and is not shown.',
};

const EQUAL: Record<Tested['kind'], string> = {
  lead: 'The printed figures are equal.',
  change: 'The printed figures are equal.',
  'lead-change': 'The printed gaps are equal.',
  threshold: 'The printed figure is the threshold itself.',
  'net-score': 'The printed figures are equal.',
  'net-score-change': 'The printed net scores are equal.',
  gap: 'The printed figures of the two groups are equal.',
};

function explainNotShown(finding: Tested, answer: CheckAnswer): string[] {
  const what = isOfTwoReleases(finding.kind) ? 'change' : 'difference';
  const [low, high] = finding.intervalPp.map((end) => formatPoints(end, 1, LOCALE));
  const sentences = [`The ${what} could be anything from ${low} to ${high}.`];
  if (finding.estimatePp === 0) sentences.unshift(EQUAL[finding.kind]);
  if (finding.kind === 'change' && finding.littleChanged) {
    return [
      ...sentences,
      'Little changed: with rounding and the high design effect allowed for, it is within the desk’s margin.',
    ];
  }
  if (finding.reasons.includes('family')) {
    const adjusted = formatP(finding.pAdjusted, LOCALE);
    sentences.push(
      `Taken alone it would pass (${formatP(finding.p, LOCALE)}); as one of ${familySize(finding, answer)} tests made together it does not (adjusted ${adjusted}).`,
    );
  }
  if (finding.reasons.includes('would-hold-at-lower-deff')) {
    sentences.push(
      `It would be larger than sampling error at a design effect of ${ends(finding, answer, 0)}.`,
    );
  }
  return [...sentences, ...breakingBelow(finding, answer), ...detectableSentence(finding, what)];
}

function breakingBelow(finding: Tested, answer: CheckAnswer): string[] {
  if (finding.reasons.includes('would-hold-at-lower-deff')) return [];
  if (!('breakingDeff' in finding) || !isPlausibleBreaking(finding, answer)) return [];
  return [
    `It would be larger than sampling error only below a design effect of ${shown(finding.breakingDeff ?? 0)}.`,
  ];
}

function detectableSentence({ detectable80Pp }: Tested, what: string): string[] {
  if (detectable80Pp === null) return [];
  const points = formatPoints(detectable80Pp, 1, LOCALE);
  return [
    `A true ${what} of ${points} points would have been found four times in five; smaller ones are often missed.`,
  ];
}

const IN_USE: Record<DeffSource, (deff: string) => string> = {
  design: (deff) => `at the design effect of ${deff} from the sample’s design`,
  kish: (deff) => `at the design effect of ${deff} from the weights`,
  stated: (deff) => `at the stated design effect of ${deff}`,
  implied: (deff) => `at the design effect of ${deff} that the stated interval implies`,
  assumed: (deff) => `at the assumed design effect of ${deff}`,
};

function passSentence(finding: Tested, answer: CheckAnswer): string {
  const [base, other] = basesOf(finding, answer);
  const at = other
    ? `at the design effects in use (${shown(base?.deff ?? 1)} and ${shown(other.deff ?? 1)})`
    : IN_USE[base?.deffSource ?? 'assumed'](shown(base?.deff ?? 1));
  if (finding.reasons.includes('design-effect')) {
    return `Larger than sampling error ${at}, but not at ${ends(finding, answer, 1)}.`;
  }
  const isRanged = basesOf(finding, answer).some(
    ({ deff, deffRange }) => deff !== null && deffRange !== null && shown(deff) !== shown(deffRange[1]),
  );
  return `Larger than sampling error ${at}${isRanged ? `, and still at ${ends(finding, answer, 1)}` : ''}.`;
}

function breakingSentence(finding: Tested): string[] {
  if ('breakingDeff' in finding) {
    const { breakingDeff } = finding;
    return breakingDeff === null ? [] : [`It fails once the design effect reaches ${shown(breakingDeff)}.`];
  }
  const { breakingFactor } = finding;
  return breakingFactor === null
    ? []
    : [`It fails once both design effects are ${shown(breakingFactor)} times as large.`];
}

function roundingSentence({ roundingPp, reasons }: Tested): string {
  const rounding = `±${formatTrimmed(roundingPp, roundingPp < 0.1 ? 2 : 1, LOCALE)}`;
  if (reasons.includes('rounding')) return `Rounding (${rounding}) undoes it.`;
  if (reasons.includes('together')) {
    return `Rounding (${rounding}) undoes it only together with the high design effect.`;
  }
  return `Rounding (${rounding}) does not undo it.`;
}

function disagreement(test: SecondTest): string {
  const name = EN.terms.secondTest[test.name];
  if (test.name !== 'newcombe') return `The ${name} does not agree (${formatP(test.p, LOCALE)}).`;
  const [low, high] = test.intervalPp.map((end) => formatPoints(end, 1, LOCALE));
  return `The ${name} does not agree (${low} to ${high}).`;
}

function doubtSentences({ reasons }: Tested): string[] {
  return [
    ...(reasons.includes('modelled')
      ? [
          'The sample is not random: this rests on the pollster’s own model and can be no better than fragile.',
        ]
      : []),
    ...(reasons.includes('comparison')
      ? ['The sample is not random: this is worked out as if it were and can be no better than fragile.']
      : []),
  ];
}

function totalErrorSentence({ survivesTwiceError }: Tested): string {
  return survivesTwiceError
    ? 'It would stand if total error were twice the sampling error.'
    : 'It would not stand if total error were twice the sampling error, so the words keep “in this poll”.';
}

function basesOf(finding: Tested, answer: CheckAnswer): BaseAnswer[] {
  const isOfTwo = isOfTwoReleases(finding.kind) || finding.kind === 'gap';
  return isOfTwo && answer.previousBase ? [answer.base, answer.previousBase] : [answer.base];
}

/** The low or high end of the design effect, of both bases where they differ. */
function ends(finding: Tested, answer: CheckAnswer, end: 0 | 1): string {
  const values = basesOf(finding, answer).map(({ deffRange }) => shown(deffRange?.[end] ?? 1));
  return [...new Set(values)].join(' and ');
}

const shown = (deff: number) => formatTrimmed(deff, 2, LOCALE);
