/**
 * The check document and its answer: the shapes that statistics are asked in and answered in.
 * Numbers named `…Pct` are percent 0–100, `…Pp` percentage points, bare `p`, `alpha`, `level` proportions 0–1.
 */

export type SampleSource = 'probability' | 'quota' | 'opt-in' | 'blended' | 'unknown';
export type Design = 'weighted' | 'unweighted' | 'clustered';
export type Range = readonly [low: number, high: number];

export type StatedInterval = { pp: number; unit: number; level: number };

export type GivenDeff = { source: 'design' | 'kish' | 'stated'; value: number; df?: number };

export type PrintedShare = {
  option: string;
  /** Percent as printed; null where the release does not disclose it. */
  pct: number | null;
  /** false for don't know, refused and the like. Default true. */
  answer?: boolean;
};

export type Base = {
  sampleSource: SampleSource;
  n: number | null;
  design: Design;
  deff?: GivenDeff | null;
  statedMargin?: StatedInterval | null;
  modelledInterval?: StatedInterval | null;
  decimals: number;
  shares: PrintedShare[];
};

export type AssumedDeff = { value: number; range: Range };

export type Policy = {
  level: number;
  assumed: Record<Design, AssumedDeff>;
  kishRange: Range;
  comparisonBasis: boolean;
  indifferencePp: number;
  minimumNEff: number;
};

export type Pair = readonly [first: string, second: string];
export type Threshold = { option: string; pct: number };

export type CheckDocument = {
  policy?: Partial<Omit<Policy, 'assumed'>> & { assumed?: Partial<Policy['assumed']> };
  release: Base;
  previous?: Base | null;
  pairs?: Pair[];
  changes?: string[];
  thresholds?: Threshold[];
};

export type Basis = 'sampling' | 'modelled' | 'comparison' | 'none';
export type DeffSource = 'design' | 'kish' | 'stated' | 'implied' | 'assumed';
export type BaseNote =
  | 'shares-exceed-100'
  | 'stated-margin-like-unweighted'
  | 'deff-assumed'
  | 'deff-below-one'
  | 'deff-above-four'
  | 'modelled-basis'
  | 'comparison-basis';

export type BaseAnswer = {
  basis: Basis;
  deff: number | null;
  deffSource: DeffSource | null;
  deffRange: Range | null;
  nEff: number | null;
  maximumMarginPp: number | null;
  notes: BaseNote[];
};

export type Verdict = 'holds' | 'fragile' | 'does-not-hold' | 'cannot-be-tested';

export type TestedReason =
  | 'family'
  | 'would-hold-at-lower-deff'
  | 'rounding'
  | 'design-effect'
  | 'second-test'
  | 'together'
  | 'modelled'
  | 'comparison';
export type UntestedReason =
  'no-sample-size' | 'no-sampling-basis' | 'too-small' | 'few-clusters' | 'not-comparable' | 'not-disclosed';
export type Reason = TestedReason | UntestedReason;

export type SecondTest =
  | { name: 'score' | 'exact-sign' | 'pooled' | 'fisher' | 'exact-binomial'; p: number; significant: boolean }
  | { name: 'newcombe'; intervalPp: Range; significant: boolean };

export type ShareFinding = {
  kind: 'share';
  option: string;
  estimatePct: number | null;
  intervalPct?: Range;
  method?: 'wilson' | 'clopper-pearson';
};

export type TestFields = {
  estimatePp: number;
  sePp: number;
  marginPp: number;
  intervalPp: Range;
  z: number | null;
  p: number;
  pAdjusted: number;
  alpha: number;
  roundingPp: number;
  secondTests: SecondTest[];
  verdict: Exclude<Verdict, 'cannot-be-tested'>;
  reasons: TestedReason[];
  detectable80Pp: number | null;
  survivesTwiceError: boolean | null;
};

export type UntestedFields = {
  estimatePp: number | null;
  verdict: 'cannot-be-tested';
  reasons: UntestedReason[];
};

type OneBase = TestFields & { breakingDeff: number | null };
type TwoBases = TestFields & { breakingFactor: number | null };

export type LeadFinding = { kind: 'lead'; pair: Pair } & (OneBase | UntestedFields);
export type ChangeFinding = { kind: 'change'; option: string } & (
  (TwoBases & { littleChanged: boolean }) | UntestedFields
);
export type LeadChangeFinding = { kind: 'lead-change'; pair: Pair } & (TwoBases | UntestedFields);
export type ThresholdFinding = { kind: 'threshold'; option: string; thresholdPct: number } & (
  OneBase | UntestedFields
);

export type TestableFinding = LeadFinding | ChangeFinding | LeadChangeFinding | ThresholdFinding;
export type Finding = ShareFinding | TestableFinding;

export type CheckAnswer = {
  engine: string;
  base: BaseAnswer;
  previousBase: BaseAnswer | null;
  findings: Finding[];
};

/** Where a share or change of the release was refused: a message with the path of the field. */
export type CheckRefusal = { path: string; message: string };
