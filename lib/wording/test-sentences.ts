import type { SecondTest, TestableFinding } from '@/lib/findings/check-types';
import { formatP, formatPoints, formatTrimmed } from '@/lib/format/number';
import type { Draft } from './draft';
import { isOfTwoReleases } from './draft-input';
import { say, type Slots } from './say';
import type { MethodSentence } from './language-pack';

type Tested = Exclude<TestableFinding, { verdict: 'cannot-be-tested' }>;

/** The part of the method note about the test: level, family, second tests, rounding and how far it carries. */
export function testSentences(draft: Draft): string[] {
  const { finding } = draft.input;
  if (finding.verdict === 'cannot-be-tested') return [];
  const write = (key: MethodSentence, extra: Slots = {}) =>
    say(draft.pack.methodNote[key], { ...draft.slots, ...extra }, draft.voice.locale);
  const { locale } = draft.voice;
  const count = familySize(draft);
  const isOfChange = isOfTwoReleases(finding.kind);
  return [
    write('test', {
      z: finding.z === null ? 'none' : formatPoints(finding.z, 2, locale),
      p: formatP(finding.p, locale),
    }),
    ...(count > 1 ? [write('family', { count, pAdjusted: formatP(finding.pAdjusted, locale) })] : []),
    ...finding.secondTests.map((test) => write('second-test', secondTestSlots(test, draft))),
    write('rounding', {
      rounding: formatTrimmed(finding.roundingPp, 2, locale),
      roundingCount: finding.roundingPp,
    }),
    ...breakingSentences(finding, draft, write),
    ...(finding.reasons.includes('would-hold-at-lower-deff') ? [write('lower-deff')] : []),
    ...(finding.detectable80Pp === null ? [] : [write('detectable')]),
    ...(finding.kind === 'change' && finding.littleChanged ? [write('little-changed')] : []),
    ...(finding.verdict === 'holds' && isOfChange ? [write('exaggerated')] : []),
  ];
}

/** How many findings were tested together with this one: changes and changes of leads are one family. */
function familySize({ input }: Draft): number {
  const familyOf = (kind: string) => (kind === 'lead-change' ? 'change' : kind);
  return input.answer.findings.filter(
    (one) =>
      one.kind !== 'share' &&
      one.verdict !== 'cannot-be-tested' &&
      familyOf(one.kind) === familyOf(input.finding.kind),
  ).length;
}

function secondTestSlots(test: SecondTest, { pack, voice }: Draft): Slots {
  const shared = { name: pack.terms.secondTest[test.name], passes: test.significant ? 'yes' : 'no' };
  if (test.name !== 'newcombe')
    return { ...shared, measure: 'p', p: formatP(test.p, voice.locale), low: '', high: '' };
  const [low, high] = test.intervalPp.map((pp) => formatPoints(pp, 1, voice.locale));
  return { ...shared, measure: 'interval', p: '', low: low ?? '', high: high ?? '' };
}

/** A sample is rarely worth more than a random one of its size, so a design effect below 1 is no reason to hope. */
function isPlausible(finding: Tested, breaking: number, { answer }: Draft['input']): boolean {
  if ('breakingDeff' in finding) return breaking >= 1;
  return [answer.base, answer.previousBase].every((base) => breaking * (base?.deff ?? 0) >= 1);
}

/** Only where it says something: beyond the design effect of a finding that passes, below that of one that fails. */
function breakingSentences(
  finding: Tested,
  { input, voice }: Draft,
  write: (key: MethodSentence, extra: Slots) => string,
): string[] {
  const hasPassed = finding.verdict !== 'does-not-hold';
  const [key, breaking, used] =
    'breakingDeff' in finding
      ? (['breaking-deff', finding.breakingDeff, input.answer.base.deff ?? 0] as const)
      : (['breaking-factor', finding.breakingFactor, 1] as const);
  if (breaking === null || breaking > used !== hasPassed) return [];
  if (!hasPassed && !isPlausible(finding, breaking, input)) return [];
  return [
    write(key, {
      settled: hasPassed ? 'yes' : 'no',
      breaking: formatTrimmed(breaking, 2, voice.locale),
    }),
  ];
}
