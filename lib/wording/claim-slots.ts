import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { ELECTION_KINDS } from '@/lib/domain/vocabulary';
import { shareBaseOf } from '@/lib/findings/threshold-base';
import { namesOf, type DraftFinding, type GapDraft } from './draft-finding';
import { figureOf, type DraftInput, type Figure } from './draft-input';
import { isolated, plain } from './names';
import { printCount, printGap, printNumber, printPercent, printShare, printSigned } from './print';
import { say, type Slots } from './say';
import type { Voice } from './voice';

/** The figures and names of the claim itself. Leads are told from the higher figure, whatever the order asked in. */
export function claimSlots(input: DraftInput, voice: Voice): Slots {
  const { finding } = input;
  switch (finding.kind) {
    case 'lead':
      return { claim: 'lead', ...ofLead(finding, input, voice) };
    case 'net-score':
      return { claim: 'netScore', ...ofLead(finding, input, voice), ...ofNetScore(finding, input, voice) };
    case 'change':
      return { claim: 'change', ...ofChange(finding, input, voice) };
    case 'lead-change':
      return { claim: 'leadChange', ...ofLeadChange(finding, input, voice) };
    case 'net-score-change':
      return { claim: 'netScoreChange', ...ofNetScoreChange(finding, input, voice) };
    case 'threshold':
      return { claim: 'threshold', ...ofThreshold(finding, input, voice) };
    case 'gap':
      return { claim: 'gap', ...ofGap(finding, input, voice) };
  }
}

type OfPair = Extract<DraftFinding, { pair: unknown }>;
type Of<K extends DraftFinding['kind']> = Extract<DraftFinding, { kind: K }>;

function ofLead({ pair, estimatePp }: OfPair, input: DraftInput, voice: Voice): Slots {
  const { release } = input;
  const [higher, lower] = (estimatePp ?? 0) < 0 ? [pair[1], pair[0]] : pair;
  const figures = [higher, lower].map((name) => figureOf(name, input, 'now'));
  return {
    setting: settingOf(release, pair, input),
    among: othersAbove(input).length > 0 ? 'several' : 'two',
    known: estimatePp === null ? 'no' : 'yes',
    ...pairSlots(higher, lower, input, voice),
    aShare: printFigure(figures[0] ?? null, voice),
    bShare: printFigure(figures[1] ?? null, voice),
    ...sizeSlots('gap', estimatePp, decimalsOf(figures), voice),
  };
}

function ofNetScore({ pair, estimatePp }: Of<'net-score'>, input: DraftInput, voice: Voice): Slots {
  const decimals = decimalsOf(pair.map((name) => figureOf(name, input, 'now')));
  return {
    setting: 'question',
    name: nameOf(pair[0], input, voice),
    net: estimatePp === null ? '' : printSigned(estimatePp, decimals, voice),
  };
}

function ofChange({ option, estimatePp }: Of<'change'>, input: DraftInput, voice: Voice): Slots {
  const [now, then] = bothTimes(option, input);
  return {
    option: nameOf(option, input, voice),
    known: knownOf([option], input),
    now: printFigure(now, voice),
    then: printFigure(then, voice),
    direction: (estimatePp ?? 0) < 0 ? 'less' : 'more',
    ...sizeSlots('move', estimatePp, decimalsOf([now, then]), voice),
  };
}

function ofLeadChange({ pair, estimatePp }: OfPair, input: DraftInput, voice: Voice): Slots {
  const [first, second] = pair;
  const [now, then] = [pairAt(pair, input, 'now'), pairAt(pair, input, 'then')];
  const isReversed = scaled(now[1]) > scaled(now[0]);
  const [higher, lower] = isReversed ? [second, first] : [first, second];
  const [toward, away] = !estimatePp ? [higher, lower] : estimatePp > 0 ? [first, second] : [second, first];
  const print = (name: string, which: 'now' | 'then') => printFigure(figureOf(name, input, which), voice);
  return {
    known: knownOf(pair, input),
    ...pairSlots(higher, lower, input, voice),
    toward: nameOf(toward, input, voice),
    away: nameOf(away, input, voice),
    aNow: print(higher, 'now'),
    bNow: print(lower, 'now'),
    aThen: print(higher, 'then'),
    bThen: print(lower, 'then'),
    ...sizeSlots('move', estimatePp, decimalsOf([...now, ...then]), voice),
  };
}

