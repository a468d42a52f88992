import { afterEach, beforeEach, expect, vi } from 'vitest';

let errors: unknown[][] = [];

beforeEach(() => {
  errors = [];
  for (const level of ['error', 'warn'] as const) {
    vi.spyOn(console, level).mockImplementation((...args: unknown[]) => {
      errors.push(args);
    });
  }
});

afterEach(() => {
  vi.restoreAllMocks();
  expect(errors, 'a test printed to console.error or console.warn').toEqual([]);
});
