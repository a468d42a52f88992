import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { diffParts } from '@/components/lines/diff-parts';

const without = (change: 'added' | 'removed', parts: ReturnType<typeof diffParts>) =>
  parts
    .filter((part) => part.change !== change)
    .map(({ text }) => text)
    .join('');

describe('the difference of two wordings', () => {
  it('marks a changed word beside the words that stayed', () => {
    expect(
      diffParts('Alder is well ahead by eight points.', 'Alder is at 49% and ahead by eight points.'),
    ).toEqual([
      { text: 'Alder is ' },
      { text: 'well ', change: 'removed' },
      { text: 'at 49% and ', change: 'added' },
      { text: 'ahead by eight points.' },
    ]);
  });

  it('tells a rewritten passage as one, without the stray words that are in both', () => {
    const parts = diffParts(
      'Alder is ahead of Brook in this poll',
      'Brook has fewer than Alder in that poll',
    );
    expect(parts.filter(({ change }) => change === 'removed')).toHaveLength(1);
    expect(parts.filter(({ change }) => change === 'added')).toHaveLength(1);
  });

  it('says nothing of equal wordings but the wording', () => {
    expect(diffParts('The same.', 'The same.')).toEqual([{ text: 'The same.' }]);
    expect(diffParts('', '')).toEqual([]);
  });

  it('always holds both wordings whole', () => {
    const words = fc
      .array(fc.constantFrom('Alder', 'leads', 'Brook', '49%', 'to', '41%', ',', '\n'), { maxLength: 12 })
      .map((list) => list.join(' '));
    fc.assert(
      fc.property(words, words, (before, after) => {
        const parts = diffParts(before, after);
        expect(without('added', parts)).toBe(before);
        expect(without('removed', parts)).toBe(after);
      }),
    );
  });
});
