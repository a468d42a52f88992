import { isPositive, isProportion, required } from '../require';

/** What one respondent of each poll adds to the variance of the change: level, and as the shares are. */
export type UnitErrors = { level: number; actual: number };

/** Square roots, so that both divided by √nEff are standard errors. */
export function unitErrorsOfChange(p1: number, p2: number): UnitErrors {
  const mean = (p1 + p2) / 2;
  return {
    level: Math.sqrt(2 * mean * (1 - mean)),
    actual: Math.sqrt(p1 * (1 - p1) + p2 * (1 - p2)),
  };
}

export function unitErrorsOfLead(first: number, second: number): UnitErrors {
  const together = first + second;
  return {
    level: Math.sqrt(together),
    actual: Math.sqrt(Math.max(0, together - (first - second) ** 2)),
  };
}

const ROUNDING = 1e-9;

export function requireTwoPolls(p1: number, p2: number, fn: string): void {
  required(
    isProportion(p1) && isProportion(p2) && unitErrorsOfChange(p1, p2).actual > 0,
    fn,
    'p1 and p2 from 0 to 1, not both 0 or 1',
  );
}

export function requireLead(first: number, second: number, fn: string): void {
  required(
    isProportion(first) &&
      isProportion(second) &&
      first + second <= 1 + ROUNDING &&
      unitErrorsOfLead(first, second).actual > 0,
    fn,
    'shares from 0 to 1 that leave some variance and sum to at most 1',
  );
}

export function requireSample(n: number, deff: number, fn: string): void {
  required(isPositive(n) && isPositive(deff), fn, 'n and deff above 0');
}

export function requireDesignEffect(deff: number, fn: string): void {
  required(isPositive(deff), fn, 'deff above 0');
}
