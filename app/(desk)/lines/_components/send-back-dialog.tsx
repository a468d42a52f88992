'use client';

import type { ActionFailure } from '@/lib/errors';
import { ReasonDialog } from '../../../_components/reason-dialog';
import { RefusedNote } from './refused-note';

type Seen = { id: string; hash: string };

export function SendBackDialog({
  author,
  seen,
  back,
}: {
  author: string;
  seen: Seen;
  back: {
    act: (input: Seen & { comment: string }) => Promise<boolean>;
    isPending: boolean;
    failure: ActionFailure | null;
  };
}) {
  const { failure } = back;
  return (
    <ReasonDialog
      id="back-comment"
      opener="Send back"
      title="Send this sheet back"
      label="What should change?"
      hint={`${author} reads this on top of the sheet.`}
      decide="Send back"
      pendingWord="Sending back…"
      maxLength={2000}
      error={failure?.fields.comment}
      refusal={<RefusedNote failure={failure?.code === 'invalid' ? null : failure} />}
      act={(comment) => back.act({ ...seen, comment })}
      isPending={back.isPending}
    />
  );
}
