import type { Stale } from '@/lib/domain/currency';
import { formatDay, formatDayRange } from '@/lib/format/date';

const LOCALE = 'en-GB';

/** Why cleared words are no longer the newest that could be said. */
export function StaleReasons({ reasons }: { reasons: readonly Stale[] }) {
  return (
    <ul>
      {reasons.map((stale) => (
        <li key={`${stale.reason} ${'part' in stale ? stale.part : ''}`}>{staleWords(stale)}</li>
      ))}
    </ul>
  );
}

export function staleWords(stale: Stale): string {
  switch (stale.reason) {
    case 'newer-release':
      return `A later comparable poll of this series is out: ${formatDayRange(stale.fieldStartOn, stale.fieldEndOn, LOCALE, { withYear: true })}.`;
    case 'new-version':
      return stale.part === 'release'
        ? 'The release has a newer version.'
        : 'The poll it was compared with has a newer version.';
    case 'source-corrected':
      return `The source was corrected on ${formatDay(new Date(stale.at).toISOString().slice(0, 10), LOCALE)}; its numbers are the same.`;
    case 'ladder':
      return `House style no longer says ${stale.words.map((word) => `“${word}”`).join(', ')} for this verdict.`;
    case 'shelf-life':
      return `Its words kept until ${formatDay(stale.endedOn, LOCALE)}.`;
  }
}
