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
export { detectableDifference } from './planning/detectable-difference';
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
export { smoothLevel, type KnownLevelOptions, type SmoothedLevel } from './series/smooth-level';
export {
  smoothLevelWithHouses,
  type KnownHouseOptions,
  type SmoothedLevelWithHouses,
} from './series/smooth-level-with-houses';
