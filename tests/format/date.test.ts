import { describe, expect, it } from 'vitest';
import { formatDay, formatDayEnds, formatDayRange, formatInstant, formatTime } from '@/lib/format/date';

describe('formatDayRange', () => {
  it.each([
    ['2026-09-14', '2026-09-17', '14–17 September', '14–17 September 2026'],
    ['2026-08-28', '2026-09-03', '28 August – 3 September', '28 August – 3 September 2026'],
    ['2026-09-14', '2026-09-14', '14 September', '14 September 2026'],
    ['2025-12-29', '2026-01-03', '29 December 2025 – 3 January 2026', '29 December 2025 – 3 January 2026'],
  ])('writes %s to %s as %s', (start, end, short, long) => {
    expect(formatDayRange(start, end, 'en-GB')).toBe(short);
    expect(formatDayRange(start, end, 'en-GB', { withYear: true })).toBe(long);
  });

  it('follows the locale', () => {
    expect(formatDayRange('2026-09-14', '2026-09-17', 'en-US')).toBe('September 14–17');
    expect(formatDayRange('2026-08-28', '2026-09-03', 'en-US')).toBe('August 28 – September 3');
    expect(formatDayRange('2026-09-14', '2026-09-17', 'de')).toBe('14.–17. September');
  });

  it('refuses what is no day, and an end before its start', () => {
    expect(() => formatDayRange('2026-02-30', '2026-03-01', 'en-GB')).toThrow(
      new RangeError('formatDayRange requires a day as YYYY-MM-DD'),
    );
    expect(() => formatDayRange('2026-03-02', '2026-03-01', 'en-GB')).toThrow(
      new RangeError('formatDayRange requires a start that is not after its end'),
    );
  });
});

describe('formatDayEnds', () => {
  it.each([
    ['es-ES', '1', '17 de septiembre', '28 de agosto', '3 de septiembre'],
    ['fr-FR', '1er', '17 septembre', '28 août', '3 septembre'],
    ['de-DE', '1.', '17. September', '28. August', '3. September'],
  ])('shortens the start within a month in %s', (locale, day, end, earlier, later) => {
    expect(formatDayEnds('2026-09-01', '2026-09-17', locale)).toEqual({ start: day, end });
    expect(formatDayEnds('2026-08-28', '2026-09-03', locale)).toEqual({ start: earlier, end: later });
    expect(formatDayEnds('2026-09-17', '2026-09-17', locale)).toEqual({ start: end, end });
  });

  it('writes the year where it is asked for, and both where the dates cross one', () => {
    expect(formatDayEnds('2026-09-14', '2026-09-17', 'fr-FR', { withYear: true })).toEqual({
      start: '14',
      end: '17 septembre 2026',
    });
    expect(formatDayEnds('2025-12-29', '2026-01-01', 'de-DE')).toEqual({
      start: '29. Dezember 2025',
      end: '1. Januar 2026',
    });
  });

  it('refuses what is no day, and an end before its start', () => {
    expect(() => formatDayEnds('2026-02-30', '2026-03-01', 'fr-FR')).toThrow(
      new RangeError('formatDayEnds requires a day as YYYY-MM-DD'),
    );
    expect(() => formatDayEnds('2026-03-02', '2026-03-01', 'fr-FR')).toThrow(
      new RangeError('formatDayEnds requires a start that is not after its end'),
    );
  });
});

describe('formatDay', () => {
  it('writes the first of a month as French does', () => {
    expect(formatDay('2026-09-01', 'fr-FR')).toBe('1er septembre 2026');
    expect(formatDay('2026-09-11', 'fr-FR')).toBe('11 septembre 2026');
    expect(formatDayRange('2026-09-01', '2026-09-03', 'fr-FR')).toBe('1er–3 septembre');
    expect(formatDay('2026-09-01', 'es-ES')).toBe('1 de septiembre de 2026');
  });

  it('writes the year unless told otherwise', () => {
    expect(formatDay('2026-09-14', 'en-GB')).toBe('14 September 2026');
    expect(formatDay('2026-09-14', 'en-GB', { withYear: false })).toBe('14 September');
  });

  it('refuses what is no day', () => {
    expect(() => formatDay('14/09/2026', 'en-GB')).toThrow(
      new RangeError('formatDay requires a day as YYYY-MM-DD'),
    );
  });
});

describe('formatInstant', () => {
  const at = Date.UTC(2026, 8, 18, 22, 30);

  it('shows what the clock on the wall of the zone showed', () => {
    expect(formatInstant(at, 'UTC', 'en-GB')).toBe('18 September 2026, 22:30');
    expect(formatInstant(at, 'Pacific/Auckland', 'en-GB')).toBe('19 September 2026, 10:30');
    expect(formatTime(Date.UTC(2026, 8, 18, 0, 5), 'UTC', 'en-GB')).toBe('00:05');
  });

  it('refuses a zone that does not exist', () => {
    expect(() => formatInstant(at, 'Averil/Coast', 'en-GB')).toThrow(RangeError);
  });
});
