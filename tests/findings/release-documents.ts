import fc from 'fast-check';
import type { Base, PrintedShare } from '@/lib/findings/check-types';
import { judgeRelease } from '@/lib/findings/judge-release';
import type {
  FindingTrace,
  ReleaseDocument,
  ReleaseFinding,
  ReleaseTestable,
  ReleaseUntestedFields,
} from '@/lib/findings/judge-types';
import { parseReleaseDocument } from '@/lib/findings/parse-release';

/** A probability sample with a known design effect, so that nothing but what a test is about moves a verdict. */
export function sample(
  n: number | null,
  shares: Record<string, number | null>,
  more: Partial<Base> = {},
): Base {
  return {
    sampleSource: 'probability',
    n,
    design: 'unweighted',
    decimals: 0,
    shares: Object.entries(shares).map(([option, pct]): PrintedShare => ({ option, pct })),
    ...more,
  };
}

export function judge(document: ReleaseDocument) {
  return judgeRelease(parseReleaseDocument(document));
}

export function findingOf(document: ReleaseDocument, key: string): ReleaseFinding {
  const found = judge(document).findings.find((finding) => finding.key === key);
  if (!found) throw new Error(`no finding ${key}`);
  return found;
}

type Tested = Exclude<ReleaseTestable, ReleaseUntestedFields> & { trace: FindingTrace; key: string };

/** The tested finding of that key; fails where it is not tested. */
export function testedOf(document: ReleaseDocument, key: string): Tested {
  const found = findingOf(document, key);
  if (found.kind === 'share' || found.verdict === 'cannot-be-tested') throw new Error(`${key} is not tested`);
  return found;
}

/** The finding of that key without a test; fails where it is tested. */
export function untestedOf(document: ReleaseDocument, key: string): ReleaseUntestedFields {
  const found = findingOf(document, key);
  if (found.kind === 'share' || found.verdict !== 'cannot-be-tested') throw new Error(`${key} is tested`);
  return found;
}

/** Three options and the undecided, in whole percents that sum to 100. */
export const anyShares = fc
  .tuple(fc.integer({ min: 5, max: 45 }), fc.integer({ min: 5, max: 30 }), fc.integer({ min: 2, max: 20 }))
  .map(([A, B, C]) => ({ A, B, C, Undecided: 100 - A - B - C }));

export const anySize = fc.integer({ min: 400, max: 3000 });
export const anyDeff = fc.double({ min: 1, max: 3, noNaN: true });

/** What a test says, without keys, names, traces and workings. */
export function testFieldsOf(document: ReleaseDocument, key: string): Record<string, unknown> {
  const { estimatePp, sePp, marginPp, z, p, pAdjusted, alpha, roundingPp, secondTests, verdict, reasons } =
    testedOf(document, key);
  return { estimatePp, sePp, marginPp, z, p, pAdjusted, alpha, roundingPp, secondTests, verdict, reasons };
}
