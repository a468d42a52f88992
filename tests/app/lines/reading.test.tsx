// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { SheetScreen } from '@/app/(desk)/lines/_components/sheet-screen';
import { tabOf, titleOf } from '@/app/(desk)/lines/_components/sheet-title';
import { changeFiledSheet } from '@/lib/services/sheet/change-filed';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { NOW } from '@/tests/support/database';
import { deskWithSheet } from '@/tests/support/sheet-view';
import { refused, sheetActs } from './acts';

const refresh = vi.fn();
vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh, push: vi.fn() }) }));

const { desk, on, see, reporter, colleague, editor, id } = deskWithSheet();
afterAll(desk.closeAndRemove);

const views = {} as Record<'filed' | 'filer' | 'other' | 'changed' | 'cleared', SheetView>;
beforeAll(() => {
  on.file(reporter, id, { body: 'Alder has the higher figure in this poll by Kelmouth Research.' });
  views.filed = see(editor);
  views.filer = see(reporter);
  views.other = see(colleague);
  changeFiledSheet(editor, on.filing(editor, id, { headline: 'Alder 47, Brook 41' }), desk.ctx());
  views.changed = see(reporter);
  on.clear(reporter, id);
  views.cleared = see(editor);
});

let acts: ReturnType<typeof sheetActs>;
beforeEach(() => {
  acts = sheetActs();
  refresh.mockReset();
});
afterEach(cleanup);

const open = (view: SheetView) =>
  render(<SheetScreen view={view} actions={acts} person="p" now={NOW} zone="Etc/UTC" />);
const press = (name: string) => userEvent.click(screen.getByRole('button', { name }));

describe('a filed sheet before its second reader', () => {
  it('shows words, difference, verdict, tests, who typed the figures and what is missing on one page', () => {
    open({
      ...views.filed,
      evidence: {
        ...views.filed.evidence,
        missing: [
          { item: 'sponsor', label: 'Sponsor', status: 'not-disclosed' },
          { item: 'mode', label: 'How they were interviewed', status: 'not-entered' },
        ],
      },
    });
    expect(titleOf(views.filed, NOW, 'Etc/UTC')).toBe('Filed by Rhea Quill at 08:00');
    expect(tabOf(views.filed)).toBe('Averil Coast governor: Alder minus Brook');
    const body = screen.getByRole('region', { name: 'Body sentence' });
    expect(body.querySelector('ins')?.textContent).toContain('higher');
    const evidence = screen.getByRole('region', { name: 'The evidence' }).textContent;
    for (const shown of [
      'Alder minus Brook: +6',
      'z = 1.70, p = 0.090',
      '1.44 implied by the stated interval (1.4–1.48)',
      'Score testp = 0.090: does not pass',
      'VerdictNot shown',
      '47Rhea Quill',
      'Interviews1,012',
      'Field dates10–13 September 2026',
      'polls.example',
      'Not disclosed: Sponsor.',
      'Not entered: How they were interviewed.',
      'This series has no release with earlier field dates that is out of embargo.',
    ])
      expect(evidence).toContain(shown);
  });

  it('is cleared once on the hash that was on the screen, however often it is pressed', async () => {
    open(views.filed);
    await userEvent.dblClick(screen.getByRole('button', { name: 'Clear for publication' }));
    await waitFor(() => expect(refresh).toHaveBeenCalledTimes(1));
    expect(acts.clear.mock.calls).toEqual([[{ id, hash: views.filed.hash }]]);
    expect(screen.getByText('Cleared for publication.')).toBeTruthy();
  });

  it('says that nothing was cleared where the evidence had changed', async () => {
    acts.clear.mockResolvedValueOnce({ ok: true, value: { outcome: 'returned' } });
    open({ ...views.filed, hasMoved: true });
    expect(screen.getByText('The evidence changed since this was filed')).toBeTruthy();
    await press('Clear for publication');
    expect(await screen.findByText(/^Nothing was cleared: the evidence had changed/)).toBeTruthy();
  });

  it('tells a refusal with a way to look again', async () => {
    acts.clear.mockResolvedValueOnce(refused('This sheet is cleared already.'));
    open(views.filed);
    await press('Clear for publication');
    expect((await screen.findByRole('alert')).textContent).toContain('This sheet is cleared already.');
    expect(screen.getByRole('button', { name: 'Reload the page' })).toBeTruthy();
    expect(refresh).not.toHaveBeenCalled();
  });

  it('is sent back with a comment, asked for in a dialog', async () => {
    acts.sendBack.mockResolvedValueOnce(
      refused('Some fields need another look.', 'invalid', { comment: 'Say what should change.' }),
    );
    open(views.filed);
    await press('Send back');
    const dialog = screen.getByRole('dialog');
    expect(document.activeElement).toBe(within(dialog).getByLabelText('What should change?'));
    await userEvent.click(within(dialog).getByRole('button', { name: 'Send back' }));
    expect(await within(dialog).findByText('Say what should change.')).toBeTruthy();
    const comment = 'Name the pollster first.';
    fireEvent.change(within(dialog).getByLabelText('What should change?'), { target: { value: comment } });
    await userEvent.click(within(dialog).getByRole('button', { name: 'Send back' }));
    await waitFor(() => expect(refresh).toHaveBeenCalled());
    expect(acts.sendBack).toHaveBeenLastCalledWith({ id, hash: views.filed.hash, comment, lines: [] });
  });

  it('stays as it is when the dialog is left by its plain button', async () => {
    open(views.filed);
    await press('Send back');
    await press('Back');
    expect(screen.queryByLabelText('What should change?')).toBeNull();
    cleanup();
    open(views.cleared);
    await press('Pull');
    await press('Keep them');
    expect(screen.queryByLabelText('Why are they withdrawn?')).toBeNull();
    expect(acts.sendBack).not.toHaveBeenCalled();
    expect(acts.pull).not.toHaveBeenCalled();
  });

  it('is changed in place by an editor, whose saving is filing', async () => {
    open(views.filed);
    await press('Change the words');
    const save = screen.getByRole<HTMLButtonElement>('button', { name: 'File the changed words' });
    expect(save.disabled).toBe(true);
    fireEvent.change(screen.getByLabelText('Headline claim'), { target: { value: 'Other words' } });
    await userEvent.click(save);
    expect(acts.change).toHaveBeenCalledWith(
      expect.objectContaining({ id, version: views.filed.version, basisHash: views.filed.basisHash }),
    );
    expect(acts.change.mock.calls[0]?.[0].lines[0]).toMatchObject({ kind: 'headline', text: 'Other words' });
  });
});

