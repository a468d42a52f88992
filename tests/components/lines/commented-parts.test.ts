import { describe, expect, it } from 'vitest';
import { commentedParts } from '@/components/lines/commented-parts';
import { diffParts } from '@/components/lines/diff-parts';

const placed = (start: number, end: number) => ({ kind: 'placed' as const, start, end });

describe('words with comments', () => {
  it('are cut where a passage begins and ends', () => {
    expect(commentedParts([{ text: 'Alder leads' }], [placed(6, 11)])).toEqual([
      { text: 'Alder ', comments: [] },
      { text: 'leads', comments: [0] },
    ]);
  });

  it('carry two comments where passages overlap', () => {
    const cut = commentedParts([{ text: 'Alder leads Brook' }], [placed(0, 11), placed(6, 17)]);
    expect(cut.map(({ text, comments }) => [text, comments])).toEqual([
      ['Alder ', [0]],
      ['leads', [0, 1]],
      [' Brook', [1]],
    ]);
  });

  it('keep their place through a difference: what went carries none, what came can', () => {
    const after = 'Alder has the higher figure here';
    const parts = diffParts('Alder leads here', after);
    const at = after.indexOf('higher figure');
    const cut = commentedParts(parts, [placed(at, at + 'higher figure'.length)]);
    expect(cut.filter(({ comments }) => comments.length > 0)).toEqual([
      { text: 'higher figure', change: 'added', comments: [0] },
    ]);
    expect(cut.find(({ change }) => change === 'removed')?.comments).toEqual([]);
    const kept = cut.filter(({ change }) => change !== 'removed').map(({ text }) => text);
    expect(kept.join('')).toBe(after);
  });

  it('are left whole where the words of a comment are gone', () => {
    expect(commentedParts([{ text: 'Brook' }], [{ kind: 'changed' }])).toEqual([
      { text: 'Brook', comments: [] },
    ]);
    expect(commentedParts([], [])).toEqual([]);
  });
});
