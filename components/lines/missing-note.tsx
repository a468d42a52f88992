import type { MissingDisclosure } from '@/lib/findings/disclosure';
import { CautionNote } from '../ui/caution-note';

const WORDS = { 'not-disclosed': 'Not disclosed', 'not-entered': 'Not entered' } as const;

/** What the release withholds, and what nobody has typed yet: two different things. */
export function MissingNote({ missing }: { missing: readonly MissingDisclosure[] }) {
  if (missing.length === 0) return null;
  const statuses = (['not-disclosed', 'not-entered'] as const).filter((status) =>
    missing.some((item) => item.status === status),
  );
  return (
    <CautionNote>
      {statuses.map((status) => (
        <p key={status}>
          <strong>{WORDS[status]}:</strong> {labelsOf(missing, status)}.
        </p>
      ))}
    </CautionNote>
  );
}

function labelsOf(missing: readonly MissingDisclosure[], status: MissingDisclosure['status']): string {
  const labels = missing.filter((item) => item.status === status).map(({ label }) => label);
  return labels.map((label, at) => (at === 0 ? label : lowerFirst(label))).join(', ');
}

function lowerFirst(label: string): string {
  return label.charAt(0).toLowerCase() + label.slice(1);
}
