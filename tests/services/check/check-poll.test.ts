import { describe, expect, it } from 'vitest';
import type { Actor } from '@/lib/domain/roles';
import { checkPoll } from '@/lib/services/check/check-poll';
import { tokenBuckets } from '@/lib/services/check/token-bucket';
import { NOW } from '@/tests/support/database';

const person = (personId: number): Actor => ({
  personId,
  publicId: `person-${personId}`,
  name: 'Rita Quill',
  roles: ['copy-desk'],
  sessionId: 1,
});

const DOCUMENT = {
  release: {
    sampleSource: 'probability',
    n: 1012,
    design: 'weighted',
    decimals: 0,
    statedMargin: { pp: 3.7, unit: 0.1, level: 0.95 },
    shares: [
      { option: 'Alder', pct: 47 },
      { option: 'Brook', pct: 41 },
    ],
  },
};

describe('a check document', () => {
  it('is answered for whoever is signed in', () => {
    const outcome = checkPoll(person(1), DOCUMENT, { now: NOW });
    expect(outcome).toMatchObject({ kind: 'answer', answer: { base: { basis: 'sampling' } } });
  });

  it('is refused with the path of its fault', () => {
    const release = { ...DOCUMENT.release, shares: [{ option: 'Alder', pct: 147 }] };
    expect(checkPoll(person(1), { release }, { now: NOW })).toEqual({
      kind: 'refused',
      error: { path: 'release.shares[0].pct', message: 'A share lies from 0 to 100 percent.' },
    });
    expect(checkPoll(person(1), null, { now: NOW })).toMatchObject({ kind: 'refused', error: { path: '' } });
  });

  it('is answered sixty times at once, then again as the minute passes, for each person', () => {
    const kinds = Array.from({ length: 61 }, () => checkPoll(person(2), DOCUMENT, { now: NOW }).kind);
    expect(kinds.filter((kind) => kind === 'answer')).toHaveLength(60);
    expect(checkPoll(person(2), DOCUMENT, { now: NOW })).toEqual({ kind: 'too-many', retryAfterMs: 1000 });
    expect(checkPoll(person(3), DOCUMENT, { now: NOW }).kind).toBe('answer');
    expect(checkPoll(person(2), DOCUMENT, { now: NOW + 1000 }).kind).toBe('answer');
    expect(checkPoll(person(2), DOCUMENT, { now: NOW + 1000 }).kind).toBe('too-many');
  });
});

describe('a document of very many questions', () => {
  it('costs as many askings as its length is worth', () => {
    const shares = Array.from({ length: 100 }, (_, at) => ({ option: `Option ${at}`, pct: 1 }));
    const thresholds = shares.map(({ option }) => ({ option, pct: 5 }));
    const long = { release: { ...DOCUMENT.release, shares }, thresholds };
    const kinds = Array.from({ length: 21 }, () => checkPoll(person(4), long, { now: NOW }).kind);
    expect(kinds.filter((kind) => kind === 'answer')).toHaveLength(20);
    expect(kinds.at(-1)).toBe('too-many');
  });
});

describe('a token bucket', () => {
  it('never holds more than its capacity and survives a clock that goes back', () => {
    const take = tokenBuckets({ capacity: 2, perMinute: 60 });
    expect([take(1, 0), take(1, 3_600_000), take(1, 3_600_000)]).toEqual([0, 0, 0]);
    expect(take(1, 3_600_000)).toBe(1000);
    expect(take(1, 0)).toBe(1000);
  });
});
