'use client';

import type { ActionResult } from '@/lib/errors';
import { loadPage } from '../../../_components/load-page';
import { ReasonDialog } from '../../../_components/reason-dialog';
import { useAction } from '../../../_components/use-action';

export function SendStyleBack({
  id,
  hash,
  isOwn,
  act,
}: {
  id: string;
  hash: string;
  /** Whoever proposed it takes it back. */
  isOwn: boolean;
  act: (input: unknown) => Promise<ActionResult<unknown>>;
}) {
  const { run, isPending, failure, forget } = useAction(act);
  const send = async (comment: string) => {
    const result = await run({ id, hash, comment });
    if (result.ok) loadPage(`/house-style/${id}`);
    return result.ok;
  };
  const own = failure?.fields.comment;
  return (
    <ReasonDialog
      id="style-comment"
      opener={isOwn ? 'Take it back' : 'Send back'}
      title={isOwn ? 'Take this version back?' : 'Send this version back?'}
      label="What should change"
      hint="Its author reads this, and it stays in the history."
      decide={isOwn ? 'Take it back' : 'Send back'}
      maxLength={2000}
      error={own}
      refusal={failure && !own ? <p role="alert">{failure.message}</p> : null}
      isPending={isPending}
      act={send}
      onClose={forget}
    />
  );
}
