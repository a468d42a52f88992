import type { WorkingStep } from '@/lib/findings/working-step';

/** Figures are written with six digits, so what is computed from them agrees to about five. */
const WRITTEN = 5e-5;
const ARITHMETIC = /^(max\()?[\d\s.,e+·−/()²√±]+$/;
const PLAIN = /^[\d\s.e+·−/()]+$/;
const COMPARISON = /^([^<>≥]+)([<>≥])([^<>≥]+)$/;

function compute(written: string): number {
  const code = written
    .replaceAll('max(', 'Math.max(')
    .replaceAll('√(', 'Math.sqrt(')
    .replaceAll('·', '*')
    .replaceAll('−', '-')
    .replaceAll('²', '**2');
  return Number(new Function(`return ${code};`)());
}

const numberIn = (text: string) => Number(text.replaceAll('−', '-'));

function isClose(actual: number, expected: number, scale = Math.abs(expected)): boolean {
  return Math.abs(actual - expected) <= WRITTEN * Math.max(scale, Math.abs(expected)) + 1e-9;
}

/** What the step says, computed again from its own numbers; null where it is not plain arithmetic. */
export function recomputed(step: WorkingStep): { agrees: boolean } | null {
  const { substituted, result } = step;
  if (ARITHMETIC.test(substituted) && substituted.includes('±')) {
    const ends = result.split(' to ').map(numberIn);
    const again = ['−', '+'].map((sign) => compute(substituted.replaceAll('±', sign)));
    const scale = Math.max(...ends.map(Math.abs));
    return { agrees: ends.every((end, index) => isClose(again[index] ?? Number.NaN, end, scale)) };
  }
  if (ARITHMETIC.test(substituted) && /[·−+/²√]/.test(substituted) && Number.isFinite(numberIn(result))) {
    const terms = [...substituted.matchAll(/\d[\d.]*/g)].map(([term]) => Number(term));
    const scale = /[√·/]/.test(substituted) ? undefined : Math.max(...terms);
    return { agrees: isClose(compute(substituted), numberIn(result), scale) };
  }
  const [, left, sign, right] = COMPARISON.exec(substituted) ?? [];
  if (left && right && [left, right].every((side) => PLAIN.test(side)) && step.label !== 'Significant') {
    const [a, b] = [compute(left), compute(right)];
    if (isClose(a, b)) return null;
    return { agrees: (sign === '<' ? a < b : a > b) === (result === 'yes') };
  }
  return null;
}
