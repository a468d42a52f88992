import 'server-only';
import { JOB_KINDS, JOB_PAYLOADS, type JobKind } from '@/lib/domain/jobs';
import type { Ctx } from '../context';
import { type Claim, fail, LeaseLost, saveStep } from './claim';
import type { Effects, Handler } from './handler';
import { embargoEnded } from './handlers/embargo-ended';
import { filingUnread } from './handlers/filing-unread';
import { purgeEmbeds } from './handlers/purge-embeds';
import { recomputeFindings } from './handlers/recompute-findings';
import { shelfEnded } from './handlers/shelf-ended';

const HANDLERS: { [Kind in JobKind]: Handler<Kind> } = {
  'embargo-ended': embargoEnded,
  'shelf-ended': shelfEnded,
  'filing-unread': filingUnread,
  'recompute-findings': recomputeFindings,
  'purge-embeds': purgeEmbeds,
};

/** A job that no repetition helps: this version of the product cannot read it. */
class Unreadable extends Error {}

/**
 * One step of a job in hand. A step that fails puts the job back to be tried later, or gives it up.
 * @param clock asked anew after work that may have taken seconds
 * @returns the job as it goes on, or null where it is out of hand: ended, put back, or taken over by another process
 */
export async function runStep(
  db: Ctx['db'],
  clock: () => number,
  claim: Claim,
  onFault: (error: unknown) => void,
): Promise<Claim | null> {
  try {
    const effects = await effectsOf(claim, { db, now: clock() });
    return saveStep({ db, now: clock() }, claim, effects);
  } catch (error) {
    onFault(error);
    if (!(error instanceof LeaseLost)) giveBack({ db, now: clock() }, claim, error, onFault);
    return null;
  }
}

function giveBack(ctx: Ctx, claim: Claim, error: unknown, onFault: (error: unknown) => void): void {
  try {
    const told = error instanceof Error ? error.message : String(error);
    fail(ctx, claim, told, error instanceof Unreadable);
  } catch (second) {
    onFault(second);
  }
}

function effectsOf({ job }: Claim, ctx: Ctx): Effects | Promise<Effects> {
  const kind = JOB_KINDS.find((known) => known === job.kind);
  if (kind === undefined) throw new Unreadable(`there is no work of the kind ${job.kind}`);
  return handed(kind, job, ctx);
}

function handed<Kind extends JobKind>(kind: Kind, job: Claim['job'], ctx: Ctx): Effects | Promise<Effects> {
  const parsed = JOB_PAYLOADS[kind].safeParse(JSON.parse(job.payload));
  if (!parsed.success) throw new Unreadable('what this work is about cannot be read');
  const handler = HANDLERS[kind] as Handler<JobKind>;
  const cursor: unknown = job.cursor === null ? null : JSON.parse(job.cursor);
  return handler({ id: job.publicId, payload: parsed.data, cursor, done: job.progressDone }, ctx);
}
