import { type ReleaseFormValues, releaseInput } from '@/lib/domain/release-input';

type Choosable = 'sampleSource' | 'design';

/** The form while it is being filled in: what must be chosen may not be chosen yet. */
export type ReleaseForm = Omit<ReleaseFormValues, Choosable> & {
  [Key in Choosable]: ReleaseFormValues[Key] | '';
};

export type ShareRow = ReleaseForm['shares'][number];
export type NewRace = Extract<ReleaseForm['race'], { kind: 'new' }>['race'];

export const blankShare = (option = ''): ShareRow => ({
  option,
  printed: '',
  notDisclosed: false,
  isAnswer: !looksLikeNonAnswer(option),
});

export const blankRace = (): NewRace => ({ name: '', kind: 'candidate', options: [], thresholds: [] });

const blank = () => ({ notDisclosed: false, value: '' });
const blankInterval = () => ({ pp: '', unit: '0.1', level: '95' });

/** A form that nobody has typed into. */
export function emptyReleaseForm(): ReleaseForm {
  return {
    race: { kind: 'existing', id: '' },
    pollster: '',
    sponsor: blank(),
    population: blank(),
    sampleSource: '',
    mode: blank(),
    design: '',
    fieldStartOn: '',
    fieldEndOn: '',
    publishedOn: '',
    embargo: null,
    n: blank(),
    deff: { source: '', value: '', df: '' },
    statedMargin: { notDisclosed: false, ...blankInterval() },
    modelledInterval: blankInterval(),
    wording: blank(),
    sameQuestion: false,
    shares: [blankShare(), blankShare(), blankShare()],
    sourceUrl: blank(),
    methodNote: '',
  };
}

/** Without the rows and lines that were left empty; what is sent, and what is validated. */
export function pruned(values: ReleaseForm): ReleaseForm {
  const shares = values.shares.filter((row) => row.option.trim() || row.printed.trim() || row.notDisclosed);
  const race: ReleaseForm['race'] =
    values.race.kind === 'existing'
      ? values.race
      : {
          kind: 'new',
          race: {
            ...values.race.race,
            options: values.race.race.options.map((name) => name.trim()).filter(Boolean),
            thresholds: values.race.race.thresholds.filter((row) => row.option.trim() || row.pct.trim()),
          },
        };
  const isRandom = values.sampleSource === 'probability';
  return {
    ...values,
    race,
    shares: shares.length > 0 ? shares : values.shares.slice(0, 1),
    modelledInterval: isRandom ? blankInterval() : values.modelledInterval,
  };
}

/** To what a printed margin is rounded; one that ends in .0 or .5 may be rounded to halves. */
export function marginUnit(printed: string): string | null {
  const match = /^±?\s*\d+(?:[.,](\d+))?$/.exec(printed.trim());
  if (!match) return null;
  const fraction = match[1] ?? '';
  if (fraction === '') return '1';
  return fraction === '0' || fraction === '5' ? '0.5' : (10 ** -fraction.length).toFixed(fraction.length);
}

const NON_ANSWER = /\b(don.?t know|do not know|dk|undecided|unsure|not sure|refused|no answer|no opinion)\b/i;
const NO_VOTE = /\b(would not|wouldn.?t|will not|won.?t) vote\b/i;

/** Whether an option reads like don't know, refused and the like; a first guess that the reporter can change. */
export function looksLikeNonAnswer(option: string): boolean {
  return NON_ANSWER.test(option) || NO_VOTE.test(option);
}

/**
 * A draft as it was kept, brought into the form's present shape. Drafts may be older than the form, so whatever
 * does not fit is left out and the rest kept.
 */
export function reviveReleaseForm(kept: unknown): ReleaseForm {
  const empty = emptyReleaseForm();
  const shares = listIn(kept, 'shares').map((row) => fitted(blankShare(), row));
  return {
    ...fitted({ ...empty, race: null, shares: null, embargo: null }, kept),
    race: revivedRace(partOf(kept, 'race')),
    embargo: partOf(kept, 'embargo') ? fitted({ local: '', zone: '' }, partOf(kept, 'embargo')) : null,
    shares: shares.length > 0 ? shares : empty.shares,
    sampleSource: chosen('sampleSource', partOf(kept, 'sampleSource')),
    design: chosen('design', partOf(kept, 'design')),
    deff: revivedDeff(partOf(kept, 'deff')),
  };
}

function revivedRace(kept: unknown): ReleaseForm['race'] {
  const race = partOf(kept, 'race');
  if (partOf(kept, 'kind') !== 'new' || !race) return { kind: 'existing', id: fitted({ id: '' }, kept).id };
  const kinds = releaseInput.shape.race.options[1].shape.race.shape.kind;
  const threshold = { option: '', pct: '', base: 'valid-votes' as const };
  return {
    kind: 'new',
    race: {
      name: fitted({ name: '' }, race).name,
      kind: kinds.safeParse(partOf(race, 'kind')).data ?? 'candidate',
      options: listIn(race, 'options').filter((one) => typeof one === 'string'),
      thresholds: listIn(race, 'thresholds').map((row) => fitted(threshold, row)),
    },
  };
}

function revivedDeff(kept: unknown): ReleaseForm['deff'] {
  const fields = fitted({ source: '', value: '', df: '' }, kept);
  const source = (['design', 'kish', 'stated'] as const).find((one) => one === fields.source) ?? '';
  return { ...fields, source };
}

function chosen<Key extends Choosable>(key: Key, kept: unknown): ReleaseForm[Key] {
  const parsed = releaseInput.shape[key].safeParse(kept);
  return parsed.success ? (parsed.data as ReleaseForm[Key]) : '';
}

/** The shape's own keys, each taken from what was kept where the kind of value agrees. */
function fitted<Shape extends object>(shape: Shape, kept: unknown): Shape {
  const entries = Object.entries(shape).map(([key, value]: [string, unknown]) => {
    const found = partOf(kept, key);
    if (typeof value === 'object' && value !== null) return [key, fitted(value, found)];
    return [key, typeof found === typeof value && value !== null ? found : value];
  });
  return Object.fromEntries(entries) as Shape;
}

function partOf(value: unknown, key: string): unknown {
  const isRecord = typeof value === 'object' && value !== null && Object.hasOwn(value, key);
  return isRecord ? (value as Record<string, unknown>)[key] : undefined;
}

function listIn(value: unknown, key: string): unknown[] {
  const list = partOf(value, key);
  return Array.isArray(list) ? list.slice(0, 60) : [];
}
