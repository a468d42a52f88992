import type { ReactNode } from 'react';

/** The one thing to do next, between two rules; the buttons stand at its end, the main one last. */
export function NextBar({
  children,
  actions,
  label = 'Next step',
}: {
  children: ReactNode;
  actions?: ReactNode;
  label?: string;
}) {
  return (
    <section className="next-bar" aria-label={label}>
      <div className="next-bar-text">{children}</div>
      {actions ? <div className="next-bar-actions">{actions}</div> : null}
    </section>
  );
}
