// @vitest-environment happy-dom
import { cleanup, configure, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { setupServer } from 'msw/node';
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { type EditorDraft, StyleEditor } from '@/components/forms/house-style/style-editor';
import { DEFAULT_DESK_POLICY } from '@/lib/services/house-style/style-body';
import { describeSentences } from '@/lib/services/house-style/describe-sentences';
import { leavesOf } from '@/lib/services/house-style/leaves';
import { decide } from '@/lib/services/house-style/save-draft';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { FRAGILE_LEAD, OWN_FRAGILE } from '../../support/house-style';

configure({ asyncUtilTimeout: 8000 });

const BODY = { style: DEFAULT_HOUSE_STYLE, policy: DEFAULT_DESK_POLICY };
type Sent = { version: number; changes: { path: string; value: unknown }[] };
const sent: Sent[] = [];
let answersWith = 200;

/** The handlers that the screen talks to, deciding as the desk does. */
const server = setupServer(
  http.put('*/api/desk/house-style/draft', async ({ request }) => {
    const body = (await request.json()) as Sent;
    if (answersWith !== 200)
      return HttpResponse.json(
        { detail: 'Somebody changed this version meanwhile.' },
        { status: answersWith },
      );
    sent.push(body);
    const found = body.changes.map(({ path, value }) => [path, decide(BODY, path, value).faults] as const);
    const faults = Object.fromEntries(found.filter(([, list]) => list.length > 0));
    return HttpResponse.json({ version: body.version + 1, faults });
  }),
  http.post('*/api/desk/house-style/draft/filled', () =>
    HttpResponse.json([
      {
        text: 'Alder is ahead of Brook',
        pollster: 'Kelmouth Research',
        fieldEndOn: '2026-09-17',
        isExample: false,
      },
    ]),
  ),
);

beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
afterAll(() => server.close());
afterEach(() => {
  cleanup();
  sent.length = 0;
  answersWith = 200;
});

function open(change: Partial<EditorDraft> = {}, propose = vi.fn()) {
  const values = [...leavesOf(BODY)].filter(([path]) => !path.startsWith('style.messages.'));
  const draft: EditorDraft = {
    id: 'draft',
    version: 3,
    note: '',
    values: Object.fromEntries(values),
    typed: {},
    faults: {},
    languages: ['en'],
    ...describeSentences(BODY),
    ...change,
  };
  render(<StyleEditor draft={draft} propose={propose} onProposed={vi.fn()} />);
  return { propose };
}

const fragile = () => screen.getByLabelText<HTMLTextAreaElement>('Fragile', { exact: true });
const type = (field: HTMLElement, value: string) => fireEvent.change(field, { target: { value } });

describe('the editor of house style', () => {
  it('saves each decision with the version that it was typed on', async () => {
    open();
    type(screen.getByLabelText('Name of the newsroom'), 'the Courier');
    await screen.findByText('Saved.');
    fireEvent.click(screen.getByLabelText('Two words (47 per cent)'));
    await waitFor(() => expect(sent).toHaveLength(2));
    expect(sent).toEqual([
      { version: 3, changes: [{ path: 'style.newsroom', value: 'the Courier' }] },
      { version: 4, changes: [{ path: 'style.percent', value: 'per-cent' }] },
    ]);
  });

  it('shows a refused sentence at its field, with the phrase and its place, and keeps what was typed', async () => {
    open();
    type(fragile(), '{a} leads {b} in poll by {pollster}, {aShare} to {bShare}');
    const error = await screen.findByText(/“leads” says more than the verdict Fragile supports/);
    expect(error.textContent).toMatch(/At “leads”, character 5/);
    expect(fragile().getAttribute('aria-invalid')).toBe('true');
    expect(fragile().value).toMatch(/^\{a\} leads/);
    type(fragile(), OWN_FRAGILE);
    await waitFor(() => expect(fragile().getAttribute('aria-invalid')).toBeNull());
  });

  it('inserts a slot from the list at the cursor', () => {
    open();
    type(fragile(), 'Ahead:  in a poll');
    fragile().setSelectionRange(7, 7);
    type(screen.getByLabelText('Insert into Fragile'), 'a');
    expect(fragile().value).toBe('Ahead: {a} in a poll');
  });

  it('shows a sentence filled with a release of the desk', async () => {
    open();
    const [list] = await screen.findAllByRole('list', { name: /, filled$/ });
    expect(list?.textContent).toContain('Kelmouth Research, field work to 2026-09-17');
  });

  it('reads levels in percent and ranges in words, and sends them as the policy has them', async () => {
    open();
    type(screen.getByLabelText('Confidence level'), '90');
    type(screen.getByLabelText('Range around a design effect from weights alone'), '0.7 to 1.4');
    await waitFor(() => expect(sent.flatMap(({ changes }) => changes)).toHaveLength(2));
    expect(sent.flatMap(({ changes }) => changes)).toEqual([
      { path: 'policy.level', value: 0.9 },
      { path: 'policy.kishRange', value: [0.7, 1.4] },
    ]);
  });

  it('goes on from what was typed and refused before', () => {
    const text = '{a} leads {b}';
    const faults = { [FRAGILE_LEAD]: [{ message: 'It says too much.', place: null, phrase: 'leads' }] };
    open({ typed: { [FRAGILE_LEAD]: text }, faults });
    expect(fragile().value).toBe(text);
    expect(screen.getByText('It says too much.')).toBeTruthy();
  });

  it('saves before it proposes, and lists what stands against it', async () => {
    const refusal = {
      ok: false,
      code: 'invalid',
      message: 'Look again.',
      fields: { note: 'Say what changes.' },
    };
    const { propose } = open({}, vi.fn().mockResolvedValue(refusal));
    type(screen.getByLabelText('Name of the newsroom'), 'the Courier');
    fireEvent.click(screen.getByRole('button', { name: 'Propose this version' }));
    expect(await screen.findByRole('link', { name: 'Say what changes.' })).toBeTruthy();
    expect(sent).toHaveLength(1);
    expect(propose).toHaveBeenCalledWith({ id: 'draft', version: 4, note: '' });
  });

  it('says so when another window has changed the draft, and sends nothing over it', async () => {
    answersWith = 409;
    open();
    type(screen.getByLabelText('Name of the newsroom'), 'the Courier');
    expect(await screen.findByText('This draft was changed in another window.')).toBeTruthy();
    answersWith = 200;
    type(screen.getByLabelText('Name of the newsroom'), 'the Herald');
    await new Promise((resolve) => setTimeout(resolve, 900));
    expect(sent).toEqual([]);
  });
});
