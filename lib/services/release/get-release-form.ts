import 'server-only';
import { findWholeVersion } from '@/db/queries/release';
import type { Disclosed } from '@/lib/domain/disclosed';
import { pctOf, type ReleaseFacts, type StatedMargin } from '@/lib/domain/release-facts';
import type { ReleaseFormValues } from '@/lib/domain/release-input';
import { type Actor, canLogReleases } from '@/lib/domain/roles';
import { authorize, type Ctx } from '../context';
import { factsOfWhole } from './facts';
import { findVisibleRelease } from './get-release';
import { whyNotRevised } from './why-not-revised';

export type StoredReleaseForm = {
  id: string;
  /** What the release is changed from: sent back with the form. */
  version: number;
  /** Number of the figures shown; saving makes the next. */
  number: number;
  race: string;
  values: ReleaseFormValues;
  /** Why these figures may not change now. */
  whyNot: string | null;
};

/** A logged release as the form would have been typed, to be changed. */
export function getReleaseForm(actor: Actor, id: string, ctx: Ctx): StoredReleaseForm {
  authorize(canLogReleases(actor), 'Only reporters and editors change releases.');
  const release = findVisibleRelease(actor, id, ctx);
  const whole = findWholeVersion(ctx.db, release.currentVersionId!)!;
  const facts = factsOfWhole(ctx.db, whole);
  const note = { sameQuestion: whole.question.sameQuestion, methodNote: whole.version.methodNote ?? '' };
  return {
    id: release.publicId,
    version: release.version,
    number: facts.version,
    race: facts.race.name,
    values: { ...valuesOf(facts), ...note },
    whyNot: whyNotRevised(ctx.db, release.id),
  };
}

function valuesOf(facts: ReleaseFacts): Omit<ReleaseFormValues, 'sameQuestion' | 'methodNote'> {
  const { deff, statedMargin } = facts;
  const margin = statedMargin.status === 'given' ? statedMargin.value : null;
  return {
    race: { kind: 'existing', id: facts.race.id },
    pollster: facts.pollster.name,
    sponsor: typed(facts.sponsor, ({ name }) => name),
    population: typed(facts.population),
    sampleSource: facts.sampleSource,
    mode: typed(facts.mode),
    design: facts.design,
    fieldStartOn: facts.fieldStartOn,
    fieldEndOn: facts.fieldEndOn,
    publishedOn: facts.publishedOn,
    embargo: null,
    n: typed(facts.n),
    deff: { source: deff?.source ?? '', value: text(deff?.value), df: text(deff?.df) },
    statedMargin: { notDisclosed: statedMargin.status === 'not-disclosed', ...typedInterval(margin) },
    modelledInterval: typedInterval(facts.modelledInterval),
    wording: typed(facts.questionWording),
    shares: facts.shares.map(({ option, units, isAnswer }) => ({
      option,
      printed: units === null ? '' : pctOf(units, facts.decimals).toFixed(facts.decimals),
      notDisclosed: units === null,
      isAnswer,
    })),
    sourceUrl: typed(facts.sourceUrl),
  };
}

function typed<T>(particular: Disclosed<T>, write: (value: T) => string = String) {
  return {
    notDisclosed: particular.status === 'not-disclosed',
    value: particular.status === 'given' ? write(particular.value) : '',
  };
}

/** Points with the decimals that they were rounded to, so that 4.0 stays 4.0. */
function typedInterval(interval: StatedMargin | null) {
  if (!interval) return { pp: '', unit: '0.1', level: '95' };
  const { pp, unit, level } = interval;
  return {
    pp: pp.toFixed(Math.max(decimalsOf(pp), decimalsOf(unit))),
    unit: String(unit),
    level: String(Number((level * 100).toFixed(6))),
  };
}

const decimalsOf = (value: number) => String(value).split('.')[1]?.length ?? 0;
const text = (value: number | null | undefined) => (value == null ? '' : String(value));
