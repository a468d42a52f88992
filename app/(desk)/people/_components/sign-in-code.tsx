'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { CopyStatus } from '@/components/ui/copy-status';

/** A one-time code, on the screen once: the server keeps only its hash. */
export function SignInCode({ name, code, onClose }: { name: string; code: string; onClose: () => void }) {
  const [said, setSaid] = useState<{ message: string; isFault: boolean } | null>(null);

  const copy = async () => {
    try {
      await navigator.clipboard.writeText(code);
      setSaid({ message: 'Copied.', isFault: false });
    } catch {
      setSaid({ message: 'The browser did not let us copy: select the code and copy it.', isFault: true });
    }
  };

  return (
    <div>
      <p>
        Give this code to {name}, in person or by telephone. It is shown this once, works once, and ends after
        seven days.
      </p>
      <p className="my-3">
        <output
          aria-label="Sign-in code"
          className="inline-block border border-rule border-t-ink bg-panel px-4 py-3 text-18 font-semibold tracking-wider select-all"
        >
          {code}
        </output>
      </p>
      <p>
        To be used at{' '}
        <strong>
          {typeof window === 'undefined' ? '/invitation' : `${window.location.origin}/invitation`}
        </strong>
      </p>
      <CopyStatus message={said?.message ?? null} isFault={said?.isFault} />
      <div className="mt-2 flex flex-wrap gap-3">
        <Button onClick={copy}>Copy the code</Button>
        <Button tone="primary" onClick={onClose}>
          Done
        </Button>
      </div>
    </div>
  );
}
