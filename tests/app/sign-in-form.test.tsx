// @vitest-environment happy-dom
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { signIn } from 'next-auth/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { SignInForm } from '@/app/(door)/_components/sign-in-form';

vi.mock('next-auth/react', () => ({ signIn: vi.fn() }));

type Answer = Awaited<ReturnType<typeof signIn>>;
const answer = (change: { ok?: boolean; error?: string | null; status?: number }): Answer => ({
  ok: false,
  error: null,
  status: 401,
  url: null,
  ...change,
});

beforeEach(() => {
  vi.mocked(signIn).mockReset();
  vi.spyOn(window.location, 'assign').mockImplementation(() => undefined);
});
afterEach(cleanup);

async function send(email: string, password: string) {
  render(<SignInForm />);
  if (email) await userEvent.type(screen.getByLabelText('Email'), email);
  if (password) await userEvent.type(screen.getByLabelText('Password'), password);
  await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
}

const summary = () => screen.findByRole('group', { name: 'You are not signed in' });

describe('the sign-in form', () => {
  it('loads a whole new page once the session is open', async () => {
    vi.mocked(signIn).mockResolvedValue(answer({ ok: true, status: 200 }));
    await send('ada@courier.example', 'lantern harbour quill seven');
    expect(signIn).toHaveBeenCalledExactlyOnceWith('credentials', {
      redirect: false,
      email: 'ada@courier.example',
      password: 'lantern harbour quill seven',
    });
    await waitFor(() => expect(window.location.assign).toHaveBeenCalledOnce());
    expect(String(vi.mocked(window.location.assign).mock.calls[0]?.[0])).toBe('http://localhost:3000/');
  });

  it('asks for what is missing, at its field, without asking the server', async () => {
    await send('', '');
    expect(document.activeElement).toBe(await summary());
    expect(screen.getByLabelText('Email').getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByLabelText('Password').getAttribute('aria-describedby')).toBe('password-error');
    expect(signIn).not.toHaveBeenCalled();
  });

  it('says one sentence for every refusal, and blames neither field', async () => {
    vi.mocked(signIn).mockResolvedValue(answer({ error: 'CredentialsSignin' }));
    await send('ada@courier.example', 'wrong');
    expect((await summary()).textContent).toContain('This email and password do not open a desk.');
    expect(screen.getByLabelText('Email').getAttribute('aria-invalid')).toBeNull();
    expect(screen.getByLabelText('Password').getAttribute('aria-invalid')).toBeNull();
    expect(window.location.assign).not.toHaveBeenCalled();
  });

  it('says how long to wait after too many tries', async () => {
    vi.mocked(signIn).mockResolvedValue(answer({ error: 'throttled' }));
    await send('ada@courier.example', 'wrong');
    expect((await summary()).textContent).toContain('Wait a quarter of an hour');
  });

  it('says so when nothing answers, and lets one try again', async () => {
    vi.mocked(signIn).mockRejectedValue(new TypeError('fetch failed'));
    await send('ada@courier.example', 'right');
    expect((await summary()).textContent).toContain('Leadline did not answer.');
    expect(screen.getByRole('button', { name: 'Sign in' }).getAttribute('aria-disabled')).toBeNull();
  });

  it('takes a pasted password, shows it when asked to, and helps a password manager', async () => {
    render(<SignInForm />);
    const password = screen.getByLabelText<HTMLInputElement>('Password');
    await userEvent.click(password);
    await userEvent.paste('lantern harbour quill seven');
    expect(password.value).toBe('lantern harbour quill seven');
    expect([password.type, password.autocomplete]).toEqual(['password', 'current-password']);
    await userEvent.click(screen.getByLabelText('Show the password'));
    expect(password.type).toBe('text');
    expect(screen.getByLabelText<HTMLInputElement>('Email').autocomplete).toBe('username');
  });

  it('would never put a password into the address, script or no script', () => {
    const { container } = render(<SignInForm />);
    expect(container.querySelector('form')?.method).toBe('post');
  });
});
