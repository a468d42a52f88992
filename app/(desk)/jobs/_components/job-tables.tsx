import { type Column, DataTable } from '@/components/ui/data-table';
import { SectionHeading } from '@/components/ui/section-heading';
import { JOB_KIND_LOSSES, JOB_STATE_NAMES } from '@/lib/domain/jobs';
import type { JobView } from '@/lib/services/jobs/list-jobs';
import { JobAct, type JobActs } from './job-act';
import { JobProgress } from './job-progress';
import { attemptWords, nameOf, progressWords, whenOf } from './job-words';

type Props = { jobs: readonly JobView[]; zone: string; now: number; acts: JobActs; onDone: () => void };
type Counted = Props & { total: number };

const rowKey = ({ id }: JobView) => id;

export function RunningJobs({ jobs, acts, onDone, ...when }: Props) {
  if (jobs.length === 0) return null;
  return (
    <section className="mt-8">
      <SectionHeading>Running now</SectionHeading>
      <DataTable
        caption="Running now"
        hideCaption
        rows={jobs}
        rowKey={rowKey}
        columns={[
          NAME,
          { key: 'progress', head: 'How far', cell: (job) => <JobProgress job={job} /> },
          { key: 'since', head: 'Since', from: 'md', cell: (job) => <When at={job.startedAt} {...when} /> },
          cancelColumn(acts, onDone, 'Stop'),
        ]}
      />
    </section>
  );
}

export function WaitingJobs({ jobs, total, acts, onDone, ...when }: Counted) {
  if (jobs.length === 0) return null;
  return (
    <section className="mt-8">
      <SectionHeading>Waiting</SectionHeading>
      <DataTable
        caption="Waiting"
        hideCaption
        rows={jobs}
        rowKey={rowKey}
        columns={[
          NAME,
          {
            key: 'when',
            head: 'When',
            cell: ({ runAt }) => (runAt <= when.now ? 'Next' : <When at={runAt} {...when} />),
          },
          {
            key: 'before',
            head: 'Before',
            from: 'md',
            cell: ({ attempts, error }) =>
              error === null ? '–' : <Failure attempts={attempts} error={error} />,
          },
          cancelColumn(acts, onDone, 'Cancel'),
        ]}
        foot={total > jobs.length ? <MoreRow shown={jobs.length} total={total} columns={4} /> : undefined}
      />
    </section>
  );
}

export function DeadJobs({ jobs, total, acts, onDone, ...when }: Counted) {
  if (jobs.length === 0) return null;
  return (
    <section className="mt-8">
      <SectionHeading>Given up</SectionHeading>
      <DataTable
        caption="Given up"
        hideCaption
        rows={jobs}
        rowKey={rowKey}
        columns={[
          NAME,
          {
            key: 'why',
            head: 'Why',
            cell: (job) => (
              <>
                <Failure attempts={job.attempts} error={job.error} isHidden={job.isHidden} />
                {job.kind ? <p className="text-13 text-soft">{JOB_KIND_LOSSES[job.kind]}</p> : null}
              </>
            ),
          },
          { key: 'when', head: 'When', from: 'md', cell: ({ endedAt }) => <When at={endedAt} {...when} /> },
          {
            key: 'acts',
            head: <span className="sr-only">Decide</span>,
            cell: (job) => (
              <div className="flex flex-wrap gap-2">
                <JobAct
                  job={job}
                  act={acts.cancel}
                  label="Cancel"
                  pendingLabel="Cancelling…"
                  onDone={onDone}
                />
                <JobAct job={job} act={acts.retry} label="Try again" pendingLabel="Asking…" onDone={onDone} />
              </div>
            ),
          },
        ]}
        foot={total > jobs.length ? <MoreRow shown={jobs.length} total={total} columns={4} /> : undefined}
      />
    </section>
  );
}

export function EndedJobs({ jobs, acts, onDone, ...when }: Props) {
  if (jobs.length === 0) return null;
  return (
    <section className="mt-8">
      <SectionHeading>Ended last</SectionHeading>
      <DataTable
        caption="Ended last"
        hideCaption
        rows={jobs}
        rowKey={rowKey}
        columns={[
          NAME,
          {
            key: 'state',
            head: 'State',
            cell: (job) => (
              <>
                {JOB_STATE_NAMES[job.state]}
                {job.cancelledBy ? ` by ${job.cancelledBy}` : ''}
                {job.progress.total === null ? null : (
                  <span className="block text-13 text-soft">{progressWords(job)}</span>
                )}
                {job.progress.note ? (
                  <span className="block text-13 text-soft">{job.progress.note}</span>
                ) : null}
              </>
            ),
          },
          { key: 'when', head: 'When', cell: ({ endedAt }) => <When at={endedAt} {...when} /> },
          {
            key: 'acts',
            head: <span className="sr-only">Decide</span>,
            cell: (job) =>
              job.state === 'cancelled' ? (
                <JobAct job={job} act={acts.retry} label="Try again" pendingLabel="Asking…" onDone={onDone} />
              ) : null,
          },
        ]}
      />
    </section>
  );
}

const NAME: Column<JobView> = {
  key: 'name',
  head: 'Job',
  rowHead: true,
  cell: (job) => (
    <>
      <span className="font-semibold">{nameOf(job)}</span>
      {job.about === null && !job.isHidden ? null : (
        <span className="block font-normal">{job.about ?? 'A poll under embargo'}</span>
      )}
      {job.askedBy ? (
        <span className="block text-13 font-normal text-soft">asked by {job.askedBy}</span>
      ) : null}
    </>
  ),
};

function cancelColumn(acts: JobActs, onDone: () => void, label: 'Cancel' | 'Stop'): Column<JobView> {
  return {
    key: 'acts',
    head: <span className="sr-only">Decide</span>,
    cell: (job) =>
      job.cancelledBy ? (
        <span className="text-13 text-soft">Stops after this step</span>
      ) : (
        <JobAct job={job} act={acts.cancel} label={label} pendingLabel="Cancelling…" onDone={onDone} />
      ),
  };
}

function Failure({
  attempts,
  error,
  isHidden = false,
}: {
  attempts: number;
  error: string | null;
  isHidden?: boolean;
}) {
  return (
    <>
      <p className="max-w-prose wrap-anywhere">
        {isHidden ? 'The reason is hidden until the embargo ends.' : (error ?? 'No reason was kept.')}
      </p>
      <p className="text-13 text-soft">{attemptWords(attempts)}</p>
    </>
  );
}

function When({ at, zone, now }: { at: number | null; zone: string; now: number }) {
  if (at === null) return '–';
  return <time dateTime={new Date(at).toISOString()}>{whenOf(at, now, zone)}</time>;
}

function MoreRow({ shown, total, columns }: { shown: number; total: number; columns: number }) {
  return (
    <tr>
      <td colSpan={columns} className="text-soft">
        {shown} of {total} are shown.
      </td>
    </tr>
  );
}
