import 'server-only';
import { given, NOT_APPLICABLE, NOT_DISCLOSED, NOT_ENTERED } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { Claim } from '@/lib/domain/sheet';
import { check } from '@/lib/findings/check';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import { claimKey, findClaim } from '@/lib/findings/claim-key';
import type { Finding, Policy } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import type { DraftInput } from '@/lib/wording/draft-input';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';

/** How the people and parties of an example are called. */
export type Names = { first: string; second: string; third: string; pollster: string };

export const PLAIN_NAMES: Names = {
  first: 'Alder',
  second: 'Brook',
  third: 'Dunmor',
  pollster: 'Kelmouth Research',
};

/** Names that break what is not careful with braces, quotes, signs, direction and length. */
export const HOSTILE_NAMES: Names[] = [
  { first: 'O’Ne{il', second: "D'Arc} #1", third: '{a}', pollster: 'The "Quo\'ted" {Panel}, plural' },
  { first: '<b>Ada</b> & Co.', second: 'עדה ברוק', third: '100% Ours', pollster: `N${'o'.repeat(80)}` },
];

type Facts = Partial<ReleaseFacts>;
type Shares = [first: number | null, second: number | null, third?: number, rest?: number];
type Row = {
  claim: (names: Names) => Claim;
  now: Shares;
  then?: Shares;
  facts?: Facts;
  earlier?: Facts;
  policy?: Partial<Policy>;
  pairs?: boolean;
};

const lead = ({ first, second }: Names): Claim => ({ kind: 'lead', pair: [first, second] });
const change = ({ first }: Names): Claim => ({ kind: 'change', option: first });
const gapChange = ({ first, second }: Names): Claim => ({ kind: 'lead-change', pair: [first, second] });
const half = ({ first }: Names): Claim => ({ kind: 'threshold', option: first, pct: 50 });
const hurdle = ({ first }: Names): Claim => ({ kind: 'threshold', option: first, pct: 5 });

const KNOWN: Facts = { deff: { source: 'stated', value: 1.3, df: null } };
const ASSUMED: Facts = { statedMargin: given({ pp: 3.1, unit: 0.1, level: 0.95 }) };
const WEIGHTS: Facts = { deff: { source: 'kish', value: 1.6, df: null } };
const NONE: Facts = { statedMargin: NOT_DISCLOSED };
const PANEL: Facts = { sampleSource: 'opt-in', mode: given('online'), sponsor: NOT_DISCLOSED, ...NONE };
const MODELLED: Facts = { ...PANEL, modelledInterval: { pp: 3.8, unit: 0.1, level: 0.95 } };
const UNSURE: Facts = {
  ...PANEL,
  sampleSource: 'unknown',
  mode: NOT_DISCLOSED,
  population: NOT_DISCLOSED,
  questionWording: NOT_ENTERED,
  design: 'unknown',
  sourceUrl: NOT_DISCLOSED,
};
const PLACES: Facts = { design: 'clustered', mode: given('face-to-face') };
const ISSUE: Facts = { race: { id: 'issue', name: 'Bridge toll', kind: 'issue', thresholds: [] } };
const TENTHS: Facts = { decimals: 1, ...KNOWN };
const MANY: Facts = { n: given(9000), ...KNOWN };
const AS_IF = { comparisonBasis: true };

