import { Select } from '@/components/ui/select';

/** What the marks in the words compare with. */
export type Against = 'draft' | 'filed' | 'cleared';

export const AGAINST: Record<Against, string> = {
  draft: 'Marked against the draft',
  filed: 'Marked against what was filed before',
  cleared: 'Marked against what was cleared last',
};

/** Chooses what the words are compared with; nothing to choose while there is only the draft. */
export function AgainstChoice({
  value,
  isThere,
  onChange,
}: {
  value: Against;
  isThere: (one: Against) => boolean;
  onChange: (value: Against) => void;
}) {
  const choices = (Object.keys(AGAINST) as Against[]).filter(isThere);
  if (choices.length < 2) return null;
  return (
    <Select
      id="against"
      label="Compare with"
      hideLabel
      value={value}
      onChange={(event) => onChange(event.target.value as Against)}
      choices={choices.map((one) => ({ value: one, label: AGAINST[one] }))}
      fieldClassName="mb-1! max-w-72"
    />
  );
}
