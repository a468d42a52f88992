import type { Language } from '@/lib/domain/vocabulary';
import type { Verdict } from '@/lib/findings/check-types';
import type { LanguagePack } from './language-pack';
import { EN } from './messages/en';

/**
 * What a desk decides about its words. Plain JSON: it is hashed into evidence and kept version by version, so a
 * sheet can always be drafted again as it was.
 */
export type HouseStyle = {
  templateVersion: string;
  /** How the desk calls itself in the middle of a sentence. */
  newsroom: string;
  /** The legal or house rule under which a comparison basis is printed; it is named beside the margin. */
  comparisonRule: string;
  percent: 'sign' | 'word';
  /** Whole points in running text: always figures, or words up to nine. Shares are always figures. */
  numbers: 'figures' | 'words-to-nine';
  /** Rounding of margins and ranges in text; finer where it would move one across what it is compared with. */
  margins: 'whole' | 'half' | 'tenth';
  locales: Record<Language, string>;
  /** Per verdict, the verbs its sentences stand on, strongest first; every draft uses one of its own rung. */
  ladder: Record<Verdict, string[]>;
  messages: Record<Language, LanguagePack>;
};

/**
 * The style a desk starts with. Percent sign for shares, "percentage points" for differences, margins to half a
 * point: editions of the AP Stylebook's polls chapter as quoted publicly, from memory. The ladder itself: AP and
 * NCPP advice (a weaker verb between one and two margins), from memory, put on a test of the lead.
 */
export const DEFAULT_HOUSE_STYLE: HouseStyle = {
  templateVersion: '1.0.0',
  newsroom: 'our desk',
  comparisonRule: 'a rule of this newsroom',
  percent: 'sign',
  numbers: 'figures',
  margins: 'half',
  locales: { en: 'en-GB' },
  ladder: {
    holds: ['leads', 'more say', 'up', 'down', 'has moved', 'above', 'below'],
    fragile: ['is ahead', 'has the higher figure', 'higher', 'lower', 'further towards', 'above', 'below'],
    'does-not-hold': ['level', 'same figure', 'could', 'too near', 'little changed', 'exactly at'],
    'cannot-be-tested': [
      'no recognised margin',
      'cannot be',
      'not comparable',
      'not disclosed',
      'does not',
      'too few',
      'leave',
    ],
  },
  messages: { en: EN },
};
