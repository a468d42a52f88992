'use client';

import { useRouter } from 'next/navigation';
import { ErrorSummary } from '@/components/ui/error-summary';
import type { ActionResult } from '@/lib/errors';
import { faultsOf, useAction } from '../../../../_components/use-action';

type Decide = (reason: string, form: FormData) => Promise<ActionResult<void>>;

/** What a dialog that asks for a reason needs: decides once, shows a refusal, and shows the page anew when done. */
export function useDecision(id: string, decide: Decide) {
  const router = useRouter();
  const { run, isPending, failure, attempt, forget } = useAction((form: FormData) =>
    decide(String(form.get('reason') ?? ''), form),
  );

  const act = async (_: string, form: FormData): Promise<boolean> => {
    const { ok } = await run(form);
    if (ok) router.refresh();
    return ok;
  };

  const faults = faultsOf(failure, { reason: id });
  const refusal = <ErrorSummary faults={faults} attempt={attempt} title="Nothing was changed" />;
  return { id, act, isPending, error: failure?.fields.reason, refusal, onClose: forget, maxLength: 1000 };
}
