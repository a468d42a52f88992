'use client';

import { Button } from '@/components/ui/button';
import { CautionNote } from '@/components/ui/caution-note';

type Failure = { code: string; message: string };

/** Why nothing was done, and the way on. */
export function RefusedNote({ failure }: { failure: Failure | null }) {
  return (
    <div role="alert">
      {failure ? (
        <CautionNote title="Nothing was done">
          <p>{failure.message}</p>
          {failure.code === 'invalid' ? null : (
            <Button className="mt-2" onClick={() => window.location.reload()}>
              Reload the page
            </Button>
          )}
        </CautionNote>
      ) : null}
    </div>
  );
}
