// @vitest-environment happy-dom
import { cleanup, configure, fireEvent, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { setupServer } from 'msw/node';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { SheetScreen } from '@/app/(desk)/lines/_components/sheet-screen';
import { NOW } from '@/tests/support/database';
import { deskWithSheet } from '@/tests/support/sheet-view';
import { refused, sheetActs } from './acts';

configure({ asyncUtilTimeout: 5000 });

const refresh = vi.fn();
vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh, push: vi.fn() }) }));

const { desk, see, on, reporter, editor, id } = deskWithSheet();
afterAll(desk.closeAndRemove);
const draft = see();

type Saved = { version: number; lines: { kind: string; text: string; knockedOut: boolean }[] };
let saved: Saved[] = [];
let answer: (body: Saved) => Response;

const server = setupServer(
  http.put('*/api/desk/sheets/:id', async ({ request }) => {
    const body = (await request.json()) as Saved;
    saved.push(body);
    return answer(body);
  }),
);
beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
afterAll(() => server.close());

let acts: ReturnType<typeof sheetActs>;
beforeEach(() => {
  saved = [];
  answer = ({ version }) => HttpResponse.json({ version: version + 1 });
  acts = sheetActs();
  refresh.mockReset();
  localStorage.clear();
});
afterEach(cleanup);

const open = (view = draft) =>
  render(<SheetScreen view={view} actions={acts} person="rhea" now={NOW} zone="Etc/UTC" />);
const body = () => screen.getByLabelText<HTMLTextAreaElement>('Body sentence');
const type = (text: string) => fireEvent.change(body(), { target: { value: text } });
const textOf = (request: Saved, kind: string) => request.lines.find((line) => line.kind === kind)?.text;
const conflict = () =>
  HttpResponse.json({ title: 'conflict', detail: 'Somebody changed this sheet meanwhile.' }, { status: 409 });

describe('a line being written', () => {
  it('is marked, as it is typed, where it says more than the figures, until it is mended', async () => {
    open();
    expect(screen.queryByText(/Not supported:/)).toBeNull();
    type('Alder leads Brook in this poll.');
    const mark = await screen.findByText(/^Not supported:/);
    expect(mark.closest('li')?.textContent).toContain('“leads”');
    expect(screen.getByText('The figures do not support some words')).toBeTruthy();
    expect(screen.getByText(/ask an editor/)).toBeTruthy();
    expect(screen.queryByLabelText(/Reason for filing/)).toBeNull();
    type('Alder has 47% in this poll.');
    await waitFor(() => expect(screen.queryByText(/Not supported:/)).toBeNull());
    expect(screen.queryByText('The figures do not support some words')).toBeNull();
  });

  it('that contradicts the figures cannot be filed whatever an editor writes', async () => {
    open(see(editor));
    type('Brook leads Alder in this poll.');
    expect(await screen.findByText('Some words contradict the figures')).toBeTruthy();
    expect(screen.queryByLabelText(/Reason for filing/)).toBeNull();
  });

  it('is filed by an editor against the check with the reason and the phrases that were on the screen', async () => {
    open(see(editor));
    type('Alder leads Brook in this poll.');
    const reason = await screen.findByLabelText('Reason for filing them all the same');
    fireEvent.change(reason, { target: { value: 'The quoted rival says so herself.' } });
    await userEvent.click(screen.getByRole('button', { name: 'File' }));
    await waitFor(() => expect(acts.file).toHaveBeenCalledTimes(1));
    expect(acts.file).toHaveBeenCalledWith(
      expect.objectContaining({
        override: {
          reason: 'The quoted rival says so herself.',
          marks: [{ kind: 'body', rule: 'lead', phrase: 'leads' }],
        },
      }),
    );
  });

  it('shows what it changed of the draft, and goes back to it', async () => {
    open();
    const before = body().value;
    type(`${before} More.`);
    expect(document.querySelector('#line-body-draft ins')?.textContent).toContain('More.');
    await userEvent.click(screen.getByRole('button', { name: /Back to the draft/ }));
    expect(body().value).toBe(before);
    expect(document.querySelector('#line-body-draft')).toBeNull();
  });

  it('is knocked out and put back, unless the chart needs it', async () => {
    open();
    const names = screen.getAllByRole('button', { name: /Knock out/ }).map((button) => button.textContent);
    expect(names).toEqual([
      'Knock out the headline claim',
      'Knock out the body sentence',
      'Knock out the method note',
    ]);
    await userEvent.click(screen.getByRole('button', { name: 'Knock out the body sentence' }));
    expect(screen.queryByLabelText('Body sentence')).toBeNull();
    expect(screen.getByText('is knocked out. It is not part of this sheet.')).toBeTruthy();
    await userEvent.click(screen.getByRole('button', { name: 'Put back the body sentence' }));
    expect(body().value).toBe(draft.lines.find(({ kind }) => kind === 'body')?.text);
  });
});

