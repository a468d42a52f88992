import { type NotRandom, NOT_RANDOM } from '@/lib/domain/house-style';
import { SAMPLE_SOURCE_NAMES } from '@/lib/domain/vocabulary';
import type { Verdict } from '@/lib/findings/check-types';

export const VERDICT_NAMES: Record<Verdict, string> = {
  holds: 'Holds',
  fragile: 'Fragile',
  'does-not-hold': 'Not shown',
  'cannot-be-tested': 'Cannot be tested',
};

export const LANGUAGE_NAMES: Record<string, string> = {
  en: 'English',
  es: 'Spanish',
  fr: 'French',
  de: 'German',
};

export const PART_NAMES: Record<string, string> = {
  headline: 'Headline claim',
  body: 'Body sentence',
  chartTitle: 'Chart title',
  told: 'Sentence for any line',
  range: 'Range',
  detectable: 'What would have been found',
  fragile: 'What a fragile finding depends on',
  fragileShort: 'What it depends on, short',
  untested: 'Why it cannot be tested',
  context: 'What is compared',
  caveat: 'Caveat',
  caveatShort: 'Caveat, short',
  oneBreath: 'Caveat in one breath',
  methodNote: 'Method note',
  comparison: 'Comparison',
  altText: 'Alt text',
  spoken: 'Spoken line',
  newsletter: 'Newsletter line',
  correction: 'Correction notice',
  terms: 'Words',
};

export const CLAIM_NAMES: Record<string, string> = {
  lead: 'Lead',
  change: 'Change of one share',
  'lead-change': 'Change of a lead',
  threshold: 'Threshold',
  'net-score': 'Net score',
  'net-score-change': 'Change of a net score',
  gap: 'Gap between groups',
};

const STATE_NAMES: Record<string, string> = {
  'holds-twice': 'Holds at twice the error',
  holds: 'Holds',
  fragile: 'Fragile',
  level: 'Not shown: equal figures',
  'not-shown': 'Not shown',
  family: 'Not shown: one of several',
  'little-changed': 'Little changed',
  untested: 'Cannot be tested',
};

const SETTINGS: Record<string, string> = {
  'style.templateVersion': 'Wording of the product',
  'style.newsroom': 'Name of the newsroom',
  'style.comparisonRule': 'Rule named where computed as if random',
  'style.percent': 'Percent',
  'style.numbers': 'Whole points in text',
  'style.margins': 'Margins are rounded to',
  'style.twiceTheMargin': 'Reading “twice the margin” beside ours',
  'style.onePollHeadlines': 'Headlines resting on one poll',
  'style.asPrintedNight': 'As-printed sheets at night, by one editor',
  'style.shelfLifeDays': 'A sheet is current for',
  'policy.level': 'Confidence level',
  'policy.assumed.weighted.value': 'Assumed design effect, weighted',
  'policy.assumed.weighted.range': 'Its range, weighted',
  'policy.assumed.clustered.value': 'Assumed design effect, clustered',
  'policy.assumed.clustered.range': 'Its range, clustered',
  'policy.assumed.unweighted.value': 'Assumed design effect, unweighted',
  'policy.assumed.unweighted.range': 'Its range, unweighted',
  'policy.kishRange': 'Range around a design effect from weights alone',
  'policy.indifferencePp': 'Margin of indifference, points',
  'policy.minimumNEff': 'Smallest effective sample that is tested',
};

export const CHOICES: Record<string, Record<string, string>> = {
  'style.percent': { sign: 'Sign (47%)', word: 'Word (47 percent)', 'per-cent': 'Two words (47 per cent)' },
  'style.numbers': { figures: 'Figures', 'words-to-nine': 'Words up to nine' },
  'style.margins': { whole: 'Whole points', half: 'Half points', tenth: 'Tenths of a point' },
  'style.onePollHeadlines': { allow: 'Allow', warn: 'Warn', refuse: 'Refuse' },
};

/** What a decision is called on screens. */
export function decisionName(path: string): string {
  const setting = SETTINGS[path];
  if (setting) return setting;
  const [root = '', group = '', ...rest] = path.split('.');
  if (group === 'locales') return `Country of ${LANGUAGE_NAMES[rest[0] ?? ''] ?? rest[0]}`;
  if (group === 'banned') return `Banned phrases, ${LANGUAGE_NAMES[rest[0] ?? ''] ?? rest[0]}`;
  if (group === 'preferred') return `Preferred phrases, ${LANGUAGE_NAMES[rest[0] ?? ''] ?? rest[0]}`;
  if (group === 'ladder') return `Verbs of ${VERDICT_NAMES[rest[0] as Verdict] ?? rest[0]}`;
  if (group === 'comparisonBasis') return `Computed as if random: ${sampleName(rest[0])}`;
  if (group === 'comparisonRules') return `Rule named for: ${sampleName(rest[0])}`;
  if (root === 'style' && group === 'messages') return sentenceName(rest);
  return [group, ...rest].join(' ');
}

export function sampleName(kind: string | undefined): string {
  const known: NotRandom | undefined = NOT_RANDOM.find((one) => one === kind);
  return known ? SAMPLE_SOURCE_NAMES[known] : (kind ?? '');
}

function sentenceName([language = '', part = '', one = '', two]: string[]): string {
  const of = two === undefined ? readable(one) : `${CLAIM_NAMES[one] ?? readable(one)}, ${stateName(two)}`;
  const head = `${LANGUAGE_NAMES[language] ?? language}: ${PART_NAMES[part] ?? readable(part)}`;
  return of ? `${head} · ${of}` : head;
}

/** The last step of a sentence's path: a state of a claim, or what the sentence is about. */
export function stateName(key: string): string {
  return STATE_NAMES[key] ?? readable(key);
}

function readable(key: string): string {
  const words = (CLAIM_NAMES[key] ?? key).replace(/([a-z])([A-Z])/g, '$1 $2').replace(/-/g, ' ');
  return words.charAt(0).toUpperCase() + words.slice(1).toLowerCase();
}

/** A decided value as it is read. */
export function valueWords(path: string, value: unknown): string {
  if (value === undefined) return '—';
  if (path === 'style.shelfLifeDays') return value === null ? 'no set time' : `${Number(value)} days`;
  if (path === 'policy.level') return `${Number((Number(value) * 100).toFixed(2))}%`;
  if (typeof value === 'boolean') return value ? 'Yes' : 'No';
  if (value === null || value === '') return '—';
  if (Array.isArray(value)) {
    if (value.length === 0) return 'none';
    const isRange = path.startsWith('policy.');
    return value.map(itemWords).join(isRange ? ' to ' : '; ');
  }
  const text = String(value as string | number);
  return CHOICES[path]?.[text] ?? text;
}

function itemWords(item: unknown): string {
  if (typeof item !== 'object' || item === null) return String(item as string | number);
  const { say, insteadOf } = item as { say?: string; insteadOf?: string };
  return `“${say ?? ''}” instead of “${insteadOf ?? ''}”`;
}
