import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { ELECTION_KINDS } from '@/lib/domain/vocabulary';
import { shareBaseOf } from '@/lib/findings/threshold-base';
import type { TestableFinding } from '@/lib/findings/check-types';
import type { DraftInput } from './draft-input';
import { plain } from './names';
import { printGap, printPercent, printShare, type Voice } from './print';
import { say, type Slots } from './say';

/** The figures and names of the claim itself. Leads are told from the higher figure, whatever the order asked in. */
export function claimSlots(input: DraftInput, voice: Voice): Slots {
  const { finding } = input;
  const claim = finding.kind === 'lead-change' ? 'leadChange' : finding.kind;
  switch (finding.kind) {
    case 'lead':
      return { claim, ...ofLead(finding, input, voice) };
    case 'change':
      return { claim, ...ofChange(finding, input, voice) };
    case 'lead-change':
      return { claim, ...ofLeadChange(finding, input, voice) };
    case 'threshold':
      return { claim, ...ofThreshold(finding, input, voice) };
  }
}

type Of<K extends TestableFinding['kind']> = Extract<TestableFinding, { kind: K }>;

function ofLead(finding: Of<'lead'>, { release }: DraftInput, voice: Voice): Slots {
  const estimate = finding.estimatePp;
  const [higher, lower] = (estimate ?? 0) < 0 ? [finding.pair[1], finding.pair[0]] : finding.pair;
  const printed = (option: string) => printShare(unitsOf(release, option), release.decimals, voice);
  return {
    setting: settingOf(release, finding.pair),
    known: estimate === null ? 'no' : 'yes',
    a: nameOf(higher, release, voice),
    b: nameOf(lower, release, voice),
    aShare: printed(higher),
    bShare: printed(lower),
    ...sizeSlots('gap', estimate, release.decimals, voice),
  };
}

function ofChange(finding: Of<'change'>, { release, previous }: DraftInput, voice: Voice): Slots {
  const { option, estimatePp } = finding;
  return {
    option: nameOf(option, release, voice),
    known: knownOf([option], release, previous),
    now: printShare(unitsOf(release, option), release.decimals, voice),
    then: printShare(previous && unitsOf(previous, option), previous?.decimals ?? 0, voice),
    direction: (estimatePp ?? 0) < 0 ? 'less' : 'more',
    ...sizeSlots('move', estimatePp, Math.max(release.decimals, previous?.decimals ?? 0), voice),
  };
}

function ofLeadChange(finding: Of<'lead-change'>, { release, previous }: DraftInput, voice: Voice): Slots {
  const { pair, estimatePp } = finding;
  const [first, second] = pair;
  const isReversed = (unitsOf(release, second) ?? 0) > (unitsOf(release, first) ?? 0);
  const [higher, lower] = isReversed ? [second, first] : [first, second];
  const [toward, away] =
    estimatePp === null || estimatePp === 0
      ? [higher, lower]
      : estimatePp > 0
        ? [first, second]
        : [second, first];
  const now = (option: string) => printShare(unitsOf(release, option), release.decimals, voice);
  const then = (option: string) =>
    printShare(previous && unitsOf(previous, option), previous?.decimals ?? 0, voice);
  return {
    known: knownOf(pair, release, previous),
    a: nameOf(higher, release, voice),
    b: nameOf(lower, release, voice),
    toward: nameOf(toward, release, voice),
    away: nameOf(away, release, voice),
    aNow: now(higher),
    bNow: now(lower),
    aThen: then(higher),
    bThen: then(lower),
    ...sizeSlots('move', estimatePp, Math.max(release.decimals, previous?.decimals ?? 0), voice),
  };
}

function ofThreshold(finding: Of<'threshold'>, { release }: DraftInput, voice: Voice): Slots {
  const { option, thresholdPct, estimatePp } = finding;
  const { terms } = voice.style.messages[voice.language];
  const decimals = [0, 1, 2, 3].find((places) => Number(thresholdPct.toFixed(places)) === thresholdPct) ?? 4;
  const pct = printPercent(thresholdPct, decimals, voice);
  const asksEveryone = shareBaseOf(release).hasNonAnswers;
  return {
    option: nameOf(option, release, voice),
    known: estimatePp === null ? 'no' : 'yes',
    share: printShare(unitsOf(release, option), release.decimals, voice),
    line: thresholdPct === 50 ? terms.half : say(terms.threshold, { pct }, voice.locale),
    side: (estimatePp ?? 0) < 0 ? 'below' : 'above',
    asked: asksEveryone ? 'everyone' : 'unknown',
  };
}

/** Leads are for contests; of an approval or issue series, or a "don't know", one can only say that more say it. */
function settingOf(release: ReleaseFacts, options: readonly string[]): 'contest' | 'question' {
  const isContest =
    ELECTION_KINDS.includes(release.race.kind) && options.every((option) => isAnswer(release, option));
  return isContest ? 'contest' : 'question';
}

/** Candidates and parties stand as they are; an answer that is a phrase, such as "End the toll", is quoted. */
function nameOf(option: string, release: ReleaseFacts, voice: Voice): string {
  const isProperName = settingOf(release, [option]) === 'contest' && release.race.kind !== 'referendum';
  if (isProperName) return plain(option);
  return say(voice.style.messages[voice.language].terms.quoted, { name: plain(option) }, voice.locale);
}

function isAnswer(release: ReleaseFacts, option: string): boolean {
  return release.shares.find((share) => share.option === option)?.isAnswer ?? true;
}

function unitsOf(release: ReleaseFacts, option: string): number | null {
  return release.shares.find((share) => share.option === option)?.units ?? null;
}

function knownOf(options: readonly string[], release: ReleaseFacts, previous: ReleaseFacts | null): string {
  const isIn = (facts: ReleaseFacts) => options.every((option) => unitsOf(facts, option) !== null);
  if (!isIn(release)) return 'none';
  return previous && isIn(previous) ? 'both' : 'now';
}

function sizeSlots(name: string, pp: number | null, decimals: number, voice: Voice): Slots {
  if (pp === null) return { [name]: '', [`${name}Count`]: 0 };
  return { [name]: printGap(pp, decimals, voice), [`${name}Count`]: Number(Math.abs(pp).toFixed(decimals)) };
}
