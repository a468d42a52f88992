import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { claimSlots } from '@/lib/wording/claim-slots';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { marginSlots } from '@/lib/wording/margin-slots';
import { atStart, inSentence } from '@/lib/wording/names';
import { roundBeside, roundUp } from '@/lib/wording/print';
import { releaseSlots } from '@/lib/wording/release-slots';
import { say } from '@/lib/wording/say';
import { untestedSlots } from '@/lib/wording/untested';
import { voiceOf } from '@/lib/wording/voice';
import { GOLDEN_CASES } from './golden-cases';

describe('roundBeside', () => {
  it('rounds as the desk does, but never onto or across what it is compared with', () => {
    expect(roundBeside(6.93, 6, DEFAULT_HOUSE_STYLE)).toBe(7);
    expect(roundBeside(-0.17, 0, DEFAULT_HOUSE_STYLE)).toBe(-0.2);
    expect(roundBeside(0.04, 0, DEFAULT_HOUSE_STYLE)).toBe(0.04);
    expect(roundBeside(8.2, 8, DEFAULT_HOUSE_STYLE)).toBe(8.2);
    expect(roundBeside(6.93, 6, { ...DEFAULT_HOUSE_STYLE, margins: 'tenth' })).toBe(6.9);
  });

  it('keeps the side for anything a thousandth away', () => {
    const far = fc.double({ min: -50, max: 50, noNaN: true });
    fc.assert(
      fc.property(far, far, (value, shore) => {
        fc.pre(Math.abs(value - shore) > 0.001);
        const rounded = roundBeside(value, shore, DEFAULT_HOUSE_STYLE);
        expect(Math.sign(rounded - shore)).toBe(Math.sign(value - shore));
      }),
    );
  });
});

describe('roundUp', () => {
  it('never promises more than was found four times in five', () => {
    expect([9.6, 9.5, 9.01].map((pp) => roundUp(pp, DEFAULT_HOUSE_STYLE))).toEqual([10, 9.5, 9.5]);
  });
});

describe('names in sentences', () => {
  it('carry their own article as the place asks', () => {
    expect(inSentence('The  Quillon Panel ', 'en')).toBe('the Quillon Panel');
    expect(atStart('the Quillon Panel', 'en')).toBe('The Quillon Panel');
    expect(atStart('our desk', 'en')).toBe('Our desk');
    expect(atStart('ePoll', 'en')).toBe('ePoll');
  });
});

describe('slots', () => {
  it('have names of their own in every part of a sheet', () => {
    const input = GOLDEN_CASES['change-not-shown'];
    const voice = voiceOf(input.houseStyle, 'en');
    const names = [
      releaseSlots(input.release, input.previous, voice),
      claimSlots(input, voice),
      marginSlots(input, voice),
      untestedSlots(input),
    ].flatMap((slots) => Object.keys(slots));
    expect(names.filter((name, index) => names.indexOf(name) !== index)).toEqual([]);
  });

  it('are missed aloud, not left as holes', () => {
    expect(() => say('{a} leads {b}', { a: 'Alder' }, 'en-GB')).toThrow(/"b" was not provided/);
  });
});
