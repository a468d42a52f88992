// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { AddShift } from '@/app/(desk)/lines/night-list/_components/add-shift';
import { RemoveShift } from '@/app/(desk)/lines/night-list/_components/remove-shift';
import { BanEntry, spanOf } from '@/app/(desk)/releases/bans/_components/ban-entry';
import { EnterBan } from '@/app/(desk)/releases/bans/_components/enter-ban';
import { TermsForm } from '@/app/(desk)/lines/_components/terms-form';
import { StateNote } from '@/app/(desk)/lines/_components/state-note';
import type { BanView } from '@/lib/services/bans/bans';
import type { DeskView } from '@/lib/services/sheet/desk-view';
import { HOUR, NOW } from '@/tests/support/database';
import { refused } from './acts';

const refresh = vi.fn();
vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh }) }));
beforeEach(() => refresh.mockReset());
afterEach(cleanup);

const press = (name: string | RegExp) => fireEvent.click(screen.getByRole('button', { name }));
const give = (label: string | RegExp, value: string) =>
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
const made = { ok: true as const, value: { id: 'new' } };
const done = { ok: true as const, value: undefined };

const ban = (change: Partial<BanView> = {}): BanView => ({
  id: 'ban',
  jurisdiction: 'Lanternholm',
  race: null,
  bars: 'all-figures',
  fromAt: Date.UTC(2026, 9, 24, 22),
  toAt: Date.UTC(2026, 9, 25, 19),
  zone: 'Europe/Vienna',
  rule: 'Town order 9, read by our lawyers.',
  enteredBy: 'Marten Reed',
  enteredAt: NOW,
  ended: null,
  state: 'ahead',
  ...change,
});

describe('the page of bans', () => {
  it('tells place, both clocks, what is barred, the rule and who entered it', () => {
    render(
      <ul>
        <BanEntry ban={ban()} zone="Etc/UTC" end={null} />
      </ul>,
    );
    const said = screen.getByRole('listitem').textContent;
    for (const part of [
      'Lanternholm: every race that ends in a vote',
      'From 25 October 2026, 00:00 to 25 October 2026, 20:00 in Europe/Vienna (UTC: 24 October 2026, 22:00',
      'what is public is taken down meanwhile',
      '“Town order 9, read by our lawyers.”',
      'Entered by Marten Reed, 17 September 2026, 08:00.',
    ])
      expect(said).toContain(part);
    expect(screen.queryByRole('button')).toBeNull();
    expect(spanOf({ ...ban(), zone: 'UTC' })).not.toContain('(UTC');
  });

  it('lets an editor end one for a reason, and none that is over', async () => {
    const end = vi.fn().mockResolvedValue(done);
    const { rerender } = render(<BanEntry ban={ban()} zone="Etc/UTC" end={end} />);
    press('End it');
    give('Why does it end?', 'The town lifted its order.');
    fireEvent.submit(screen.getByLabelText('Why does it end?').closest('form')!);
    await waitFor(() =>
      expect(end).toHaveBeenCalledWith({ id: 'ban', reason: 'The town lifted its order.' }),
    );
    const ended = { by: 'Isolde Varn', at: NOW + HOUR, reason: 'The town lifted its order.' };
    rerender(<BanEntry ban={ban({ state: 'over', ended })} zone="Etc/UTC" end={end} />);
    expect(screen.queryByRole('button', { name: 'End it' })).toBeNull();
    expect(screen.getByText(/Ended by Isolde Varn, 17 September 2026, 09:00/)).toBeTruthy();
  });

  it('sends what an editor typed, every race where none is chosen, and shows a refusal at its field', async () => {
    const enter = vi.fn().mockResolvedValue(made);
    render(<EnterBan races={[{ id: 'r', name: 'Governor' }]} zone="Europe/Vienna" enter={enter} />);
    give('Place', 'Lanternholm');
    give('From', '2026-10-25T00:00');
    give('To', '2026-10-25T20:00');
    give('The rule', 'Town order 9, read by our lawyers.');
    const form = screen.getByLabelText('Place').closest('form')!;
    fireEvent.submit(form);
    await waitFor(() => expect(refresh).toHaveBeenCalledTimes(1));
    expect(enter).toHaveBeenCalledWith({
      jurisdiction: 'Lanternholm',
      raceId: null,
      bars: 'new-figures',
      fromLocal: '2026-10-25T00:00',
      toLocal: '2026-10-25T20:00',
      zone: 'Europe/Vienna',
      rule: 'Town order 9, read by our lawyers.',
    });
    const twice = 'The clocks go back then, and this time happens twice. Give it in UTC.';
    enter.mockResolvedValue(refused('Some fields need another look.', 'invalid', { toLocal: twice }));
    fireEvent.submit(form);
    expect(await screen.findByText('No ban was entered')).toBeTruthy();
    expect(screen.getByLabelText('To').getAttribute('aria-invalid')).toBe('true');
    expect(refresh).toHaveBeenCalledTimes(1);
  });
});

