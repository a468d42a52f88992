'use client';

import { Radios } from '@/components/ui/radios';
import type { ActionResult } from '@/lib/errors';
import { ReasonDialog } from '../../../../_components/reason-dialog';
import { useDecision } from './use-decision';

type Override = (input: unknown) => Promise<ActionResult<void>>;
export type Candidate = { releaseId: string; label: string; differences: string };

/** An editor's act: compare with a release that differs, for a reason that travels into the method note. */
export function OverrideComparison({
  id,
  candidates,
  override,
}: {
  id: string;
  candidates: readonly Candidate[];
  override: Override;
}) {
  const decision = useDecision('override-reason', (reason, form) =>
    override({ id, comparedWith: String(form.get('comparedWith') ?? ''), reason }),
  );
  return (
    <ReasonDialog
      {...decision}
      opener="Compare all the same"
      title="Compare with a release that differs"
      label="Why may the two be compared?"
      hint="Your words go into the method note of whatever is printed."
      decide="Compare with it"
    >
      <Radios
        id="override-release"
        name="comparedWith"
        label="Which release"
        defaultValue={candidates[0]?.releaseId}
        choices={candidates.map(({ releaseId, label, differences }) => ({
          value: releaseId,
          label,
          hint: differences,
        }))}
      />
    </ReasonDialog>
  );
}
