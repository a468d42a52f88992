import { criticalValue, leadStandardError } from '@/lib/stats';
import { drawPoll } from './draws';
import { leadPrinter, TWO_OPTIONS, type Knowledge } from './printed-lead';
import { rateOf, type Rate } from './rate';
import { seeded } from './random';

export type VerdictCase = {
  n: number;
  /** True lead, proportion. */
  lead: number;
  /** True design effect of the draw. */
  deff: number;
  /** Whether the document gives the true design effect or leaves it to the desk's policy. */
  knowledge: Knowledge;
};

export type VerdictRates = VerdictCase & {
  holds: Rate;
  fragile: Rate;
  /** `holds` for the option that is truly behind; at a true lead of 0 for either. */
  holdsWrongly: Rate;
  /** The z test of the lead at the printed whole percents with the chosen design effect. */
  plainPrinted: Rate;
  /** The same test at the unrounded shares. */
  plainUnrounded: Rate;
};

/** How often a lead gets each verdict at printed whole percents. */
export function verdictRates(asked: VerdictCase, draws: number, seed: number): VerdictRates {
  const random = seeded(seed);
  const leadOf = leadPrinter(asked);
  const critical = criticalValue(0.05, null);
  const first = (TWO_OPTIONS + asked.lead) / 2;
  const population = { shares: [first, first - asked.lead], deff: asked.deff };
  const hits = { holds: 0, fragile: 0, holdsWrongly: 0, plainPrinted: 0, plainUnrounded: 0 };
  for (let draw = 0; draw < draws; draw += 1) {
    const [a = 0, b = 0] = drawPoll(random, asked.n, population);
    const { printed, deff } = leadOf(a, b);
    if (printed.verdict === 'holds') {
      hits.holds += 1;
      if (asked.lead === 0 || printed.estimatePp < 0) hits.holdsWrongly += 1;
    }
    if (printed.verdict === 'fragile') hits.fragile += 1;
    if (printed.p < printed.alpha) hits.plainPrinted += 1;
    const standardError = leadStandardError(a / asked.n, b / asked.n, asked.n, deff);
    if (Math.abs(a - b) / asked.n > critical * standardError) hits.plainUnrounded += 1;
  }
  return {
    ...asked,
    holds: rateOf(hits.holds, draws),
    fragile: rateOf(hits.fragile, draws),
    holdsWrongly: rateOf(hits.holdsWrongly, draws),
    plainPrinted: rateOf(hits.plainPrinted, draws),
    plainUnrounded: rateOf(hits.plainUnrounded, draws),
  };
}
