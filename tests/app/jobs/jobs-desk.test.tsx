// @vitest-environment happy-dom
import { cleanup, configure, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { setupServer } from 'msw/node';
import { SWRConfig } from 'swr';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { JobsDesk } from '@/app/(desk)/jobs/_components/jobs-desk';
import type { JobsView, JobView } from '@/lib/services/jobs/list-jobs';
import { NOW } from '@/tests/support/database';

configure({ asyncUtilTimeout: 5000 });

const job = (change: Partial<JobView> = {}): JobView => ({
  id: 'a',
  kind: 'recompute-findings',
  about: null,
  isHidden: false,
  state: 'waiting',
  runAt: NOW + 3_600_000,
  attempts: 0,
  error: null,
  progress: { done: 0, total: null, note: null },
  askedBy: null,
  cancelledBy: null,
  createdAt: NOW,
  startedAt: null,
  endedAt: null,
  ...change,
});
const view = (change: Partial<JobsView> = {}): JobsView => ({
  process: { state: 'answering', beatAt: NOW - 2000, startedAt: NOW - 60_000 },
  running: [],
  waiting: [],
  nWaiting: change.waiting?.length ?? 0,
  dead: [],
  nDead: change.dead?.length ?? 0,
  ended: [],
  isDemo: false,
  readAt: NOW,
  ...change,
});

let answer: () => Response;
let asked = 0;
const server = setupServer(
  http.get('*/api/v1/jobs', () => {
    asked += 1;
    return answer();
  }),
);
beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
afterAll(() => server.close());
beforeEach(() => {
  asked = 0;
  answers(view());
});
afterEach(cleanup);

const answers = (data: JobsView) => {
  answer = () => HttpResponse.json(data);
};
const acts = { cancel: vi.fn(), retry: vi.fn() };
beforeEach(() => {
  acts.cancel.mockReset().mockResolvedValue({ ok: true, value: {} });
  acts.retry.mockReset().mockResolvedValue({ ok: true, value: {} });
});
const open = (initial?: JobsView, everyMs = 0) =>
  render(
    <SWRConfig value={{ provider: () => new Map(), dedupingInterval: 0, revalidateIfStale: false }}>
      <JobsDesk initial={initial} person="ada" zone="Etc/UTC" acts={acts} everyMs={everyMs} />
    </SWRConfig>,
  );
const table = (name: string) => within(screen.getByRole('table', { name }));

describe('the work behind the screens', () => {
  it('says that it is read, and then that there is none', async () => {
    open();
    expect(screen.getByRole('status').textContent).toContain('Reading the jobs…');
    await screen.findByText('There is no work, and there has been none');
    expect(screen.getByText('Nothing runs now, nothing waits.')).toBeTruthy();
    expect(screen.getByText(/answered 2 seconds ago/)).toBeTruthy();
  });

  it('says that it could not be read, keeps what it had, and reads again when asked', async () => {
    answer = () => HttpResponse.json({ detail: 'Your session has ended.' }, { status: 401 });
    open(undefined);
    await screen.findByText(/Your session has ended\. It was not read yet\./);
    answers(view({ waiting: [job()] }));
    await userEvent.click(screen.getByRole('button', { name: 'Read it again' }));
    expect((await screen.findByRole('table', { name: 'Waiting' })).textContent).toContain('09:00');
    expect(screen.queryByText('This page may be old')).toBeNull();
  });

  it('says since when nobody does it, and what goes on all the same', () => {
    open(view({ process: { state: 'silent', beatAt: NOW - 600_000, startedAt: NOW - 700_000 } }));
    expect(screen.getByText(/has not answered since 07:50/)).toBeTruthy();
    expect(screen.getByText('Nothing is being done now')).toBeTruthy();
    cleanup();
    open(view({ process: { state: 'never-started', beatAt: null, startedAt: null } }));
    expect(screen.getByText(/has not answered since it was set up/)).toBeTruthy();
  });

  it('shows how far a running job is, and refreshes itself', async () => {
    const running = (done: number) =>
      view({
        running: [
          job({
            state: 'running',
            startedAt: NOW,
            askedBy: 'Edda Marsh',
            progress: { done, total: 90, note: null },
          }),
        ],
      });
    answers(running(50));
    open(running(25), 20);
    const bar = screen.getByRole('progressbar', { name: 'Findings computed anew' });
    expect(bar.getAttribute('max')).toBe('90');
    await table('Running now').findByText('50 of 90 done');
    expect(table('Running now').getByText('asked by Edda Marsh')).toBeTruthy();
    expect(asked).toBeGreaterThan(0);
  });

  it('never names whose poll a job under embargo is about', () => {
    open(
      view({
        waiting: [
          job({ kind: 'embargo-ended', isHidden: true }),
          job({ id: 'b', kind: 'shelf-ended', about: 'Averil Coast governor, Kelmouth Research' }),
        ],
      }),
    );
    expect(table('Waiting').getByText('A poll under embargo')).toBeTruthy();
    expect(table('Waiting').getByText('Averil Coast governor, Kelmouth Research')).toBeTruthy();
  });

  it('says how many wait that are not listed', () => {
    open(view({ waiting: [job()], nWaiting: 51 }));
    expect(table('Waiting').getByText('1 of 51 are shown.')).toBeTruthy();
  });
});

describe('an administrator', () => {
  const dead = () =>
    view({
      dead: [
        job({
          kind: 'purge-embeds',
          state: 'dead',
          attempts: 8,
          error: 'the cache answered 500',
          endedAt: NOW,
        }),
      ],
    });

  it('reads why a job was given up and what that means, and has it tried again', async () => {
    open(dead());
    const row = table('Given up');
    expect(row.getByText('the cache answered 500')).toBeTruthy();
    expect(row.getByText('Tried 8 times')).toBeTruthy();
    expect(row.getByText(/Caches keep what they have for up to 60 seconds/)).toBeTruthy();
    answers(view({ waiting: [job({ kind: 'purge-embeds', runAt: NOW })] }));
    await userEvent.click(row.getByRole('button', { name: /^Try again\s+Embeds taken from caches$/ }));
    expect(acts.retry).toHaveBeenCalledExactlyOnceWith({ id: 'a' });
    expect((await screen.findByRole('table', { name: 'Waiting' })).textContent).toContain('Next');
    expect(screen.queryByRole('table', { name: 'Given up' })).toBeNull();
  });

  it('cancels one that waits, and is told where somebody was faster', async () => {
    answers(view({ waiting: [job()] }));
    open(view({ waiting: [job()] }));
    acts.cancel.mockResolvedValue({
      ok: false,
      code: 'conflict',
      message: 'This job has ended. Reload the page.',
      fields: {},
    });
    await userEvent.click(screen.getByRole('button', { name: /^Cancel\s+Findings computed anew$/ }));
    expect((await screen.findByRole('alert')).textContent).toBe('This job has ended. Reload the page.');
    expect(acts.cancel).toHaveBeenCalledExactlyOnceWith({ id: 'a' });
  });

  it('stops a running one after its step, once', () => {
    open(view({ running: [job({ state: 'running', startedAt: NOW, cancelledBy: 'Ada Fenn' })] }));
    expect(table('Running now').getByText('Stops after this step')).toBeTruthy();
    expect(screen.queryByRole('button')).toBeNull();
  });

  it('has a cancelled one tried again, never one that is done', () => {
    open(
      view({
        ended: [
          job({
            state: 'done',
            endedAt: NOW,
            progress: { done: 90, total: 90, note: 'One release could not be computed.' },
          }),
          job({ id: 'b', state: 'cancelled', endedAt: NOW, cancelledBy: 'Ada Fenn' }),
        ],
      }),
    );
    const ended = table('Ended last');
    expect(ended.getByText('90 of 90 done')).toBeTruthy();
    expect(ended.getByText('One release could not be computed.')).toBeTruthy();
    expect(ended.getByText('Cancelled by Ada Fenn')).toBeTruthy();
    expect(ended.getAllByRole('button')).toHaveLength(1);
  });
});
