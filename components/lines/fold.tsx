import { type KeyboardEvent, type ReactNode, useState } from 'react';
import { Details } from '../ui/details';
import { SectionHeading } from '../ui/section-heading';

/** A part of a sheet that stands behind its heading until it is wanted; opening one closes another. */
export function Fold({
  id,
  title,
  isOpen = false,
  children,
}: {
  /** Of the heading. */
  id: string;
  title: string;
  /** Open from the start. */
  isOpen?: boolean;
  children: ReactNode;
}) {
  // How it began: a later drawing of the page leaves it as whoever reads it left it.
  const [isFirstOpen] = useState(isOpen);
  const close = (event: KeyboardEvent<HTMLDetailsElement>) => {
    const fold = event.currentTarget;
    if (event.key !== 'Escape' || !fold.open) return;
    fold.open = false;
    fold.querySelector('summary')?.focus();
  };
  return (
    <section aria-labelledby={id} className="fold">
      <Details
        name={isFirstOpen ? undefined : 'sheet-folds'}
        open={isFirstOpen}
        onKeyDown={close}
        summary={<SectionHeading id={id}>{title}</SectionHeading>}
      >
        {children}
      </Details>
    </section>
  );
}
