import 'server-only';
import { z } from 'zod';
import { findNamed, findRaceByPublicId } from '@/db/queries/race';
import { plainName } from '@/lib/domain/plain-name';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { type Actor, canLogReleases } from '@/lib/domain/roles';
import { DESIGNS, MODES, POPULATIONS, SAMPLE_SOURCES } from '@/lib/domain/vocabulary';
import type { Policy } from '@/lib/findings/check-types';
import { authorize, type Ctx, parse } from '../context';
import { readDeskSettings } from '../setup/desk-settings';
import { chooseAmong, type Comparison } from './comparison';
import { factsOf } from './facts';

const day = z.string().regex(/^\d{4}-\d{2}-\d{2}$/);
const schema = z.strictObject({
  /** Of a release that is being changed, so that it is not compared with itself; empty for a new one. */
  releaseId: z.string().max(64).default(''),
  raceId: z.string().max(64),
  pollster: z.string().max(120),
  wording: z.string().max(2000).nullable(),
  sameQuestion: z.boolean(),
  answerOptions: z.array(z.string().max(120)).max(30),
  hasNonAnswers: z.boolean(),
  population: z.enum(POPULATIONS).nullable(),
  mode: z.enum(MODES).nullable(),
  sampleSource: z.enum(SAMPLE_SOURCES),
  design: z.enum(DESIGNS),
  fieldStartOn: day.nullable(),
  fieldEndOn: day.nullable(),
});
export type ComparisonQuery = z.input<typeof schema>;

export type ComparisonPreview = {
  previous: ReleaseFacts | null;
  comparison: Omit<Comparison, 'versionId' | 'override'> | null;
  policy: Policy;
};

/** What a release that is still being typed would be compared with. Writes nothing. */
export function previewComparison(actor: Actor, input: unknown, ctx: Ctx): ComparisonPreview {
  authorize(canLogReleases(actor), 'Only reporters and editors log releases.');
  const query = parse(schema, input);
  const policy = readDeskSettings(ctx.db).policy.body;
  const race = findRaceByPublicId(ctx.db, query.raceId);
  const pollster = findNamed(ctx.db, 'pollsters', plainName(query.pollster));
  if (!race || !pollster) return { previous: null, comparison: null, policy };
  const { versionId, reason, unknowns, differences, passedOver } = chooseAmong(
    ctx.db,
    {
      id: query.releaseId,
      pollster: pollster.publicId,
      race: race.publicId,
      questionWording: query.wording,
      sameQuestion: query.sameQuestion,
      answerOptions: query.answerOptions,
      population: query.population,
      likelyVoterMethod: null,
      modeFamily: query.mode,
      sampleSource: query.sampleSource === 'unknown' ? null : query.sampleSource,
      sampleSupplier: null,
      weightingScheme: query.design === 'unknown' ? null : query.design,
      sponsorKind: null,
      isRebased: query.hasNonAnswers ? false : null,
      questionOrder: null,
      fieldStartOn: query.fieldStartOn,
      fieldEndOn: query.fieldEndOn,
    },
    race.id,
    pollster.id,
    ctx.now,
  );
  return {
    previous: versionId === null ? null : factsOf(ctx.db, versionId),
    comparison: { reason, unknowns, differences, passedOver },
    policy,
  };
}
