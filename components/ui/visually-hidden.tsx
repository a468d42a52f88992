import type { ReactNode } from 'react';

/** Read aloud, not seen. */
export function VisuallyHidden({ children }: { children: ReactNode }) {
  return <span className="sr-only">{children}</span>;
}
