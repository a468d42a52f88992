'use client';

import { Button } from '@/components/ui/button';
import type { ActionResult } from '@/lib/errors';
import type { JobView } from '@/lib/services/jobs/list-jobs';
import { useAction } from '../../../_components/use-action';
import { fullNameOf } from './job-words';

type Act = (input: { id: string }) => Promise<ActionResult<unknown>>;
export type JobActs = { cancel: Act; retry: Act };

/** One act on one job, with its refusal beside it. */
export function JobAct({
  job,
  act,
  label,
  pendingLabel,
  onDone,
}: {
  job: JobView;
  act: Act;
  label: string;
  pendingLabel: string;
  onDone: () => void;
}) {
  const { run, isPending, failure } = useAction(act);
  const press = async () => {
    await run({ id: job.id });
    onDone();
  };
  return (
    <>
      <Button pending={isPending} pendingLabel={pendingLabel} onClick={press}>
        {label} <span className="sr-only">{fullNameOf(job)}</span>
      </Button>
      {failure ? (
        <p role="alert" className="mt-1 max-w-60 text-13 text-caution">
          {failure.message}
        </p>
      ) : null}
    </>
  );
}
