import { ENGLISH_CHART_WORDS } from '@/lib/charts/chart-words';
import type { SoundingSpec } from '@/lib/charts/sounding-spec';
import { soundingSpecOf } from '@/lib/charts/sounding-spec-of';
import { check } from '@/lib/findings/check';
import type { Base, CheckDocument, Finding } from '@/lib/findings/check-types';

export const words = ENGLISH_CHART_WORDS;

const kelmouth = (shares: [string, number][], more: Partial<Base> = {}): Base => ({
  sampleSource: 'probability',
  n: 1012,
  design: 'weighted',
  decimals: 0,
  shares: [
    ...shares.map(([option, pct]) => ({ option, pct })),
    { option: 'Don’t know', pct: 6, answer: false },
  ],
  ...more,
});

/** Alder at so many percent, Brook at 36. */
const alder = (pct: number, more: Partial<Base> = {}) =>
  kelmouth(
    [
      ['Alder', pct],
      ['Brook', 36],
    ],
    more,
  );

/** Invented releases, each showing one kind and verdict. */
export const documents = {
  fragile: {
    release: kelmouth([
      ['Alder', 49],
      ['Brook', 41],
      ['Someone else', 4],
    ]),
  },
  holds: {
    release: kelmouth([
      ['Alder', 56],
      ['Brook', 36],
      ['Someone else', 2],
    ]),
  },
  notShown: {
    release: kelmouth(
      [
        ['Alder', 47],
        ['Brook', 41],
      ],
      { statedMargin: { pp: 3.7, unit: 0.1, level: 0.95 } },
    ),
  },
  level: {
    release: kelmouth([
      ['Alder', 45],
      ['Brook', 45],
    ]),
  },
  cannotBeTested: {
    release: kelmouth(
      [
        ['Alder', 47],
        ['Brook', 41],
      ],
      { sampleSource: 'opt-in' },
    ),
  },
  change: {
    release: kelmouth([
      ['Alder', 49],
      ['Brook', 41],
    ]),
    previous: kelmouth(
      [
        ['Alder', 46],
        ['Brook', 43],
      ],
      { n: 1005 },
    ),
  },
  threshold: {
    release: kelmouth([
      ['Alder', 49],
      ['Brook', 41],
      ['Someone else', 4],
    ]),
    thresholds: [
      { option: 'Brook', pct: 50 },
      { option: 'Someone else', pct: 5 },
    ],
  },
  family: { release: alder(50), previous: alder(44) },
  changeFragile: { release: alder(51), previous: alder(44) },
  changeHolds: { release: alder(55), previous: alder(44), thresholds: [{ option: 'Alder', pct: 50 }] },
  changeUnlike: { release: alder(51), previous: alder(44, { sampleSource: 'opt-in' }) },
  tooSmall: { release: alder(54, { n: 110 }) },
  thresholdFragile: { release: alder(54), thresholds: [{ option: 'Alder', pct: 50 }] },
} satisfies Record<string, CheckDocument>;

export function findingOf<K extends Finding['kind']>(document: CheckDocument, kind: K, at = 0) {
  const found = check(document).findings.filter((finding) => finding.kind === kind)[at];
  if (!found) throw new Error(`no ${kind} in the example`);
  return found as Extract<Finding, { kind: K }>;
}

export function specOf(document: CheckDocument, kind: Finding['kind'], at = 0): SoundingSpec {
  const spec = soundingSpecOf(findingOf(document, kind, at), document, words);
  if (!spec) throw new Error(`nothing to draw of the ${kind} in the example`);
  return spec;
}

/** Every kind with every verdict it has among the examples, by the name of its stored picture. */
export const pictures: Record<string, SoundingSpec> = {
  'lead-holds': specOf(documents.holds, 'lead'),
  'lead-fragile': specOf(documents.fragile, 'lead'),
  'lead-not-shown': specOf(documents.notShown, 'lead'),
  'lead-level': specOf(documents.level, 'lead'),
  'lead-cannot-be-tested': specOf(documents.cannotBeTested, 'lead'),
  'lead-too-small': specOf(documents.tooSmall, 'lead'),
  'change-not-shown': specOf(documents.change, 'change'),
  'change-down-not-shown': specOf(documents.change, 'change', 1),
  'change-not-shown-in-family': specOf(documents.family, 'change'),
  'change-fragile': specOf(documents.changeFragile, 'change'),
  'change-holds': specOf(documents.changeHolds, 'change'),
  'change-cannot-be-tested': specOf(documents.changeUnlike, 'change'),
  'lead-change-fragile': specOf(documents.changeHolds, 'lead-change'),
  'lead-change-not-shown': specOf(documents.change, 'lead-change'),
  'threshold-holds': specOf(documents.threshold, 'threshold'),
  'threshold-fragile': specOf(documents.thresholdFragile, 'threshold'),
  'threshold-not-shown': specOf(documents.threshold, 'threshold', 1),
  share: specOf(documents.fragile, 'share'),
  'share-without-margin': specOf(documents.cannotBeTested, 'share'),
};
