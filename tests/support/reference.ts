import { expect } from 'vitest';
import { kinds } from '../reference/tolerances';

/** Whether a number agrees with a reference figure to the accuracy asked of the engine. */
export function agrees(actual: number, reference: number): boolean {
  const { relative, absolute } = kinds.figure;
  return Math.abs(actual - reference) <= Math.max(relative * Math.abs(reference), absolute);
}

/** Fails unless the number agrees. */
export function expectFigure(actual: number, reference: number, what: string): void {
  expect(agrees(actual, reference), `${what}: ${actual} instead of ${reference}`).toBe(true);
}

/** Fails unless the p-value agrees by part of itself, however small. */
export function expectP(actual: number, reference: number, what: string): void {
  const { relative, vanishing } = kinds.pValue;
  const isClose =
    Math.abs(actual - reference) <= relative * reference || (actual < vanishing && reference < vanishing);
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
