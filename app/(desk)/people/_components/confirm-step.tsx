'use client';

import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { ErrorSummary } from '@/components/ui/error-summary';
import type { ActionResult } from '@/lib/errors';
import { faultsOf, useAction } from '../../../_components/use-action';

type Props<T> = {
  act: () => Promise<ActionResult<T>>;
  onDone: (value: T) => void;
  onBack: () => void;
  label: string;
  isCaution?: boolean;
  children: ReactNode;
};

/** What will happen, and the one button that makes it happen. */
export function ConfirmStep<T>({ act, onDone, onBack, label, isCaution, children }: Props<T>) {
  const { run, isPending, failure, attempt } = useAction<undefined, T>(act);

  const confirm = async () => {
    const result = await run(undefined);
    if (result.ok) onDone(result.value);
  };

  return (
    <>
      <ErrorSummary faults={faultsOf(failure, {})} attempt={attempt} title="Nothing was changed" />
      <p>{children}</p>
      <div className="mt-4 flex flex-wrap gap-3">
        <Button onClick={onBack}>Back</Button>
        <Button tone={isCaution ? 'caution' : 'primary'} pending={isPending} onClick={confirm}>
          {label}
        </Button>
      </div>
    </>
  );
}
