'use client';

import Link from 'next/link';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { CopyStatus } from '@/components/ui/copy-status';
import type { ActionResult } from '@/lib/errors';
import { useAction } from '../../../_components/use-action';

/** Makes the embed of a sheet; asked twice, it is the same one. */
export function MakeEmbed({
  sheetId,
  create,
}: {
  sheetId: string;
  create: (input: { sheetId: string }) => Promise<ActionResult<{ id: string }>>;
}) {
  const { run, isPending, failure } = useAction(create);
  const [made, setMade] = useState<string | null>(null);
  const make = async () => {
    const result = await run({ sheetId });
    if (result.ok) setMade(result.value.id);
  };
  return (
    <>
      {made ? (
        <Link href={`/embeds#embed-${made}`}>The embed of this sheet</Link>
      ) : (
        <Button pending={isPending} pendingLabel="Making…" onClick={make}>
          Make an embed
        </Button>
      )}
      <CopyStatus
        message={failure?.message ?? (made ? 'The embed is made.' : null)}
        isFault={failure !== null}
      />
    </>
  );
}
