// @vitest-environment happy-dom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { changesOf } from '@/app/(desk)/history/_components/changes-of';
import { EntryChanges } from '@/app/(desk)/history/_components/entry-changes';

afterEach(cleanup);

describe('what an entry changed', () => {
  it('is one line for each value, named in words', () => {
    expect(changesOf(null, { designEffect: 1.4, fieldEndOn: '2026-09-13' })).toEqual([
      { what: 'design effect', before: null, after: '1.4' },
      { what: 'field end on', before: null, after: '2026-09-13' },
    ]);
  });

  it('leaves out what stayed as it was', () => {
    const change = changesOf({ roles: ['editor'], disabled: false }, { roles: ['editor'], disabled: true });
    expect(change).toEqual([{ what: 'disabled', before: 'no', after: 'yes' }]);
  });

  it('counts lists of things from one, and tells empty, none and left out apart', () => {
    expect(
      changesOf({ shares: [{ n: 1 }], note: null, old: 2 }, { shares: [{ n: 0 }], note: '', tags: [] }),
    ).toEqual([
      { what: 'shares, 1, n', before: '1', after: '0' },
      { what: 'note', before: 'none', after: '' },
      { what: 'old', before: '2', after: null },
      { what: 'tags', before: null, after: 'none' },
    ]);
  });

  it('is empty where nothing is known on either side', () => {
    expect(changesOf(null, null)).toEqual([]);
    expect(changesOf('draft', 'filed')).toEqual([{ what: 'value', before: 'draft', after: 'filed' }]);
  });
});

describe('an entry of the history', () => {
  it('shows reason and values', () => {
    const entry = {
      before: { state: 'filed' },
      after: { state: 'pulled' },
      reason: 'Wrong base.',
      hidden: false,
    };
    const { container } = render(<EntryChanges entry={entry} />);
    expect(screen.getByText('“Wrong base.”')).toBeTruthy();
    expect(screen.getByText('1 value')).toBeTruthy();
    expect(container.querySelector('dd')?.textContent).toBe('before: filed → after: pulled');
  });

  it('says that an embargo keeps it, and shows nothing else', () => {
    const { container } = render(
      <EntryChanges entry={{ before: null, after: null, reason: null, hidden: true }} />,
    );
    expect(container.textContent).toBe('hidden until the embargo ends');
  });
});
