// @vitest-environment happy-dom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { EmbargoBand, embargoEnd } from '@/components/lines/embargo-band';

afterEach(cleanup);

const at = Date.UTC(2026, 8, 17, 10, 30);

describe('the band of an embargo', () => {
  it('gives its end on the clocks of its zone and in UTC, once where they agree', () => {
    expect(embargoEnd({ at, zone: 'Etc/UTC' })).toBe('17 September 2026, 10:30 UTC');
    expect(embargoEnd({ at, zone: 'Etc/GMT-2' })).toBe('17 September 2026, 12:30 in Etc/GMT-2 (10:30 UTC)');
  });

  it('is told to the second, and with the day of UTC where that is another', () => {
    const late = Date.UTC(2026, 8, 17, 22, 30, 15);
    expect(embargoEnd({ at: late, zone: 'Europe/Vienna' })).toBe(
      '18 September 2026, 00:30:15 in Europe/Vienna (17 September 2026, 22:30:15 UTC)',
    );
  });

  it('tells the two hours apart that have one name when the clocks go back', () => {
    const [first, second] = [0, 1].map((hour) =>
      embargoEnd({ at: Date.UTC(2026, 9, 25, hour, 30), zone: 'Europe/Vienna' }),
    );
    expect(first).toBe('25 October 2026, 02:30 in Europe/Vienna (00:30 UTC)');
    expect(second).toBe('25 October 2026, 02:30 in Europe/Vienna (01:30 UTC)');
  });

  it('stands only while the embargo runs, and says who cannot copy', () => {
    const { rerender } = render(<EmbargoBand embargo={{ isRunning: false, at, zone: 'Etc/UTC' }} />);
    expect(screen.queryByRole('complementary')).toBeNull();
    rerender(<EmbargoBand embargo={{ isRunning: true, at, zone: 'Etc/UTC' }} isOnList={false} />);
    expect(screen.getByRole('complementary', { name: 'Embargo' }).textContent).toContain('you cannot copy');
  });
});
