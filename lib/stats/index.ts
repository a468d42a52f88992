export { clopperPearsonInterval } from './clopper-pearson-interval';
export { criticalValue } from './critical-value';
export { impliedDesignEffect, kishDesignEffect } from './design-effects';
export { detectableDifference } from './detectable-difference';
export { exactBinomialP } from './exact-binomial-p';
export { exactSignP } from './exact-sign-p';
export { fisherExactP } from './fisher-exact-p';
export { holm, type HolmResult } from './holm';
export type { Interval } from './interval';
export { isBelow, nearlyEqual, roundHalfUp } from './nearly-equal';
export { newcombeInterval } from './newcombe-interval';
export { normalQuantile } from './normal-quantile';
export { normalUpperTail } from './normal-upper-tail';
export { roundingHalfWidth } from './rounding-half-width';
export {
  leadNullStandardError,
  leadStandardError,
  maximumMargin,
  pooledStandardError,
  shareStandardError,
} from './standard-errors';
export { twoSidedP } from './two-sided-p';
export { wilsonInterval } from './wilson-interval';
