// @vitest-environment happy-dom
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { ErrorSummary } from '@/components/ui/error-summary';
import { TextInput } from '@/components/ui/text-input';

afterEach(cleanup);

const faults = [
  { message: 'Interviews: give a whole number.', fieldId: 'n' },
  { message: 'The page is out of date.' },
];

describe('the error summary', () => {
  it('is not there without faults', () => {
    const { container } = render(<ErrorSummary faults={[]} />);
    expect(container.innerHTML).toBe('');
  });

  it('takes focus when it appears, and again at the next attempt', () => {
    const view = render(<ErrorSummary faults={faults} attempt={1} />);
    const summary = screen.getByRole('group', { name: 'Something needs another look' });
    expect(document.activeElement).toBe(summary);
    summary.blur();
    view.rerender(<ErrorSummary faults={faults} attempt={2} />);
    expect(document.activeElement).toBe(summary);
  });

  it('leads to the field, with the cursor in it', async () => {
    render(
      <>
        <ErrorSummary faults={faults} />
        <TextInput id="n" label="Interviews" />
      </>,
    );
    await userEvent.click(screen.getByRole('link', { name: 'Interviews: give a whole number.' }));
    expect(document.activeElement).toBe(screen.getByLabelText('Interviews'));
    expect(screen.queryByRole('link', { name: 'The page is out of date.' })).toBeNull();
  });
});
