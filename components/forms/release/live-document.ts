import { type Disclosed, NOT_ENTERED } from '@/lib/domain/disclosed';
import { plainName } from '@/lib/domain/plain-name';
import { type PrintedNumber, readPrintedNumber, unitsAt } from '@/lib/domain/printed-number';
import type { FactThreshold, ReleaseFacts } from '@/lib/domain/release-facts';
import { readDecimal, releaseInput } from '@/lib/domain/release-input';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import type { CheckDocument, Policy } from '@/lib/findings/check-types';
import { withNamesOf } from '@/lib/findings/same-names';
import { uncountedThresholds } from '@/lib/findings/threshold-base';
import type { ReleaseForm, ShareRow } from './form-values';

/** What the form leads to so far, and what of it could not be read yet. */
export type LiveDocument = {
  document: CheckDocument;
  /** The form's row of each share of the document: rows that say nothing yet are left out. */
  rows: number[];
  leftOut: string[];
  /** Why there is no sample size, where that is not the pollster's silence. */
  sizeGap: string | null;
};

export type LiveAround = {
  policy: Policy;
  previous: ReleaseFacts | null;
  /** Of the chosen race; those of a race being added are in the form itself. */
  thresholds: FactThreshold[];
};

const fields = releaseInput.shape;

/**
 * The check document of a form that is being typed: whatever reads is taken as the service will take it, whatever
 * does not read yet is left out with a word about it.
 *
 * @returns null where no share can be read
 */
export function liveDocument(values: ReleaseForm, around: LiveAround): LiveDocument | null {
  const leftOut: string[] = [];
  const read = readShares(values.shares, leftOut);
  if (!read.some((row) => row.printed !== null)) return null;
  const decimals = Math.max(0, ...read.map((row) => row.printed?.decimals ?? 0));
  const facts: ReleaseFacts = {
    ...UNSAVED,
    ...readParticulars(values, leftOut),
    race: { ...UNSAVED.race, thresholds: thresholdsOf(values, around) },
    decimals,
    shares: read.map(({ option, printed, isAnswer }) => ({
      option,
      units: printed && unitsAt(printed, decimals),
      isAnswer,
    })),
  };
  for (const { option, pct } of uncountedThresholds(facts))
    leftOut.push(
      `${option} is not tested against ${pct}%: the rule counts a different base from these shares.`,
    );
  const previous = around.previous && withNamesOf(around.previous, facts);
  return {
    document: checkDocumentOf(facts, previous, around.policy),
    rows: read.map((row) => row.row),
    leftOut,
    sizeGap: sizeGapOf(values),
  };
}

function sizeGapOf({ n: typed }: ReleaseForm): string | null {
  const n = readable(fields.n.safeParse(typed));
  if (!n) return 'The sample size cannot be read yet.';
  return n.status === 'not-entered' ? 'There is no sample size yet.' : null;
}

/** What a release has only once it is logged; no figure rests on it. */
const UNSAVED: ReleaseFacts = {
  releaseId: '',
  versionId: '',
  version: 0,
  race: { id: '', name: '', kind: 'candidate', thresholds: [] },
  pollster: { id: '', name: '' },
  sponsor: NOT_ENTERED,
  population: NOT_ENTERED,
  sampleSource: 'unknown',
  mode: NOT_ENTERED,
  design: 'unknown',
  fieldStartOn: '',
  fieldEndOn: '',
  publishedOn: '',
  n: NOT_ENTERED,
  deff: null,
  statedMargin: NOT_ENTERED,
  modelledInterval: null,
  questionWording: NOT_ENTERED,
  decimals: 0,
  shares: [],
  sourceUrl: NOT_ENTERED,
};

type ReadRow = { row: number; option: string; printed: PrintedNumber | null; isAnswer: boolean };

function readShares(rows: readonly ShareRow[], leftOut: string[]): ReadRow[] {
  return rows.flatMap(({ option: typed, printed: text, notDisclosed, isAnswer }, row): ReadRow[] => {
    const option = plainName(typed);
    const printed = notDisclosed ? null : readPrintedNumber(text);
    const name = option || `Row ${row + 1}`;
    if (!notDisclosed && text.trim() === '') return [];
    if (!notDisclosed && (!printed || printed.units > 100 * 10 ** printed.decimals))
      leftOut.push(`${name}: “${text.trim()}” is no share from 0 to 100, so it is left out.`);
    else if (option === '') leftOut.push(`${name} has no name yet, so it is left out.`);
    else return [{ row, option, printed, isAnswer }];
    return [];
  });
}

type Particulars = Pick<
  ReleaseFacts,
  'population' | 'sampleSource' | 'mode' | 'design' | 'n' | 'deff' | 'statedMargin' | 'modelledInterval'
>;

function readParticulars(values: ReleaseForm, leftOut: string[]): Particulars {
  const n = readable(fields.n.safeParse(values.n));
  const deff = fields.deff.safeParse(values.deff);
  const margin = readable(fields.statedMargin.safeParse(values.statedMargin));
  const modelled = fields.modelledInterval.safeParse(values.modelledInterval);
  const isRandom = values.sampleSource === 'probability';
  if (values.sampleSource === '') leftOut.push('How people came into the sample is not chosen yet.');
  const gap = sizeGapOf(values);
  if (gap) leftOut.push(gap);
  if (!deff.success) leftOut.push('The design effect cannot be read yet, so it is left out.');
  if (!margin) leftOut.push('The stated margin cannot be read yet, so it is left out.');
  if (!modelled.success && !isRandom)
    leftOut.push('The modelled interval cannot be read yet, so it is left out.');
  return {
    population: readable(fields.population.safeParse(values.population)) ?? NOT_ENTERED,
    sampleSource: values.sampleSource || 'unknown',
    mode: readable(fields.mode.safeParse(values.mode)) ?? NOT_ENTERED,
    design: values.design || 'unknown',
    n: n ?? NOT_ENTERED,
    deff: deff.success ? deff.data : null,
    statedMargin: margin ?? NOT_ENTERED,
    modelledInterval: modelled.success && !isRandom ? modelled.data : null,
  };
}

function readable<T>(
  parsed: { success: true; data: Disclosed<T> } | { success: false },
): Disclosed<T> | null {
  return parsed.success ? parsed.data : null;
}

function thresholdsOf({ race }: ReleaseForm, { thresholds }: LiveAround): FactThreshold[] {
  if (race.kind === 'existing') return thresholds;
  return race.race.thresholds.flatMap(({ option, pct: typed, base }) => {
    const pct = readDecimal(typed);
    return pct !== null && pct > 0 && pct < 100 ? [{ option: plainName(option), pct, base }] : [];
  });
}
