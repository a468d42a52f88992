import { SectionHeading } from '@/components/ui/section-heading';
import { formatInstant } from '@/lib/format/date';

/** Who read a release from its embargo list; it stays to be seen after the hour. */
export function EmbargoViews({
  views,
  zone,
}: {
  views: readonly { name: string; count: number; lastAt: number }[];
  zone: string;
}) {
  if (views.length === 0) return null;
  return (
    <section aria-labelledby="embargo-views" className="mb-6">
      <SectionHeading id="embargo-views">Read under embargo</SectionHeading>
      <ul>
        {views.map(({ name, count, lastAt }) => (
          <li key={name} className="py-1">
            {name}, {count === 1 ? 'once' : `${count} times`}, last{' '}
            <time dateTime={new Date(lastAt).toISOString()}>{formatInstant(lastAt, zone, 'en-GB')}</time>
          </li>
        ))}
      </ul>
    </section>
  );
}
