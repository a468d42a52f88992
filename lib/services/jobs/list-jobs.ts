import 'server-only';
import { countJobsIn, listJobsIn } from '@/db/queries/jobs';
import { JOB_KINDS, type JobKind, type JobState } from '@/lib/domain/jobs';
import { type Actor, canManageJobs } from '@/lib/domain/roles';
import { readEnv } from '@/lib/env';
import { authorize, type Ctx } from '../context';
import { type JobProcessView, viewJobProcess } from './job-process';

export type JobView = {
  id: string;
  /** Null for a kind that this version of the product does not know. */
  kind: JobKind | null;
  /** Whose poll it is about; null where it is about none, or an embargo keeps it from the viewer. */
  about: string | null;
  isHidden: boolean;
  state: JobState;
  runAt: number;
  /** Begun so often since it last got further. */
  attempts: number;
  error: string | null;
  progress: { done: number; total: number | null; note: string | null };
  askedBy: string | null;
  /** Who asked it to stop. */
  cancelledBy: string | null;
  createdAt: number;
  startedAt: number | null;
  endedAt: number | null;
};

export type JobsView = {
  process: JobProcessView;
  running: JobView[];
  /** The soonest of them. */
  waiting: JobView[];
  nWaiting: number;
  dead: JobView[];
  nDead: number;
  /** Done or cancelled, the latest first. */
  ended: JobView[];
  /** Hosted services are stood in for: nothing leaves this machine. */
  isDemo: boolean;
  readAt: number;
};

const WAITING = 50;
const DEAD = 50;
const ENDED = 20;

/** What works behind the screens now, what waits, what was given up and what ended. Never a figure. */
export function listJobs(actor: Actor, ctx: Ctx): JobsView {
  authorize(canManageJobs(actor), 'The work behind the screens is shown to administrators.');
  const list = (states: readonly JobState[], order: 'soonest' | 'latest', limit: number) =>
    listJobsIn(ctx.db, states, order, limit, actor, ctx.now).map(viewOf);
  return {
    process: viewJobProcess(ctx.db, ctx.now),
    running: list(['running'], 'soonest', WAITING),
    waiting: list(['waiting'], 'soonest', WAITING),
    nWaiting: countJobsIn(ctx.db, 'waiting'),
    dead: list(['dead'], 'latest', DEAD),
    nDead: countJobsIn(ctx.db, 'dead'),
    ended: list(['done', 'cancelled'], 'latest', ENDED),
    isDemo: readEnv().LEADLINE_FAKES,
    readAt: ctx.now,
  };
}

function viewOf(row: ReturnType<typeof listJobsIn>[number]): JobView {
  const { job, race, pollster } = row;
  const isHidden = job.releaseId !== null && !row.isVisible;
  return {
    id: job.publicId,
    kind: JOB_KINDS.find((kind) => kind === job.kind) ?? null,
    about: isHidden || race === null || pollster === null ? null : `${race}, ${pollster}`,
    isHidden,
    state: job.state,
    runAt: job.runAt,
    attempts: job.attempts,
    error: isHidden ? null : job.lastError,
    progress: { done: job.progressDone, total: job.progressTotal, note: job.progressNote },
    askedBy: row.askedBy,
    cancelledBy: row.cancelledBy,
    createdAt: job.createdAt,
    startedAt: job.startedAt,
    endedAt: job.endedAt,
  };
}
