import type { Verdict } from '@/lib/findings/check-types';

const ORDER: readonly Verdict[] = ['holds', 'fragile', 'does-not-hold', 'cannot-be-tested'];
const NUMBERS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine'];

const SAYS: Record<Verdict, (isOne: boolean) => string> = {
  holds: (isOne) => (isOne ? 'holds' : 'hold'),
  fragile: (isOne) => (isOne ? 'is fragile' : 'are fragile'),
  'does-not-hold': (isOne) => (isOne ? 'is not shown' : 'are not shown'),
  'cannot-be-tested': () => 'cannot be tested',
};

/** How many findings have which verdict, in one sentence: "One holds, one is fragile." */
export function verdictSummary(verdicts: readonly Verdict[]): string {
  const parts = ORDER.flatMap((verdict) => {
    const count = verdicts.filter((one) => one === verdict).length;
    return count === 0 ? [] : [`${NUMBERS[count] ?? count} ${SAYS[verdict](count === 1)}`];
  });
  if (parts.length === 0) return 'Nothing here is tested.';
  const sentence = parts.join(', ');
  return `${sentence[0]!.toUpperCase()}${sentence.slice(1)}.`;
}
