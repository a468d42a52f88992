import { useEffect } from 'react';

/**
 * Has the browser ask before a page goes on which something was changed.
 *
 * @param read what stands there now
 * @param opened what stood there first
 */
export function useLeaveWarning(read: () => unknown, opened: unknown): void {
  const before = JSON.stringify(opened);
  useEffect(() => {
    const warn = (event: BeforeUnloadEvent) => {
      if (JSON.stringify(read()) !== before) event.preventDefault();
    };
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [read, before]);
}
