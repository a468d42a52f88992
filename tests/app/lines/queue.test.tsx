// @vitest-environment happy-dom
import { cleanup, configure, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { setupServer } from 'msw/node';
import { SWRConfig } from 'swr';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { Queue, type QueueData } from '@/app/(desk)/lines/_components/queue';
import { newsBetween } from '@/app/(desk)/lines/_components/use-news';
import type { OpenSheetItem } from '@/lib/services/sheet/list-open-sheets';
import { NOW } from '@/tests/support/database';

configure({ asyncUtilTimeout: 5000 });

const sheet = (change: Partial<OpenSheetItem> = {}): OpenSheetItem => ({
  id: 'a',
  race: 'Averil Coast governor',
  pollster: 'Kelmouth Research',
  fieldStartOn: '2026-09-10',
  fieldEndOn: '2026-09-13',
  headline: 'Alder 47%, Brook 41%',
  state: 'filed',
  author: 'Rhea Quill',
  filedBy: 'Rhea Quill',
  filedAt: NOW,
  isFiledByMe: false,
  returned: null,
  waitsFor: 'me',
  isUnderEmbargo: false,
  wanted: null,
  look: { kind: 'waiting', escalatesAt: NOW + 600_000 },
  isHeld: false,
  needsReview: false,
  isAsPrinted: false,
  ...change,
});
const draft = sheet({ id: 'b', state: 'draft', filedBy: null, filedAt: null, waitsFor: 'nobody' });

let onCall: string[] = [];
let answer: () => Response;
let asked = 0;
const server = setupServer(
  http.get('*/api/desk/queue', () => {
    asked += 1;
    return answer();
  }),
);
beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
afterAll(() => server.close());
beforeEach(() => {
  asked = 0;
  answers([]);
});
afterEach(cleanup);

const answers = (sheets: OpenSheetItem[], readAt = NOW) => {
  answer = () => HttpResponse.json({ sheets, onCall, readAt } satisfies QueueData);
};
const open = (initial?: OpenSheetItem[], everyMs = 0) =>
  render(
    <SWRConfig value={{ provider: () => new Map(), dedupingInterval: 0 }}>
      <Queue
        initial={initial && { sheets: initial, onCall, readAt: NOW }}
        person="rhea"
        zone="Etc/UTC"
        everyMs={everyMs}
      />
    </SWRConfig>,
  );

describe('the queue', () => {
  it('stands in three parts, by whose move it is', async () => {
    const comment = 'Name the pollster first.';
    const sheets = [
      sheet(),
      draft,
      sheet({ id: 'c', waitsFor: 'others', isFiledByMe: true }),
      sheet({
        id: 'd',
        state: 'sent-back',
        filedBy: null,
        filedAt: null,
        isUnderEmbargo: true,
        returned: { comment, by: 'Marten Reed', at: NOW },
      }),
    ];
    answers(sheets);
    open(sheets);
    const you = within(screen.getByRole('region', { name: 'Waiting for you (2)' }));
    const [filed, back] = you.getAllByRole('listitem').map((item) => item.textContent);
    expect(filed).toBe(
      'Alder 47%, Brook 41%FiledAveril Coast governor, Kelmouth Research, 10–13 September. Filed by Rhea Quill, 08:00.',
    );
    expect(back).toContain('EMBARGO');
    expect(back).toContain(`Marten Reed, 08:00: “${comment}”`);
    expect(you.getAllByRole('link')[0]?.getAttribute('href')).toBe('/lines/a');
    expect(screen.getByRole('region', { name: 'Being written (1)' }).textContent).toContain(
      'Written by Rhea',
    );
    expect(screen.getByRole('region', { name: 'Waiting for others (1)' }).textContent).toContain(
      'Filed by you, 08:00. Somebody else reads it.',
    );
    await waitFor(() => expect(asked).toBeGreaterThan(0));
  });

  it('puts a time and what presses under a sheet, and says whom to fetch for one that nobody opened', async () => {
    onCall = ['Isolde Varn', 'Marten Reed'];
    const late = sheet({
      look: { kind: 'escalated', since: NOW - 60_000 },
      wanted: { at: NOW - 5 * 60_000, local: '2026-09-17T09:55', zone: 'Europe/Vienna' },
      isHeld: true,
      needsReview: true,
    });
    answers([late]);
    open([late]);
    expect(screen.getByText('On call now: Isolde Varn and Marten Reed.')).toBeTruthy();
    for (const mark of [
      'Overdue: wanted by 09:55 (Europe/Vienna), 5 minutes ago',
      'Not opened by a second person for 10 minutes',
      'Held: publication is barred now',
      'Needs review: changed in another language',
    ])
      expect(screen.getByText(mark)).toBeTruthy();
    await waitFor(() => expect(asked).toBeGreaterThan(0));
    onCall = [];
  });

  it('says while it is loading, and what would stand there when nothing does', async () => {
    open();
    expect(screen.getByText('Reading the queue…')).toBeTruthy();
    expect(await screen.findByText('Nothing is being written, and nothing waits')).toBeTruthy();
  });

  it('refreshes itself and announces what changed', async () => {
    answers([draft]);
    open([draft], 50);
    await waitFor(() => expect(asked).toBeGreaterThan(0));
    answers([sheet({ id: 'b' })], NOW + 60_000);
    expect(
      await screen.findByText('Averil Coast governor, Kelmouth Research: filed, waiting for you.'),
    ).toBeTruthy();
    expect(screen.getByRole('region', { name: 'Waiting for you (1)' })).toBeTruthy();
  });

  it('keeps the list it has when it cannot be read, and says how old it is', async () => {
    answer = () => HttpResponse.json({ detail: 'Leadline is busy.' }, { status: 503 });
    open([sheet()]);
    expect(await screen.findByText('The list may be old')).toBeTruthy();
    expect(screen.getByText('Leadline is busy. Last read 08:00.')).toBeTruthy();
    expect(screen.getByText('Alder 47%, Brook 41%')).toBeTruthy();
    answers([]);
    await userEvent.click(screen.getByRole('button', { name: 'Read it again' }));
    expect(await screen.findByText('Nothing is being written, and nothing waits')).toBeTruthy();
    expect(screen.queryByText('The list may be old')).toBeNull();
  });

  it('says when it could not be read at all', async () => {
    answer = () => HttpResponse.json({ detail: 'Your session has ended.' }, { status: 401 });
    open();
    expect(await screen.findByText('Your session has ended. It was not read yet.')).toBeTruthy();
  });
});

describe('the news of the queue', () => {
  it('names what came, moved and left, and is silent where nothing did', () => {
    expect(newsBetween([draft], [draft])).toBe('');
    expect(newsBetween([], [draft])).toBe('Averil Coast governor, Kelmouth Research: draft.');
    expect(newsBetween([sheet(), draft], [])).toBe('2 sheets left the queue.');
    expect(newsBetween([sheet()], [draft])).toBe(
      'Averil Coast governor, Kelmouth Research: draft. One sheet left the queue.',
    );
  });
});
