import { JOB_KIND_NAMES } from '@/lib/domain/jobs';
import { formatInstant, formatTime } from '@/lib/format/date';
import { formatCount } from '@/lib/format/number';
import type { JobsView, JobView } from '@/lib/services/jobs/list-jobs';

const LOCALE = 'en-GB';
const DAY_MS = 24 * 60 * 60_000;

export function nameOf({ kind }: JobView): string {
  return kind === null ? 'Work of an unknown kind' : JOB_KIND_NAMES[kind];
}

/** What tells one job from another of its kind, for whoever hears a button's name alone. */
export function fullNameOf(job: JobView): string {
  return job.about === null ? nameOf(job) : `${nameOf(job)}, ${job.about}`;
}

/** An instant as near as needed: the time alone within a day of now. */
export function whenOf(at: number, now: number, zone: string): string {
  return Math.abs(at - now) < DAY_MS / 2 ? formatTime(at, zone, LOCALE) : formatInstant(at, zone, LOCALE);
}

export function secondsWords(ms: number): string {
  const seconds = Math.max(0, Math.round(ms / 1000));
  return seconds === 1 ? '1 second ago' : `${formatCount(seconds, LOCALE)} seconds ago`;
}

/** The state of the process that runs jobs, as one sentence. */
export function processWords({ process, readAt }: JobsView, zone: string): string {
  if (process.beatAt === null) return 'The process that does this work has not answered since it was set up.';
  if (process.state === 'answering')
    return `The process that does this work answered ${secondsWords(readAt - process.beatAt)}.`;
  return `The process that does this work has not answered since ${whenOf(process.beatAt, readAt, zone)}.`;
}

export function progressWords({ progress }: JobView): string {
  const { done, total } = progress;
  if (total === null) return done === 0 ? 'Just begun' : `${formatCount(done, LOCALE)} done`;
  return `${formatCount(done, LOCALE)} of ${formatCount(total, LOCALE)} done`;
}

/** How often a job was begun without getting further; empty the first time. */
export function attemptWords(attempts: number): string {
  if (attempts === 0) return '';
  return attempts === 1 ? 'Tried once' : `Tried ${attempts} times`;
}
