'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { CopyStatus } from '@/components/ui/copy-status';

/** The name of the evidence, by which anybody can find and check it. */
export function HashLine({ hash }: { hash: string }) {
  const [message, setMessage] = useState<string | null>(null);
  const copy = () =>
    navigator.clipboard.writeText(hash).then(
      () => setMessage('The whole hash is copied.'),
      () =>
        setMessage('This browser does not let the page copy; the whole hash is the title of the short one.'),
    );
  return (
    <div className="mt-2">
      <p className="flex flex-wrap items-center gap-3 text-13 text-soft">
        <span>
          Evidence <code title={hash}>{hash.slice(0, 12)}</code>
        </span>
        <Button onClick={copy}>Copy the hash</Button>
      </p>
      <CopyStatus message={message} />
    </div>
  );
}
