'use client';

import { useEffect } from 'react';

/** A page that the browser brings back from memory may show what its reader may no longer see: load it anew. */
export function ReloadRestored() {
  useEffect(() => {
    const reload = (event: PageTransitionEvent) => {
      if (event.persisted) window.location.reload();
    };
    window.addEventListener('pageshow', reload);
    return () => window.removeEventListener('pageshow', reload);
  }, []);
  return null;
}
