import type {
  Base,
  BaseAnswer,
  Basis,
  CheckDocument,
  DeffSource,
  Pair,
  Range,
  ShareFinding,
  TestFields,
  UntestedReason,
} from './check-types';
import type { Comparability } from './comparability';
import type { Presentation } from './present-share';
import type { ShareBase } from './threshold-base';
import type { WorkingStep } from './working-step';
import type { ThresholdBase } from '@/lib/domain/vocabulary';

/**
 * What judgeRelease is asked and what it answers, as plain data. Numbers named `…Pct` are percent 0–100, `…Pp`
 * percentage points, bare `p`, `alpha`, `level` proportions 0–1. A name in a pair, change, threshold or net score is
 * that of an option or of a bloc.
 */
export type ReleaseDocument = {
  /** As in a check document; absent keys take the defaults. */
  policy?: CheckDocument['policy'];
  release: QuestionBase;
  comparison?: ComparisonInput | null;
  /** Sums of options taken as one share. */
  blocs?: Bloc[];
  /** Leads. Default: the two answers with the largest shares, unless they are a net score asked; [] means none. */
  pairs?: Pair[];
  netScores?: NetScore[];
  /** Default: the names in pairs and net scores that are answers, or blocs, in both bases. */
  changes?: string[];
  thresholds?: AskedThreshold[];
  /** Each entry is one family of gaps. */
  subgroups?: SubgroupQuestion[];
};

/** The base of a question: as in a check document, with what belongs to the question. */
export type QuestionBase = Base & {
  /** Present where don't-knows were taken out and the shares computed anew; `n` of the base is then everyone asked. */
  rebased?: { n: number | null };
  /** Whom the shares are shares of; looked at where a rule counts one population only. */
  population?: ShareBase['population'];
};

export type Bloc = {
  name: string;
  /** At least one option of the release, none twice. */
  options: string[];
  /** The figure as tables give it; absent: the printed shares are summed. */
  printed?: PrintedBloc;
};

export type PrintedBloc = { pct: number; decimals: number };

export type NetScore = { approve: string; disapprove: string };

/** A value that a share is held against; with `countedBase`, tested only where the shares are shares of it. */
export type AskedThreshold = { option: string; pct: number; countedBase?: ThresholdBase };

export type ComparisonInput = {
  base: QuestionBase;
  /** What compareReleases found; absent: not looked into, and told so. */
  comparability?: Comparability;
  /** An editor's written reason to compare all the same. */
  override?: { reason: string };
  /** Tracking averages with waves in common. */
  overlap?: WaveOverlap;
  /** Whether the same people were asked both times. Default false. */
  samePeople?: boolean;
  /** Figures of blocs as the earlier release's tables give them; absent: summed. */
  blocs?: ({ name: string } & PrintedBloc)[];
};

/** Two averages over equally many waves, in order: the earlier one the first `window`, the later one the last. */
export type WaveOverlap = {
  /** Waves in each average, whole, at least 1. */
  window: number;
  /** Waves in both, whole, 0 to window. */
  shared: number;
  /** Interviews of all 2·window − shared waves in order; absent: as many in every wave of an average. */
  interviews?: number[];
  /** Shares of single waves where they are known, in percent, in the same order; absent: one pooled share. */
  shares?: { option: string; pct: number[] }[];
};

/** Subgroups of one question, and the gaps asked about: one family. */
export type SubgroupQuestion = {
  question: string;
  /** The whole sample, needed where a gap is asked against the rest of it. */
  total?: { name: string; base: Base };
  groups: Subgroup[];
  gaps: AskedGap[];
};

/** `by` names the characteristic, such as age: only groups of one characteristic have nobody in common. */
export type Subgroup = { name: string; by: string; base: Base };

export type AskedGap = {
  option: string;
  group: string;
  /** The other group, or the rest of the sample by the group's weighted share of it. The gap is `group` less this. */
  against: string | { restOfWeightPct: number };
};

export type ReleaseUntestedReason =
  | UntestedReason
  /** Interviews overlap in time and which waves are shared is not known, or every wave is shared. */
  | 'shared-waves'
  /** The same people were asked twice, and how many changed is not known. */
  | 'same-people'
  /** How many people the re-based shares stand on is not disclosed. */
  | 'rebased-size'
  /** The rule counts another base than the shares do. */
  | 'other-base'
  /** A share of a subgroup that the presentation standard suppresses. */
  | 'below-presentation-standard';

export type ReleaseUntestedFields = {
  estimatePp: number | null;
  verdict: 'cannot-be-tested';
  /** All that apply, in the order of the type. */
  reasons: ReleaseUntestedReason[];
  /** On `same-people`: the margin two independent samples of these sizes would have; null where there is none. */
  independentMarginPp?: number | null;
};

