// @vitest-environment happy-dom
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { AddLine } from '@/app/(desk)/lines/_components/add-line';
import { AsPrintedScreen } from '@/app/(desk)/lines/_components/as-printed-screen';
import { findLatestHouseStyle, insertHouseStyle } from '@/db/queries/desk';
import { write } from '@/db/write';
import { newId } from '@/lib/security/ids';
import { createAsPrinted } from '@/lib/services/sheet/create-as-printed';
import { type AsPrintedView, getAsPrinted } from '@/lib/services/sheet/get-as-printed';
import { readSecond, releaseAlone } from '@/lib/services/sheet/release-alone';
import { HOUR, NOW } from '@/tests/support/database';
import { deskWithSheet } from '@/tests/support/sheet-view';
import { refused, sheetActs } from './acts';

const refresh = vi.fn();
vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh, push: vi.fn() }) }));

const { desk, see, reporter, editor, releaseId } = deskWithSheet();
afterAll(desk.closeAndRemove);

/** 22:00 by the clocks of the desk. */
const NIGHT = 14 * HOUR;
let id: string;
const views = {} as Record<'off' | 'day' | 'night' | 'alone' | 'second' | 'read', AsPrintedView>;
const look = (actor = editor, later = 0) => getAsPrinted(actor, id, desk.ctx(later));
beforeAll(() => {
  id = createAsPrinted(reporter, { submissionKey: newId(), releaseId }, desk.ctx()).id;
  views.off = look();
  const style = JSON.parse(findLatestHouseStyle(desk.db)!.body) as object;
  const body = JSON.stringify({ ...style, asPrintedNight: true });
  write(desk.db, (tx) => insertHouseStyle(tx, body, desk.ctx().now));
  [views.day, views.night] = [look(), look(editor, NIGHT)];
  const { version, basisHash } = views.night;
  releaseAlone(editor, { id, version, basisHash }, desk.ctx(NIGHT));
  [views.alone, views.second] = [look(editor, NIGHT), look(reporter, NIGHT)];
  readSecond(reporter, { id, hash: views.second.hash! }, desk.ctx(NIGHT));
  views.read = look(editor, NIGHT);
});

const acts = () => ({
  ...sheetActs(),
  alone: vi.fn().mockResolvedValue({ ok: true, value: undefined }),
  second: vi.fn().mockResolvedValue({ ok: true, value: undefined }),
});
let given: ReturnType<typeof acts>;
beforeEach(() => {
  given = acts();
  refresh.mockReset();
});
afterEach(cleanup);
const open = (view: AsPrintedView) =>
  render(<AsPrintedScreen view={view} actions={given} now={NOW + NIGHT} zone="Etc/UTC" />);
const press = (name: string) => userEvent.click(screen.getByRole('button', { name }));

describe('figures as printed on their screen', () => {
  it('are words that nobody can type into, with the shares and who typed them beside', () => {
    open(views.off);
    expect(screen.queryByRole('textbox', { name: 'Headline claim' })).toBeNull();
    expect(screen.getByRole('region', { name: 'Headline claim' }).textContent).toContain('Alder 47%');
    expect(screen.getByRole('region', { name: 'Shares as printed, in percent' }).textContent).toContain(
      '47Rhea Quill',
    );
  });

  it('are filed for a second reader; alone they are released only where the rule is on, and at night', async () => {
    const alone = 'Release alone, by the night rule';
    open(views.off);
    expect(screen.queryByRole('button', { name: alone })).toBeNull();
    await press('File');
    const { version, basisHash } = views.off;
    expect(given.file).toHaveBeenCalledWith({ id, version, basisHash, lines: [] });
    cleanup();
    open(views.day);
    expect(screen.queryByRole('button', { name: alone })).toBeNull();
    expect(screen.getByText(/An editor alone may release it between 22:00 and 06:00/)).toBeTruthy();
    cleanup();
    open(views.night);
    given.alone.mockResolvedValue(refused('One editor alone releases figures as printed only at night.'));
    await press(alone);
    const seen = views.night;
    expect(given.alone).toHaveBeenCalledWith({ id, version: seen.version, basisHash: seen.basisHash });
    expect(await screen.findByText(/only at night/)).toBeTruthy();
  });

  it('are marked "one reader" until a second person says that they have read them', async () => {
    open(views.alone);
    expect(screen.getByText('One reader')).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'I have read these words' })).toBeNull();
    cleanup();
    open(views.second);
    await press('I have read these words');
    await waitFor(() => expect(refresh).toHaveBeenCalledTimes(1));
    expect(given.second).toHaveBeenCalledWith({ id, hash: views.second.hash });
    cleanup();
    open(views.read);
    expect(screen.queryByText('One reader')).toBeNull();
    expect(screen.getByText('Released by Marten Reed alone; read since by Rhea Quill.')).toBeTruthy();
  });
});

describe('adding a line', () => {
  const added = (save: () => Promise<boolean>) =>
    render(<AddLine view={see()} add={given.add} save={save} version={{ current: 7 }} onDone={onDone} />);
  const onDone = vi.fn();

  it('saves what is being typed first, asks for the kind that was chosen, and says what came', async () => {
    const save = vi.fn<() => Promise<boolean>>().mockResolvedValue(true);
    const view = see();
    added(save);
    const choice = screen.getByLabelText('Add a line');
    expect(screen.getByRole<HTMLButtonElement>('button', { name: 'Add' }).disabled).toBe(true);
    await userEvent.selectOptions(choice, 'standfirst');
    await press('Add');
    await waitFor(() => expect(onDone).toHaveBeenCalledWith('Added: standfirst.'));
    expect(save).toHaveBeenCalledTimes(1);
    expect(given.add).toHaveBeenCalledWith({ id: view.id, version: 7, kind: 'standfirst' });
  });

  it('asks for nothing while the words could not be saved, and tells a refusal', async () => {
    added(async () => false);
    await userEvent.selectOptions(screen.getByLabelText('Add a line'), 'standfirst');
    await press('Add');
    expect(given.add).not.toHaveBeenCalled();
    cleanup();
    given.add.mockResolvedValue(refused('This sheet changed meanwhile. Reload the page.'));
    added(async () => true);
    await userEvent.selectOptions(screen.getByLabelText('Add a line'), 'standfirst');
    await press('Add');
    expect(await screen.findByText(/changed meanwhile/)).toBeTruthy();
  });
});
