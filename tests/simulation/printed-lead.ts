import { check } from '@/lib/findings/check';
import type { CheckDocument, LeadFinding, TestFields } from '@/lib/findings/check-types';

/** Together the two options have this much; the rest is one more answer. */
export const TWO_OPTIONS = 0.93;
const OPTIONS = ['First', 'Second'] as const;

/** Whether the document gives the true design effect or leaves it to the desk's policy. */
export type Knowledge = 'known' | 'assumed';

export type Sample = { n: number; deff: number; knowledge: Knowledge };

type PrintedLead = { printed: LeadFinding & TestFields; deff: number };

/**
 * The lead of releases that print whole percents, from the counts of their two options; the judgement of each printed
 * pair is kept, since few pairs come up again and again.
 */
export function leadPrinter(sample: Sample): (a: number, b: number) => PrintedLead {
  const known = new Map<string, PrintedLead>();
  return (a, b) => {
    const pcts = [a, b].map((count) => Math.round((100 * count) / sample.n));
    const key = pcts.join(' ');
    const lead = known.get(key) ?? judge(sample, pcts);
    known.set(key, lead);
    return lead;
  };
}

function judge({ n, deff, knowledge }: Sample, pcts: readonly number[]): PrintedLead {
  const document: CheckDocument = {
    release: {
      sampleSource: 'probability',
      n,
      design: 'weighted',
      deff: knowledge === 'known' ? { source: 'design', value: deff } : null,
      decimals: 0,
      shares: pcts.map((pct, index) => ({ option: OPTIONS[index] ?? '', pct })),
    },
    pairs: [OPTIONS],
  };
  const answer = check(document);
  const printed = answer.findings.find((finding) => finding.kind === 'lead');
  if (!printed || !('alpha' in printed) || answer.base.deff === null) {
    throw new TypeError('leadPrinter requires a poll whose lead can be tested');
  }
  return { printed, deff: answer.base.deff };
}
