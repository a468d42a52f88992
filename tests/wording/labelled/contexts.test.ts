import { describe, expect, it } from 'vitest';
import { check } from '@/lib/findings/check';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import type { CheckAnswer } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import { CONTEXTS, type Context, type ContextName } from './contexts';

/** What the labels were written from: every verdict, in the engine's order. */
const VERDICTS: Record<ContextName, string[]> = {
  none: [],
  'lead-holds': ['lead Alder Brook +14 holds twice'],
  'lead-fragile': ['lead Alder Brook +8 fragile design-effect'],
  'lead-not-shown': ['lead Alder Brook +3 does-not-hold'],
  'lead-level': ['lead Alder Brook 0 does-not-hold'],
  'change-up': [
    'lead Alder Brook +13 holds',
    'change Alder +10 holds',
    'change Brook -9 holds',
    'lead-change Alder Brook +19 holds',
  ],
  'change-fragile': [
    'lead Alder Brook +8 holds',
    'change Alder +7 fragile rounding',
    'change Brook -2 does-not-hold',
    'lead-change Alder Brook +9 does-not-hold',
  ],
  'change-not-shown': [
    'lead Alder Brook +5 does-not-hold',
    'change Alder +3 does-not-hold',
    'change Brook 0 does-not-hold',
    'lead-change Alder Brook +3 does-not-hold',
  ],
  'little-changed': [
    'lead Alder Brook +8 holds twice',
    'change Alder -1 does-not-hold little-changed',
    'change Brook 0 does-not-hold little-changed',
    'lead-change Alder Brook -1 does-not-hold',
  ],
  'approval-down': [
    'lead Disapprove Approve +19 holds twice',
    'change Disapprove +11 holds twice',
    'change Approve -11 holds',
    'lead-change Disapprove Approve +22 holds',
  ],
  'other-population': [
    'lead Alder Brook +13 holds',
    'change Alder +10 holds',
    'change Brook -9 holds',
    'lead-change Alder Brook +19 holds',
  ],
  'opt-in': [
    'lead Alder Brook +7 cannot-be-tested no-sampling-basis',
    'change Alder +3 cannot-be-tested no-sampling-basis',
    'change Brook -2 cannot-be-tested no-sampling-basis',
    'lead-change Alder Brook +5 cannot-be-tested no-sampling-basis',
  ],
  modelled: ['lead Alder Brook +14 fragile modelled'],
  assembly: [
    'lead Coast Alliance Reform League +7.7 holds',
    'threshold Harbour Union +0.6 does-not-hold',
    'threshold Meadow Party +13.6 holds twice',
    'threshold Lantern List -1.9 holds',
  ],
  'toll-majority': [
    'lead No Yes +16 holds twice',
    'threshold Yes -9 holds twice',
    'threshold No +7 holds twice',
  ],
  'toll-close': ['lead Yes No +7 holds', 'threshold Yes +1 does-not-hold', 'threshold No -6 holds'],
  'small-sample': ['lead Alder Brook +8 does-not-hold'],
  'two-pollsters': [
    'lead Alder Brook +14 holds twice',
    'change Alder +1 does-not-hold',
    'change Brook -1 does-not-hold',
    'lead-change Alder Brook +2 does-not-hold',
    'lead Alder Brook +2 does-not-hold',
  ],
};

const answersOf = ({ releases }: Context): CheckAnswer[] =>
  releases.map(({ facts, previous }) =>
    check(parseCheckDocument(checkDocumentOf(facts, previous, DEFAULT_POLICY))),
  );

function verdictsOf({ findings }: CheckAnswer): string[] {
  return findings.flatMap((finding) => {
    if (finding.kind === 'share') return [];
    const names = 'pair' in finding ? finding.pair : [finding.option];
    const points = Number(finding.estimatePp?.toFixed(1));
    const marks = [
      'littleChanged' in finding && finding.littleChanged ? 'little-changed' : '',
      'survivesTwiceError' in finding && finding.survivesTwiceError ? 'twice' : '',
    ];
    const size = points > 0 ? `+${points}` : `${points}`;
    return [
      [finding.kind, ...names, size, finding.verdict, ...finding.reasons, ...marks].filter(Boolean).join(' '),
    ];
  });
}

describe('a context of labelled sentences', () => {
  it.each(Object.entries(CONTEXTS))(
    'has the verdicts that its labels were written from: %s',
    (name, context) => {
      expect(answersOf(context).flatMap(verdictsOf)).toEqual(VERDICTS[name as ContextName]);
    },
  );

  it.each([
    ['lead-holds', 3.7, 6.9],
    ['lead-not-shown', 3.7, 6.9],
    ['change-not-shown', 3.7, 7],
    ['small-sample', 7.4, 13.8],
    ['toll-majority', 3, 5.9],
  ] as const)('has the margins that its labels speak of: %s', (name, share, lead) => {
    const [answer] = answersOf(CONTEXTS[name]);
    const found = answer?.findings.find((finding) => finding.kind === 'lead');
    expect(answer?.base.maximumMarginPp).toBeCloseTo(share, 9);
    expect(found && 'marginPp' in found && Number(found.marginPp.toFixed(1))).toBe(lead);
  });

  it('names two pollsters side by side once, and a sponsor with a stake once', () => {
    const pollsters = CONTEXTS['two-pollsters'].releases.map(({ facts }) => facts.pollster.name);
    expect(pollsters).toEqual(['Kelmouth Research', 'Norwater Polls']);
    const stake = Object.entries(CONTEXTS).filter(([, { releases }]) =>
      releases.some(
        ({ facts }) => facts.sponsor.status === 'given' && facts.sponsor.value.id === 'operators',
      ),
    );
    expect(stake.map(([name]) => name)).toEqual(['toll-majority']);
  });
});
