import { valueOf } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { ELECTION_KINDS } from '@/lib/domain/vocabulary';
import type { BaseAnswer } from '@/lib/findings/check-types';
import { formatPoints } from '@/lib/format/number';
import { untestedSentences } from './body';
import { sayAll, type Draft } from './draft';
import { isOfTwoReleases } from './draft-input';
import { basesOf } from './margin-slots';
import { inSentence, plain } from './names';
import { printShare } from './print';
import { say } from './say';
import { testSentences } from './test-sentences';

/** How the finding was worked out, one sentence per item, with what the reader cannot see in the text itself. */
export function draftMethodNote(draft: Draft): string {
  const { input, pack } = draft;
  const isElection = ELECTION_KINDS.includes(input.release.race.kind);
  const sentences = [
    ...comparisonSentences(draft),
    questionSentence(draft),
    choiceSentence(draft),
    ...(usesDeff(draft) ? deffNotes(draft) : []),
    ...testSentences(draft),
    input.finding.verdict === 'cannot-be-tested'
      ? `${sayAll([pack.methodNote.untested], draft)} ${untestedSentences(draft)}`
      : '',
    sayAll([pack.methodNote.engine], draft, {
      engine: input.answer.engine,
      templateVersion: input.houseStyle.templateVersion,
    }),
    sayAll([pack.methodNote[isElection ? 'before-a-vote' : 'opinion']], draft),
    sourceSentence(draft),
  ];
  return sentences.filter((sentence) => sentence !== '').join(' ');
}

function comparisonSentences(draft: Draft): string[] {
  if (!isOfTwoReleases(draft.input.finding.kind)) return [];
  const compared = sayAll([draft.pack.methodNote['compared-with']], draft);
  return [compared, ...draft.input.comparison.note.map(asSentence)];
}

function questionSentence(draft: Draft): string {
  const question = valueOf(draft.input.release.questionWording);
  return question
    ? sayAll([draft.pack.methodNote.question], draft, {
        question: plain(question),
        ended: /[.!?]$/.test(plain(question)) ? 'yes' : 'no',
      })
    : '';
}

function choiceSentence(draft: Draft): string {
  const { release } = draft.input;
  const shares = release.shares
    .filter((share) => !share.isAnswer)
    .map(({ option, units }) => `${plain(option)} ${printShare(units, release.decimals, draft.voice)}`);
  return shares.length > 0
    ? sayAll([draft.pack.methodNote['no-choice']], draft, { shares: shares.join('; ') })
    : '';
}

/** Whether a design effect decided anything: a test, or that the sample is too small or has too few places. */
function usesDeff({ input: { finding } }: Draft): boolean {
  if (finding.verdict !== 'cannot-be-tested') return true;
  return finding.reasons.includes('too-small') || finding.reasons.includes('few-clusters');
}

function deffNotes(draft: Draft): string[] {
  const sentences = basesOf(draft.input).flatMap(({ facts, base }, index) =>
    deffSentences(draft, facts, base, index),
  );
  return sentences.length > 0 ? [...sentences, sayAll([draft.pack.methodNote['one-deff']], draft)] : [];
}

function deffSentences(draft: Draft, facts: ReleaseFacts, base: BaseAnswer | null, index: number): string[] {
  if (!base?.deffSource || base.deff === null || !base.deffRange) return [];
  const { pack, voice, slots } = draft;
  const hundredths = [base.deff, ...base.deffRange].some((deff) => !isOneDecimal(deff));
  const shown = (deff: number) => formatPoints(deff, hundredths ? 2 : 1, voice.locale);
  const [low, high] = base.deffRange;
  const extra = {
    ...slots,
    stated: base.basis === 'modelled' ? 'modelled' : 'margin',
    poll: index === 0 ? 'this' : 'earlier',
    pollster: inSentence(facts.pollster.name),
    deff: shown(base.deff),
    deffLow: shown(low),
    deffHigh: shown(high),
    ranged: shown(low) === shown(high) ? 'no' : 'yes',
  };
  const isLikeUnweighted = base.notes.includes('stated-margin-like-unweighted');
  const keys = [...(isLikeUnweighted ? (['stated-margin-like-unweighted'] as const) : []), base.deffSource];
  return keys.map((key) => say(pack.methodNote[key], extra, voice.locale));
}

const isOneDecimal = (deff: number) => Math.abs(deff - Number(deff.toFixed(1))) < 1e-9;

function sourceSentence(draft: Draft): string {
  const url = valueOf(draft.input.release.sourceUrl);
  return url ? sayAll([draft.pack.methodNote.source], draft, { url: plain(url) }) : '';
}

function asSentence(text: string): string {
  const sentence = plain(text);
  return /[.!?]$/.test(sentence) ? sentence : `${sentence}.`;
}
