'use client';

import { useRouter } from 'next/navigation';
import { Button } from '@/components/ui/button';
import { CopyStatus } from '@/components/ui/copy-status';
import type { ActionResult } from '@/lib/errors';
import { useAction } from '../../../../_components/use-action';

/** Takes one turn off the night list. */
export function RemoveShift({
  id,
  about,
  remove,
}: {
  id: string;
  about: string;
  remove: (input: { id: string }) => Promise<ActionResult<void>>;
}) {
  const router = useRouter();
  const { run, isPending, failure } = useAction(remove);
  const take = async () => {
    const { ok } = await run({ id });
    if (ok) router.refresh();
  };
  return (
    <>
      <Button pending={isPending} pendingLabel="Taking off…" onClick={take}>
        Take off<span className="sr-only"> {about}</span>
      </Button>
      <CopyStatus message={failure?.message ?? null} isFault />
    </>
  );
}
