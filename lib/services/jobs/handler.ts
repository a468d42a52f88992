import 'server-only';
import type { Tx } from '@/db/client';
import type { JobKind, JobPayload } from '@/lib/domain/jobs';
import type { Ctx } from '../context';
import type { StepEnd } from './claim';

/** What a handler is given of a job. */
export type Handed<Kind extends JobKind> = {
  id: string;
  payload: JobPayload<Kind>;
  /** Where the last step left it; null at its beginning. */
  cursor: unknown;
  done: number;
};

export type Effects = (tx: Tx) => StepEnd;

/**
 * One step of a job: what has to happen outside the database happens when it is called, possibly more than once; what
 * it gives back is done in the transaction that saves the step, exactly once.
 */
export type Handler<Kind extends JobKind> = (job: Handed<Kind>, ctx: Ctx) => Effects | Promise<Effects>;

/** Nothing is left to do. */
export const FINISHED: StepEnd = { cursor: null };
