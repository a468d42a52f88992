import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { labelsOf, rNumber, rString } from '@/lib/findings/r-script/r-literal';
import { readString } from './r-source';

const nasty = fc.constantFrom(
  '"',
  '\\',
  '\n',
  '\r',
  '#',
  "'",
  '`',
  '")',
  '\\"',
  '\u2028',
  '\u0000',
  '\uDC00',
  '🗳',
);
const anyUnit = fc.integer({ min: 0, max: 0xffff }).map((unit) => String.fromCharCode(unit));
const name = fc.array(fc.oneof(nasty, anyUnit, fc.string({ maxLength: 3 }))).map((parts) => parts.join(''));

/** What R's strings cannot hold is written as U+FFFD. */
const held = (text: string) => text.replace(/\0/g, '\uFFFD').toWellFormed();

describe('rString', () => {
  test('is one line of printable ASCII that reads back as the text', () => {
    fc.assert(
      fc.property(name, (text) => {
        const literal = rString(text);
        expect(literal).toMatch(/^"[ -~]*"$/);
        expect(readString(literal)).toBe(held(text));
      }),
    );
  });

  test('has no quote inside that is not escaped', () => {
    fc.assert(
      fc.property(name, (text) => {
        expect(rString(text)).toMatch(/^"(?:[^"\\]|\\.)*"$/);
      }),
    );
  });
});

describe('labelsOf', () => {
  test('keeps an ordinary name as it is', () => {
    const names = ['Alder', 'Öst-Brook', '橋党', ''];
    expect([...labelsOf(names).values()]).toEqual(names);
  });

  test('gives distinct options distinct labels that a string of R can hold', () => {
    const alike = fc.constantFrom(
      'A\0',
      'A\uFFFD',
      'A\uD800',
      'A\uFFFD (2)',
      'B'.repeat(130),
      'B'.repeat(131),
    );
    fc.assert(
      fc.property(fc.array(fc.oneof(name, alike)), (options) => {
        const labels = labelsOf(options);
        const given = [...labels.values()];
        expect(labels.size).toBe(new Set(options).size);
        expect(new Set(given).size).toBe(given.length);
        for (const label of given) {
          expect(held(label)).toBe(label);
          expect([...label].length).toBeLessThanOrEqual(130);
        }
      }),
    );
  });
});

describe('rNumber', () => {
  test('reads back as the same number', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        expect(Number(rNumber(value))).toBe(value + 0);
      }),
    );
  });

  test('refuses what is no number of R', () => {
    for (const value of [Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(() => rNumber(value)).toThrow(new RangeError('rNumber requires a finite number'));
    }
  });
});
