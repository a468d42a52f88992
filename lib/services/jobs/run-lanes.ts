import 'server-only';
import { setTimeout as sleep } from 'node:timers/promises';
import type { Db } from '@/db/client';
import { nextRunAt } from '@/db/queries/jobs';
import { JOB_LANES, type JobKind } from '@/lib/domain/jobs';
import { type Claim, claimDue, putBack, renewLease } from './claim';
import { runStep } from './run-step';

export type Lanes = {
  db: Db;
  clock: () => number;
  /** Asks to stop: the step in hand is finished, and what is left of its job waits. */
  stop: AbortSignal;
  onFault: (error: unknown) => void;
};

const POLL_MS = 1000;
const AFTER_FAULT_MS = 1000;

/** Runs jobs, one of each lane at a time, until it is asked to stop. */
export function runLanes(lanes: Lanes): { ended: Promise<void>; renewLeases: () => void } {
  const held = new Map<number, Claim>();
  const running = JOB_LANES.map((kinds, lane) =>
    runLane(lanes, kinds, (claim) => (claim ? held.set(lane, claim) : held.delete(lane))),
  );
  const now = () => ({ db: lanes.db, now: lanes.clock() });
  return {
    ended: Promise.all(running).then(() => undefined),
    renewLeases: () => held.forEach((claim) => renewLease(now(), claim)),
  };
}

async function runLane(
  lanes: Lanes,
  kinds: readonly JobKind[],
  onHeld: (claim: Claim | null) => void,
): Promise<void> {
  while (!lanes.stop.aborted) {
    try {
      const claim = claimDue({ db: lanes.db, now: lanes.clock() }, kinds);
      if (claim) await runJob(lanes, claim, onHeld);
      else await pause(lanes, kinds);
    } catch (error) {
      lanes.onFault(error);
      await sleep(AFTER_FAULT_MS);
    }
  }
}

async function runJob(lanes: Lanes, first: Claim, onHeld: (claim: Claim | null) => void): Promise<void> {
  const { db, clock, stop, onFault } = lanes;
  try {
    let claim: Claim | null = first;
    while (claim && !stop.aborted) {
      onHeld(claim);
      claim = await runStep(db, clock, claim, onFault);
      // Steps are synchronous for the most part: other lanes and signals get their turn between them.
      await sleep(0);
    }
    if (claim) putBack({ db, now: clock() }, claim);
  } finally {
    onHeld(null);
  }
}

/** A second, or less where a job is due before; ends early where the process is asked to stop. */
async function pause({ db, clock, stop }: Lanes, kinds: readonly JobKind[]): Promise<void> {
  const next = nextRunAt(db, kinds);
  const waitMs = next === null ? POLL_MS : Math.min(POLL_MS, Math.max(1, next - clock()));
  await sleep(waitMs, undefined, { signal: stop }).catch(() => undefined);
}
