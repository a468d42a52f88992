import type { JobView } from '@/lib/services/jobs/list-jobs';
import { nameOf, progressWords } from './job-words';

/** How far a running job is, as a bar where its whole is known, and in words. */
export function JobProgress({ job }: { job: JobView }) {
  const { done, total, note } = job.progress;
  return (
    <>
      {total === null || total === 0 ? null : (
        <progress
          className="block h-2 w-full max-w-60 accent-ink"
          value={done}
          max={total}
          aria-label={nameOf(job)}
        />
      )}
      <span className="text-13">{progressWords(job)}</span>
      {note ? <span className="block text-13 text-soft">{note}</span> : null}
    </>
  );
}
