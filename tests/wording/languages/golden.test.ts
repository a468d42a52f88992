import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { LINE_KINDS, type LineKind } from '@/lib/domain/sheet';
import { carries } from '@/lib/wording/carries';
import type { DraftInput } from '@/lib/wording/draft-input';
import { draftLine } from '@/lib/wording/draft-sheet';
import { GOLDEN_CASES } from '../golden-cases';
import { JUDGED_CASES } from '../judged-cases';
import { OTHERS } from './messages';

const CASES = Object.entries({ ...GOLDEN_CASES, ...JUDGED_CASES });
/** Cases of which every line is kept; of the others, the lines that carry the claim. */
const WHOLE = [
  'lead-holds',
  'lead-fragile-together',
  'lead-fragile-modelled',
  'lead-untested-not-stated-how',
  'change-not-shown',
  'change-across-years',
  'lead-change-fragile',
  'threshold-hurdle-not-shown',
  'net-score-change-same-people',
  'gap-against-the-rest',
  'change-overlap-holds',
];
const CLAIMING: readonly LineKind[] = ['headline', 'body', 'chart-title', 'change-sentence'];

function readable(name: string, input: DraftInput): string {
  const kinds = WHOLE.includes(name) ? LINE_KINDS : CLAIMING;
  const lines = kinds
    .filter((kind) => kind !== 'correction-notice' && carries(kind, input.claim.kind))
    .map((kind) => `${kind}: ${draftLine(input, kind)}\n`);
  return `# ${name} (${input.finding.verdict})\n${lines.join('')}`;
}

/** Read here, and by no native editor of a desk yet; changed by hand or not at all. */
describe.each(OTHERS)('the sheets of %s', (language) => {
  const kept = readFileSync(new URL(`./golden/${language}.txt`, import.meta.url), 'utf8');
  const parts = new Map(kept.split(/^(?=# )/m).map((part) => [/^# (\S+)/.exec(part)?.[1] ?? '', part]));

  it.each(CASES)('read as they were read: %s', { timeout: 20_000 }, (name, input) => {
    expect(readable(name, { ...input, language })).toBe(parts.get(name));
  });

  it('are of every case', () => {
    expect([...parts.keys()]).toEqual(CASES.map(([name]) => name));
  });
});
