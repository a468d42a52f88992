import betainc from '@stdlib/math-base-special-betainc';
import betaLogpdf from '@stdlib/stats-base-dists-beta-logpdf';
import { integrateLine } from '../integrate-line';

/** Dirichlet of the first option, the second, and all others together (0 where there are none). */
export type LeadDirichlet = { first: number; second: number; rest: number };

const FAR = 8;
const WIDEST_STEP = 1;
const STEP_IN_SD = 0.95;

/**
 * For any lead, −1 to 1, the probability that the first share exceeds the second by more than it.
 *
 * The two together are S ~ Beta(first + second, rest), and the first one's part of them is Beta(first, second)
 * whatever S is. So the lead exceeds m where that part exceeds (1 + m/S)/2, integrated over S.
 */
export function leadUpperTail(dirichlet: LeadDirichlet): (lead: number) => number {
  const { first, second, rest } = dirichlet;
  const mirrored = { first: second, second: first, rest };
  const all = rest === 0 ? 1 : overTogether(0, dirichlet, () => 1);
  return (lead) => (lead < 0 ? 1 - tailAbove(-lead, mirrored, all) : tailAbove(lead, dirichlet, all));
}

function tailAbove(lead: number, dirichlet: LeadDirichlet, all: number): number {
  if (lead >= 1) return 0;
  const { first, second, rest } = dirichlet;
  if (rest === 0 || lead === 0) return betainc((1 - lead) / 2, second, first);
  const inside = (s: number, above: number) => betainc(above / (2 * s), second, first);
  return Math.min(1, overTogether(lead, dirichlet, inside) / all);
}

/**
 * Integral over S above the lead. In u = log((S − lead)/(1 − S)) the density dies out exponentially at both ends,
 * however few the counts. Dividing by the same integral of the density alone takes out the library's constant.
 */
function overTogether(
  lead: number,
  dirichlet: LeadDirichlet,
  inside: (s: number, above: number) => number,
): number {
  const together = dirichlet.first + dirichlet.second;
  const term = (u: number) => {
    const growth = Math.exp(-Math.abs(u));
    const [up, down] = u > 0 ? [1, growth] : [growth, 1];
    const above = ((1 - lead) * up) / (up + down);
    const below = ((1 - lead) * down) / (up + down);
    const s = lead + above;
    const density = Math.exp(betaLogpdf(s, together, dirichlet.rest));
    return density > 0 ? (density * inside(s, above) * above * below) / (1 - lead) : 0;
  };
  const sd =
    Math.sqrt((together * dirichlet.rest) / (together + dirichlet.rest + 1)) / (together + dirichlet.rest);
  const s0 = startOf(lead, sd, dirichlet);
  const slope = 1 / (s0 - lead) + 1 / (1 - s0);
  return integrateLine(
    term,
    Math.log((s0 - lead) / (1 - s0)),
    Math.min(WIDEST_STEP, STEP_IN_SD * sd * slope),
  );
}

/** Where S is likely and the lead is not out of reach: its mean, or higher where only higher S allow the lead. */
function startOf(lead: number, sd: number, { first, second, rest }: LeadDirichlet): number {
  const together = first + second;
  const middle = together / (together + rest);
  const surplus = (first - second) / together;
  const enough = surplus > 0 && lead > 0 ? lead / surplus : middle;
  const wanted = Math.min(Math.max(middle, enough), middle + FAR * sd);
  const lowest = lead + Math.min(sd, (1 - lead) / 2);
  return Math.min(Math.max(wanted, lowest), (1 + Math.max(middle, lead)) / 2);
}
