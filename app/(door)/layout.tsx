import type { ReactNode } from 'react';
import { SkipLink } from '@/components/ui/skip-link';
import { Wordmark } from '@/components/ui/wordmark';
import './door.css';

/** The pages in front of the desk: the rail's line with nothing on it yet, and one form. */
export default function DoorLayout({ children }: { children: ReactNode }) {
  return (
    <div className="door">
      <SkipLink />
      <header className="door-side">
        <Wordmark />
        <p className="door-motto">
          How much of the printed lead is really there, and what may be said of it.
        </p>
        <span className="door-line" aria-hidden="true" />
      </header>
      <main id="main" tabIndex={-1} className="door-main">
        {children}
      </main>
    </div>
  );
}
