import fc from 'fast-check';
import { given, NOT_DISCLOSED, type Disclosed } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { Claim } from '@/lib/domain/sheet';
import {
  DESIGNS,
  MODES,
  POPULATIONS,
  RACE_KINDS,
  SAMPLE_SOURCES,
  type RaceKind,
} from '@/lib/domain/vocabulary';
import { check } from '@/lib/findings/check';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import type { Pair, TestableFinding } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import type { DraftInput } from '@/lib/wording/draft-input';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { releaseOf } from '../wording/examples';

type Names = readonly string[];
export const PLAIN_NAMES: Names = ['Alder', 'Brook', 'Harbour Union'];
/** Names that contain words of leading, moving and counting, beside plain ones. */
const NAMES: readonly Names[] = [
  PLAIN_NAMES,
  ['Forward Lead', 'Rising Tide', 'Momentum List'],
  ['Yes', 'No', 'Someone else'],
  ['End the toll', 'Keep it up', 'Majority First'],
];
export const PLAIN_QUESTION = 'If the election for governor were held today, whom would you vote for?';
/** Questions that ask in words of leading and counting. */
const QUESTIONS: Names = [PLAIN_QUESTION, 'Who leads, in your view?', 'Will the majority win?'];

const disclosed = <T>(values: readonly T[]): fc.Arbitrary<Disclosed<T>> =>
  fc.oneof({ weight: 4, arbitrary: fc.constantFrom(...values).map(given) }, fc.constant(NOT_DISCLOSED));

function anyRelease(
  [start, end, published]: [string, string, string],
  kind: RaceKind,
  decimals: number,
  names: Names,
  questions: Names,
): fc.Arbitrary<ReleaseFacts> {
  const scale = 10 ** decimals;
  return fc
    .record({
      cuts: fc.array(fc.nat(97 * scale), { minLength: 3, maxLength: 3 }),
      hidden: fc.option(fc.nat(3), { freq: 12 }),
      n: disclosed([80, 150, 400, 1012, 3000, 12000]),
      sampleSource: fc.constantFrom(...SAMPLE_SOURCES, 'probability' as const, 'probability' as const),
      mode: disclosed(MODES),
      population: disclosed(POPULATIONS),
      design: fc.constantFrom(...DESIGNS),
      deff: fc.option(
        fc.constantFrom<NonNullable<ReleaseFacts['deff']>>(
          { source: 'design', value: 1.3, df: 30 },
          { source: 'design', value: 2.2, df: 6 },
          { source: 'kish', value: 1.6, df: null },
          { source: 'stated', value: 1.1, df: null },
        ),
      ),
      modelledInterval: fc.option(fc.constant({ pp: 4, unit: 0.5, level: 0.9 })),
      questionWording: fc.constantFrom(...questions).map(given),
    })
    .map(({ cuts, hidden, ...facts }) => {
      const [x = 0, y = 0, z = 0] = [...cuts].sort((a, b) => a - b);
      const units = [x, y - x, z - y, 97 * scale - z];
      return releaseOf(
        {},
        {
          ...facts,
          decimals,
          fieldStartOn: start,
          fieldEndOn: end,
          publishedOn: published,
          race: {
            id: 'race',
            name: 'Averil Coast',
            kind,
            thresholds: [
              { option: names[0] ?? '', pct: 50, base: 'answers' },
              { option: names[2] ?? '', pct: 4.5, base: 'answers' },
            ],
          },
          statedMargin: NOT_DISCLOSED,
          shares: [...names, 'Don’t know'].map((option, index) => ({
            option,
            units: index === hidden ? null : (units[index] ?? 0),
            isAnswer: option !== 'Don’t know',
          })),
        },
      );
    });
}

/** Two releases of one race, a policy and a style: what a sheet is drafted from; its answers have one list of the names. */
export const anyRaceOf = (all: readonly Names[], questions: Names = QUESTIONS) =>
  fc
    .record({
      kind: fc.constantFrom(...RACE_KINDS),
      decimals: fc.nat(1),
      names: fc.constantFrom(...all),
      comparisonBasis: fc.boolean(),
      style: fc.record({
        percent: fc.constantFrom('sign' as const, 'word' as const),
        numbers: fc.constantFrom('figures' as const, 'words-to-nine' as const),
        margins: fc.constantFrom('whole' as const, 'half' as const, 'tenth' as const),
      }),
    })
    .chain(({ kind, decimals, names, ...rest }) =>
      fc.record({
        release: anyRelease(['2026-09-14', '2026-09-17', '2026-09-18'], kind, decimals, names, questions),
        previous: anyRelease(['2025-12-30', '2026-01-02', '2026-01-03'], kind, decimals, names, questions),
        names: fc.constant(names),
        rest: fc.constant(rest),
      }),
    );

export const anyRace = anyRaceOf(NAMES);

export type AnyRace = typeof anyRace extends fc.Arbitrary<infer T> ? T : never;

/** Every claim of a race as a sheet would be drafted from it. */
export function draftInputsOf({
  release,
  previous,
  names,
  rest: { comparisonBasis, style },
}: AnyRace): DraftInput[] {
  const policy = { ...DEFAULT_POLICY, comparisonBasis };
  const [a = '', b = '', c = ''] = names;
  const pairs: Pair[] = [
    [a, b],
    [b, c],
  ];
  const asked = { pairs, changes: [a, 'Don’t know'] };
  const answer = check(parseCheckDocument(checkDocumentOf(release, previous, policy, asked)));
  return answer.findings.flatMap((finding) =>
    finding.kind === 'share'
      ? []
      : [
          {
            claim: claimOf(finding),
            finding,
            answer,
            release,
            previous,
            comparison: { note: [] },
            houseStyle: { ...DEFAULT_HOUSE_STYLE, ...style },
            policy,
            language: 'en' as const,
          },
        ],
  );
}

function claimOf(finding: TestableFinding): Claim {
  if (finding.kind === 'threshold') {
    return { kind: 'threshold', option: finding.option, pct: finding.thresholdPct };
  }
  return finding.kind === 'change'
    ? { kind: 'change', option: finding.option }
    : { kind: finding.kind, pair: [finding.pair[0], finding.pair[1]] };
}
