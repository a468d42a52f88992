// @vitest-environment happy-dom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { ActsList } from '@/components/lines/acts-list';
import { isTakenBack } from '@/components/lines/taken-back';

afterEach(cleanup);

const NOW = Date.UTC(2026, 8, 18, 9);
const act = (name: string, person: string, comment: string | null = null) => ({
  act: name,
  person,
  at: NOW,
  comment,
});

describe('a sheet taken back by whoever filed it', () => {
  const acts = [
    act('filed', 'Rhea Quill'),
    act('sent-back', 'Rhea Quill', 'Taken back by whoever filed it.'),
  ];

  it('is told apart from one that a reader sent back', () => {
    expect(isTakenBack(acts)).toBe(true);
    expect(isTakenBack([act('filed', 'Rhea Quill'), act('sent-back', 'Marten Reed', 'Shorter.')])).toBe(
      false,
    );
    expect(isTakenBack([...acts, act('filed', 'Rhea Quill')])).toBe(false);
    expect(isTakenBack([])).toBe(false);
  });

  it('is listed in plain words', () => {
    render(<ActsList acts={acts} now={NOW} zone="Etc/UTC" />);
    expect(screen.getAllByRole('listitem').map((item) => item.textContent)).toEqual([
      'Rhea Quill filed it, 09:00',
      'Rhea Quill took it back, 09:00',
    ]);
  });
});
