// @vitest-environment happy-dom
import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { Checkbox } from '@/components/ui/checkbox';
import { Radios } from '@/components/ui/radios';
import { Select } from '@/components/ui/select';
import { TextArea } from '@/components/ui/text-area';
import { TextInput } from '@/components/ui/text-input';

afterEach(cleanup);

const textOfIds = (ids: string | null) =>
  (ids ?? '').split(' ').map((id) => document.getElementById(id)?.textContent);

describe('a field', () => {
  it('has its label, and tells hint and error of its control', () => {
    render(<TextInput id="n" label="Interviews" hint="As printed." error="Give a whole number." />);
    const control = screen.getByLabelText('Interviews');
    expect(textOfIds(control.getAttribute('aria-describedby'))).toEqual([
      'As printed.',
      'Error: Give a whole number.',
    ]);
    expect(control.getAttribute('aria-invalid')).toBe('true');
  });

  it('says nothing more where there is neither hint nor error', () => {
    render(<TextInput id="n" label="Interviews" />);
    const control = screen.getByLabelText('Interviews');
    expect(control.hasAttribute('aria-describedby')).toBe(false);
    expect(control.hasAttribute('aria-invalid')).toBe(false);
  });

  it('keeps a description that the page gives it', () => {
    render(<TextInput id="n" label="Interviews" hint="As printed." aria-describedby="unit" />);
    expect(screen.getByLabelText('Interviews').getAttribute('aria-describedby')).toBe('unit n-hint');
  });

  it('of several lines and of a list are labelled the same way', () => {
    render(
      <>
        <TextArea id="body" label="Body sentence" copy error="Too long." />
        <Select
          id="who"
          label="Population"
          empty="Choose one"
          choices={[{ value: 'lv', label: 'Likely voters' }]}
        />
      </>,
    );
    expect(screen.getByLabelText('Body sentence').getAttribute('aria-describedby')).toBe('body-error');
    const options = within(screen.getByLabelText('Population')).getAllByRole('option');
    expect(options.map((option) => option.textContent)).toEqual(['Choose one', 'Likely voters']);
  });

  it('can keep its label for the ear alone', () => {
    render(<TextInput id="share-0" label="Share of Alder" hideLabel />);
    expect(screen.getByText('Share of Alder').className).toBe('sr-only');
  });
});

describe('choices', () => {
  it('of a group carry its question, and the first its id for the error summary', () => {
    render(
      <Radios
        id="source"
        name="source"
        label="Sample source"
        error="Choose one."
        defaultValue="quota"
        choices={[
          { value: 'probability', label: 'Probability' },
          { value: 'quota', label: 'Quota', hint: 'Not random.' },
        ]}
      />,
    );
    const group = screen.getByRole('group', { name: 'Sample source' });
    expect(textOfIds(group.getAttribute('aria-describedby'))).toEqual(['Error: Choose one.']);
    expect(screen.getByLabelText('Probability').id).toBe('source');
    const quota = screen.getByLabelText<HTMLInputElement>('Quota');
    expect(quota.checked).toBe(true);
    expect(textOfIds(quota.getAttribute('aria-describedby'))).toEqual(['Not random.']);
  });

  it('of one yes or no have the label as their target', () => {
    render(<Checkbox id="same" label="Same people asked twice" />);
    screen.getByText('Same people asked twice').click();
    expect(screen.getByLabelText<HTMLInputElement>('Same people asked twice').checked).toBe(true);
  });
});
