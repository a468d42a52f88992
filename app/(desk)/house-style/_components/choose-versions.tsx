import { Button } from '@/components/ui/button';
import { Select } from '@/components/ui/select';

/** Two versions to compare; a plain form, so that its address says what is shown. */
export function ChooseVersions({
  versions,
  from,
  to,
}: {
  versions: readonly { id: string; number: number | null }[];
  from: string;
  to: string;
}) {
  const choices = versions.map(({ id, number }) => ({ value: id, label: `Version ${number}` }));
  return (
    <form
      method="get"
      action="/house-style/compare"
      className="no-print mb-6 flex flex-wrap items-end gap-x-4"
    >
      <Select id="compare-from" name="from" label="Earlier" choices={choices} defaultValue={from} />
      <Select id="compare-to" name="to" label="Later" choices={choices} defaultValue={to} />
      <Button type="submit" className="mb-4">
        Compare
      </Button>
    </form>
  );
}
