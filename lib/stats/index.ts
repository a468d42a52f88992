export { clopperPearsonInterval } from './proportions/clopper-pearson-interval';
export { criticalValue } from './distributions/critical-value';
export { impliedDesignEffect, kishDesignEffect } from './samples/design-effects';
export { detectableDifference } from './planning/detectable-difference';
export { exactBinomialP } from './proportions/exact-binomial-p';
export { exactSignP } from './proportions/exact-sign-p';
export { fisherExactP } from './proportions/fisher-exact-p';
export { holm, type HolmResult } from './families/holm';
export type { Interval } from './interval';
export { isBelow, nearlyEqual, roundHalfUp } from './nearly-equal';
export { newcombeInterval } from './proportions/newcombe-interval';
export { normalQuantile } from './distributions/normal-quantile';
export { normalUpperTail } from './distributions/normal-upper-tail';
export { roundingHalfWidth } from './distributions/rounding-half-width';
export {
  leadNullStandardError,
  leadStandardError,
  maximumMargin,
  pooledStandardError,
  shareStandardError,
} from './proportions/standard-errors';
export { twoSidedP } from './distributions/two-sided-p';
export { wilsonInterval } from './proportions/wilson-interval';