/** One row per claim, verdict and reason that reads differently, with one point, many points and fractions among them. */
const ROWS: Row[] = [
  { claim: lead, now: [60, 31], facts: KNOWN },
  { claim: lead, now: [52, 40], facts: ASSUMED },
  { claim: lead, now: [39, 52], facts: KNOWN, pairs: true },
  { claim: lead, now: [54, 38], facts: { ...ISSUE, ...KNOWN } },
  { claim: lead, now: [49, 41], facts: ASSUMED },
  { claim: lead, now: [49, 41], facts: { ...PLACES, ...NONE } },
  { claim: lead, now: [49, 42], facts: KNOWN },
  { claim: lead, now: [46, 38], facts: ASSUMED },
  { claim: lead, now: [49, 41], facts: WEIGHTS },
  { claim: lead, now: [48, 41], facts: { ...ISSUE, ...ASSUMED } },
  { claim: lead, now: [54, 38], facts: MODELLED },
  { claim: lead, now: [54, 38], facts: PANEL, policy: AS_IF },
  { claim: lead, now: [52, 40, 455, 401], facts: { ...TENTHS, n: given(120) }, pairs: true },
  { claim: lead, now: [47, 41] },
  { claim: lead, now: [42, 41], facts: KNOWN },
  { claim: lead, now: [421, 416], facts: TENTHS },
  { claim: lead, now: [47, 43], facts: MODELLED },
  { claim: lead, now: [44, 41], facts: PANEL, policy: AS_IF },
  { claim: lead, now: [40, 34], facts: ASSUMED },
  { claim: lead, now: [285, 230, 202], facts: TENTHS, pairs: true },
  { claim: lead, now: [44, 44] },
  { claim: lead, now: [49, 41], facts: PANEL },
  { claim: lead, now: [49, 41], facts: UNSURE },
  { claim: lead, now: [49, 41], facts: { n: NOT_DISCLOSED } },
  { claim: lead, now: [49, 41], facts: { n: given(120), ...NONE } },
  { claim: lead, now: [49, 41], facts: { ...PLACES, deff: { source: 'design', value: 2.1, df: 6 } } },
  { claim: lead, now: [47, null], pairs: true },
  { claim: change, now: [58, 33], then: [43, 44], facts: KNOWN, earlier: KNOWN },
  { claim: change, now: [43, 44], then: [58, 33], facts: KNOWN, earlier: KNOWN },
  { claim: change, now: [52, 40], then: [42, 48], facts: KNOWN, earlier: KNOWN },
  { claim: change, now: [42, 48], then: [52, 40], facts: KNOWN, earlier: KNOWN },
  { claim: change, now: [50, 41], then: [43, 44], facts: ASSUMED, earlier: ASSUMED },
  { claim: change, now: [38, 46], then: [44, 43], facts: KNOWN, earlier: KNOWN },
  { claim: change, now: [47, 41], then: [44, 43] },
  {
    claim: change,
    now: [45, 42],
    then: [44, 43],
    earlier: { pollster: { id: 'other', name: 'Norwater Polls' } },
  },
  { claim: change, now: [38, 37], then: [44, 43], facts: ASSUMED, earlier: ASSUMED },
  { claim: change, now: [45, 43], then: [45, 42] },
  { claim: change, now: [47, 41], then: [47, 42], facts: MANY, earlier: MANY },
  { claim: change, now: [47, 41], then: [44, 43], facts: PANEL, earlier: PANEL },
  { claim: change, now: [47, 41], then: [44, 43], earlier: PANEL },
  { claim: change, now: [47, 41], then: [null, 43] },
  { claim: change, now: [47, 41], then: [44, 43], facts: { n: NOT_DISCLOSED } },
  { claim: gapChange, now: [62, 28], then: [40, 48], facts: KNOWN, earlier: KNOWN },
  { claim: gapChange, now: [54, 36], then: [43, 45], facts: KNOWN, earlier: KNOWN },
  { claim: gapChange, now: [50, 41], then: [43, 46], facts: ASSUMED, earlier: ASSUMED },
  { claim: gapChange, now: [47, 41], then: [44, 43] },
  { claim: gapChange, now: [380, 370, 150], then: [440, 390, 100], facts: TENTHS, earlier: TENTHS },
  { claim: gapChange, now: [46, 42], then: [45, 41] },
  { claim: gapChange, now: [47, 41], then: [44, 43], facts: { n: NOT_DISCLOSED } },
  { claim: gapChange, now: [47, 41], then: [44, 43], earlier: PANEL },
  { claim: half, now: [58, 33], facts: KNOWN },
  { claim: half, now: [40, 49], facts: KNOWN },
  { claim: half, now: [41, 49] },
  { claim: half, now: [55, 38], facts: KNOWN },
  { claim: half, now: [54, 38], facts: ASSUMED },
  { claim: half, now: [46, 48], facts: ASSUMED },
  { claim: half, now: [51, 41], facts: { sponsor: NOT_APPLICABLE } },
  { claim: half, now: [50, 41] },
  { claim: half, now: [58, 33], facts: PANEL },
  { claim: hurdle, now: [52, 400, 305], facts: TENTHS },
  { claim: hurdle, now: [91, 400, 305], facts: TENTHS },
];

