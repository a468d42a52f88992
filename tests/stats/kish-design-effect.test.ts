import { describe, expect, test } from 'vitest';
import { kishDesignEffect } from '@/lib/stats';

describe('kishDesignEffect', () => {
  test('is 1 for equal weights and does not depend on scale or order', () => {
    expect(kishDesignEffect([3, 3, 3])).toBe(1);
    expect(kishDesignEffect([1, 2, 4])).toBeCloseTo(kishDesignEffect([40, 10, 20]), 14);
    expect(kishDesignEffect([7])).toBe(1);
  });
});
