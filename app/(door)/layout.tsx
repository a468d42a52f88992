import type { ReactNode } from 'react';
import { SkipLink } from '@/components/ui/skip-link';
import { Wordmark } from '@/components/ui/wordmark';

/** The pages in front of the desk: the rail's line with nothing on it yet, and one form. */
export default function DoorLayout({ children }: { children: ReactNode }) {
  return (
    <div className="grid min-h-dvh grid-rows-[auto_1fr] md:grid-cols-[minmax(220px,30%)_minmax(0,1fr)] md:grid-rows-none">
      <SkipLink />
      <header className="relative border-b border-rule bg-panel px-[clamp(16px,5vw,40px)] py-4 md:border-r md:border-b-0 md:px-10 md:pt-10">
        <Wordmark />
        <p className="mt-4 hidden max-w-[24ch] pl-[26px] font-serif text-18 text-pretty text-soft italic md:block">
          How much of the printed lead is really there, and what may be said of it.
        </p>
        {/* The line runs on below the weight of the name, out of the page. */}
        <span
          aria-hidden="true"
          className="absolute top-[74px] bottom-0 left-[45.75px] hidden border-l-[1.5px] border-ink md:block"
        />
      </header>
      <main
        id="main"
        tabIndex={-1}
        className="px-[clamp(16px,5vw,72px)] pt-7 pb-15 focus:outline-none md:pt-[15vh]"
      >
        {children}
      </main>
    </div>
  );
}
