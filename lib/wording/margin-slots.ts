import { valueOf } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { uncertaintyOf } from '@/lib/findings/bands';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import type { BaseAnswer, Range } from '@/lib/findings/check-types';
import type { TestedDraft } from './draft-finding';
import { figureOf, isOfTwoReleases, type DraftInput } from './draft-input';
import { farFromTrace } from './far-ends';
import { printNumber, printPercent, roundBeside, roundUp } from './print';
import type { Slots } from './say';
import type { Voice } from './voice';

type ConcernedBase = {
  facts: ReleaseFacts;
  base: BaseAnswer | null;
  /** The name of a subgroup; empty for everyone else in the sample. */
  group?: string;
};

/** The bases a finding stands on, each with the release it belongs to: one, the later and the earlier, two groups. */
export function basesOf(input: DraftInput): ConcernedBase[] {
  const { answer, release, previous, finding, beside } = input;
  if (beside?.groups) return beside.groups.map(({ name, base }) => ({ facts: release, base, group: name }));
  const own = { facts: release, base: answer.base };
  return isOfTwoReleases(finding.kind) && previous
    ? [own, { facts: previous, base: answer.previousBase }]
    : [own];
}

/** Margin, range and what they rest on; the wider ones are those at the high end of the design effects. */
export function marginSlots(input: DraftInput, voice: Voice): Slots {
  const { finding, policy, release } = input;
  const stated = valueOf(release.statedMargin);
  const modelled = release.modelledInterval;
  const shared: Slots = {
    basis: basisOf(input),
    deffSource: deffSourceOf(input),
    level: printLevel(policy.level, voice),
    stated: statedStatus(input),
    sameLevel: !stated || stated.level === policy.level ? 'yes' : 'no',
    statedPp: stated ? printNumber(stated.pp, 2, voice, 'points') : '',
    statedCount: stated?.pp ?? 0,
    statedLevel: stated ? printLevel(stated.level, voice) : '',
    ...sizeSlots('modelled', modelled?.pp ?? 0, voice),
    ...indifferenceSlots(input, voice),
  };
  if (finding.verdict === 'cannot-be-tested') {
    return {
      ...shared,
      ...sizeSlots('independent', roundUp(finding.independentMarginPp ?? 0, voice.style), voice),
    };
  }
  const far = farEnds(finding, input);
  const size = Math.abs(finding.estimatePp);
  const margin = roundBeside(finding.marginPp, size, voice.style);
  const widerMargin = roundBeside(far.marginPp, size, voice.style);
  const near = rangeSlots('', finding, finding.intervalPp, voice);
  const wide = rangeSlots('wider', finding, far.intervalPp, voice);
  return {
    ...shared,
    ...sizeSlots('margin', margin, voice),
    ...sizeSlots('widerMargin', widerMargin, voice),
    wider: margin === widerMargin ? 'no' : 'yes',
    ...near,
    ...wide,
    rangeWidens: near.low === wide.widerLow && near.high === wide.widerHigh ? 'no' : 'yes',
    ...sizeSlots('detectable', roundUp(finding.detectable80Pp ?? 0, voice.style), voice),
  };
}

/** The weakest basis among the bases concerned. */
export function basisOf(input: DraftInput): 'sampling' | 'modelled' | 'comparison' {
  const all = basesOf(input).map(({ base }) => base?.basis);
  if (all.includes('comparison')) return 'comparison';
  return all.includes('modelled') ? 'modelled' : 'sampling';
}

export function printLevel(level: number, voice: Voice): string {
  const pct = Number((level * 100).toFixed(6));
  return printPercent(pct, Number.isInteger(pct) ? 0 : 1, voice);
}

