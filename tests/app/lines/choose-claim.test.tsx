// @vitest-environment happy-dom
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { ComponentProps } from 'react';
import { afterAll, afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ChooseClaim } from '@/app/(desk)/lines/_components/choose-claim';
import { getRelease } from '@/lib/services/release/get-release';
import { deskWithSheet } from '@/tests/support/sheet-view';
import { refused } from './acts';

const push = vi.fn();
vi.mock('next/navigation', () => ({ useRouter: () => ({ push }) }));

const { desk, reporter, releaseId } = deskWithSheet();
afterAll(desk.closeAndRemove);
const { facts, previous, document, answer } = getRelease(reporter, releaseId, desk.ctx());

type Create = ComponentProps<typeof ChooseClaim>['create'];
const create = vi.fn<Create>();
beforeEach(() => {
  push.mockReset();
  create.mockReset().mockResolvedValue({ ok: true, value: { id: 'made' } });
});
afterEach(cleanup);

const languages = [
  { language: 'en' as const, isClearable: true },
  { language: 'es' as const, isClearable: false },
];
type More = { onePollHeadlines: 'allow' | 'warn' | 'refuse' };
const open = (preselected: string | null = null, more: More = { onePollHeadlines: 'allow' }) =>
  render(
    <ChooseClaim
      {...{ releaseId, preselected, facts, previous, document, answer, create, languages, ...more }}
      preselectedLanguage="en"
    />,
  );
const draft = () => screen.getByRole('button', { name: 'Draft the sheet' });

describe('choosing the claim of a sheet', () => {
  it('lists every tested finding with its verdict, and drafts the chosen one once', async () => {
    open();
    const choice = screen.getByRole<HTMLInputElement>('radio', { name: /Alder minus Brook: \+6.*Not shown/ });
    expect(choice.checked).toBe(false);
    await userEvent.click(choice);
    await userEvent.dblClick(draft());
    await waitFor(() => expect(push).toHaveBeenCalledWith('/lines/made'));
    expect(create).toHaveBeenCalledTimes(1);
    expect(create.mock.calls[0]?.[0]).toMatchObject({ releaseId, claimKey: 'lead:Alder|Brook' });
    expect(create.mock.calls[0]?.[0].submissionKey).toMatch(/^[\w-]{16,64}$/);
  });

  it('takes the one that the release page named, where the release has it', () => {
    open('lead:Alder|Brook');
    expect(screen.getByRole<HTMLInputElement>('radio').checked).toBe(true);
    cleanup();
    open('lead:Alder|Nobody');
    expect(screen.getByRole<HTMLInputElement>('radio').checked).toBe(false);
  });

  it('sends the same key again after a refusal, so that nothing is drafted twice', async () => {
    const fields = { claimKey: 'Choose what the sheet claims.' };
    create.mockResolvedValueOnce(refused('Some fields need another look.', 'invalid', fields));
    open();
    await userEvent.click(draft());
    expect(await screen.findByRole('link', { name: 'Choose what the sheet claims.' })).toBeTruthy();
    await userEvent.click(screen.getByRole('radio'));
    await userEvent.click(draft());
    const [first, second] = create.mock.calls.map(([input]) => input.submissionKey);
    expect(first).toBe(second);
  });

  it('says at the choice of a language what it still lacks, and drafts in the one chosen', async () => {
    open('lead:Alder|Brook');
    const choice = screen.getByRole('combobox', { name: 'Language of the sheet' });
    expect(screen.queryByText(/No native editor/)).toBeNull();
    await userEvent.selectOptions(choice, 'es');
    expect(screen.getByText(/No native editor of this desk has signed/)).toBeTruthy();
    await userEvent.click(draft());
    await waitFor(() => expect(create.mock.calls[0]?.[0]).toMatchObject({ language: 'es' }));
  });

  it('says before drafting what house style makes of a headline on one poll', () => {
    open('lead:Alder|Brook', { onePollHeadlines: 'refuse' });
    expect(screen.getByText(/it is drafted knocked out/)).toBeTruthy();
    cleanup();
    open('lead:Alder|Brook');
    expect(screen.queryByText(/rests on one poll/)).toBeNull();
  });
});
