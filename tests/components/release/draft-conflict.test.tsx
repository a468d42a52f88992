// @vitest-environment happy-dom
import { cleanup, configure, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { SWRConfig } from 'swr';
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { ReleaseForm } from '@/components/forms/release/release-form';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import { NOW } from '@/tests/support/database';
import { deskServer, refuse } from './desk-server';
import { blankForm } from './values';

configure({ asyncUtilTimeout: 5000 });
vi.mock('next/navigation', () => ({ useRouter: () => ({ push: vi.fn() }) }));

const { server, saved, kept, reset } = deskServer();
beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
afterAll(() => server.close());
afterEach(() => {
  cleanup();
  reset();
});

const CHOICES = { races: [], pollsters: [], sponsors: [], zone: 'Etc/UTC', policy: DEFAULT_POLICY };
const CHANGED = 'This draft was changed in another tab';

async function openAndType(pollster: string) {
  render(
    <SWRConfig value={{ provider: () => new Map() }}>
      <ReleaseForm choices={CHOICES} personId="rita" submit={vi.fn()} />
    </SWRConfig>,
  );
  await screen.findByRole('form', { name: 'Release' });
  fireEvent.change(pollsterField(), { target: { value: pollster } });
}

const elsewhere = (pollster: string) => ({ body: blankForm({ pollster }), savedAt: NOW + 50 });
const pollsterField = () => screen.getByLabelText<HTMLInputElement>('Pollster', { exact: true });
const press = (name: string) => fireEvent.click(screen.getByRole('button', { name }));
const names = () => saved.map((body) => (body as { pollster: string }).pollster);
const isAsked = () => {
  const event = new Event('beforeunload', { cancelable: true });
  window.dispatchEvent(event);
  return event.defaultPrevented;
};

describe('a draft that another tab has changed', () => {
  it('is told, and nothing is kept over it while nobody has chosen', async () => {
    kept.elsewhere = elsewhere('Norwater Polls');
    await openAndType('Kelmouth A');
    expect(await screen.findByText(CHANGED)).toBeTruthy();
    fireEvent(window, new Event('focus'));
    fireEvent.change(pollsterField(), { target: { value: 'Kelmouth B' } });
    await new Promise((resolve) => setTimeout(resolve, 900));
    expect(names()).not.toContain('Kelmouth B');
    expect(pollsterField().value).toBe('Kelmouth B');
    expect(isAsked()).toBe(true);
  });

  it('is replaced on the word of the writer, and can still be brought back', async () => {
    kept.elsewhere = elsewhere('Norwater Polls');
    await openAndType('Kelmouth C');
    await screen.findByText(CHANGED);
    press('Keep what is typed here');
    await waitFor(() => expect(names()).toContain('Kelmouth C'));
    expect(screen.queryByText(CHANGED)).toBeNull();
    expect(isAsked()).toBe(false);
    press('Swap the two versions');
    expect(pollsterField().value).toBe('Norwater Polls');
  });

  it('is loaded on the word of the writer, and what was typed here can be brought back', async () => {
    kept.elsewhere = elsewhere('Norwater Polls');
    await openAndType('Kelmouth D');
    await screen.findByText(CHANGED);
    press('Load the other one');
    expect(pollsterField().value).toBe('Norwater Polls');
    await screen.findByText(/^Saved/);
    press('Swap the two versions');
    expect(pollsterField().value).toBe('Kelmouth D');
    await waitFor(() => expect(names()).toContain('Kelmouth D'));
  });

  it('is no other tab where an answer to a save of this one was lost', async () => {
    const lost = http.put(
      '*/api/desk/drafts',
      async ({ request }) => {
        const { body } = (await request.json()) as { body: string };
        kept.elsewhere = { body: JSON.parse(body) as unknown, savedAt: NOW + 50 };
        return HttpResponse.error();
      },
      { once: true },
    );
    server.use(lost);
    await openAndType('Kelmouth E');
    await screen.findByText('Not saved: Leadline cannot be reached.');
    fireEvent.change(pollsterField(), { target: { value: 'Kelmouth F' } });
    await waitFor(() => expect(names()).toContain('Kelmouth F'), { timeout: 3000 });
    expect(screen.queryByText(CHANGED)).toBeNull();
  });

  it('is told as not saved where the other version cannot be fetched', async () => {
    await openAndType('Kelmouth G');
    kept.elsewhere = elsewhere('Norwater Polls');
    server.use(http.get('*/api/desk/drafts', () => refuse(500, 'Something went wrong.'), { once: true }));
    expect(await screen.findByText('Not saved: Something went wrong.')).toBeTruthy();
    expect(pollsterField().value).toBe('Kelmouth G');
  });
});