function ofNetScoreChange(finding: Of<'net-score-change'>, input: DraftInput, voice: Voice): Slots {
  const { pair, estimatePp } = finding;
  const [now, then] = [pairAt(pair, input, 'now'), pairAt(pair, input, 'then')];
  const net = (figures: readonly (Figure | null)[]) =>
    figures.every((figure) => figure?.units != null)
      ? printSigned(scaled(figures[0]) - scaled(figures[1]), decimalsOf(figures), voice)
      : printShare(null, 0, voice);
  return {
    known: knownOf(pair, input),
    name: nameOf(pair[0], input, voice),
    netNow: net(now),
    netThen: net(then),
    direction: (estimatePp ?? 0) < 0 ? 'less' : 'more',
    ...sizeSlots('move', estimatePp, decimalsOf([...now, ...then]), voice),
  };
}

function ofThreshold(
  { option, thresholdPct, estimatePp }: Of<'threshold'>,
  input: DraftInput,
  voice: Voice,
): Slots {
  const { terms } = voice.style.messages[voice.language];
  const decimals = [0, 1, 2, 3].find((places) => Number(thresholdPct.toFixed(places)) === thresholdPct) ?? 4;
  const pct = printPercent(thresholdPct, decimals, voice);
  const line = {
    pct,
    pctCount: thresholdPct,
    number: printNumber(thresholdPct, decimals, voice),
    spoken: voice.isSpoken ? 'yes' : 'no',
  };
  const asksEveryone = shareBaseOf(input.release).hasNonAnswers;
  return {
    option: nameOf(option, input, voice),
    known: estimatePp === null ? 'no' : 'yes',
    share: printFigure(figureOf(option, input, 'now'), voice),
    line: say(thresholdPct === 50 ? terms.half : terms.threshold, line, voice.locale),
    side: (estimatePp ?? 0) < 0 ? 'below' : 'above',
    asked: asksEveryone ? 'everyone' : 'unknown',
  };
}

function ofGap({ option, estimatePp }: GapDraft, input: DraftInput, voice: Voice): Slots {
  const { terms } = voice.style.messages[voice.language];
  const [one, other] = input.beside?.groups ?? [];
  if (!one || !other) throw new RangeError('draftSheet requires both groups of a gap');
  const [g, h] = (estimatePp ?? 0) < 0 ? [other, one] : [one, other];
  const isSuppressed = one.isSuppressed || other.isSuppressed;
  const named = (group: typeof g) => (group.name === '' ? terms.everyoneElse : isolated(group.name));
  return {
    setting: settingOf(input.release, [option], input),
    option: nameOf(option, input, voice),
    known: isSuppressed ? 'hidden' : estimatePp === null ? 'no' : 'yes',
    g: named(g),
    h: named(h),
    gShare: printFigure(g.figure, voice),
    hShare: printFigure(h.figure, voice),
    gSized: g.n === null ? 'no' : 'yes',
    hSized: h.n === null ? 'no' : 'yes',
    gN: g.n === null ? '' : printCount(g.n, voice),
    hN: h.n === null ? '' : printCount(h.n, voice),
    ...sizeSlots('gap', estimatePp, decimalsOf([g.figure, h.figure]), voice),
  };
}