describe('the night list', () => {
  it('puts an editor on it for a day of every week or for one date', async () => {
    const add = vi.fn().mockResolvedValue(made);
    render(<AddShift editors={[{ id: 'reed', name: 'Marten Reed' }]} zone="Etc/UTC" add={add} />);
    const form = screen.getByLabelText('Editor').closest('form')!;
    give('Editor', 'reed');
    give('When', '3');
    fireEvent.submit(form);
    const night = { personId: 'reed', fromTime: '22:00', toTime: '06:00', zone: 'Etc/UTC' };
    await waitFor(() => expect(add).toHaveBeenCalledWith({ ...night, when: { weekday: 3 } }));
    await waitFor(() => expect(refresh).toHaveBeenCalledTimes(1));
    give('Editor', 'reed');
    give('When', 'date');
    give('Date', '2026-12-24');
    fireEvent.submit(form);
    await waitFor(() => expect(add).toHaveBeenLastCalledWith({ ...night, when: { onDay: '2026-12-24' } }));
  });

  it('shows a refusal at its field, and takes a turn off', async () => {
    const add = vi
      .fn()
      .mockResolvedValue(
        refused('The night list needs another look.', 'invalid', { personId: 'Only an editor is on call.' }),
      );
    render(<AddShift editors={[]} zone="Etc/UTC" add={add} />);
    fireEvent.submit(screen.getByLabelText('Editor').closest('form')!);
    expect(await screen.findByText('Nothing was put on the list')).toBeTruthy();
    expect(screen.getByLabelText('Editor').getAttribute('aria-invalid')).toBe('true');
    cleanup();
    const remove = vi.fn().mockResolvedValueOnce(refused('This turn was taken off already.'));
    remove.mockResolvedValue(done);
    render(<RemoveShift id="s" about="Marten Reed, every Monday" remove={remove} />);
    press('Take off Marten Reed, every Monday');
    expect(await screen.findByText('This turn was taken off already.')).toBeTruthy();
    press('Take off Marten Reed, every Monday');
    await waitFor(() => expect(refresh).toHaveBeenCalledTimes(1));
  });
});

describe('the time by which a sheet is wanted', () => {
  const wanted = { at: NOW + HOUR, local: '2026-09-17T11:00', zone: 'Europe/Vienna' };
  const desk = (change: Partial<DeskView> = {}) =>
    ({ wanted, shelfDays: 7, maySetTerms: true, ...change }) as DeskView;

  it('is set with the days that the words keep, and taken away by being emptied', async () => {
    const set = vi.fn().mockResolvedValue(done);
    render(<TermsForm id="sheet" desk={desk()} zone="Etc/UTC" set={set} />);
    expect((screen.getByLabelText(/^Wanted by/) as HTMLInputElement).value).toBe('2026-09-17T11:00');
    give(/^Keeps for/, '3');
    const form = screen.getByLabelText(/^Keeps for/).closest('form')!;
    fireEvent.submit(form);
    const { local, zone } = wanted;
    await waitFor(() =>
      expect(set).toHaveBeenCalledWith({ id: 'sheet', wanted: { local, zone }, shelfDays: 3 }),
    );
    give(/^Wanted by/, '');
    give(/^Keeps for/, '');
    fireEvent.submit(form);
    await waitFor(() => expect(set).toHaveBeenLastCalledWith({ id: 'sheet', wanted: null, shelfDays: null }));
  });

  it('is set by nobody else, and told to everybody beside the state, as overdue once it has passed', () => {
    render(<TermsForm id="sheet" desk={desk({ maySetTerms: false })} zone="Etc/UTC" set={vi.fn()} />);
    expect(screen.queryByLabelText(/^Wanted by/)).toBeNull();
    const { container, rerender } = render(<StateNote state="filed" wanted={wanted} now={NOW} />);
    expect(container.textContent).toBe('Wanted by 11:00 (Europe/Vienna), in 1 hour · Filed');
    rerender(<StateNote state="filed" wanted={wanted} now={NOW + 2 * HOUR} />);
    expect(container.textContent).toContain('Overdue: wanted by 11:00');
    rerender(<StateNote state="pulled" wanted={wanted} now={NOW} />);
    expect(container.textContent).toBe('Pulled');
  });
});
