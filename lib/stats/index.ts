export type { Extended } from './accuracy/extended';
export { mostellerMeasures, type MostellerMeasures } from './accuracy/mosteller-measures';
export { multiPartyAccuracy, type MultiPartyAccuracy } from './accuracy/multi-party-accuracy';
export { predictiveAccuracy, type PredictiveAccuracy } from './accuracy/predictive-accuracy';
export type { Alternative } from './distributions/alternative';
export { criticalValue } from './distributions/critical-value';
export { normalP } from './distributions/normal-p';
export { normalQuantile } from './distributions/normal-quantile';
export { normalUpperTail } from './distributions/normal-upper-tail';
export { roundingHalfWidth } from './distributions/rounding-half-width';
export { twoSidedP } from './distributions/two-sided-p';
export { upperTailP } from './distributions/upper-tail-p';
export { zTest, type ZTest } from './distributions/z-test';
export { adjustBenjaminiHochberg, adjustBenjaminiYekutieli } from './families/adjust-false-discovery';
export { adjustBonferroni, adjustHochberg, adjustHolm } from './families/adjust-family-wise';
export { equivalenceTest, type EquivalenceTest, type NoEquivalenceTest } from './families/equivalence-test';
export { holm, type HolmResult } from './families/holm';
export type { Interval } from './interval';
export { isBelow, nearlyEqual, roundHalfUp } from './nearly-equal';
export { changePower, type ChangePlan, type ChangePower } from './planning/change-power';
export { detectableChange, type DetectableChange } from './planning/detectable-change';
export { detectableDifference } from './planning/detectable-difference';
export { leadPower, type LeadPlan, type LeadPower } from './planning/lead-power';
export { sampleSizeForChange, type ChangeSampleSize } from './planning/sample-size-for-change';
export { sampleSizeForLead, type LeadSampleSize } from './planning/sample-size-for-lead';
export {
  sampleSizeForMargin,
  type MarginPlan,
  type MarginSampleSize,
} from './planning/sample-size-for-margin';
export type { TestSides } from './planning/sides';
export {
  detectableLead,
  smallestSignificantLead,
  type LeadQuestion,
  type SmallestLead,
} from './planning/smallest-lead';
export { leadPosterior, type LeadPosterior, type LeadPosteriorQuestion } from './posterior/lead-posterior';
export { probabilityLargest } from './posterior/probability-largest';
export { agrestiCoullInterval } from './proportions/agresti-coull-interval';
export { binomialTestP } from './proportions/binomial-test-p';
export { changeOfLead, changeOfShare, type Change, type ChangeOfLead } from './proportions/changes';
export { clopperPearsonInterval } from './proportions/clopper-pearson-interval';
export type { Estimated } from './proportions/estimated';
export { exactBinomialP } from './proportions/exact-binomial-p';
export { exactSignP } from './proportions/exact-sign-p';
export {
  finitePopulationFactor,
  finitePopulationMargin,
  finitePopulationStandardError,
  type PopulationConvention,
} from './proportions/finite-population';
export { fisherExactP } from './proportions/fisher-exact-p';
export { jeffreysInterval } from './proportions/jeffreys-interval';
export {
  leadEstimate,
  leadScoreTest,
  leadTest,
  probabilityAheadNormal,
  type LeadSample,
} from './proportions/lead';
export { mcnemarCorrectedP } from './proportions/mcnemar-corrected-p';
export { newcombeInterval } from './proportions/newcombe-interval';
export { oneProportionScoreTest, shareScoreTest } from './proportions/one-proportion-score-test';
export { effectiveCounts, type SampleShare } from './proportions/sample-share';
export { signTest } from './proportions/sign-test';
export {
  leadNullStandardError,
  leadStandardError,
  maximumMargin,
  pooledStandardError,
  shareStandardError,
} from './proportions/standard-errors';
export {
  agrestiCaffoInterval,
  differenceEstimate,
  newcombeDifferenceInterval,
} from './proportions/two-proportion-intervals';
export { pooledTest, unpooledTest, type PooledTest } from './proportions/two-proportion-tests';
export { shareEstimate, waldInterval } from './proportions/wald-interval';
export { wilsonCorrectedInterval } from './proportions/wilson-corrected-interval';
export { wilsonInterval } from './proportions/wilson-interval';
export { withinUnit } from './proportions/within-unit';
export type { Column, Labels } from './samples/columns';
export {
  impliedDesignEffect,
  impliedDesignEffectRange,
  kishDesignEffect,
  weightVariation,
  type ImpliedDesignEffect,
  type WeightVariation,
} from './samples/design-effects';
export { indicator } from './samples/indicator';
export { likelihoodInterval } from './samples/likelihood-interval';
export type { MeanIntervals } from './samples/mean-intervals';
export {
  proportionIntervals,
  type ProportionIntervals,
  type ShareFigures,
} from './samples/proportion-intervals';
export {
  replicateDesign,
  type ReplicateColumns,
  type ReplicateDesign,
  type ReplicateType,
} from './samples/replicate-design';
export type { Domain, EstimateOptions, SampleDesign, SampleMean } from './samples/sample-mean';
export { surveyDesign, type LonelyPsu, type SurveyColumns, type SurveyDesign } from './samples/survey-design';
export { weightedLead, type WeightedLead } from './samples/weighted-lead';
export { weightedMean, type WeightedMean } from './samples/weighted-mean';
export { weightedProportion, type WeightedProportion } from './samples/weighted-proportion';
export { chiSquareUpperTail } from './waves/chi-square-upper-tail';
export {
  homogeneityOfAnswers,
  type AnswerHomogeneity,
  type PolledAnswers,
} from './waves/homogeneity-of-answers';
export { homogeneityOfShares, type ShareHomogeneity } from './waves/homogeneity-of-shares';
export {
  changeOfOverlappingAverages,
  type AveragesChange,
  type TrackingAverages,
  type Wave,
} from './waves/overlapping-averages';
export type { PolledShare } from './waves/polls';
export { trendOfShares, type ScoredShare, type ShareTrend } from './waves/trend-of-shares';
export {
  fitLevel,
  type FitOptions,
  type FitPoll,
  type FittedLevel,
  type LevelVariances,
} from './series/fit-level';
export { leftOutFit, leftOutPoll, type LeftOutPoll } from './series/left-out-poll';
export { levelBands } from './series/level-bands';
export type {
  CertifiedResult,
  HouseChoice,
  HouseEffect,
  HousePoll,
  LevelChange,
  LevelDays,
  LevelPoll,
  LevelSpan,
  PlacePrediction,
  PollPlace,
} from './series/polls';
export type { Sampling } from './series/sampling-variance';
export { smoothLevel, type KnownLevelOptions, type SmoothedLevel } from './series/smooth-level';
export {
  smoothLevelWithHouses,
  type KnownHouseOptions,
  type SmoothedLevelWithHouses,
} from './series/smooth-level-with-houses';
export {
  changeStandardError,
  waveToWaveVariance,
  type ChangeError,
  type WaveToWave,
} from './series/wave-to-wave';
