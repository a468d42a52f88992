import type { PassedOver } from '@/lib/services/release/comparison';
import { formatDayRange } from '@/lib/format/date';
import { EN } from '@/lib/wording/messages/en';
import { overrideComparisonAction } from '../../actions';
import { OverrideComparison } from './override-comparison';

/** What an editor may do where earlier releases were passed over for differences that a reason can lift. */
export function ComparisonOverride({ id, passedOver }: { id: string; passedOver: readonly PassedOver[] }) {
  const candidates = passedOver
    .filter(({ differences }) => differences.every((difference) => difference.isOverridable))
    .map(({ releaseId, fieldStartOn, fieldEndOn, differences }) => ({
      releaseId,
      label: formatDayRange(fieldStartOn, fieldEndOn, 'en-GB', { withYear: true }),
      differences: `Differs in ${listOf(differences.map(({ item }) => EN.terms.comparable[item]))}.`,
    }));
  if (candidates.length === 0) return null;
  return (
    <div className="no-print mt-3">
      <OverrideComparison id={id} candidates={candidates} override={overrideComparisonAction} />
    </div>
  );
}

function listOf(names: readonly string[]): string {
  return new Intl.ListFormat('en-GB', { type: 'conjunction' }).format(names);
}
