import { describe, expect, it } from 'vitest';
import { claimsAbove } from '@/lib/wording/never-says-more';

describe('claimsAbove', () => {
  it.each([
    ['Alder leads Brook', ['leads'], 'holds'],
    ['Alder, the front-runner, has a majority', ['front-runner', 'majority'], 'holds'],
    ['Alder is up and Brook is down', ['up', 'down'], 'holds'],
    ['Support has fallen', ['has fallen'], 'holds'],
    ['Alder is ahead of Brook', ['ahead'], 'fragile'],
    ['Alder is above half', ['above half'], 'fragile'],
    ['Harbour Union is below the 5% threshold', ['below the 5% threshold'], 'fragile'],
    ['A significant gap', ['significant'], 'fragile'],
  ] as const)('takes “%s” to need a verdict', (text, phrases, lowest) => {
    expect(claimsAbove('holds', text)).toEqual([]);
    expect(claimsAbove('fragile', text)).toEqual(lowest === 'holds' ? phrases : []);
    expect(claimsAbove('does-not-hold', text)).toEqual(phrases);
    expect(claimsAbove('cannot-be-tested', text)).toEqual(phrases);
  });

  it.each([
    ['A statistical tie', 'statistical tie'],
    ['Alder and Brook are tied', 'tied'],
    ['Alder surges', 'surges'],
    ['Momentum for Alder', 'Momentum'],
    ['The poll shows', 'poll shows'],
    ['Alder unchanged', 'unchanged'],
    ['an 8 percent lead', 'percent lead'],
  ])('never lets “%s” pass', (text, phrase) => {
    expect(claimsAbove('holds', text)).toEqual([phrase]);
  });

  it('leaves plain words alone', () => {
    const text = 'The sample is made up of adults; up to 12 points; poll by Kelmouth Research suggests';
    expect(claimsAbove('cannot-be-tested', text)).toEqual([]);
  });

  it('names each phrase once, in the order of the text', () => {
    expect(claimsAbove('does-not-hold', 'ahead, leads, ahead')).toEqual(['ahead', 'leads']);
  });
});
