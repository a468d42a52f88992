// @vitest-environment happy-dom
import { cleanup, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { AddPerson } from '@/app/(desk)/people/_components/add-person';
import { ChangePerson } from '@/app/(desk)/people/_components/change-person';
import type { PersonRow } from '@/app/(desk)/people/_components/person-row';
import type { ActionFailure, ErrorCode, FieldErrors } from '@/lib/errors';

const refresh = vi.fn();
vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh }) }));

beforeEach(() => {
  refresh.mockReset();
  vi.spyOn(window.location, 'assign').mockImplementation(() => undefined);
});
afterEach(cleanup);

const refused = (code: ErrorCode, message: string, fields: FieldErrors = {}): ActionFailure => ({
  ok: false,
  code,
  message,
  fields,
});
const press = (name: string | RegExp) => userEvent.click(screen.getByRole('button', { name }));
const CODE = 'ABCDE-FGHJK-MNPQR-STVWX';

describe('adding a person', () => {
  const fill = async () => {
    await press('Add a person');
    await userEvent.type(screen.getByLabelText('Name'), 'Cora Pell');
    await userEvent.type(screen.getByLabelText('Email'), 'cora@courier.example');
    await userEvent.click(screen.getByLabelText('Copy desk'));
    await press('Add and show the code');
  };

  it('shows the one-time code with where to use it, and forgets it when closed', async () => {
    const add = vi.fn().mockResolvedValue({ ok: true, value: { id: 'x', code: CODE } });
    render(<AddPerson add={add} />);
    await fill();
    expect(add).toHaveBeenCalledExactlyOnceWith({
      name: 'Cora Pell',
      email: 'cora@courier.example',
      roles: ['copy-desk'],
    });
    expect((await screen.findByLabelText('Sign-in code')).textContent).toBe(CODE);
    expect(screen.getByText(/\/invitation$/)).toBeTruthy();
    expect(refresh).toHaveBeenCalledOnce();
    await press('Done');
    await press('Add a person');
    expect(screen.queryByText(CODE)).toBeNull();
    expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('');
  });

  it('copies the code, or says that the browser refused', async () => {
    render(<AddPerson add={async () => ({ ok: true, value: { id: 'x', code: CODE } })} />);
    await fill();
    await screen.findByLabelText('Sign-in code');
    const writeText = vi.spyOn(navigator.clipboard, 'writeText');
    writeText.mockResolvedValueOnce(undefined).mockRejectedValueOnce(new Error('denied'));
    await press('Copy the code');
    await screen.findByText('Copied.');
    await press('Copy the code');
    await screen.findByText('The browser did not let us copy: select the code and copy it.');
    expect(writeText).toHaveBeenCalledWith(CODE);
  });

  it('shows a refusal at its field and on top, and keeps what was typed', async () => {
    const message = 'Somebody with this e-mail address is on the list already.';
    render(<AddPerson add={async () => refused('invalid', 'Nobody was added.', { email: message })} />);
    await fill();
    const summary = await screen.findByRole('group', { name: 'Nobody was added' });
    expect(document.activeElement).toBe(summary);
    await userEvent.click(within(summary).getByRole('link', { name: message }));
    expect(document.activeElement).toBe(screen.getByLabelText('Email'));
    expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('Cora Pell');
    expect(screen.getByLabelText<HTMLInputElement>('Copy desk').checked).toBe(true);
  });

  it('says so when nothing answers', async () => {
    render(<AddPerson add={() => Promise.reject(new TypeError('fetch failed'))} />);
    await fill();
    await screen.findByText(/Leadline did not answer/);
  });
});

describe('changing a person', () => {
  const edda: PersonRow = {
    id: 'edda',
    name: 'Edda Marsh',
    roles: ['editor'],
    state: 'active',
    version: 3,
    isSelf: false,
  };
  const actionsThat = (result: unknown) => ({
    setRoles: vi.fn().mockResolvedValue(result),
    setDisabled: vi.fn().mockResolvedValue(result),
    renewCode: vi.fn().mockResolvedValue(result),
  });
  const open = async (person: PersonRow, actions: ReturnType<typeof actionsThat>) => {
    render(<ChangePerson person={person} actions={actions} />);
    await press(`Change ${person.name}`);
  };

  it('sends the roles with the version that the page was made from', async () => {
    const actions = actionsThat({ ok: true });
    await open(edda, actions);
    await userEvent.click(screen.getByLabelText('Reporter'));
    await press('Save the roles');
    expect(actions.setRoles).toHaveBeenCalledExactlyOnceWith({
      id: 'edda',
      version: 3,
      roles: ['reporter', 'editor'],
    });
    await waitFor(() => expect(refresh).toHaveBeenCalledOnce());
  });

  it('loads a whole new page when it was oneself', async () => {
    await open({ ...edda, isSelf: true }, actionsThat({ ok: true }));
    await press('Save the roles');
    await waitFor(() => expect(window.location.assign).toHaveBeenCalledOnce());
    expect(refresh).not.toHaveBeenCalled();
  });

  it('asks before it disables, and Back changes nothing', async () => {
    const actions = actionsThat({ ok: true });
    await open(edda, actions);
    await press('Disable…');
    expect(screen.getByRole('dialog', { name: 'Disable Edda Marsh?' })).toBeTruthy();
    await press('Back');
    expect(actions.setDisabled).not.toHaveBeenCalled();
    await press('Disable…');
    await press('Disable Edda Marsh');
    expect(actions.setDisabled).toHaveBeenCalledExactlyOnceWith({ id: 'edda', version: 3, disabled: true });
  });

  it('offers to enable whoever is disabled', async () => {
    const actions = actionsThat({ ok: true });
    await open({ ...edda, state: 'disabled' }, actions);
    await press('Enable…');
    await press('Enable Edda Marsh');
    expect(actions.setDisabled).toHaveBeenCalledExactlyOnceWith({ id: 'edda', version: 3, disabled: false });
  });

  it('shows a new code after it was asked for twice', async () => {
    await open(edda, actionsThat({ ok: true, value: { code: CODE } }));
    await press('New sign-in code…');
    expect(screen.queryByText(CODE)).toBeNull();
    await press('Make a new code');
    expect((await screen.findByLabelText('Sign-in code')).textContent).toBe(CODE);
  });

  it('keeps the dialog open with the refusal of a stale page or of the last administrator', async () => {
    const message = 'Somebody has to stay administrator. Give the role to another person first.';
    await open(edda, actionsThat(refused('conflict', message)));
    await press('Save the roles');
    expect((await screen.findByRole('group', { name: 'Nothing was changed' })).textContent).toContain(
      message,
    );
    expect(refresh).not.toHaveBeenCalled();
  });
});
