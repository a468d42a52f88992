/** How often something happened, with the standard error of having drawn only so often. */
export type Rate = { rate: number; error: number; draws: number };

export function rateOf(hits: number, draws: number): Rate {
  const rate = hits / draws;
  return { rate, error: Math.sqrt((rate * (1 - rate)) / draws), draws };
}

/** Percent with its Monte Carlo error: `4.92 ± 0.07`. */
export function printRate({ rate, error }: Rate): string {
  return `${(100 * rate).toFixed(2)} ± ${(100 * error).toFixed(2)}`;
}

/** The most that chance may add to a rate that is truly `nominal`: four standard errors. */
export function allowance(nominal: number, draws: number): number {
  return 4 * Math.sqrt((nominal * (1 - nominal)) / draws);
}
