import { zTest, type ZTest } from '../distributions/z-test';
import { estimated, type Estimated } from './estimated';
import { requireLeads, type LeadSample } from './lead';
import { requireShares, type SampleShare } from './sample-share';
import { leadStandardError } from './standard-errors';
import { differenceStandardError } from './two-proportion-tests';

/** A change with its margin of error, and whether chance explains it. */
export type Change = Estimated & { readonly test: ZTest };

/**
 * The change of a share from an earlier poll to a later one of different people.
 *
 * Not for panels or overlapping tracking waves, whose errors are not independent.
 *
 * @param before earlier share, its sample size and design effect
 * @param after the same of the later
 * @param level confidence level, inside 0–1
 * @returns estimate after − before with margin and interval (Wald), and the two-sided test in which each poll keeps its
 *   own variance; the score test is pooledTest(after, before, …)
 * @throws RangeError `changeOfShare requires p from 0 to 1`
 * @throws RangeError `changeOfShare requires n and deff above 0`
 * @throws RangeError `changeOfShare requires level inside 0 and 1`
 * @see closed form in R 4.2.2
 * @example
 * changeOfShare({ p: 0.44, n: 700, deff: 1 }, { p: 0.47, n: 700, deff: 1 }, 0.95).margin; // => 0.0521...
 */
export function changeOfShare(before: SampleShare, after: SampleShare, level: number): Change {
  requireShares('changeOfShare', before, after);
  const error = differenceStandardError(before, after);
  return changed('changeOfShare', after.p - before.p, error, level);
}

/** A change of a lead, with the two leads. */
export type ChangeOfLead = Change & { readonly leadBefore: number; readonly leadAfter: number };

/**
 * The change of a lead from an earlier poll to a later one of different people.
 *
 * Its margin is near twice that of the change of a share. Not for panels or overlapping tracking waves.
 *
 * @param before earlier shares of the two options, sample size and design effect
 * @param after the same of the later
 * @param level confidence level, inside 0–1
 * @returns estimate leadAfter − leadBefore with margin and interval, the two-sided test, and both leads
 * @throws RangeError `changeOfLead requires shares from 0 to 1, together at most 1.05`
 * @throws RangeError `changeOfLead requires n and deff above 0`
 * @throws RangeError `changeOfLead requires level inside 0 and 1`
 * @see closed form in R 4.2.2
 * @example
 * changeOfLead(
 *   { first: 0.44, second: 0.43, n: 700, deff: 1 },
 *   { first: 0.47, second: 0.41, n: 700, deff: 1 },
 *   0.95,
 * ).estimate; // => 0.05
 */
export function changeOfLead(before: LeadSample, after: LeadSample, level: number): ChangeOfLead {
  requireLeads('changeOfLead', before, after);
  const leadBefore = before.first - before.second;
  const leadAfter = after.first - after.second;
  const error = Math.hypot(
    leadStandardError(before.first, before.second, before.n, before.deff),
    leadStandardError(after.first, after.second, after.n, after.deff),
  );
  return { ...changed('changeOfLead', leadAfter - leadBefore, error, level), leadBefore, leadAfter };
}

function changed(fn: string, difference: number, standardError: number, level: number): Change {
  const test = zTest(difference, standardError, 'two-sided');
  return { ...estimated(fn, difference, standardError, level), test };
}
