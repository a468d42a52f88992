'use client';

import { useEffect, useRef } from 'react';
import { Button } from '@/components/ui/button';
import { NextBar } from '@/components/ui/next-bar';

/** Something broke while a page was made. Its message stays in the log; the reference finds it there. */
export function ErrorPage({ error, retry }: { error: unknown; retry: () => void }) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  const reference = referenceOf(error);

  return (
    <div role="alert">
      <h1 ref={heading} tabIndex={-1} className="page-title-name">
        This page could not be made
      </h1>
      <p className="page-title-sub">
        Something went wrong on our side. What was saved before is still saved; what you were typing may be
        gone from this page.
      </p>
      <NextBar
        actions={
          <>
            <a href="/" className="button button-plain">
              To your first page
            </a>
            <Button tone="primary" onClick={retry}>
              Try again
            </Button>
          </>
        }
      >
        {reference ? (
          <>
            If it stays, tell whoever runs the desk, with this reference: <code>{reference}</code>
          </>
        ) : (
          'If it stays, tell whoever runs the desk.'
        )}
      </NextBar>
    </div>
  );
}

function referenceOf(error: unknown): string | null {
  if (typeof error !== 'object' || error === null || !('digest' in error)) return null;
  return typeof error.digest === 'string' ? error.digest : null;
}
