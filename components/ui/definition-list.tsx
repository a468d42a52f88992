import type { ReactNode } from 'react';
import { classNames } from './class-names';

export type Definition = { term: ReactNode; value: ReactNode; key?: string };

/** Particulars: the name in soft ink, the value at the right edge (or beneath it, `stacked`). */
export function DefinitionList({
  items,
  stacked = false,
  className,
}: {
  items: readonly Definition[];
  stacked?: boolean;
  className?: string;
}) {
  return (
    <dl className={classNames('definitions', stacked ? 'definitions-stacked' : null, className)}>
      {items.map((item, at) => (
        <div key={item.key ?? at}>
          <dt>{item.term}</dt>
          <dd>{item.value}</dd>
        </div>
      ))}
    </dl>
  );
}
