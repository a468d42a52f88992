import 'server-only';
import type { Conn } from '@/db/client';
import { listRaceThresholds } from '@/db/queries/race';
import { findWholeVersion, listShares, type WholeVersion } from '@/db/queries/release';
import { type Disclosed, given } from '@/lib/domain/disclosed';
import type { ReleaseFacts, StatedMargin } from '@/lib/domain/release-facts';
import { AppError } from '@/lib/errors';

/** One stored version as plain facts. */
export function factsOf(conn: Conn, versionId: number): ReleaseFacts {
  const whole = findWholeVersion(conn, versionId);
  if (!whole) throw new AppError('not-found', 'There is no such release.');
  return factsOfWhole(conn, whole);
}

export function factsOfWhole(conn: Conn, whole: WholeVersion): ReleaseFacts {
  const { release, version, race, pollster, sponsor, base, question } = whole;
  return {
    releaseId: release.publicId,
    versionId: version.publicId,
    version: version.number,
    race: {
      id: race.publicId,
      name: race.name,
      kind: race.kind,
      thresholds: listRaceThresholds(conn, race.id),
    },
    pollster: { id: pollster.publicId, name: pollster.name },
    sponsor: disclosed(version.sponsorStatus, sponsor && { id: sponsor.publicId, name: sponsor.name }),
    population: disclosed(base.populationStatus, base.population),
    sampleSource: version.sampleSource,
    mode: disclosed(version.modeStatus, version.mode),
    design: base.design,
    fieldStartOn: version.fieldStartOn,
    fieldEndOn: version.fieldEndOn,
    publishedOn: version.publishedOn,
    n: disclosed(base.nStatus, base.n),
    deff:
      base.deffSource && base.deff !== null
        ? { source: base.deffSource, value: base.deff, df: base.deffDf }
        : null,
    statedMargin: disclosed(
      base.statedMarginStatus,
      interval(base.statedMarginPp, base.statedMarginUnit, base.statedMarginLevel),
    ),
    modelledInterval: interval(base.modelledPp, base.modelledUnit, base.modelledLevel),
    questionWording: disclosed(question.wordingStatus, question.wording),
    decimals: question.decimals,
    shares: listShares(conn, question.id).map(({ share }) => ({
      option: share.option,
      units: share.units,
      isAnswer: share.isAnswer,
    })),
    sourceUrl: disclosed(version.sourceUrlStatus, version.sourceUrl),
  };
}

function disclosed<T>(status: Disclosed<T>['status'], value: T | null): Disclosed<T> {
  if (status !== 'given') return { status };
  if (value === null) throw new Error('a given particular requires a value');
  return given(value);
}

function interval(pp: string | null, unit: string | null, level: string | null): StatedMargin | null {
  if (pp === null || unit === null || level === null) return null;
  return { pp: Number(pp), unit: Number(unit), level: Number(level) };
}
