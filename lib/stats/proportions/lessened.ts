/** A continuity correction: the value, brought nearer to 0 by an allowance but never past it. */
export function lessened(value: number, allowance: number): number {
  const rest = Math.abs(value) - allowance;
  return rest > 0 ? Math.sign(value) * rest : 0;
}
