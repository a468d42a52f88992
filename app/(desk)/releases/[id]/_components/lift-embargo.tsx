'use client';

import type { ActionResult } from '@/lib/errors';
import { ReasonDialog } from '../../../../_components/reason-dialog';
import { useDecision } from './use-decision';

type Lift = (input: unknown) => Promise<ActionResult<void>>;

/** An editor's act: the embargo ends now, for a written reason. */
export function LiftEmbargo({ id, version, lift }: { id: string; version: number; lift: Lift }) {
  const decision = useDecision('lift-reason', (reason) => lift({ id, version, reason }));
  return (
    <ReasonDialog
      {...decision}
      opener="Lift the embargo"
      title="Lift the embargo now?"
      label="Why does it end early?"
      hint="It stays in the history with your name."
      decide="Lift the embargo"
      tone="caution"
      keep="Keep it"
    >
      <p className="mb-4">
        Everything cleared from this release becomes public at once. An embargo that is lifted cannot be put
        back.
      </p>
    </ReasonDialog>
  );
}
