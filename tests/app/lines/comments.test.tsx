// @vitest-environment happy-dom
import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { SheetScreen } from '@/app/(desk)/lines/_components/sheet-screen';
import { addComment, resolveComment } from '@/lib/services/sheet/comment';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { NOW } from '@/tests/support/database';
import { deskWithSheet } from '@/tests/support/sheet-view';
import { sheetActs } from './acts';

const refresh = vi.fn();
vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh, push: vi.fn() }) }));

const { desk, on, see, reporter, editor, id } = deskWithSheet();
afterAll(desk.closeAndRemove);

const HEADLINE = 'Alder has the higher figure in this poll';
const views = {} as Record<'written' | 'filed', SheetView>;
beforeAll(() => {
  on.file(reporter, id, { headline: HEADLINE });
  const note = (quote: string, body: string, start = HEADLINE.indexOf(quote)) =>
    addComment(editor, { id, kind: 'headline', start, end: start + quote.length, quote, body }, desk.ctx())
      .id;
  resolveComment(editor, { id: note('Alder', 'Settled long ago.') }, desk.ctx());
  note('higher figure', 'Say which of the two.');
  note('figure in this poll', 'Name the pollster.');
  views.filed = see(editor);
  on.sendBack(editor, id, 'Two comments.');
  views.written = see(reporter);
});

let acts: ReturnType<typeof sheetActs>;
beforeEach(() => {
  acts = sheetActs();
  refresh.mockReset();
});
afterEach(cleanup);

const open = (view: SheetView) =>
  render(<SheetScreen view={view} actions={acts} person="p" now={NOW} zone="Etc/UTC" />);
const headline = () => within(screen.getByRole('region', { name: 'Headline claim' }));

describe('comments on filed words', () => {
  it('are marked in the words, one stop each, and read aloud with them', () => {
    open(views.filed);
    const links = headline().getAllByRole('link');
    expect(links.map((link) => link.textContent)).toEqual(['higher  comment 1', 'figure comment 2']);
    const spoken = links.map((link) =>
      link
        .getAttribute('aria-describedby')!
        .split(' ')
        .map((note) => document.getElementById(note)?.textContent),
    );
    expect(spoken).toEqual([
      ['Comment 1 by Marten Reed: Say which of the two.'],
      ['Comment 1 by Marten Reed: Say which of the two.', 'Comment 2 by Marten Reed: Name the pollster.'],
    ]);
    for (const link of links)
      expect(document.getElementById(link.getAttribute('aria-details')!)?.tagName).toBe('LI');
    expect(screen.queryByText(/Settled long ago/, { selector: 'span' })).toBeNull();
  });

  it('are opened from the keyboard: the fold opens and the comment has the focus; Escape closes it', async () => {
    open(views.filed);
    const fold = screen.getByText('Comments (2 open)').closest('details')!;
    expect(fold.open).toBe(false);
    headline().getAllByRole('link')[0]!.focus();
    await userEvent.keyboard('{Enter}');
    expect(fold.open).toBe(true);
    expect(document.activeElement?.textContent).toContain('Say which of the two.');
    await userEvent.keyboard('{Escape}');
    expect(fold.open).toBe(false);
    expect(document.activeElement?.tagName).toBe('SUMMARY');
  });

  it('lead back from their entry to their words, and are settled there', async () => {
    open(views.filed);
    const entry = screen.getByText('Say which of the two.').closest('li')!;
    const back = within(entry).getByRole('link').getAttribute('href')!;
    expect(document.querySelector(back)?.textContent).toContain('higher');
    await userEvent.click(within(entry).getByRole('button', { name: /^Settle/ }));
    expect(acts.settle).toHaveBeenCalledWith({ id: views.filed.desk.comments[1]!.id });
    expect(refresh).toHaveBeenCalledTimes(1);
  });

  it('are made on words of a line, and refused where those do not stand there', async () => {
    open(views.filed);
    await userEvent.type(screen.getByLabelText(/^Its words/), 'this poll');
    await userEvent.type(screen.getByLabelText('What about them?'), 'Which?');
    await userEvent.click(screen.getByRole('button', { name: 'Comment' }));
    const start = HEADLINE.indexOf('this poll');
    expect(acts.comment).toHaveBeenCalledWith({
      id,
      kind: 'headline',
      start,
      end: start + 9,
      quote: 'this poll',
      body: 'Which?',
    });
    await userEvent.type(screen.getByLabelText(/^Its words/), 'nowhere');
    await userEvent.click(screen.getByRole('button', { name: 'Comment' }));
    expect(screen.getByText('These words do not stand in that line.')).toBeTruthy();
    expect(acts.comment).toHaveBeenCalledTimes(1);
  });
});

describe('comments on words being written', () => {
  it('stand under the field of their line, tied to it, and are in sight from the start', () => {
    open(views.written);
    const field = screen.getByLabelText('Headline claim');
    const about = field.getAttribute('aria-describedby')!.split(' ');
    const told = about.map((part) => document.getElementById(part)?.textContent).join(' ');
    expect(told).toContain('Comment 1 by Marten Reed on “higher figure”: Say which of the two.');
    expect(screen.getByText('Comments (2 open)').closest('details')!.open).toBe(true);
  });
});
