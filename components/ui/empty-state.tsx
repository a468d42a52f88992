import type { ReactNode } from 'react';

/** Nothing here yet: what would stand here, and how it gets here. */
export function EmptyState({
  title,
  children,
  action,
}: {
  title: ReactNode;
  children?: ReactNode;
  action?: ReactNode;
}) {
  return (
    <div className="empty-state">
      <svg aria-hidden="true" viewBox="0 0 16 72" width="16" height="72" className="empty-state-line">
        <path d="M8 0V56" />
        <path d="M8 52C11 57 14.5 61.5 14.5 65.5A6.5 6.5 0 0 1 1.5 65.5C1.5 61.5 5 57 8 52Z" />
      </svg>
      <div>
        <p className="text-18 font-semibold">{title}</p>
        {children ? <div className="mt-1 max-w-prose text-soft">{children}</div> : null}
        {action ? <div className="mt-4">{action}</div> : null}
      </div>
    </div>
  );
}
