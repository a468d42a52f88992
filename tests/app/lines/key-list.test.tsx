// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { KeyList } from '@/app/(desk)/lines/_components/key-list';

beforeEach(() => localStorage.clear());
afterEach(cleanup);

const open = () =>
  render(
    <>
      <h2 id="evidence">The evidence</h2>
      <textarea aria-label="Words" />
      <div className="next-bar-actions">
        <button type="button">Discard</button>
        <button type="button" className="button-primary">
          File
        </button>
      </div>
      <KeyList />
    </>,
  );
const press = (key: string, code: string, held = {}) =>
  fireEvent.keyDown(document.body, { key, code, ...held });
const withBoth = { altKey: true, shiftKey: true };

describe('the keys of a sheet', () => {
  it('go to their places: the next step is the main button, not the first one', () => {
    open();
    press('E', 'KeyE', withBoth);
    expect(document.activeElement?.id).toBe('evidence');
    press('N', 'KeyN', withBoth);
    expect(document.activeElement?.textContent).toBe('File');
    press('E', 'KeyE', { altKey: true });
    expect(document.activeElement?.textContent).toBe('File');
  });

  it('are listed by ?, which types itself into a field and can be switched off', () => {
    open();
    fireEvent.keyDown(screen.getByLabelText('Words'), { key: '?', code: 'Slash' });
    expect(screen.queryByRole('dialog')).toBeNull();
    press('?', 'Slash', { shiftKey: true });
    expect(screen.getByRole('dialog').textContent).toContain('Alt + Shift + E');
    fireEvent.click(screen.getByRole('button', { name: 'Switch the key ? off' }));
    fireEvent.click(screen.getByRole('button', { name: 'Close' }));
    press('?', 'Slash', { shiftKey: true });
    expect(screen.queryByRole('dialog')).toBeNull();
  });
});
