import type { SecondTest } from '@/lib/findings/check-types';
import { formatP, formatPoints, formatTrimmed } from '@/lib/format/number';
import type { Draft } from './draft';
import type { TestedDraft } from './draft-finding';
import { isOfTwoReleases } from './draft-input';
import { say, type Slots } from './say';
import { familySize, isPlausibleBreaking } from './test-facts';
import type { MethodSentence } from './language-pack';

/** The part of the method note about the test: level, family, second tests, rounding and how far it carries. */
export function testSentences(draft: Draft): string[] {
  const { finding } = draft.input;
  if (finding.verdict === 'cannot-be-tested') return [];
  const write = (key: MethodSentence, extra: Slots = {}) =>
    say(draft.pack.methodNote[key], { ...draft.slots, ...extra }, draft.voice.locale);
  const { locale } = draft.voice;
  const count = familySize(finding, draft.input.answer);
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

function secondTestSlots(test: SecondTest, { pack, voice }: Draft): Slots {
  const shared = { name: pack.terms.secondTest[test.name], passes: test.significant ? 'yes' : 'no' };
  if (test.name !== 'newcombe')
    return { ...shared, measure: 'p', p: formatP(test.p, voice.locale), low: '', high: '' };
  const [low, high] = test.intervalPp.map((pp) => formatPoints(pp, 1, voice.locale));
  return { ...shared, measure: 'interval', p: '', low: low ?? '', high: high ?? '' };
}

function breakingSentences(
  finding: TestedDraft,
  { input, voice }: Draft,
  write: (key: MethodSentence, extra: Slots) => string,
): string[] {
  if (!isPlausibleBreaking(finding, input.answer)) return [];
  const [key, breaking] =
    'breakingDeff' in finding
      ? (['breaking-deff', finding.breakingDeff] as const)
      : (['breaking-factor', finding.breakingFactor] as const);
  return [
    write(key, {
      settled: finding.verdict === 'does-not-hold' ? 'no' : 'yes',
      breaking: formatTrimmed(breaking ?? 0, 2, voice.locale),
    }),
  ];
}
