// @vitest-environment happy-dom
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { setupServer } from 'msw/node';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { CopyLines } from '@/app/(desk)/copy-desk/_components/copy-lines';

const LINES = [
  { kind: 'headline' as const, text: 'As it stood when the page was made' },
  { kind: 'caveat' as const, text: 'The caveat.' },
];

let asked: unknown[] = [];
let answer: () => Response;
const server = setupServer(
  http.post('*/api/desk/copy/:id', async ({ request, params }) => {
    asked.push([params.id, await request.json()]);
    return answer();
  }),
);
beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
afterAll(() => server.close());

/** A clipboard that keeps what it is given, as a browser's does; happy-dom has no ClipboardItem. */
const written: Record<string, string>[] = [];
class Item {
  constructor(readonly parts: Record<string, Promise<Blob>>) {}
}
const write = vi.fn(async ([item]: Item[]) => {
  const entries = Object.entries(item?.parts ?? {});
  const texts = await Promise.all(entries.map(async ([type, part]) => [type, await (await part).text()]));
  written.push(Object.fromEntries(texts) as Record<string, string>);
});

beforeEach(() => {
  asked = [];
  written.length = 0;
  write.mockClear();
  answer = () => HttpResponse.json({ plain: 'As it is now', html: '<p>As it is now</p>' });
  vi.stubGlobal('ClipboardItem', Item);
  Object.defineProperty(navigator, 'clipboard', { value: { write }, configurable: true });
});
afterEach(() => {
  vi.unstubAllGlobals();
  cleanup();
});

const open = (blocked: string | null = null) =>
  render(<CopyLines id="sheet" lines={LINES} blocked={blocked} zone="Etc/UTC" />);
const press = (name: string) => userEvent.click(screen.getByRole('button', { name }));

describe('copying from the copy desk', () => {
  it('puts on the clipboard what the server says at the click, not what the page was made with', async () => {
    open();
    await press('Plain: headline claim');
    expect(await screen.findByText(/^Copied \d\d:\d\d$/)).toBeTruthy();
    expect(asked).toEqual([['sheet', { kinds: ['headline'], form: 'plain' }]]);
    expect(written).toEqual([{ 'text/plain': 'As it is now' }]);
  });

  it('gives rich text as both kinds, and all lines in one', async () => {
    open();
    await press('All, Rich');
    await waitFor(() => expect(written).toHaveLength(1));
    expect(asked).toEqual([['sheet', { kinds: ['headline', 'caveat'], form: 'rich' }]]);
    expect(written[0]).toEqual({ 'text/plain': 'As it is now', 'text/html': '<p>As it is now</p>' });
  });

  it('says why nothing was copied', async () => {
    const detail = 'These words are not cleared any more. Reload before you copy anything.';
    answer = () => HttpResponse.json({ detail }, { status: 409 });
    open();
    await press('Markdown: caveat');
    expect(await screen.findByText(`Not copied. ${detail}`)).toBeTruthy();
    expect(written).toEqual([]);
  });

  it('selects the words to be copied by hand where the browser does not let it', async () => {
    vi.stubGlobal('ClipboardItem', undefined);
    open();
    await press('Plain: caveat');
    const area = await screen.findByLabelText<HTMLTextAreaElement>('Copy from here');
    expect([area.value, document.activeElement]).toEqual(['As it is now', area]);
    expect(asked).toHaveLength(1);
  });

  it('is switched off under embargo, with the reason', () => {
    open('Under embargo until noon.');
    const buttons = screen.getAllByRole<HTMLButtonElement>('button');
    expect(buttons.every((button) => button.disabled)).toBe(true);
    const reason = document.getElementById(buttons[0]!.getAttribute('aria-describedby')!);
    expect(reason?.textContent).toBe('Under embargo until noon.');
  });
});
