import { check } from '@/lib/findings/check';
import type { CheckDocument } from '@/lib/findings/check-types';

/** Together the two options have this much; the rest is one more answer. */
export const TWO_OPTIONS = 0.93;

/** Whether the document gives the true design effect or leaves it to the desk's policy. */
export type Knowledge = 'known' | 'assumed';

export type Sample = { n: number; deff: number; knowledge: Knowledge };

/** The lead of a release that prints whole percents, from the counts of its two options. */
export function printedLead({ n, deff, knowledge }: Sample, a: number, b: number) {
  const document: CheckDocument = {
    release: {
      sampleSource: 'probability',
      n,
      design: 'weighted',
      deff: knowledge === 'known' ? { source: 'design', value: deff } : null,
      decimals: 0,
      shares: [
        { option: 'First', pct: Math.round((100 * a) / n) },
        { option: 'Second', pct: Math.round((100 * b) / n) },
      ],
    },
    pairs: [['First', 'Second']],
  };
  const answer = check(document);
  const printed = answer.findings.find((finding) => finding.kind === 'lead');
  if (!printed || !('alpha' in printed) || answer.base.deff === null) {
    throw new TypeError('printedLead requires a poll whose lead can be tested');
  }
  return { printed, deff: answer.base.deff };
}
