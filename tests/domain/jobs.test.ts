import { describe, expect, it } from 'vitest';
import {
  isAnswering,
  JOB_KIND_NAMES,
  JOB_KINDS,
  JOB_LANES,
  JOB_PAYLOADS,
  MAX_ATTEMPTS,
  retryAt,
  SILENT_AFTER_MS,
} from '@/lib/domain/jobs';

const SECOND = 1000;
const HOUR = 3_600 * SECOND;

describe('waiting after a failure', () => {
  it('is four times as long each time, and at most six hours', () => {
    const waits = Array.from({ length: MAX_ATTEMPTS }, (_, at) => retryAt(0, at + 1) / SECOND);
    expect(waits).toEqual([5, 20, 80, 320, 1280, 5120, 20480, (6 * HOUR) / SECOND]);
    expect(retryAt(7, 1_000_000)).toBe(7 + 6 * HOUR);
  });

  it('is asked only after an attempt', () => {
    for (const attempts of [0, -1, Number.NaN])
      expect(() => retryAt(0, attempts)).toThrow(new RangeError('retryAt requires at least one attempt'));
  });
});

describe('the kinds', () => {
  it('each have a name, a lane and a payload that refuses what it does not know', () => {
    expect(JOB_LANES.flat().sort()).toEqual([...JOB_KINDS].sort());
    expect(new Set(Object.values(JOB_KIND_NAMES)).size).toBe(JOB_KINDS.length);
    for (const kind of JOB_KINDS)
      expect(JOB_PAYLOADS[kind].safeParse({ surprise: true }).success).toBe(false);
  });

  it('say which embeds a purge is about', () => {
    expect(JOB_PAYLOADS['purge-embeds'].safeParse({ of: 'embed', id: 'x' }).success).toBe(true);
    expect(JOB_PAYLOADS['purge-embeds'].safeParse({ of: 'person', id: 'x' }).success).toBe(false);
  });
});

describe('the sign of life', () => {
  it('counts for as long as it is fresh', () => {
    expect(isAnswering(null, 0)).toBe(false);
    expect(isAnswering(0, SILENT_AFTER_MS)).toBe(true);
    expect(isAnswering(0, SILENT_AFTER_MS + 1)).toBe(false);
  });
});
