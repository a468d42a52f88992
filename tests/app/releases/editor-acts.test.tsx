// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { EmbargoList } from '@/app/(desk)/releases/[id]/_components/embargo-list';
import { LiftEmbargo } from '@/app/(desk)/releases/[id]/_components/lift-embargo';
import { OverrideComparison } from '@/app/(desk)/releases/[id]/_components/override-comparison';
import type { ActionResult } from '@/lib/errors';

const refresh = vi.fn();
vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh }) }));

type Act = (input: unknown) => Promise<ActionResult<void>>;
const done = () => vi.fn<Act>().mockResolvedValue({ ok: true, value: undefined });
const refusing = (fields: Record<string, string>) =>
  vi.fn<Act>().mockResolvedValue({ ok: false, code: 'invalid', message: 'Nothing was changed.', fields });
const press = (name: string | RegExp) => fireEvent.click(screen.getByRole('button', { name }));
const give = (label: string, value: string) =>
  fireEvent.change(screen.getByLabelText(label), { target: { value } });

beforeEach(() => refresh.mockReset());
afterEach(cleanup);

describe('lifting an embargo', () => {
  it('asks for a reason, sends the version that was on the screen, and shows the page anew', async () => {
    const lift = done();
    render(<LiftEmbargo id="rel" version={3} lift={lift} />);
    press('Lift the embargo');
    give('Why does it end early?', 'The pollster published early.');
    fireEvent.submit(screen.getByLabelText('Why does it end early?').closest('form')!);
    await waitFor(() => expect(refresh).toHaveBeenCalled());
    expect(lift).toHaveBeenCalledWith({ id: 'rel', version: 3, reason: 'The pollster published early.' });
  });

  it('shows a refusal at the reason and stays open', async () => {
    render(<LiftEmbargo id="rel" version={3} lift={refusing({ reason: 'Say why.' })} />);
    press('Lift the embargo');
    fireEvent.submit(screen.getByLabelText('Why does it end early?').closest('form')!);
    expect(await screen.findAllByText('Say why.')).toHaveLength(2);
    expect(refresh).not.toHaveBeenCalled();
  });
});

describe('the embargo list', () => {
  const candidates = [
    { id: 'cora', name: 'Cora Lane' },
    { id: 'ada', name: 'Ada Minn' },
  ];

  it('puts the whole copy desk or a person on it', async () => {
    const setReader = done();
    render(<EmbargoList id="rel" readers={[]} candidates={candidates} setReader={setReader} />);
    const list = screen.getByLabelText('Open it to');
    fireEvent.change(list, { target: { value: 'copy-desk' } });
    fireEvent.submit(list.closest('form')!);
    await waitFor(() => expect(setReader).toHaveBeenCalledWith({ id: 'rel', personId: null, listed: true }));
    fireEvent.change(list, { target: { value: 'ada' } });
    fireEvent.submit(list.closest('form')!);
    await waitFor(() => expect(setReader).toHaveBeenCalledWith({ id: 'rel', personId: 'ada', listed: true }));
  });

  it('takes them off and offers nobody twice', async () => {
    const setReader = done();
    const readers = [
      { personId: null, name: null },
      { personId: 'cora', name: 'Cora Lane' },
    ];
    render(<EmbargoList id="rel" readers={readers} candidates={candidates} setReader={setReader} />);
    const offered = screen.getAllByRole('option').map((option) => option.textContent);
    expect(offered).toEqual(['Choose', 'Ada Minn']);
    press(/^Take off\s*Cora Lane$/);
    await waitFor(() =>
      expect(setReader).toHaveBeenCalledWith({ id: 'rel', personId: 'cora', listed: false }),
    );
  });
});

describe('comparing all the same', () => {
  it('sends the chosen release with the written reason', async () => {
    const override = done();
    const candidates = [
      { releaseId: 'sept', label: '3 September 2026', differences: 'Differs in mode.' },
      { releaseId: 'aug', label: '13 August 2026', differences: 'Differs in mode.' },
    ];
    render(<OverrideComparison id="rel" candidates={candidates} override={override} />);
    press('Compare all the same');
    fireEvent.click(screen.getByLabelText('13 August 2026'));
    give('Why may the two be compared?', 'Both modes ran side by side.');
    fireEvent.submit(screen.getByLabelText('Why may the two be compared?').closest('form')!);
    await waitFor(() => expect(override).toHaveBeenCalled());
    expect(override).toHaveBeenCalledWith({
      id: 'rel',
      comparedWith: 'aug',
      reason: 'Both modes ran side by side.',
    });
  });
});
