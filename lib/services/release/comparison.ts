import 'server-only';
import type { Conn } from '@/db/client';
import {
  findOverride,
  findWholeVersion,
  listVersionsOfSeries,
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
export function comparisonOf(conn: Conn, whole: WholeVersion): Comparison {
  const current = seriesFactsOf(conn, whole);
  const override = findOverride(conn, whole.version.id);
  const overridden = override && findWholeVersion(conn, override.override.comparisonVersionId);
  if (override && overridden) {
    const { differences, unknowns } = compareReleases(current, seriesFactsOf(conn, overridden));
    const { reason, personId } = override.override;
    return {
      versionId: overridden.version.id,
      reason: 'override',
      unknowns,
      differences,
      passedOver: [],
      override: { reason, by: override.person, personId },
    };
  }
  return chooseAmong(conn, current, whole.release.raceId, whole.release.pollsterId);
}

/** The same choice for facts that are not stored yet. */
export function chooseAmong(
  conn: Conn,
  current: ComparableFacts,
  raceId: number,
  pollsterId: number,
): Comparison {
  const series = listVersionsOfSeries(conn, raceId, pollsterId).map((row) => seriesFactsOf(conn, row));
  const choice = chooseComparison(current, series);
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
