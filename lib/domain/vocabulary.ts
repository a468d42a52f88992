/** The closed lists of the trade that a release is described with, and the words that screens show for them. */

export const POPULATIONS = ['adults', 'registered-voters', 'likely-voters'] as const;
export type Population = (typeof POPULATIONS)[number];
export const POPULATION_NAMES: Record<Population, string> = {
  adults: 'Adults',
  'registered-voters': 'Registered voters',
  'likely-voters': 'Likely voters',
};

export const SAMPLE_SOURCES = ['probability', 'quota', 'opt-in', 'blended', 'unknown'] as const;
export const SAMPLE_SOURCE_NAMES: Record<(typeof SAMPLE_SOURCES)[number], string> = {
  probability: 'Probability sample',
  quota: 'Quota sample',
  'opt-in': 'Opt-in panel',
  blended: 'Blended (random and opt-in)',
  unknown: 'Not stated',
};

export const MODES = [
  'live-telephone',
  'recorded-telephone',
  'face-to-face',
  'online',
  'post',
  'mixed',
] as const;
export type Mode = (typeof MODES)[number];
export const MODE_NAMES: Record<Mode, string> = {
  'live-telephone': 'Live telephone',
  'recorded-telephone': 'Recorded telephone',
  'face-to-face': 'Face to face',
  online: 'Online',
  post: 'Post',
  mixed: 'Mixed modes',
};

export const DESIGNS = ['weighted', 'unweighted', 'clustered', 'unknown'] as const;
export type StatedDesign = (typeof DESIGNS)[number];
export const DESIGN_NAMES: Record<StatedDesign, string> = {
  weighted: 'Weighted',
  unweighted: 'Unweighted',
  clustered: 'Clustered',
  unknown: 'Not known',
};

export const RACE_KINDS = ['candidate', 'party-list', 'referendum', 'approval', 'issue'] as const;
export type RaceKind = (typeof RACE_KINDS)[number];
export const RACE_KIND_NAMES: Record<RaceKind, string> = {
  candidate: 'Candidate race',
  'party-list': 'Party list',
  referendum: 'Referendum',
  approval: 'Approval series',
  issue: 'Issue series',
};
/** Races that end in a vote: only there may a caveat speak of the error of pre-election polls. */
export const ELECTION_KINDS: readonly RaceKind[] = ['candidate', 'party-list', 'referendum'];

export const THRESHOLD_BASES = ['votes-cast', 'valid-votes', 'registered-voters', 'answers'] as const;
export type ThresholdBase = (typeof THRESHOLD_BASES)[number];
export const THRESHOLD_BASE_NAMES: Record<ThresholdBase, string> = {
  'votes-cast': 'All votes cast',
  'valid-votes': 'Valid votes',
  'registered-voters': 'All registered voters',
  answers: 'Everyone asked',
};

export const DEFF_SOURCES = ['design', 'kish', 'stated'] as const;
export const DEFF_SOURCE_NAMES: Record<(typeof DEFF_SOURCES)[number], string> = {
  design: 'From the design',
  kish: 'From the weights',
  stated: 'Stated by the pollster',
};

export const LANGUAGES = ['en', 'es', 'fr', 'de'] as const;
export type Language = (typeof LANGUAGES)[number];
/** Each in itself, as those who read it look for it. */
export const LANGUAGE_NAMES: Record<Language, string> = {
  en: 'English',
  es: 'Español',
  fr: 'Français',
  de: 'Deutsch',
};
