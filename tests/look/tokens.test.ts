import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { ROLE_STYLES } from '@/lib/charts/scene-styles';
import { MARK_PAIRS, TEXT_PAIRS, TEXT_PX, TOKENS, type Theme, type TokenName } from '@/lib/charts/tokens';

const css = readFileSync('app/globals.css', 'utf8');
const themes: Theme[] = ['light', 'night'];
const names = Object.keys(TOKENS) as TokenName[];

/** The declarations of the rule that begins with this selector. */
function declarationsOf(selector: string): Map<string, string> {
  const from = css.indexOf(`${selector} {`);
  expect(from, `${selector} is in app/globals.css`).toBeGreaterThan(-1);
  const body = css.slice(css.indexOf('{', from) + 1, css.indexOf('}', from));
  return new Map(
    [...body.matchAll(/--([\w-]+):\s*(#[0-9a-f]{6})/g)].map(([, name = '', hex = '']) => [name, hex]),
  );
}

/** Relative luminance and contrast ratio as WCAG 2.2 defines them (from memory). */
function luminance(hex: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5]
    .map((at) => parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((value) => (value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4));
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function contrast(one: string, other: string): number {
  const [high, low] = [luminance(one), luminance(other)].sort((a, b) => b - a) as [number, number];
  return (high + 0.05) / (low + 0.05);
}

describe('the tokens', () => {
  it.each([
    [":root,\n[data-theme='light']", 'light'],
    [":root:not([data-theme='light'])", 'night'],
    ["  [data-theme='night']", 'night'],
  ] as const)('stand in the stylesheet under %s as %s', (selector, theme) => {
    const declared = declarationsOf(selector);
    expect(Object.fromEntries(declared)).toEqual(
      Object.fromEntries(names.map((name) => [name, TOKENS[name][theme]])),
    );
  });

  it('are each a colour of Tailwind, and its own palette is gone', () => {
    expect(css).toContain('--color-*: initial');
    for (const name of names) expect(css).toContain(`--color-${name}: var(--${name})`);
  });

  it('give the type scale in rem', () => {
    for (const px of Object.values(TEXT_PX)) expect(css).toContain(`--text-${px}: ${px / 16}rem`);
  });
});

describe('contrast', () => {
  it('computes the two ends of the scale', () => {
    expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 10);
    expect(contrast('#767676', '#ffffff')).toBeCloseTo(4.54, 2);
  });

  it.each(themes)('of every text pair is at least 4.5 to 1 by %s', (theme) => {
    const weak = TEXT_PAIRS.filter(
      ([text, ground]) => contrast(TOKENS[text][theme], TOKENS[ground][theme]) < 4.5,
    );
    expect(weak).toEqual([]);
  });

  it.each(themes)('of every mark that carries meaning is at least 3 to 1 by %s', (theme) => {
    const weak = MARK_PAIRS.filter(
      ([mark, ground]) => contrast(TOKENS[mark][theme], TOKENS[ground][theme]) < 3,
    );
    expect(weak).toEqual([]);
  });

  it('is checked on paper for every line, weight and word of a picture', () => {
    const checked = new Set(
      [...MARK_PAIRS, ...TEXT_PAIRS].filter(([, on]) => on === 'paper').map(([mark]) => mark),
    );
    const drawn = Object.values(ROLE_STYLES).flatMap(({ stroke }) => (stroke ? [stroke] : []));
    expect(drawn.filter((token) => !checked.has(token))).toEqual([]);
  });
});