/** The rows as inputs of drafting under the product's own style, through the engine itself. */
export function exampleInputs(names: Names): DraftInput[] {
  return ROWS.flatMap((row) => {
    const claim = row.claim(names);
    const release = releaseOf(names, row.now, claim, row.facts ?? {});
    const previous = row.then ? earlierOf(names, row.then, claim, row.earlier ?? {}) : null;
    const policy = { ...DEFAULT_POLICY, ...row.policy };
    const asked = row.pairs ? { pairs: pairsOf(release) } : {};
    const answer = check(parseCheckDocument(checkDocumentOf(release, previous, policy, asked)));
    const finding = findClaim(answer, claimKey(asFinding(claim)))?.finding;
    if (!finding || finding.kind === 'share') return [];
    const comparison = { note: [] };
    const common = { houseStyle: DEFAULT_HOUSE_STYLE, policy, language: 'en' as const };
    return [{ claim, finding, answer, release, previous, comparison, ...common }];
  });
}

function pairsOf({ shares }: ReleaseFacts): [string, string][] {
  const names = shares.filter(({ isAnswer }) => isAnswer).map(({ option }) => option);
  return names.flatMap((one, at) => names.slice(at + 1).map((other): [string, string] => [one, other]));
}

function asFinding(claim: Claim): Finding {
  const untested = { estimatePp: null, verdict: 'cannot-be-tested' as const, reasons: [] };
  return claim.kind === 'threshold'
    ? { kind: 'threshold', option: claim.option, thresholdPct: claim.pct, ...untested }
    : { ...claim, ...untested };
}

function releaseOf(
  names: Names,
  [first, second, third, rest]: Shares,
  claim: Claim,
  facts: Facts,
): ReleaseFacts {
  const decimals = facts.decimals ?? 0;
  const sum = [first, second, third, rest].reduce<number>((total, units) => total + (units ?? 0), 0);
  const left = Math.max(0, 100 * 10 ** decimals - sum);
  const thresholds =
    claim.kind === 'threshold' ? [{ option: claim.option, pct: claim.pct, base: 'answers' as const }] : [];
  return {
    releaseId: 'example',
    versionId: 'example',
    version: 1,
    race: { id: 'governor', name: 'Governor of Averil Coast', kind: 'candidate', thresholds },
    pollster: { id: 'kelmouth', name: names.pollster },
    sponsor: given({ id: 'courier', name: 'The Averil Courier' }),
    population: given('likely-voters'),
    sampleSource: 'probability',
    mode: given('live-telephone'),
    design: 'weighted',
    fieldStartOn: '2026-09-14',
    fieldEndOn: '2026-09-17',
    publishedOn: '2026-09-18',
    n: given(1012),
    deff: null,
    statedMargin: given({ pp: 3.7, unit: 0.1, level: 0.95 }),
    modelledInterval: null,
    questionWording: given('If the election for governor were held today, whom would you vote for?'),
    decimals,
    shares: [
      { option: names.first, units: first, isAnswer: true },
      { option: names.second, units: second, isAnswer: true },
      ...(third === undefined ? [] : [{ option: names.third, units: third, isAnswer: true }]),
      { option: 'Someone else', units: rest ?? Math.floor(left / 2), isAnswer: true },
      { option: 'Don’t know', units: rest === undefined ? Math.ceil(left / 2) : left, isAnswer: false },
    ],
    sourceUrl: given('https://kelmouth.example/september'),
    ...facts,
  };
}

function earlierOf(names: Names, shares: Shares, claim: Claim, facts: Facts): ReleaseFacts {
  return releaseOf(names, shares, claim, {
    releaseId: 'earlier',
    versionId: 'earlier',
    fieldStartOn: '2026-08-17',
    fieldEndOn: '2026-08-20',
    publishedOn: '2026-08-21',
    n: given(1005),
    ...facts,
  });
}