/** Other answers whose printed share is not below the lower of a pair: the two are then not the first two. */
export function othersAbove(input: DraftInput): string[] {
  const { finding, release, beside } = input;
  if (finding.kind !== 'lead' || finding.estimatePp === null) return [];
  const members = (beside?.blocs ?? [])
    .filter(({ name }) => finding.pair.includes(name))
    .flatMap(({ options }) => options);
  const inClaim = new Set([...finding.pair, ...members]);
  const lower = Math.min(...finding.pair.map((name) => scaled(figureOf(name, input, 'now'))));
  return release.shares
    .filter(({ option, isAnswer, units }) => isAnswer && units !== null && !inClaim.has(option))
    .filter(({ option }) => scaled(figureOf(option, input, 'now')) > lower)
    .map(({ option }) => option);
}

/** Leads are for contests; of an approval or issue series, or a "don't know", one can only say that more say it. */
function settingOf(
  release: ReleaseFacts,
  names: readonly string[],
  { beside }: Pick<DraftInput, 'beside'>,
): 'contest' | 'question' {
  const membersOf = (name: string) => beside?.blocs.find((bloc) => bloc.name === name)?.options ?? [name];
  const isAnswer = (name: string) => release.shares.find((share) => share.option === name)?.isAnswer ?? true;
  const isContest = ELECTION_KINDS.includes(release.race.kind) && names.flatMap(membersOf).every(isAnswer);
  return isContest ? 'contest' : 'question';
}

/** Candidates, parties and blocs stand as they are; an answer that is a phrase, such as "End the toll", is quoted. */
export function nameOf(option: string, input: DraftInput, voice: Voice): string {
  const { release, beside } = input;
  const isBloc = beside?.blocs.some(({ name }) => name === option) ?? false;
  const isProperName =
    settingOf(release, [option], input) === 'contest' && release.race.kind !== 'referendum';
  if (isBloc || isProperName) return isolated(option);
  const { quoted } = voice.style.messages[voice.language].terms;
  return say(quoted, { name: isolated(option) }, voice.locale);
}

/** Two names, and both in one phrase: "and" follows the next sound in Spanish, "Alder e Ilvane". */
function pairSlots(higher: string, lower: string, input: DraftInput, voice: Voice): Slots {
  const [a = '', b = ''] = [higher, lower].map((name) => nameOf(name, input, voice));
  const spelt = new Intl.ListFormat(voice.locale, { type: 'conjunction' }).formatToParts(
    [higher, lower].map(plain),
  );
  const shown = [a, b];
  const both = spelt.map(({ type, value }) => (type === 'element' ? shown.shift() : value)).join('');
  return { a, b, both };
}

export function printFigure(figure: Figure | null, voice: Voice): string {
  return printShare(figure?.units ?? null, figure?.decimals ?? 0, voice);
}

function bothTimes(name: string, input: DraftInput): [Figure | null, Figure | null] {
  return [figureOf(name, input, 'now'), figureOf(name, input, 'then')];
}

function pairAt(pair: readonly string[], input: DraftInput, which: 'now' | 'then'): (Figure | null)[] {
  return pair.map((name) => figureOf(name, input, which));
}

function scaled(figure: Figure | null | undefined): number {
  return figure?.units ? figure.units / 10 ** figure.decimals : 0;
}

function decimalsOf(figures: readonly (Figure | null)[]): number {
  return Math.max(0, ...figures.map((figure) => figure?.decimals ?? 0));
}

function knownOf(names: readonly string[], input: DraftInput): string {
  const isIn = (which: 'now' | 'then') => names.every((name) => figureOf(name, input, which)?.units != null);
  if (!isIn('now')) return 'none';
  return isIn('then') ? 'both' : 'now';
}

function sizeSlots(name: string, pp: number | null, decimals: number, voice: Voice): Slots {
  if (pp === null) return { [name]: '', [`${name}Count`]: 0 };
  return { [name]: printGap(pp, decimals, voice), [`${name}Count`]: Number(Math.abs(pp).toFixed(decimals)) };
}

/** Names of the claim that are blocs. */
export function blocsOf({ finding, beside }: DraftInput) {
  const names = namesOf(finding);
  return (beside?.blocs ?? []).filter(({ name }) => names.includes(name));
}
