import 'server-only';
import type { Conn } from '@/db/client';
import {
  findOverride,
  findWholeVersion,
  listVersionsOfSeries,
  type StandIn,
  type WholeVersion,
} from '@/db/queries/release';
import { listShares } from '@/db/queries/release';
import {
  type ComparableFacts,
  type ComparableItem,
  compareReleases,
  type Comparability,
} from '@/lib/findings/comparability';
import { chooseComparison, type ChoiceReason } from '@/lib/findings/choose-comparison';

export type SeriesFacts = ComparableFacts & { versionId: number };

export type PassedOver = {
  releaseId: string;
  fieldStartOn: string;
  fieldEndOn: string;
  differences: Comparability['differences'];
};

export type Comparison = {
  /** Internal id of the version compared with. */
  versionId: number | null;
  reason: ChoiceReason | 'override';
  unknowns: ComparableItem[];
  differences: Comparability['differences'];
  passedOver: PassedOver[];
  override: { reason: string; by: string; personId: number } | null;
};

/** What of a stored version decides whether it compares. */
export function seriesFactsOf(conn: Conn, whole: WholeVersion): SeriesFacts {
  const { release, version, race, pollster, base, question } = whole;
  const options = listShares(conn, question.id).map(({ share }) => share);
  return {
    id: release.publicId,
    versionId: version.id,
    pollster: pollster.publicId,
    race: race.publicId,
    questionWording: question.wording,
    sameQuestion: question.sameQuestion,
    answerOptions: options.filter((share) => share.isAnswer).map((share) => share.option),
    population: base.population,
    likelyVoterMethod: null,
    modeFamily: version.mode,
    sampleSource: version.sampleSource === 'unknown' ? null : version.sampleSource,
    sampleSupplier: null,
    weightingScheme: base.design === 'unknown' ? null : base.design,
    sponsorKind: null,
    isRebased: options.some((share) => !share.isAnswer) ? false : null,
    questionOrder: null,
    fieldStartOn: version.fieldStartOn,
    fieldEndOn: version.fieldEndOn,
  };
}

/** The release that a stored version is compared with: the latest comparable one, or an editor's override. */
export function comparisonOf(
  conn: Conn,
  whole: WholeVersion,
  now: number,
  standIn: StandIn | null = null,
): Comparison {
  const current = seriesFactsOf(conn, whole);
  const { raceId, pollsterId } = whole.release;
  return (
    overriddenOf(conn, whole, current, standIn) ??
    chooseAmong(conn, current, raceId, pollsterId, now, standIn)
  );
}

/** An editor chose a release, whose figures are those of its newest version; one that fits no more is left. */
function overriddenOf(
  conn: Conn,
  whole: WholeVersion,
  current: SeriesFacts,
  standIn: StandIn | null,
): Comparison | null {
  const override = findOverride(conn, whole.version.id);
  const chosen = override && findWholeVersion(conn, override.override.comparisonVersionId);
  const newestId =
    chosen?.release.id === standIn?.releaseId ? standIn?.versionId : chosen?.release.currentVersionId;
  const newest = chosen && findWholeVersion(conn, newestId ?? chosen.version.id);
  if (!override || !newest) return null;
  const { differences, unknowns } = compareReleases(current, seriesFactsOf(conn, newest));
  if (!mayBeCompared(whole, newest, differences)) return null;
  const { reason, personId } = override.override;
  return {
    versionId: newest.version.id,
    reason: 'override',
    unknowns,
    differences,
    passedOver: [],
    override: { reason, by: override.person, personId },
  };
}

/** What no written reason lifts: another race, and interviews that did not end before these began. */
export function mayBeCompared(
  current: WholeVersion,
  earlier: WholeVersion,
  differences: Comparability['differences'],
): boolean {
  return (
    earlier.version.fieldEndOn < current.version.fieldStartOn &&
    differences.every((difference) => difference.isOverridable)
  );
}

/**
 * The same choice for facts that are not stored yet. Nothing under embargo is compared with: a figure that is held
 * would show through the change.
 */
export function chooseAmong(
  conn: Conn,
  current: ComparableFacts,
  raceId: number,
  pollsterId: number,
  now: number,
  standIn: StandIn | null = null,
): Comparison {
  const choice = chooseComparison(current, earlierThan(conn, current, raceId, pollsterId, now, standIn));
  return {
    versionId: choice.chosen?.versionId ?? null,
    reason: choice.reason,
    unknowns: choice.comparability?.unknowns ?? [],
    differences: [],
    passedOver: choice.passedOver.map(({ release, comparability }) => ({
      releaseId: release.id,
      fieldStartOn: release.fieldStartOn ?? '',
      fieldEndOn: release.fieldEndOn ?? '',
      differences: comparability.differences,
    })),
    override: null,
  };
}

/** Down to the first that compares: a series of years is not read to its beginning. */
function earlierThan(
  conn: Conn,
  current: ComparableFacts,
  raceId: number,
  pollsterId: number,
  now: number,
  standIn: StandIn | null,
): SeriesFacts[] {
  const earlier: SeriesFacts[] = [];
  for (const row of listVersionsOfSeries(conn, raceId, pollsterId, now, standIn)) {
    if (row.release.publicId === current.id || !isEarlier(row, current)) continue;
    const facts = seriesFactsOf(conn, row);
    earlier.push(facts);
    if (compareReleases(current, facts).comparable) break;
  }
  return earlier;
}

function isEarlier({ version }: WholeVersion, { fieldStartOn, fieldEndOn }: ComparableFacts): boolean {
  if (!fieldStartOn || !fieldEndOn) return false;
  return (
    version.fieldEndOn < fieldEndOn ||
    (version.fieldEndOn === fieldEndOn && version.fieldStartOn < fieldStartOn)
  );
}
