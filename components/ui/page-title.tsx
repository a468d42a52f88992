import Link from 'next/link';
import type { ReactNode } from 'react';
import { classNames } from './class-names';

export type Crumb = { label: string; href?: string };

/** What this page is: where one is, the title in the copy face, one line of particulars, a note at the right. */
export function PageTitle({
  title,
  sub,
  crumbs = [],
  note,
  isCompact = false,
}: {
  title: ReactNode;
  sub?: ReactNode;
  crumbs?: readonly Crumb[];
  note?: ReactNode;
  /** In one line with its particulars where the screen is wide: for pages that have to fit it. */
  isCompact?: boolean;
}) {
  return (
    <header className={classNames('page-title', isCompact ? 'page-title-compact' : null)}>
      {crumbs.length > 0 || note ? (
        <div className="page-title-top">
          {crumbs.length > 0 ? (
            <nav aria-label="Where you are">
              <ol className="crumbs">
                {crumbs.map((crumb) => (
                  <li key={crumb.label}>
                    {crumb.href ? <Link href={crumb.href}>{crumb.label}</Link> : crumb.label}
                  </li>
                ))}
              </ol>
            </nav>
          ) : (
            <span />
          )}
          {note ? <p className="page-title-note">{note}</p> : null}
        </div>
      ) : null}
      <h1 className="page-title-name">{title}</h1>
      {sub ? <p className="page-title-sub">{sub}</p> : null}
    </header>
  );
}
