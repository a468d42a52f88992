import type { ReactNode } from 'react';

/** A quiet heading over a part of the page, as in a printed table of particulars. */
export function SectionHeading({
  children,
  id,
  level = 2,
}: {
  children: ReactNode;
  id?: string;
  level?: 2 | 3;
}) {
  const Heading = level === 2 ? 'h2' : 'h3';
  return (
    <Heading id={id} className="section-heading">
      {children}
    </Heading>
  );
}
