import { valueOf } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { BaseAnswer } from '@/lib/findings/check-types';
import { formatTrimmed } from '@/lib/format/number';
import type { DraftFinding } from './draft-finding';

export type TwiceMargin = {
  /** The margin for a share: the pollster's where stated at the same level, else ours at 50 %. */
  marginPp: number;
  whose: 'stated' | 'ours';
  zone: 'above' | 'between' | 'below';
  /** How our own test answers beside it. */
  test: 'agrees' | 'stricter' | 'looser';
};

const LOCALE = 'en-GB';

/**
 * The rule of thumb that holds a lead against twice the margin for a share: AP Stylebook polls chapter as quoted
 * publicly and NCPP, from memory.
 *
 * Use it beside the verdict where a house style insists on it; it never replaces the verdict, and words never go by
 * it. It is meant for two candidates who share all votes between them.
 *
 * @param finding any finding; the rule knows leads alone
 * @param base the base of the lead
 * @param release for the margin that its pollster states
 * @param level the level of the desk's tests
 * @returns null where there is nothing to hold against it: no lead, no test, or a sample that is not random
 */
export function twiceTheMargin(
  finding: DraftFinding,
  base: BaseAnswer,
  release: Pick<ReleaseFacts, 'statedMargin' | 'sampleSource'>,
  level: number,
): TwiceMargin | null {
  if (finding.kind !== 'lead' || finding.verdict === 'cannot-be-tested' || finding.estimatePp === 0)
    return null;
  if (base.basis !== 'sampling' || base.maximumMarginPp === null) return null;
  const stated = valueOf(release.statedMargin);
  const isStated = stated !== null && stated.level === level;
  const marginPp = isStated ? stated.pp : base.maximumMarginPp;
  const size = Math.abs(finding.estimatePp);
  const zone = size > 2 * marginPp ? 'above' : size > marginPp ? 'between' : 'below';
  const holds = finding.verdict === 'holds';
  const test = holds === (zone === 'above') ? 'agrees' : holds ? 'looser' : 'stricter';
  return { marginPp, whose: isStated ? 'stated' : 'ours', zone, test };
}

/** The same for staff, in a sentence beside the reasons of a verdict. */
export function twiceTheMarginNote(reading: TwiceMargin): string {
  const margin = `±${formatTrimmed(reading.marginPp, 1, LOCALE)}`;
  const whose = reading.whose === 'stated' ? 'the pollster states' : 'we put';
  return `Against twice the margin for a share (${margin}, as ${whose} it): ${ZONES[reading.zone]}. ${TESTS[reading.test]}`;
}

const ZONES: Record<TwiceMargin['zone'], string> = {
  above: 'the difference is larger than that',
  between: 'the difference is between once and twice that margin',
  below: 'the difference is smaller than the margin itself',
};

const TESTS: Record<TwiceMargin['test'], string> = {
  agrees: 'The verdict comes from the test of the difference itself.',
  stricter:
    'The test of the difference itself is stricter here: it also allows for weighting, rounding and the number of comparisons.',
  looser:
    'The test of the difference itself asks less here: where others or undecided people have a part, twice the margin is more than a difference needs.',
};
