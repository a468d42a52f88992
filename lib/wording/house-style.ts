import type { NotRandom } from '@/lib/domain/house-style';
import type { Language } from '@/lib/domain/vocabulary';
import type { Verdict } from '@/lib/findings/check-types';
import type { LanguagePack } from './language-pack';
import { DE } from './messages/de';
import { EN } from './messages/en';
import { ES } from './messages/es';
import { FR } from './messages/fr';

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
  /** The rule named instead, per kind of sample that the desk computes as if random; empty for the one above. */
  comparisonRules: Record<NotRandom, string>;
  /** 47%, 47 percent, 47 per cent. */
  percent: 'sign' | 'word' | 'per-cent';
  /** Whole points in running text: always figures, or words up to nine. Shares are always figures. */
  numbers: 'figures' | 'words-to-nine';
  /** Rounding of margins and ranges in text; finer where it would move one across what it is compared with. */
  margins: 'whole' | 'half' | 'tenth';
  locales: Record<Language, string>;
  /** Per verdict, the verbs its sentences stand on, strongest first; every draft uses one of its own rung. */
  ladder: Record<Verdict, string[]>;
  messages: Record<Language, LanguagePack>;
  /** Phrases that no line of this desk uses, per language. */
  banned: Record<Language, string[]>;
  /** What this desk says, and what it is said instead of, per language. */
  preferred: Record<Language, { say: string; insteadOf: string }[]>;
  /** The house reading "more than twice the margin" beside the verdict, which it never exceeds. */
  twiceTheMargin: boolean;
  /** Headlines that rest on one poll. */
  onePollHeadlines: 'allow' | 'warn' | 'refuse';
  /** One editor alone may release an unedited sheet of printed figures at night. */
  asPrintedNight: boolean;
  /** Days after its field dates from which a cleared sheet is no longer current; null for never. */
  shelfLifeDays: number | null;
};

/**
 * The style a desk starts with. Percent sign for shares, "percentage points" for differences, margins to half a
 * point: editions of the AP Stylebook's polls chapter as quoted publicly, from memory. The ladder itself: AP and
 * NCPP advice (a weaker verb between one and two margins), from memory, put on a test of the lead.
 */
export const DEFAULT_HOUSE_STYLE: HouseStyle = {
  templateVersion: '1.2.0',
  newsroom: 'our desk',
  comparisonRule: 'a rule of this newsroom',
  comparisonRules: { quota: '', 'opt-in': '', blended: '', unknown: '' },
  percent: 'sign',
  numbers: 'figures',
  margins: 'half',
  locales: { en: 'en-GB', es: 'es-ES', fr: 'fr-FR', de: 'de-DE' },
  ladder: {
    holds: ['leads', 'more say', 'up', 'down', 'has moved', 'above', 'below'],
    fragile: [
      'is ahead',
      'ahead of',
      'has the higher figure',
      'higher',
      'lower',
      'further towards',
      'above',
      'below',
    ],
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
  messages: { en: EN, es: ES, fr: FR, de: DE },
  banned: { en: [], es: [], fr: [], de: [] },
  preferred: { en: [], es: [], fr: [], de: [] },
  twiceTheMargin: false,
  onePollHeadlines: 'allow',
  asPrintedNight: false,
  shelfLifeDays: null,
};