describe('saving', () => {
  it('happens by itself, once for many keys, each time from the version that the last one gave', async () => {
    open();
    type('One');
    type('One two');
    await screen.findByText(/^Saved \d\d:\d\d$/);
    expect(saved.map((request) => [request.version, textOf(request, 'body')])).toEqual([[1, 'One two']]);
    type('One two three');
    await waitFor(() => expect(saved).toHaveLength(2));
    expect(saved[1]?.version).toBe(2);
  });

  it('that meets somebody else’s change says so, stops, and loses no word', async () => {
    answer = conflict;
    const view = open();
    type('My own words.');
    await screen.findByText('What you typed is not saved');
    expect(screen.getByText('Somebody changed this sheet meanwhile.')).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Reload the page' })).toBeTruthy();
    expect(body().value).toBe('My own words.');
    await userEvent.click(screen.getByRole('button', { name: 'File' }));
    expect(acts.file).not.toHaveBeenCalled();

    view.unmount();
    answer = ({ version }) => HttpResponse.json({ version: version + 1 });
    open();
    expect(body().value).not.toBe('My own words.');
    await userEvent.click(screen.getByRole('button', { name: 'Put them back' }));
    expect(body().value).toBe('My own words.');
    await screen.findByText(/^Saved/);
    expect(localStorage.length).toBe(0);
  });

  it('that meets an ended session says how to go on', async () => {
    answer = () => HttpResponse.json({ detail: 'Your session has ended.' }, { status: 401 });
    open();
    type('Words of a session that ended.');
    expect(await screen.findByText(/^Your session has ended\. Sign in again in another tab/)).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Save now' })).toBeTruthy();
  });

  it('that fails for now is tried again on demand', async () => {
    answer = () => HttpResponse.json({ detail: 'Leadline is busy.' }, { status: 503 });
    open();
    type('Words that wait.');
    await screen.findByText('What you typed is not saved yet');
    answer = ({ version }) => HttpResponse.json({ version: version + 1 });
    await userEvent.click(screen.getByRole('button', { name: 'Save now' }));
    await screen.findByText(/^Saved/);
    expect(textOf(saved.at(-1)!, 'body')).toBe('Words that wait.');
  });
});

describe('filing', () => {
  it('saves first and files once, on what was on the screen, however often it is pressed', async () => {
    open();
    type('The last word.');
    await userEvent.dblClick(screen.getByRole('button', { name: 'File' }));
    await waitFor(() => expect(refresh).toHaveBeenCalledTimes(1));
    expect(acts.file).toHaveBeenCalledTimes(1);
    expect(acts.file).toHaveBeenCalledWith(
      expect.objectContaining({ id: draft.id, version: 2, basisHash: draft.basisHash }),
    );
    expect(saved).toHaveLength(1);
  });

  it('is told, and the words that tell it take the focus', async () => {
    open();
    await userEvent.click(screen.getByRole('button', { name: 'File' }));
    const said = await screen.findByText('Filed.');
    await waitFor(() => expect(document.activeElement).toBe(said));
  });

  it('that is refused names the lines on top and at the field', async () => {
    const words = 'A filed line has words. Knock it out, or write it.';
    acts.file.mockResolvedValueOnce(
      refused('Some lines need another look.', 'invalid', { body: words }) as never,
    );
    open();
    await userEvent.click(screen.getByRole('button', { name: 'File' }));
    const link = await screen.findByRole('link', { name: `Body sentence: ${words}` });
    expect(body().getAttribute('aria-invalid')).toBe('true');
    expect(document.activeElement?.contains(link)).toBe(true);
  });

  it('on figures that moved says so and offers to read them', async () => {
    acts.file.mockResolvedValueOnce(refused('The figures changed since you opened this page.'));
    open();
    await userEvent.click(screen.getByRole('button', { name: 'File' }));
    expect((await screen.findByRole('alert')).textContent).toContain('The figures changed');
    expect(screen.getByRole('button', { name: 'Reload the page' })).toBeTruthy();
  });
});

describe('a sheet that came back', () => {
  it('has the comment on top', () => {
    on.file(reporter, id);
    const comment = 'Name the pollster first.';
    on.sendBack(editor, id, comment);
    open(see());
    expect(screen.getByText('Marten Reed sent this back at 08:00')).toBeTruthy();
    expect(screen.getAllByText(`“${comment}”`).length).toBeGreaterThan(0);
  });

  it('because the evidence changed is agreed to with one key', async () => {
    const view = { ...see(), agreesAnew: true };
    open(view);
    expect(screen.queryByRole('button', { name: 'File' })).toBeNull();
    await userEvent.click(screen.getByRole('button', { name: 'Agree and file again' }));
    await waitFor(() => expect(acts.file).toHaveBeenCalledTimes(1));
  });
});

describe('a draft that nobody filed', () => {
  it('is thrown away after one question, and kept by the button that stands first', async () => {
    open();
    await userEvent.click(screen.getByRole('button', { name: 'Discard the draft' }));
    await userEvent.click(screen.getByRole('button', { name: 'Keep it' }));
    expect(acts.discard).not.toHaveBeenCalled();
    acts.discard.mockResolvedValue(refused('This sheet was filed once, so it is kept.'));
    await userEvent.click(screen.getByRole('button', { name: 'Discard the draft' }));
    const [, inDialog] = screen.getAllByRole('button', { name: 'Discard the draft' });
    await userEvent.click(inDialog!);
    expect(acts.discard).toHaveBeenCalledWith({ id: draft.id });
    expect(screen.getByText('This sheet was filed once, so it is kept.')).toBeTruthy();
  });
});
