// @vitest-environment happy-dom
import { cleanup, configure, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import { http } from 'msw';
import { SWRConfig } from 'swr';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { ReleaseForm } from '@/components/forms/release/release-form';
import type { SubmitRelease } from '@/components/forms/release/log-fields';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import { NOW } from '@/tests/support/database';
import { withheld } from '@/tests/support/release';
import { deskServer, refuse } from './desk-server';
import { typedForm } from './values';

configure({ asyncUtilTimeout: 5000 });

const push = vi.fn();
vi.mock('next/navigation', () => ({ useRouter: () => ({ push }) }));

const { server, saved, asked, kept, reset } = deskServer();
beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
afterAll(() => server.close());
beforeEach(() => push.mockReset());
afterEach(() => {
  cleanup();
  reset();
});

const CHOICES = {
  races: [
    {
      id: 'governor',
      name: 'Averil Coast governor',
      kind: 'candidate' as const,
      options: ['Alder', 'Brook'],
      thresholds: [],
    },
  ],
  pollsters: ['Kelmouth Research'],
  sponsors: [],
  zone: 'Etc/UTC',
  policy: DEFAULT_POLICY,
};

async function open(submit: SubmitRelease = vi.fn()) {
  render(
    <SWRConfig value={{ provider: () => new Map() }}>
      <ReleaseForm choices={CHOICES} personId="rita" submit={submit} />
    </SWRConfig>,
  );
  await screen.findByRole('form', { name: 'Release' });
}

/** As a draft that is complete; lists are chosen by hand, since happy-dom has no default choice to restore. */
async function openTyped(submit?: SubmitRelease, values = typedForm()) {
  kept.draft = { body: values, savedAt: NOW };
  await open(submit);
  const { population, mode, sampleSource, design } = values;
  const chosen = {
    Population: population.value,
    Mode: mode.value,
    'Sample source': sampleSource,
    Design: design,
  };
  for (const [name, value] of Object.entries(chosen)) if (value !== '') type(name, value);
}

const field = (name: string) => screen.getByLabelText<HTMLInputElement>(name, { exact: true });
const type = (name: string, value: string) => fireEvent.change(field(name), { target: { value } });
const press = (name: string) => fireEvent.click(screen.getByRole('button', { name }));
const valueOf = (name: string) => screen.getByRole<HTMLInputElement>('textbox', { name }).value;

/** A form that goes saves what it has, so a save of the test before may still arrive. */
const pollstersSaved = () => saved.map((body) => (body as { pollster: string }).pollster);

describe('the draft', () => {
  it('comes back before the form opens, and says when it was kept', async () => {
    await openTyped(undefined, typedForm({ pollster: 'Norwater Polls' }));
    expect(field('Pollster').value).toBe('Norwater Polls');
    expect(screen.getByText(/^Your draft of \d\d:\d\d is back\.$/)).toBeTruthy();
  });

  it('is kept a moment after typing, once, and says so', async () => {
    await open();
    type('Pollster', 'Kel');
    type('Pollster', 'Kelmouth');
    expect(await screen.findByText(/^Saved \d\d:\d\d$/, undefined, { timeout: 3000 })).toBeTruthy();
    expect(pollstersSaved().filter((name) => name !== 'Norwater Polls')).toEqual(['Kelmouth']);
  });

  it('is kept at once when the page is left', async () => {
    await open();
    type('Pollster', 'Kelmouth Ltd');
    fireEvent(window, new Event('pagehide'));
    await waitFor(() => expect(pollstersSaved()).toContain('Kelmouth Ltd'), { timeout: 500 });
  });

  it('keeps the text where the session has ended, says what to do, and is sent again', async () => {
    server.use(http.put('*/api/desk/drafts', () => refuse(401, 'Your session has ended.'), { once: true }));
    await open();
    type('Pollster', 'Kelmouth');
    const words = /^Not saved: your session has ended\. Sign in in another tab/;
    expect(await screen.findByText(words, undefined, { timeout: 3000 })).toBeTruthy();
    expect(field('Pollster').value).toBe('Kelmouth');
    fireEvent(window, new Event('focus'));
    expect(await screen.findByText(/^Saved/)).toBeTruthy();
  });

  it('is never typed over where it could not be fetched', async () => {
    server.use(http.get('*/api/desk/drafts', () => refuse(500, 'Something went wrong.'), { once: true }));
    render(
      <SWRConfig value={{ provider: () => new Map() }}>
        <ReleaseForm choices={CHOICES} personId="rita" submit={vi.fn()} />
      </SWRConfig>,
    );
    expect(await screen.findByText('What you typed before could not be fetched')).toBeTruthy();
    expect(screen.queryByRole('form')).toBeNull();
    press('Try again');
    expect(await screen.findByRole('form', { name: 'Release' })).toBeTruthy();
  });

  it('goes only when it is asked for twice', async () => {
    await openTyped();
    press('Discard this draft');
    expect(document.activeElement).toBe(screen.getByRole('button', { name: 'Keep it' }));
    const before = saved.length;
    press('Discard the draft');
    await waitFor(() => expect(field('Pollster').value).toBe(''));
    expect(kept.draft).toBeNull();
    await waitFor(() => expect(document.activeElement).toBe(field('Race')));
    await new Promise((resolve) => setTimeout(resolve, 900));
    expect(saved.length).toBe(before);
  });
});

describe('sending the form', () => {
  it('leads to the release, with everything as typed', async () => {
    const submit = vi.fn<SubmitRelease>().mockResolvedValue({ ok: true, value: { id: 'rel-1' } });
    await openTyped(submit, typedForm({ n: withheld }));
    press('Log the release');
    await waitFor(() => expect(push).toHaveBeenCalledWith('/releases/rel-1'));
    const [sent] = submit.mock.calls[0]!;
    expect(sent).toEqual({
      submissionKey: expect.stringMatching(/^[\w-]{16,64}$/) as string,
      release: typedForm({ n: withheld }),
    });
  });

  it('sends once however often the button is pressed, and saves no draft after that', async () => {
    const submit = vi.fn<SubmitRelease>().mockResolvedValue({ ok: true, value: { id: 'rel-1' } });
    await openTyped(submit);
    type('Pollster', 'Only Once');
    const button = screen.getByRole('button', { name: 'Log the release' });
    fireEvent.click(button);
    fireEvent.click(button);
    await waitFor(() => expect(push).toHaveBeenCalled());
    fireEvent(window, new Event('pagehide'));
    await new Promise((resolve) => setTimeout(resolve, 900));
    expect(submit).toHaveBeenCalledTimes(1);
    expect(pollstersSaved()).not.toContain('Only Once');
  });

  it('says on top and at the fields what is missing, and takes the eye there', async () => {
    const submit = vi.fn<SubmitRelease>();
    await open(submit);
    press('Log the release');
    const summary = await screen.findByRole('group', { name: 'Something needs another look' });
    await waitFor(() => expect(document.activeElement).toBe(summary));
    const links = within(summary)
      .getAllByRole('link')
      .map((link) => link.textContent);
    expect(links).toEqual([
      'Race: Choose a race.',
      'Pollster: Who did the fieldwork?',
      'Sample source: Choose how people came into the sample.',
      'Design: Choose how the sample was weighted.',
      'First day: When did interviewing begin?',
      'Last day: When did interviewing end?',
      'Publication date: When was or will it be published?',
      'Row 1: Name the option.',
    ]);
    expect(field('Pollster').getAttribute('aria-invalid')).toBe('true');
    fireEvent.click(within(summary).getByText('Pollster: Who did the fieldwork?'));
    expect(document.activeElement).toBe(field('Pollster'));
    expect(submit).not.toHaveBeenCalled();
  });

  it('tells what the engine refuses in the same round as what is missing', async () => {
    const submit = vi.fn<SubmitRelease>();
    const form = typedForm({ pollster: '' });
    form.shares[0]!.printed = '90';
    form.statedMargin.unit = '0.5';
    await openTyped(submit, form);
    press('Log the release');
    const summary = await screen.findByRole('group', { name: 'Something needs another look' });
    const told = within(summary).getAllByRole('link');
    expect(told.map((link) => link.textContent)).toEqual([
      'Pollster: Who did the fieldwork?',
      'Stated margin: This margin is not a multiple of 0.5, the unit it is said to be rounded to.',
      'Shares: The shares sum to more than 100 percent and rounding allow.',
    ]);
    type('Rounded to', '0.1');
    await waitFor(() => expect(within(summary).queryByText(/^Stated margin:/)).toBeNull());
    const [first] = screen.getAllByRole('textbox', { name: 'Share' });
    fireEvent.change(first!, { target: { value: '47' } });
    await waitFor(() => expect(within(summary).queryByText(/^Shares:/)).toBeNull());
    expect(submit).not.toHaveBeenCalled();
  });

  it('lands a refusal of the service at its field and keeps the text', async () => {
    const fields = { 'embargo.local': 'This time does not exist.', 'release.n.value': 'Too many.' };
    const refusal = {
      ok: false as const,
      code: 'invalid',
      message: 'Some fields need another look.',
      fields,
    };
    const embargo = { local: '2026-03-29T02:30', zone: 'Europe/Vienna' };
    await openTyped(vi.fn<SubmitRelease>().mockResolvedValue(refusal), typedForm({ embargo }));
    press('Log the release');
    expect(await screen.findByText('Embargo: This time does not exist.')).toBeTruthy();
    expect(screen.getByText('Sample size: Too many.')).toBeTruthy();
    expect(field('Sample size').getAttribute('aria-invalid')).toBe('true');
    expect(field('Sample size').value).toBe('1,012');
  });

  it('keeps everything where there is no answer at all, and can be sent again with the same key', async () => {
    const submit = vi
      .fn<SubmitRelease>()
      .mockRejectedValueOnce(new TypeError('gone'))
      .mockResolvedValue({ ok: true, value: { id: 'rel-1' } });
    await openTyped(submit);
    press('Log the release');
    expect(await screen.findByText(/^The release could not be sent/)).toBeTruthy();
    press('Log the release');
    await waitFor(() => expect(push).toHaveBeenCalled());
    const keys = submit.mock.calls.map(([input]) => (input as { submissionKey: string }).submissionKey);
    expect(keys[0]).toBe(keys[1]);
  });
});

describe('the shares', () => {
  it('take their names from the race, and two pasted columns', async () => {
    await open();
    fireEvent.change(field('Race'), { target: { value: 'governor' } });
    expect([valueOf('Option 1'), valueOf('Option 2')]).toEqual(['Alder', 'Brook']);
    fireEvent.paste(screen.getByRole('textbox', { name: 'Option 1' }), {
      clipboardData: { getData: () => 'Brook\t41\nAlder\t47\nDon’t know\t8' },
    });
    expect(valueOf('Option 3')).toBe('Don’t know');
    const rows = screen.getAllByRole('group', { name: /^Row \d/ });
    const typed = rows.map(
      (row) => within(row).getByRole<HTMLInputElement>('textbox', { name: 'Share' }).value,
    );
    expect(typed).toEqual(['47', '41', '8']);
    expect(within(rows[2]!).getByRole<HTMLInputElement>('checkbox', { name: 'Not an answer' }).checked).toBe(
      true,
    );
  });

  it('leave a paste of one word to the field it goes into', async () => {
    await open();
    const isLeft = fireEvent.paste(screen.getByRole('textbox', { name: 'Option 1' }), {
      clipboardData: { getData: () => 'Alder' },
    });
    expect(isLeft).toBe(true);
  });

  it('move and go by the keyboard alone', async () => {
    await openTyped();
    fireEvent.keyDown(screen.getByRole('textbox', { name: 'Option 2' }), { key: 'ArrowUp', altKey: true });
    expect([valueOf('Option 1'), valueOf('Option 2')]).toEqual(['Brook', 'Alder']);
    press('Remove option 1');
    expect(valueOf('Option 1')).toBe('Alder');
    expect(document.activeElement).toBe(field('Option 1'));
    fireEvent.keyDown(field('Option 3'), { key: 'Delete', altKey: true });
    expect(document.activeElement).toBe(field('Option 2'));
    press('Add an option');
    expect(valueOf('Option 3')).toBe('');
    const tabbed = screen.getAllByRole('button', { name: /^(Move|Remove) option/ });
    expect(tabbed.filter((button) => button.tabIndex !== -1)).toEqual([]);
  });

  it('are typed down the column with Enter, which adds a row at the end and never sends', async () => {
    const submit = vi.fn<SubmitRelease>();
    await openTyped(submit);
    const shares = () => screen.getAllByRole('textbox', { name: 'Share' });
    const enter = (at: number) => fireEvent.keyDown(shares()[at]!, { key: 'Enter' });
    expect(enter(0)).toBe(false);
    expect(document.activeElement).toBe(shares()[1]);
    expect(enter(3)).toBe(false);
    expect(shares()).toHaveLength(5);
    await waitFor(() => expect(document.activeElement).toBe(field('Option 5')));
    expect(enter(4)).toBe(false);
    expect(shares()).toHaveLength(5);
    expect(submit).not.toHaveBeenCalled();
  });
});

describe('the findings beside the form', () => {
  it('follow what is typed and tell what is left out', async () => {
    await open();
    expect(screen.getByText('Type the shares, and what they support appears here.')).toBeTruthy();
    cleanup();
    await openTyped();
    expect(await screen.findByRole('heading', { name: 'Alder minus Brook: +6' })).toBeTruthy();
    expect(screen.getByText('One finding is not shown by the numbers.')).toBeTruthy();
    type('Sample size', 'a thousand');
    const unread = await screen.findAllByText('The sample size cannot be read yet.');
    expect(unread.length).toBe(2);
    expect(screen.queryByText(/people asked is not disclosed/)).toBeNull();
    expect(await screen.findByText('One finding cannot be tested.')).toBeTruthy();
  });

  it('show an impossible figure at its field while it is typed', async () => {
    await openTyped();
    const [first] = screen.getAllByRole('textbox', { name: 'Share' });
    fireEvent.change(first!, { target: { value: '90' } });
    await waitFor(() => expect(screen.getByText(/^These figures cannot be:/)).toBeTruthy());
  });

  it('ask which release compares, and tell why there is none', async () => {
    const comparison = { reason: 'none-earlier' as const, unknowns: [], differences: [], passedOver: [] };
    kept.compared = { previous: null, comparison };
    await openTyped();
    const words = 'This series has no release with earlier field dates that is out of embargo.';
    expect(await screen.findByText(words, undefined, { timeout: 3000 })).toBeTruthy();
    expect(asked.at(-1)).toMatchObject({ raceId: 'governor', pollster: 'Kelmouth Research' });
  });

  it('stand without the comparison where it cannot be looked up', async () => {
    server.use(http.post('*/api/desk/comparison', () => refuse(403, 'Not for you.')));
    await openTyped();
    expect(await screen.findByText(/Not for you\./, undefined, { timeout: 3000 })).toBeTruthy();
    expect(screen.getByRole('heading', { name: 'Alder minus Brook: +6' })).toBeTruthy();
  });
});

describe('what a pollster withholds', () => {
  it('is marked, keeps what was typed and cannot be typed over', async () => {
    await openTyped();
    fireEvent.click(screen.getByRole('checkbox', { name: 'Not disclosed (sample size)' }));
    expect(field('Sample size').readOnly).toBe(true);
    expect(field('Sample size').value).toBe('1,012');
    expect(await screen.findByText('One finding cannot be tested.')).toBeTruthy();
    expect(screen.getByText(/people asked is not disclosed/)).toBeTruthy();
  });

  it('loses its mark when something is chosen after all', async () => {
    await openTyped(undefined, typedForm({ mode: withheld }));
    fireEvent.change(field('Mode'), { target: { value: 'online' } });
    const mark = screen.getByRole<HTMLInputElement>('checkbox', { name: 'Not disclosed (mode)' });
    await waitFor(() => expect(mark.checked).toBe(false));
  });
});

describe('a race that is added in the form', () => {
  it('has a name, options and thresholds of its own, and names the rows', async () => {
    await open();
    fireEvent.change(field('Race'), { target: { value: 'add' } });
    type('Name of the race', 'Bridge toll');
    const options = screen.getByRole('textbox', { name: 'Answer options' });
    fireEvent.change(options, { target: { value: 'Yes\nNo' } });
    fireEvent.blur(options);
    expect([valueOf('Option 1'), valueOf('Option 2')]).toEqual(['Yes', 'No']);
    press('Add a threshold');
    const threshold = screen.getByRole('group', { name: 'Threshold 1' });
    expect(within(threshold).getByRole('option', { name: 'Yes' })).toBeTruthy();
  });

  it('tells an option that stands there twice at the list of options', async () => {
    await open();
    fireEvent.change(field('Race'), { target: { value: 'add' } });
    type('Name of the race', 'Bridge toll');
    const options = screen.getByRole<HTMLTextAreaElement>('textbox', { name: 'Answer options' });
    fireEvent.change(options, { target: { value: 'Yes\n\nNo\nyes' } });
    press('Log the release');
    fireEvent.click(await screen.findByText('Options of the race: This option stands here twice.'));
    expect(document.activeElement).toBe(options);
    expect(options.getAttribute('aria-invalid')).toBe('true');
    expect(options.value).toBe('Yes\nNo\nyes');
  });
});
