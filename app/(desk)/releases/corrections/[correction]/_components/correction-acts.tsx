'use client';

import { useRouter } from 'next/navigation';
import { Button } from '@/components/ui/button';
import { CopyStatus } from '@/components/ui/copy-status';
import type { ActionResult } from '@/lib/errors';
import { ReasonDialog } from '../../../../../_components/reason-dialog';
import { useAction } from '../../../../../_components/use-action';

/** Applies a staged correction as it was shown. */
export function ApplyStaged({
  id,
  seen,
  apply,
}: {
  id: string;
  seen: string;
  apply: (input: { id: string; seen: string }) => Promise<ActionResult<void>>;
}) {
  const router = useRouter();
  const { run, isPending, failure } = useAction(apply);
  const act = async () => {
    await run({ id, seen });
    router.refresh();
  };
  return (
    <>
      <Button tone="primary" pending={isPending} pendingLabel="Applying…" onClick={act}>
        Apply: old and new change places
      </Button>
      <CopyStatus message={failure?.message ?? null} isFault />
    </>
  );
}

/** Takes a staged correction back, for a written reason. */
export function WithdrawStaged({
  id,
  withdraw,
}: {
  id: string;
  withdraw: (input: { id: string; reason: string }) => Promise<ActionResult<void>>;
}) {
  const router = useRouter();
  const { run, isPending, failure } = useAction(withdraw);
  return (
    <ReasonDialog
      id="withdraw-reason"
      opener="Withdraw"
      decide="Withdraw the correction"
      keep="Keep it staged"
      pendingWord="Withdrawing…"
      title="Withdraw this staged correction"
      label="Why is it withdrawn?"
      hint="Nothing in print changed. What was drafted for it is put away."
      maxLength={2000}
      error={failure?.fields.reason}
      refusal={failure && failure.code !== 'invalid' ? <p role="alert">{failure.message}</p> : null}
      isPending={isPending}
      act={async (reason) => {
        const { ok } = await run({ id, reason });
        if (ok) router.refresh();
        return ok;
      }}
    />
  );
}

/** Lets the notices of an applied correction go out. */
export function ConfirmNotices({
  id,
  confirm,
}: {
  id: string;
  confirm: (input: { id: string }) => Promise<ActionResult<void>>;
}) {
  const router = useRouter();
  const { run, isPending, failure } = useAction(confirm);
  const act = async () => {
    await run({ id });
    router.refresh();
  };
  return (
    <>
      <Button tone="primary" pending={isPending} pendingLabel="Confirming…" onClick={act}>
        Let the notices go out
      </Button>
      <CopyStatus message={failure?.message ?? null} isFault />
    </>
  );
}

/** Drafts the words that take a sheet's place, and opens them. */
export function DraftReplacement({
  correctionId,
  sheetId,
  submissionKey,
  draft,
}: {
  correctionId: string;
  sheetId: string;
  submissionKey: string;
  draft: (input: {
    submissionKey: string;
    correctionId: string;
    sheetId: string;
  }) => Promise<ActionResult<{ id: string }>>;
}) {
  const router = useRouter();
  const { run, isPending, failure } = useAction(draft);
  const act = async () => {
    const result = await run({ submissionKey, correctionId, sheetId });
    if (result.ok) router.push(`/lines/${result.value.id}`);
  };
  return (
    <>
      <Button pending={isPending} pendingLabel="Drafting…" onClick={act}>
        Draft its replacement
      </Button>
      <CopyStatus message={failure?.message ?? null} isFault />
    </>
  );
}
