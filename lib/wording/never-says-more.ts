import type { Language } from '@/lib/domain/vocabulary';
import type { Verdict } from '@/lib/findings/check-types';
import { type Barred, phrasesAbove } from './ladder';
import { DE_BARRED } from './messages/de-ladder';
import { ES_BARRED } from './messages/es-ladder';
import { FR_BARRED } from './messages/fr-ladder';

/**
 * Phrases that no sentence about a poll should use, whatever the verdict. Ties and dead heats: AP Stylebook polls
 * chapter and NCPP as quoted publicly, from memory. "Shows", "proves": BBC Editorial Guidelines, section 10, from
 * memory. The rest: common practice, no source.
 */
const NEVER = [
  /\b(?:statistical(?:ly)? )?(?:tied?|dead heat)\b/gi,
  /\bneck and neck\b/gi,
  /\btoo close to call\b/gi,
  /\b(?:surg|slump|soar|plung|plummet)(?:e|es|ed|ing|s)?\b/gi,
  /\bmomentum\b/gi,
  /\blandslide\b/gi,
  /\b(?:polls?|surveys?|figures|numbers) (?:shows?|proves?)\b/gi,
  /\b(?:no change|unchanged)\b/gi,
  /\bpercent (?:lead|gap|rise|fall)\b/gi,
];

/** What takes a finding that holds: verbs of leading, a majority, a direction. Common practice, no source. */
const NEEDS_HOLDS = [
  /\b(?:leads|leading|in the lead|front-?runner)\b/gi,
  /\b(?:well|clearly|comfortably|firmly) ahead\b/gi,
  /\bmajority\b/gi,
  /\bmore say\b/gi,
  /\b(?<!\b(?:made|make|makes|making|break|breaks) )up\b(?! to\b)/gi,
  /\bdown\b/gi,
  /\b(?:has|have) (?:risen|fallen|moved|grown|shrunk|gained|lost)\b/gi,
  /\b(?:rises|rose|falls|fell|gains|climbs|climbed|drops|dropped|jumps|jumped)\b/gi,
  /\bthe (?:rise|fall|move)\b/gi,
];

/** What takes at least a fragile one: being ahead, being on one side of a threshold. Common practice, no source. */
const NEEDS_FRAGILE = [
  /\bahead\b/gi,
  /\b(?:above|below|over|under) (?:half|the \S+ threshold)\b/gi,
  /\bmore than half\b/gi,
  /\bless than half\b/gi,
];

/** Significance is for what was found significant. AP Stylebook polls chapter as quoted publicly, from memory. */
const NEEDS_A_TEST_PASSED = [/\bsignificant(?:ly)?\b/gi];

const BARRED: Record<Verdict, readonly RegExp[]> = {
  holds: NEVER,
  fragile: [...NEVER, ...NEEDS_HOLDS],
  'does-not-hold': [...NEVER, ...NEEDS_HOLDS, ...NEEDS_FRAGILE, ...NEEDS_A_TEST_PASSED],
  'cannot-be-tested': [...NEVER, ...NEEDS_HOLDS, ...NEEDS_FRAGILE, ...NEEDS_A_TEST_PASSED],
};

const LISTED: Partial<Record<Language, Barred>> = { es: ES_BARRED, fr: FR_BARRED, de: DE_BARRED };

/**
 * The phrases of a text that say more than its verdict, as they stand in the text.
 *
 * A caution for whoever files, never a proof that a text is sound: it knows a short list of phrases per language,
 * does not read negations ("cannot say who leads" is listed) and does not see names. An empty list means only that
 * none of these phrases is there.
 *
 * @param verdict the verdict of the finding that the text is about
 * @param text any text of a line
 * @param language the language of the text
 * @returns each phrase once, in order of appearance
 * @example
 * claimsAbove('fragile', 'Alder leads Brook'); // => ['leads']
 * claimsAbove('holds', 'Alder leads Brook'); // => []
 */
export function claimsAbove(verdict: Verdict, text: string, language: Language = 'en'): string[] {
  const listed = LISTED[language];
  if (listed) return phrasesAbove(listed, verdict, text);
  const found = BARRED[verdict].flatMap((pattern) =>
    [...text.matchAll(pattern)].map((match) => ({ at: match.index, phrase: match[0] })),
  );
  return [...new Set(found.sort((a, b) => a.at - b.at).map(({ phrase }) => phrase))];
}
