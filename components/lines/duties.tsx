import { DISCLOSURE_LABELS, type DisclosureItem, type MissingDisclosure } from '@/lib/findings/disclosure';
import { DefinitionList } from '../ui/definition-list';
import { Details } from '../ui/details';

const STATUS = { 'not-disclosed': 'not disclosed', 'not-entered': 'not entered yet' } as const;
const ITEMS = Object.keys(DISCLOSURE_LABELS) as DisclosureItem[];

/** What a disclosure standard asks of a poll, each with whether the release has it as far as the desk knows. */
export function Duties({ missing }: { missing: readonly MissingDisclosure[] }) {
  const rows = ITEMS.map((item) => {
    const gap = missing.find((one) => one.item === item);
    return {
      key: item,
      term: DISCLOSURE_LABELS[item],
      value: gap ? <strong>{STATUS[gap.status]}</strong> : 'in the release, or does not apply',
    };
  });
  return (
    <Details
      className="duties"
      summary={`Disclosure: ${ITEMS.length - missing.length} of ${ITEMS.length} known`}
    >
      <DefinitionList items={rows} className="particulars" />
    </Details>
  );
}
