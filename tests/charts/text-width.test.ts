import { describe, expect, it } from 'vitest';
import { fitText, textWidthPx, wrapText } from '@/lib/charts/text-width';

describe('the width of a text', () => {
  it('grows with every character and with the size', () => {
    expect(textWidthPx('', 13)).toBe(0);
    expect(textWidthPx('Alder', 13)).toBeLessThan(textWidthPx('Alders', 13));
    expect(textWidthPx('Alder', 26)).toBeCloseTo(2 * textWidthPx('Alder', 13), 10);
  });

  it('counts a wide character for more than a narrow one', () => {
    expect(textWidthPx('W', 10)).toBeGreaterThan(textWidthPx('i', 10));
    expect(textWidthPx('民', 10)).toBeGreaterThan(textWidthPx('W', 10));
  });
});

describe('a text that must fit', () => {
  it('is left alone where it does', () => {
    expect(fitText('Alder', 500, 13)).toBe('Alder');
  });

  it('is cut with an ellipsis, never past the room', () => {
    const cut = fitText('Alliance for a Better Averil Coast', 120, 13);
    expect(cut).toMatch(/^Alliance.*…$/);
    expect(textWidthPx(cut, 13)).toBeLessThanOrEqual(120);
  });

  it('is dropped where not one letter has room', () => {
    expect(fitText('Alder', 5, 13)).toBe('');
  });

  it('wraps between words and cuts a word that is too long alone', () => {
    expect(wrapText('No margin of sampling error', 1000, 13)).toEqual(['No margin of sampling error']);
    const lines = wrapText('No margin of sampling error', 110, 13);
    expect(lines.length).toBeGreaterThan(1);
    expect(lines.join(' ')).toBe('No margin of sampling error');
    expect(wrapText('unverwechselbarerweise', 60, 13)[0]).toMatch(/…$/);
  });
});
