import type { Db } from '@/db/client';
import { JOB_KINDS, type JobKind } from '@/lib/domain/jobs';
import { claimDue } from '@/lib/services/jobs/claim';
import { runStep } from '@/lib/services/jobs/run-step';

/** Does what is due at a moment, as the process that runs jobs would; gives the faults on the way. */
export async function runDueJobs(
  db: Db,
  now: number,
  kinds: readonly JobKind[] = JOB_KINDS,
): Promise<unknown[]> {
  const faults: unknown[] = [];
  for (let claim = claimDue({ db, now }, kinds); claim; claim = claimDue({ db, now }, kinds)) {
    let held: typeof claim | null = claim;
    while (held)
      held = await runStep(
        db,
        () => now,
        held,
        (fault) => faults.push(fault),
      );
  }
  return faults;
}
