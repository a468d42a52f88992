import { expect } from 'vitest';

/** A figure of R must be met to this part of itself, or to this much where it is near 0 (see statistics in lib). */
const RELATIVE = 1e-9;
const ABSOLUTE = 1e-12;

/** Whether a number agrees with a reference figure to the accuracy asked of the engine. */
export function agrees(actual: number, reference: number): boolean {
  return Math.abs(actual - reference) <= Math.max(RELATIVE * Math.abs(reference), ABSOLUTE);
}

/** Fails unless the number agrees; p-values are compared by part alone, however small. */
export function expectFigure(actual: number, reference: number, what: string): void {
  expect(agrees(actual, reference), `${what}: ${actual} instead of ${reference}`).toBe(true);
}

export function expectP(actual: number, reference: number, what: string): void {
  const isClose =
    Math.abs(actual - reference) <= RELATIVE * reference || (actual < 1e-300 && reference < 1e-300);
  expect(isClose, `${what}: ${actual} instead of ${reference}`).toBe(true);
}

export function expectInterval(
  actual: readonly [number, number],
  reference: readonly number[],
  what: string,
): void {
  expect(reference).toHaveLength(2);
  expectFigure(actual[0], reference[0] ?? Number.NaN, `${what}, low`);
  expectFigure(actual[1], reference[1] ?? Number.NaN, `${what}, high`);
}
