import type { BaseAnswer, BaseNote, DeffSource } from '@/lib/findings/check-types';
import { formatCount, formatPoints, formatTrimmed } from '@/lib/format/number';

const LOCALE = 'en-GB';

const NOTES: Record<BaseNote, string> = {
  'shares-exceed-100':
    'The printed shares sum to more than 100: within what rounding does, or an answer was entered twice.',
  'stated-margin-like-unweighted':
    'The stated margin cannot be told from one that ignores weighting, so it is not used.',
  'deff-assumed':
    'The design effect is assumed: neither the design, the weights nor a usable margin is stated. Ask the pollster.',
  'deff-below-one':
    'The design effect is below 1: the sample would be worth more than a random one of its size. Check where it was read.',
  'deff-above-four':
    'The design effect is above 4: the sample would be worth less than a quarter of its size. Check where it was read.',
  'modelled-basis':
    'The sample is not random; findings rest on the interval that the pollster’s own model gives and can be no better than fragile.',
  'comparison-basis':
    'The sample is not random; margins are worked out as if it were, by a rule of this desk that print must name. Findings can be no better than fragile.',
};

/** A note of the engine about a base, as a sentence for staff. */
export function noteText(note: BaseNote): string {
  return NOTES[note];
}

const SOURCES: Record<DeffSource, string> = {
  design: 'from the design of the sample',
  kish: 'from the weights alone',
  stated: 'stated by the pollster',
  implied: 'implied by the stated interval',
  assumed: 'assumed by the desk’s policy',
};

/** Where a design effect comes from, as staff read it beside the number. */
export function deffSourceText(source: DeffSource): string {
  return SOURCES[source];
}

/**
 * A base in one line for staff: design effect with source and range, what the sample is worth, its widest margin.
 *
 * @example baseSummary(answer.base) // 'Design effect 1.44, implied by the stated interval (1.4–1.48); worth …'
 */
export function baseSummary(base: BaseAnswer): string {
  const { deff, deffSource, deffRange, nEff, maximumMarginPp } = base;
  if (deff === null || !deffSource || !deffRange || nEff === null || maximumMarginPp === null) {
    return 'No margin: the sample is not random, or its size is not disclosed.';
  }
  const [low, high] = deffRange.map((end) => formatTrimmed(end, 2, LOCALE));
  const range = low === high ? '' : ` (${low}–${high})`;
  const worth = `worth ${formatCount(nEff, LOCALE)} interviews of a random sample`;
  const margin = `margin near 50% ±${formatPoints(maximumMarginPp, 1, LOCALE)}`;
  return `Design effect ${formatTrimmed(deff, 2, LOCALE)}, ${SOURCES[deffSource]}${range}; ${worth}; ${margin}.`;
}