/** Margin and interval at the high end of the design effects: the dashed reach of the chart. */
function farEnds(finding: TestedDraft, input: DraftInput): { marginPp: number; intervalPp: Range } {
  const near = { marginPp: finding.marginPp, intervalPp: finding.intervalPp };
  if (finding.trace) return farFromTrace(finding, finding.trace, input.answer.base);
  if (finding.kind === 'net-score' || finding.kind === 'net-score-change' || finding.kind === 'gap')
    return near;
  const far = uncertaintyOf(finding, checkDocumentOf(input.release, input.previous, input.policy))?.far;
  if (!far) return near;
  if (finding.kind !== 'threshold') {
    return { marginPp: (far.high - far.low) / 2, intervalPp: [far.low, far.high] };
  }
  const { deff, deffRange } = input.answer.base;
  const factor = deff && deffRange ? Math.sqrt(deffRange[1] / deff) : 1;
  const pct = finding.thresholdPct;
  return { marginPp: finding.marginPp * factor, intervalPp: [far.low - pct, far.high - pct] };
}

/** Changes of one number keep their sign; the rest are told from the side that has more. */
const TOLD_AS_ASKED: readonly string[] = ['change', 'net-score-change'];

function rangeSlots(prefix: '' | 'wider', finding: TestedDraft, [low, high]: Range, voice: Voice): Slots {
  if (finding.kind === 'threshold') {
    const pct = finding.thresholdPct;
    const print = (end: number) => {
      const rounded = roundBeside(end + pct, pct, voice.style);
      return printPercent(rounded, decimalsOf(rounded), voice);
    };
    return { [slotName(prefix, 'low')]: print(low), [slotName(prefix, 'high')]: print(high) };
  }
  const isMirrored = !TOLD_AS_ASKED.includes(finding.kind) && finding.estimatePp < 0;
  return spanSlots(prefix, isMirrored ? [-high, -low] : [low, high], voice);
}

const slotName = (prefix: string, word: string) =>
  prefix ? prefix + word.charAt(0).toUpperCase() + word.slice(1) : word;

/** An interval around zero as two sizes: across it, above it, or below it (then the smaller size first). */
function spanSlots(prefix: string, [low, high]: Range, voice: Voice): Slots {
  const from = roundBeside(low, 0, voice.style);
  const to = roundBeside(high, 0, voice.style);
  const span = from < 0 && to > 0 ? 'across' : from < 0 ? 'below' : 'above';
  const [first, second] = span === 'below' ? [-to, -from] : [Math.abs(from), Math.abs(to)];
  return {
    [slotName(prefix, 'span')]: span,
    ...sizeSlots(slotName(prefix, 'low'), first, voice),
    ...sizeSlots(slotName(prefix, 'high'), second, voice),
  };
}

function deffSourceOf(input: DraftInput): string {
  const sources = basesOf(input).map(({ base }) => base?.deffSource);
  return (['assumed', 'kish', 'implied'] as const).find((source) => sources.includes(source)) ?? 'other';
}

function statedStatus(input: DraftInput): 'given' | 'none' | 'unknown' {
  if (basisOf(input) !== 'sampling') return 'unknown';
  const { status } = input.release.statedMargin;
  return status === 'given' ? 'given' : status === 'not-disclosed' ? 'none' : 'unknown';
}

/** What counts as little: the desk's margin of indifference or a fifth of the earlier share, whichever is smaller. */
function indifferenceSlots(input: DraftInput, voice: Voice): Slots {
  const { finding, policy } = input;
  const earlier = finding.kind === 'change' ? figureOf(finding.option, input, 'then') : null;
  const fifth = earlier?.units ? earlier.units / 10 ** earlier.decimals / 5 : Infinity;
  return sizeSlots('indifference', Math.min(policy.indifferencePp, fifth), voice);
}

function sizeSlots(name: string, pp: number, voice: Voice): Slots {
  return { [name]: printNumber(pp, 3, voice, 'points'), [`${name}Count`]: pp };
}

const decimalsOf = (pct: number) => [0, 1, 2].find((places) => Number(pct.toFixed(places)) === pct) ?? 3;
