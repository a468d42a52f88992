import { valueOf } from '@/lib/domain/disclosed';
import { ELECTION_KINDS } from '@/lib/domain/vocabulary';
import { formatPoints } from '@/lib/format/number';
import { untestedSentences } from './body';
import { blocsOf } from './claim-slots';
import { blocSlots, listOf, sharesWaves, waveSlots } from './context';
import { sayAll, type Draft } from './draft';
import { isOfTwoReleases } from './draft-input';
import { basesOf } from './margin-slots';
import { inSentence, isolated, plain } from './names';
import { printCount, printShare } from './print';
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
    ...besideSentences(draft),
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
    .map(({ option, units }) => `${isolated(option)} ${printShare(units, release.decimals, draft.voice)}`);
  return shares.length > 0
    ? sayAll([draft.pack.methodNote['no-choice']], draft, { shares: listOf(shares, draft) })
    : '';
}

/** Whether a design effect decided anything: a test, or that the sample is too small or has too few places. */
function usesDeff({ input: { finding } }: Draft): boolean {
  if (finding.verdict !== 'cannot-be-tested') return true;
  return finding.reasons.includes('too-small') || finding.reasons.includes('few-clusters');
}

/** What the judgement of a whole release rests on beyond its printed shares. */
function besideSentences(draft: Draft): string[] {
  const { input, pack } = draft;
  const { beside, finding } = input;
  if (!beside) return [];
  const rebasedN = beside.rebasedN;
  return [
    typeof rebasedN === 'number'
      ? sayAll([pack.methodNote.rebased], draft, { rebasedN: printCount(rebasedN, draft.voice) })
      : '',
    ...blocsOf(input).map((bloc) => sayAll([pack.methodNote.bloc], draft, blocSlots(bloc, draft))),
    finding.kind === 'net-score' || finding.kind === 'net-score-change'
      ? sayAll([pack.methodNote['net-score']], draft)
      : '',
    sharesWaves(draft) ? sayAll([pack.methodNote['shared-waves']], draft, waveSlots(draft)) : '',
  ];
}

function deffNotes(draft: Draft): string[] {
  const sentences = basesOf(draft.input).flatMap((concerned, index) =>
    deffSentences(draft, concerned, index),
  );
  return sentences.length > 0 ? [...sentences, sayAll([draft.pack.methodNote['one-deff']], draft)] : [];
}

function deffSentences(
  draft: Draft,
  { facts, base, group }: ReturnType<typeof basesOf>[number],
  index: number,
): string[] {
  if (!base?.deffSource || base.deff === null || !base.deffRange) return [];
  const { pack, voice, slots } = draft;
  const hundredths = [base.deff, ...base.deffRange].some((deff) => !isOneDecimal(deff));
  const shown = (deff: number) => formatPoints(deff, hundredths ? 2 : 1, voice.locale);
  const [low, high] = base.deffRange;
  const extra = {
    ...slots,
    stated: base.basis === 'modelled' ? 'modelled' : 'margin',
    poll: group !== undefined ? 'group' : index === 0 ? 'this' : 'earlier',
    group: group ? isolated(group) : pack.terms.everyoneElse,
    pollster: inSentence(facts.pollster.name, voice.language),
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
