import { given, NOT_DISCLOSED } from '@/lib/domain/disclosed';
import type { FactShare, ReleaseFacts } from '@/lib/domain/release-facts';
import type { Claim } from '@/lib/domain/sheet';
import { check } from '@/lib/findings/check';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import type { CheckAnswer, Policy, TestableFinding } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import type { DraftInput } from '@/lib/wording/draft-input';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';

type Printed = Record<string, number | null>;

/** A release of the invented governor's race; `shares` in whole percents, "Don’t know" is no answer. */
export function releaseOf(shares: Printed, change: Partial<ReleaseFacts> = {}): ReleaseFacts {
  return {
    releaseId: 'release-september',
    versionId: 'version-september',
    version: 1,
    race: { id: 'governor', name: 'Governor of Averil Coast', kind: 'candidate', thresholds: [] },
    pollster: { id: 'kelmouth', name: 'Kelmouth Research' },
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
    decimals: 0,
    shares: sharesOf(shares),
    sourceUrl: given('https://kelmouth.example/september'),
    ...change,
  };
}

/** The same series four weeks earlier. */
export function earlierOf(shares: Printed, change: Partial<ReleaseFacts> = {}): ReleaseFacts {
  return releaseOf(shares, {
    releaseId: 'release-august',
    versionId: 'version-august',
    fieldStartOn: '2026-08-17',
    fieldEndOn: '2026-08-20',
    publishedOn: '2026-08-21',
    n: given(1005),
    statedMargin: given({ pp: 3.8, unit: 0.1, level: 0.95 }),
    ...change,
  });
}

export function sharesOf(shares: Printed): FactShare[] {
  return Object.entries(shares).map(([option, units]) => ({
    option,
    units,
    isAnswer: option !== 'Don’t know',
  }));
}

export const OPT_IN: Partial<ReleaseFacts> = {
  pollster: { id: 'quillon', name: 'The Quillon Panel' },
  sponsor: NOT_DISCLOSED,
  sampleSource: 'opt-in',
  mode: given('online'),
  statedMargin: NOT_DISCLOSED,
};

type Case = {
  claim: Claim;
  release: ReleaseFacts;
  previous?: ReleaseFacts | null;
  policy?: Partial<Policy>;
  pairs?: [string, string][];
  note?: string[];
};

/** What a sheet is drafted from, through the engine itself. */
export function inputOf({ claim, release, previous = null, policy, pairs, note = [] }: Case): DraftInput {
  const whole = { ...DEFAULT_POLICY, ...policy };
  const asked = pairs ? { pairs } : {};
  const answer = check(parseCheckDocument(checkDocumentOf(release, previous, whole, asked)));
  return {
    claim,
    finding: findingOf(answer, claim),
    answer,
    release,
    previous,
    comparison: { note },
    houseStyle: DEFAULT_HOUSE_STYLE,
    policy: whole,
    language: 'en',
  };
}

export function findingOf(answer: CheckAnswer, claim: Claim): TestableFinding {
  const found = answer.findings.find((finding): finding is TestableFinding => {
    if (finding.kind !== claim.kind) return false;
    if ('pair' in finding && 'pair' in claim) return finding.pair.join() === claim.pair.join();
    return 'option' in finding && 'option' in claim && finding.option === claim.option;
  });
  if (!found) throw new Error('the answer has no such finding');
  return found;
}
