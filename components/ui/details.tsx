import type { ComponentProps, ReactNode } from 'react';
import { classNames } from './class-names';

/** Opens to what stands one step away. */
export function Details({
  summary,
  className,
  children,
  ...rest
}: Omit<ComponentProps<'details'>, 'summary'> & { summary: ReactNode }) {
  return (
    <details {...rest} className={classNames('details', className)}>
      <summary>{summary}</summary>
      <div className="details-body">{children}</div>
    </details>
  );
}
