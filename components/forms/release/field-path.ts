import type { FieldErrors } from 'react-hook-form';
import type { FieldFault } from '../../ui/error-summary';

/** The id of the control of a field; `shares.2.printed` is `field-shares-2-printed`. */
export function fieldId(path: string): string {
  const whole = path.replace(/^(race\.race\.options)\.\d+$/, '$1');
  return `field-${(CONTROL_OF[whole] ?? whole).replaceAll('.', '-')}`;
}

/** Faults of a whole group are told at its first control. */
const CONTROL_OF: Record<string, string> = {
  shares: 'shares.0.option',
  race: 'race.id',
  sponsor: 'sponsor.value',
  population: 'population.value',
  mode: 'mode.value',
  n: 'n.value',
  deff: 'deff.value',
  statedMargin: 'statedMargin.pp',
  modelledInterval: 'modelledInterval.pp',
  wording: 'wording.value',
  sourceUrl: 'sourceUrl.value',
  embargo: 'embargo.local',
};

const LABELS: [RegExp, string][] = [
  [/^race\.race\.name/, 'Name of the race'],
  [/^race\.race\.options/, 'Options of the race'],
  [/^race\.race\.thresholds/, 'Threshold'],
  [/^race/, 'Race'],
  [/^pollster/, 'Pollster'],
  [/^sponsor/, 'Sponsor'],
  [/^population/, 'Population'],
  [/^sampleSource/, 'Sample source'],
  [/^mode/, 'Mode'],
  [/^design/, 'Design'],
  [/^fieldStartOn/, 'First day'],
  [/^fieldEndOn/, 'Last day'],
  [/^publishedOn/, 'Publication date'],
  [/^embargo\.zone/, 'Time zone of the embargo'],
  [/^embargo/, 'Embargo'],
  [/^n\b/, 'Sample size'],
  [/^deff/, 'Design effect'],
  [/^statedMargin/, 'Stated margin'],
  [/^modelledInterval/, 'Modelled interval'],
  [/^wording/, 'Question wording'],
  [/^shares/, 'Shares'],
  [/^sourceUrl/, 'Source link'],
  [/^methodNote/, 'Method note'],
];

/** Every fault of the form for the summary on top, in the order of the page. */
export function faultsOf(errors: FieldErrors): FieldFault[] {
  return leaves(errors, [])
    .map(({ path, message }) => ({ path, message, rank: rankOf(path) }))
    .sort((a, b) => a.rank - b.rank)
    .map(({ path, message, rank }) => {
      const label = labelOf(path, rank);
      return label ? { fieldId: fieldId(path), message: `${label}: ${message}` } : { message };
    });
}

function labelOf(path: string, rank: number): string | null {
  const label = LABELS[rank]?.[1] ?? null;
  const row = /^shares\.(\d+)/.exec(path)?.[1];
  return row === undefined ? label : `Row ${Number(row) + 1}`;
}

function rankOf(path: string): number {
  const at = LABELS.findIndex(([pattern]) => pattern.test(path));
  return at === -1 ? LABELS.length : at;
}

function leaves(errors: unknown, path: string[]): { path: string; message: string }[] {
  if (typeof errors !== 'object' || errors === null) return [];
  if ('message' in errors && typeof errors.message === 'string' && errors.message !== '')
    return [{ path: path.join('.'), message: errors.message }];
  return Object.entries(errors)
    .filter(([key]) => key !== 'ref')
    .flatMap(([key, value]) => leaves(value, isOfWhole(key, path) ? path : [...path, key]));
}

/** A list's own fault is kept under `root` of the list. */
function isOfWhole(key: string, path: readonly string[]): boolean {
  return key === 'root' && path.length > 0;
}

/** The message of one fault, where it is one. */
export function messageOf(error: unknown): string | undefined {
  const isFault = typeof error === 'object' && error !== null && 'message' in error;
  return isFault && typeof error.message === 'string' && error.message !== '' ? error.message : undefined;
}