describe('a filed sheet before others', () => {
  it('tells its filer to wait, and lets it be taken back', async () => {
    open(views.filer);
    expect(screen.getByText('You filed this; somebody else reads it.')).toBeTruthy();
    expect(screen.queryByRole('button', { name: /clear/i })).toBeNull();
    await press('Take back');
    expect(acts.sendBack).toHaveBeenCalledWith(expect.objectContaining({ id, hash: views.filer.hash }));
  });

  it('tells a reporter why it is not theirs to clear', () => {
    open(views.other);
    expect(screen.getByText(/A reporter filed this, so an editor clears it/)).toBeTruthy();
    for (const name of [/clear/i, 'Send back', 'Take back', 'Change the words'])
      expect(screen.queryByRole('button', { name })).toBeNull();
  });

  it('that an editor changed is agreed to by its author, marked against what they filed', async () => {
    open(views.changed);
    expect(screen.getByText('Marked against what you filed')).toBeTruthy();
    const headline = screen.getByRole('region', { name: 'Headline claim' });
    expect(headline.querySelector('ins')?.textContent).toContain('Brook 41');
    expect(screen.getByRole('region', { name: 'Body sentence' }).querySelector('ins')).toBeNull();
    await press('Agree and clear');
    expect(acts.clear).toHaveBeenCalledWith({ id, hash: views.changed.hash });
  });
});

describe('a cleared sheet', () => {
  it('names both people, its evidence and what can be done now', async () => {
    open(views.cleared);
    expect(screen.getByText(/Agreed by Marten Reed at 08:00 and by Rhea Quill at 08:00\./)).toBeTruthy();
    expect(screen.getByText(views.cleared.hash!.slice(0, 12))).toBeTruthy();
    await press('Make an embed');
    expect(acts.embed).toHaveBeenCalledWith({ sheetId: id });
    expect(screen.getByRole('button', { name: 'Start a new version' })).toBeTruthy();
  });

  it('lists everything done to it, with comments', () => {
    open(views.cleared);
    const list = screen.getByRole('region', { name: 'What was done' });
    expect(
      within(list)
        .getAllByRole('listitem')
        .map((item) => item.textContent),
    ).toEqual([
      'Rhea Quill filed it, 08:00',
      expect.stringContaining('Marten Reed sent it back, 08:00'),
      'Marten Reed filed it, 08:00',
      'Rhea Quill cleared it, 08:00',
    ]);
  });

  it('is pulled by an editor for a reason, and by nobody else', async () => {
    open(views.cleared);
    await press('Pull');
    const dialog = screen.getByRole('dialog');
    const reason = 'The pollster is checking a batch of interviews.';
    fireEvent.change(within(dialog).getByLabelText('Why are they withdrawn?'), { target: { value: reason } });
    await userEvent.click(within(dialog).getByRole('button', { name: 'Pull' }));
    expect(acts.pull).toHaveBeenCalledWith({ id, reason });
    cleanup();
    open(see(reporter));
    expect(screen.queryByRole('button', { name: 'Pull' })).toBeNull();
  });
});
