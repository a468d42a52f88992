import { uncertaintyOf } from '@/lib/findings/bands';
import type { CheckDocument, Finding, TestableFinding } from '@/lib/findings/check-types';
import { printedDecimals } from '@/lib/findings/heading';
import { formatValue, untestedNote, type ChartWords } from './chart-words';
import type { SoundingSpec } from './sounding-spec';

/**
 * What the picture of one finding is made from.
 *
 * @param finding a finding of `check(document)`
 * @param document the check document it came from
 * @param words the language of the picture
 * @returns null where there is no figure to draw: the share is not disclosed
 */
export function soundingSpecOf(
  finding: Finding,
  document: CheckDocument,
  words: ChartWords,
): SoundingSpec | null {
  const estimate = finding.kind === 'share' ? finding.estimatePct : finding.estimatePp;
  if (estimate === null) return null;
  const uncertainty = uncertaintyOf(finding, document);
  const isUntested = finding.kind !== 'share' && finding.verdict === 'cannot-be-tested';
  return {
    quantity: finding.kind,
    verdict: finding.kind === 'share' ? null : finding.verdict,
    estimatePp: finding.kind === 'threshold' ? estimate + finding.thresholdPct : estimate,
    decimals: printedDecimals(finding, document),
    bands: (uncertainty?.bands ?? []).map(({ level, low, high }) => ({ level, lowPp: low, highPp: high })),
    far: uncertainty?.far ? { lowPp: uncertainty.far.low, highPp: uncertainty.far.high } : null,
    untestedNote: isUntested ? untestedNote(finding.reasons, words) : uncertainty ? null : words.noMargin,
    ...namesOf(finding, words),
    ...shoreOf(finding, estimate, words),
  };
}

function namesOf(finding: Finding, words: ChartWords): Pick<SoundingSpec, 'label' | 'name'> {
  switch (finding.kind) {
    case 'share':
      return { label: finding.option, name: finding.option };
    case 'threshold':
      return {
        label: words.thresholdLabel(finding.option, thresholdText(finding.thresholdPct, words)),
        name: finding.option,
      };
    case 'lead':
      return {
        label: words.leadLabel(...finding.pair),
        name: finding.estimatePp === 0 ? '' : finding.pair[0],
      };
    case 'change':
      return { label: words.changeLabel(finding.option), name: '' };
    case 'lead-change':
      return { label: words.leadChangeLabel(...finding.pair), name: '' };
  }
}

type Shore = Pick<SoundingSpec, 'shorePp' | 'land' | 'sides'>;

/** Land is the side where the claim fails; an estimate on the shore itself takes the left. */
function shoreOf(finding: Finding, estimate: number, words: ChartWords): Shore {
  if (finding.kind === 'share') return { shorePp: null, land: null, sides: null };
  return {
    shorePp: finding.kind === 'threshold' ? finding.thresholdPct : 0,
    land: estimate < 0 ? 'right' : 'left',
    sides: sidesOf(finding, words),
  };
}

function sidesOf(finding: TestableFinding, words: ChartWords): { left: string; right: string } {
  switch (finding.kind) {
    case 'lead':
      return { left: words.ahead(finding.pair[1]), right: words.ahead(finding.pair[0]) };
    case 'change':
      return { left: words.down, right: words.up };
    case 'lead-change':
      return { left: words.towards(finding.pair[1]), right: words.towards(finding.pair[0]) };
    case 'threshold': {
      const pct = thresholdText(finding.thresholdPct, words);
      return { left: words.below(pct), right: words.above(pct) };
    }
  }
}

function thresholdText(pct: number, words: ChartWords): string {
  const decimals = Math.min(6, (String(pct).split('.')[1] ?? '').length);
  return formatValue(pct, decimals, 'threshold', words);
}
