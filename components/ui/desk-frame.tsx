import type { ReactNode } from 'react';
import { SkipLink } from './skip-link';

/** The frame of the signed-in pages: rail at the left, bands on top, the page as `#main`. */
export function DeskFrame({
  rail,
  bands,
  children,
}: {
  rail: ReactNode;
  bands?: ReactNode;
  children: ReactNode;
}) {
  return (
    <div className="desk-frame">
      <SkipLink />
      {rail}
      <div className="desk-page">
        {bands}
        <main id="main" tabIndex={-1} className="desk-main">
          {children}
        </main>
      </div>
    </div>
  );
}
