import Link from 'next/link';
import type { ReactNode } from 'react';
import { Wordmark } from './wordmark';

export type RailItem = { href: string; label: string; /** Things waiting there. */ count?: number };

/**
 * The sections, hung on a line with its weight at the current one. Under 720 px it folds into a menu.
 * `currentHref` is the href of the section one is in.
 */
export function Rail({
  items,
  currentHref,
  foot,
  homeHref = '/',
}: {
  items: readonly RailItem[];
  currentHref: string | null;
  /** Whoever is signed in, and the way out. */
  foot?: ReactNode;
  homeHref?: string;
}) {
  const current = items.find((item) => item.href === currentHref);
  return (
    <header className="rail no-print">
      <Link href={homeHref} className="rail-mark" aria-label="Leadline, to the first page">
        <Wordmark />
      </Link>
      <nav aria-label="Sections" className="rail-wide">
        <RailList items={items} currentHref={currentHref} />
      </nav>
      {foot ? <div className="rail-foot">{foot}</div> : null}
      {/* The key folds the menu up again once another section is reached. */}
      <details key={currentHref ?? ''} className="rail-menu">
        <summary>
          <span className="sr-only">Sections, now in </span>
          {current?.label ?? 'Sections'}
        </summary>
        <div className="rail-menu-panel">
          <nav aria-label="Sections">
            <RailList items={items} currentHref={currentHref} />
          </nav>
          {foot ? <div className="rail-menu-foot">{foot}</div> : null}
        </div>
      </details>
    </header>
  );
}

function RailList({ items, currentHref }: { items: readonly RailItem[]; currentHref: string | null }) {
  return (
    <ul className="rail-list">
      {items.map((item) => (
        <li key={item.href}>
          <Link href={item.href} aria-current={item.href === currentHref ? 'page' : undefined}>
            <span>{item.label}</span>
            {item.count ? (
              <b>
                {item.count}
                <span className="sr-only"> waiting</span>
              </b>
            ) : null}
          </Link>
        </li>
      ))}
    </ul>
  );
}
