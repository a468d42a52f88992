import type { LineKind } from '@/lib/domain/sheet';

/** What a reader is told of how a poll was made. */
export type Particular =
  | 'pollster'
  | 'sponsor'
  | 'population'
  | 'sample-size'
  | 'mode'
  | 'field-dates'
  | 'sample-type'
  /** Of the quantity in the line, or why there is none. */
  | 'margin'
  | 'stated-margin'
  | 'confidence-level'
  | 'not-disclosed'
  | 'other-error';

/**
 * What each length of the caveat owes; what is not known is named as missing in the first two. A shorter one leaves
 * the rest to the longer ones that stand on the same sheet. Minimum contents: common practice, no source.
 */
export const CAVEAT_PARTICULARS: Record<
  Extract<LineKind, 'caveat' | 'caveat-short' | 'caveat-one-breath'>,
  readonly Particular[]
> = {
  caveat: [
    'pollster',
    'sponsor',
    'population',
    'sample-size',
    'mode',
    'field-dates',
    'sample-type',
    'margin',
    'stated-margin',
    'confidence-level',
    'not-disclosed',
    'other-error',
  ],
  'caveat-short': [
    'pollster',
    'sponsor',
    'population',
    'sample-size',
    'mode',
    'field-dates',
    'margin',
    'stated-margin',
    'confidence-level',
    'not-disclosed',
  ],
  'caveat-one-breath': ['pollster', 'population', 'sample-size', 'field-dates', 'margin'],
};