type OneBase = TestFields & { breakingDeff: number | null };
type TwoBases = TestFields & { breakingFactor: number | null };
type Judged<Tested> = (Tested & { trace: FindingTrace }) | ReleaseUntestedFields;

/** Each finding's key as claimKey makes it, and its worked calculation, made when it is first read. */
type Carried = { key: string; working: WorkingStep[] };

export type ReleaseShare = ShareFinding & { bloc?: BlocNote };
export type BlocNote = { options: string[]; source: 'printed' | 'summed' };

export type ReleaseLead = { kind: 'lead'; pair: Pair } & Judged<OneBase>;
export type NetScoreFinding = { kind: 'net-score'; pair: Pair } & Judged<OneBase>;
export type ReleaseChange = { kind: 'change'; option: string } & Judged<
  TwoBases & { littleChanged: boolean }
>;
export type ReleaseLeadChange = { kind: 'lead-change'; pair: Pair } & Judged<TwoBases>;
export type NetScoreChange = { kind: 'net-score-change'; pair: Pair } & Judged<TwoBases>;
export type ReleaseThreshold = { kind: 'threshold'; option: string; thresholdPct: number } & Judged<OneBase>;
/** The first group's share less the second's; the rest of the sample is named by an empty text. */
export type GapFinding = {
  kind: 'gap';
  question: string;
  option: string;
  groups: Pair;
  presentation: [Presentation | null, Presentation | null];
} & Judged<TwoBases>;

export type ReleaseTestable =
  | ReleaseLead
  | NetScoreFinding
  | ReleaseChange
  | ReleaseLeadChange
  | NetScoreChange
  | ReleaseThreshold
  | GapFinding;
export type ReleaseFinding = (ReleaseShare | ReleaseTestable) & Carried;

/** What a test was computed from: enough to compute it again outside. */
export type FindingTrace = {
  /** Printed figures in the estimate; `base` is the place in `bases`. */
  terms: TraceTerm[];
  bases: TraceBase[];
  /** The fixed value of a threshold, in percent; null elsewhere. */
  thresholdPct: number | null;
  /** Level of intervals, 0–1. */
  level: number;
  /** Tests of the family, and how many of them are ranked before this one. */
  family: { size: number; before: number };
  /** Of overlapping averages; null elsewhere. */
  waves: TraceWave[] | null;
};

export type TraceTerm = {
  base: number;
  name: string;
  sign: 1 | -1;
  p: number;
  /** Rounding units in points of the printed figures that make up this one. */
  roundingUnitsPp: number[];
};

export type TraceBase = {
  role: 'release' | 'comparison' | 'group' | 'against';
  name: string | null;
  basis: Exclude<Basis, 'none'>;
  n: number;
  deff: number;
  deffRange: Range;
  deffSource: DeffSource;
  df: number | null;
};

export type TraceWave = {
  /** In the earlier average alone, the later alone, or both. */
  in: 'earlier' | 'later' | 'both';
  /** Weight in the later average less that in the earlier. */
  weightChange: number;
  interviews: number;
  /** The share of each name of the estimate, 0–1, in the order of the pair. */
  shares: number[];
};

export type ComparisonStatus =
  /** No difference found, or not looked into. */
  | 'comparable'
  /** Differences that an editor's written reason has lifted. */
  | 'overridden'
  /** Interviews overlap; only waves not shared are compared. */
  | 'overlapping'
  | 'same-people'
  | 'not-comparable';

export type ComparisonAnswer = {
  status: ComparisonStatus;
  base: BaseAnswer;
  differences: Comparability['differences'];
  unknowns: Comparability['unknowns'];
  /** false where no comparability was handed in. */
  wasLookedInto: boolean;
  /** The editor's reason, for the method note; null where none was needed. */
  overrideReason: string | null;
  overlap: OverlapAnswer | null;
};

export type OverlapAnswer = {
  window: number;
  shared: number;
  /** Interviews per wave were not known and are taken as equal: say so. */
  assumesEqualWaves: boolean;
  /** Shares of single waves were not known and one pooled share stands for them: say so. */
  usesPooledShare: boolean;
};

export type SubgroupAnswer = {
  question: string;
  groups: {
    name: string;
    base: BaseAnswer;
    shares: (ShareFinding & { presentation: Presentation | null })[];
  }[];
};

export type ReleaseJudgement = {
  engine: string;
  base: BaseAnswer;
  /** People that the re-based shares stand on; null where not disclosed, absent where not re-based. */
  rebasedN?: number | null;
  comparison: ComparisonAnswer | null;
  /** Shares and blocs, leads, net scores, changes, changes of leads and net scores, thresholds, gaps. */
  findings: ReleaseFinding[];
  subgroups: SubgroupAnswer[];
};
