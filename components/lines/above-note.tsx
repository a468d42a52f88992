import type { Verdict } from '@/lib/findings/check-types';
import { VERDICT_NAMES } from '../charts/verdict-mark';

/** Phrases that say more than the verdict, as a caution to whoever writes or reads. It refuses nothing. */
export function AboveNote({ phrases, verdict }: { phrases: readonly string[]; verdict: Verdict }) {
  if (phrases.length === 0) return null;
  const quoted = phrases.map((phrase) => `“${phrase}”`);
  const listed = new Intl.ListFormat('en-GB', { type: 'conjunction' }).format(quoted);
  const says = phrases.length === 1 ? 'says' : 'say';
  return (
    <p className="mt-1 text-13 font-semibold text-caution">
      {listed} {says} more than {VERDICT_NAMES[verdict]} allows.
    </p>
  );
}
