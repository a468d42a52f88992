import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  formatCount,
  formatP,
  formatPercent,
  formatPoints,
  formatShare,
  formatSigned,
  formatTrimmed,
  roundHalfUp,
} from '@/lib/format/number';

describe('roundHalfUp', () => {
  it.each([
    [2.5, 0, 3],
    [-2.5, 0, -3],
    [1.005, 2, 1.01],
    [-2.25, 1, -2.3],
    [0.04, 1, 0],
    [6.927, 1, 6.9],
  ])('rounds %d to %d decimals as %d', (value, decimals, rounded) => {
    expect(roundHalfUp(value, decimals)).toBe(rounded);
  });

  it('never gives a negative zero', () => {
    expect(Object.is(roundHalfUp(-0.04, 1), 0)).toBe(true);
  });

  it('mirrors and is never further off than half a unit', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e4, max: 1e4, noNaN: true }), fc.nat(4), (value, decimals) => {
        expect(roundHalfUp(-value, decimals) + roundHalfUp(value, decimals)).toBe(0);
        expect(Math.abs(roundHalfUp(value, decimals) - value)).toBeLessThanOrEqual(
          0.5 / 10 ** decimals + 1e-7,
        );
      }),
    );
  });

  it('refuses what is not a number, and decimals out of range', () => {
    expect(() => roundHalfUp(NaN, 1)).toThrow(new RangeError('roundHalfUp requires a finite value'));
    expect(() => roundHalfUp(1, 7)).toThrow(new RangeError('roundHalfUp requires 0 to 6 decimals'));
    expect(() => roundHalfUp(1, 0.5)).toThrow(new RangeError('roundHalfUp requires 0 to 6 decimals'));
  });
});

describe('printed numbers', () => {
  it('keeps the zero of a share that was printed with it', () => {
    expect(formatShare(470, 1, 'en-GB')).toBe('47.0');
    expect(formatShare(47, 0, 'en-GB')).toBe('47');
    expect(formatShare(470, 1, 'de')).toBe('47,0');
  });

  it('writes a real minus', () => {
    expect(formatPoints(-2.2, 1, 'en-GB')).toBe('−2.2');
    expect(formatSigned(-9, 0, 'en-GB')).toBe('−9');
    expect(formatTrimmed(-0.5, 1, 'fr')).toBe('−0,5');
  });

  it('writes a plus only above zero', () => {
    expect([8, 0, -0.04].map((pp) => formatSigned(pp, 1, 'en-GB'))).toEqual(['+8.0', '0.0', '0.0']);
  });

  it('drops zeros that say nothing where they are not as printed', () => {
    expect([1.4, 1.889, 2].map((deff) => formatTrimmed(deff, 2, 'en-GB'))).toEqual(['1.4', '1.89', '2']);
  });

  it('groups counts', () => {
    expect(formatCount(1012, 'en-GB')).toBe('1,012');
    expect(formatCount(701.5, 'en-GB')).toBe('702');
  });

  it('sets the percent sign as the language does', () => {
    expect(formatPercent(95, 0, 'en-GB')).toBe('95%');
    expect(['es-ES', 'fr-FR', 'de-DE', 'es-MX'].map((locale) => formatPercent(47.5, 1, locale))).toEqual([
      '47,5\u00a0%',
      '47,5\u202f%',
      '47,5\u00a0%',
      expect.stringMatching(/^47\.5\u00a0?%$/),
    ]);
  });

  it('writes the comma, the minus and the groups of each language', () => {
    const locales = ['es-ES', 'fr-FR', 'de-DE'];
    expect(locales.map((locale) => formatPoints(-6.5, 1, locale))).toEqual(['−6,5', '−6,5', '−6,5']);
    expect(locales.map((locale) => formatSigned(6, 0, locale))).toEqual(['+6', '+6', '+6']);
    expect(locales.map((locale) => formatCount(1012, locale))).toEqual(['1012', '1\u202f012', '1.012']);
    expect(locales.map((locale) => formatCount(12012, locale))).toEqual(['12.012', '12\u202f012', '12.012']);
    expect(locales.map((locale) => formatP(0.0004, locale))).toEqual(['p < 0,001', 'p < 0,001', 'p < 0,001']);
  });

  it('prints p to three decimals and never as zero', () => {
    expect([0.031, 0.0009, 0.001, 1].map((p) => formatP(p, 'en-GB'))).toEqual([
      'p = 0.031',
      'p < 0.001',
      'p = 0.001',
      'p = 1.000',
    ]);
  });
});
