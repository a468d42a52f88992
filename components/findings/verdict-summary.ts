import type { Verdict } from '@/lib/findings/check-types';

const ORDER: readonly Verdict[] = ['holds', 'fragile', 'does-not-hold', 'cannot-be-tested'];
const NUMBERS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine'];

const SAYS: Record<Verdict, (isOne: boolean) => string> = {
  holds: (isOne) => (isOne ? 'holds' : 'hold'),
  fragile: (isOne) => (isOne ? 'is fragile' : 'are fragile'),
  'does-not-hold': (isOne) => `${isOne ? 'is' : 'are'} not shown by the numbers`,
  'cannot-be-tested': () => 'cannot be tested',
};

/** How many findings have which verdict, in one sentence: "One finding holds, one is fragile." */
export function verdictSummary(verdicts: readonly Verdict[]): string {
  const parts = ORDER.flatMap((verdict) => {
    const count = verdicts.filter((one) => one === verdict).length;
    return count === 0
      ? []
      : [{ number: NUMBERS[count] ?? String(count), says: SAYS[verdict](count === 1), count }];
  });
  if (parts.length === 0) return 'Nothing here is tested.';
  const sentence = parts
    .map(({ number, says, count }, index) => {
      const what = index > 0 ? '' : count === 1 ? ' finding' : ' findings';
      return `${number}${what} ${says}`;
    })
    .join(', ');
  return `${sentence[0]!.toUpperCase()}${sentence.slice(1)}.`;
}
