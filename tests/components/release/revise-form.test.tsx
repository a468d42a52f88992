// @vitest-environment happy-dom
import { cleanup, configure, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { SWRConfig } from 'swr';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { ReviseForm, type ReviseRelease } from '@/components/forms/release/revise-form';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import { deskServer } from './desk-server';
import { typedForm } from './values';

configure({ asyncUtilTimeout: 5000 });

const push = vi.fn();
vi.mock('next/navigation', () => ({ useRouter: () => ({ push }) }));

const { server, saved, asked, reset } = deskServer();
beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
afterAll(() => server.close());
beforeEach(() => push.mockReset());
afterEach(() => {
  cleanup();
  reset();
});

const GOVERNOR = { id: 'governor', name: 'Averil Coast governor', kind: 'candidate' as const };
const CHOICES = {
  races: [{ ...GOVERNOR, options: ['Alder', 'Brook'], thresholds: [] }],
  pollsters: ['Kelmouth Research'],
  sponsors: [],
  zone: 'Etc/UTC',
  policy: DEFAULT_POLICY,
};
const SAVED = { ok: true as const, value: { version: 5 } };

/** The release on file; lists are chosen by hand, since happy-dom has no default choice to restore. */
function open(submit: ReviseRelease = vi.fn()) {
  const values = typedForm();
  render(
    <SWRConfig value={{ provider: () => new Map() }}>
      <ReviseForm
        choices={CHOICES}
        personId="rita"
        stored={{ id: 'rel-1', version: 4, number: 2, values }}
        submit={submit}
      />
    </SWRConfig>,
  );
  type('Population', values.population.value);
  type('Mode', values.mode.value);
  type('Sample source', values.sampleSource);
  type('Design', values.design);
}

const field = (name: string) => screen.getByLabelText<HTMLInputElement>(name, { exact: true });
const type = (name: string, value: string) => fireEvent.change(field(name), { target: { value } });
const save = () => fireEvent.click(screen.getByRole('button', { name: 'Save as version 3' }));

function isLeavingAsked(): boolean {
  const event = new Event('beforeunload', { cancelable: true });
  window.dispatchEvent(event);
  return event.defaultPrevented;
}

describe('changing the figures of a release', () => {
  it('starts from what is on file, with race and embargo as they are', () => {
    open();
    expect(field('Pollster').value).toBe('Kelmouth Research');
    expect(field('Race').value).toBe('Averil Coast governor');
    expect(field('Race').readOnly).toBe(true);
    expect(screen.queryByRole('checkbox', { name: 'Under embargo' })).toBeNull();
    expect(screen.getByText(/changed on the release page/)).toBeTruthy();
  });

  it('sends the version it started from and leads back to the release', async () => {
    const submit = vi.fn<ReviseRelease>().mockResolvedValue(SAVED);
    open(submit);
    type('Sample size', '1,021');
    save();
    await waitFor(() => expect(push).toHaveBeenCalledWith('/releases/rel-1'));
    const release = typedForm({ n: { notDisclosed: false, value: '1,021' } });
    expect(submit.mock.calls).toEqual([[{ id: 'rel-1', version: 4, release }]]);
  });

  it('is no draft of a new release, and is not compared with itself', async () => {
    open();
    type('Pollster', 'Norwater Polls');
    fireEvent(window, new Event('pagehide'));
    await waitFor(() =>
      expect(asked.at(-1)).toMatchObject({ releaseId: 'rel-1', pollster: 'Norwater Polls' }),
    );
    expect(saved).toEqual([]);
    expect(screen.queryByText('What you type is kept as a draft.')).toBeNull();
  });

  it('has the browser ask before it goes only where something was changed', () => {
    open();
    expect(isLeavingAsked()).toBe(false);
    type('Sample size', '1,021');
    expect(isLeavingAsked()).toBe(true);
    type('Sample size', '1,012');
    expect(isLeavingAsked()).toBe(false);
  });

  it('lands a refusal of the service at its field', async () => {
    const fields = { 'release.n.value': 'Too many.', 'race.id': 'A release stays with its race.' };
    const refused = {
      ok: false as const,
      code: 'invalid',
      message: 'Some fields need another look.',
      fields,
    };
    open(vi.fn<ReviseRelease>().mockResolvedValue(refused));
    save();
    expect(await screen.findByText('Sample size: Too many.')).toBeTruthy();
    expect(field('Sample size').getAttribute('aria-invalid')).toBe('true');
    fireEvent.click(screen.getByText('Race: A release stays with its race.'));
    expect(document.activeElement).toBe(field('Race'));
    expect(screen.queryByRole('button', { name: 'Reload the page' })).toBeNull();
  });

  it('offers to reload where somebody was faster, and keeps what was typed until then', async () => {
    const message = 'Somebody changed this release meanwhile. Reload it and look again.';
    const refused = { ok: false as const, code: 'conflict', message, fields: {} };
    open(vi.fn<ReviseRelease>().mockResolvedValue(refused));
    type('Sample size', '1,021');
    save();
    expect(await screen.findByText(message)).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Reload the page' })).toBeTruthy();
    expect(field('Sample size').value).toBe('1,021');
    expect(push).not.toHaveBeenCalled();
  });

  it('keeps everything where there is no answer at all, and is sent again', async () => {
    const submit = vi
      .fn<ReviseRelease>()
      .mockRejectedValueOnce(new TypeError('gone'))
      .mockResolvedValue(SAVED);
    open(submit);
    save();
    expect(await screen.findByText(/^The figures could not be sent/)).toBeTruthy();
    save();
    await waitFor(() => expect(push).toHaveBeenCalledWith('/releases/rel-1'));
  });
});
