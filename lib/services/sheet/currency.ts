import 'server-only';
import type { Conn } from '@/db/client';
import { findFlaggedAt } from '@/db/queries/corrections';
import { findHouseStyle, findLatestHouseStyle } from '@/db/queries/desk';
import { findWholeVersion, findWholeVersionByPublicId, listVersionsOfSeries } from '@/db/queries/release';
import type { SheetRow } from '@/db/queries/sheet';
import { type Currency, shelfEnd, type Stale, takenOffRung } from '@/lib/domain/currency';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { LineKind, LineText } from '@/lib/domain/sheet';
import { dayInZone } from '@/lib/domain/wall-clock';
import { readEnv } from '@/lib/env';
import type { Verdict } from '@/lib/findings/check-types';
import { compareReleases } from '@/lib/findings/comparability';
import type { HouseStyle } from '@/lib/wording/house-style';
import { seriesFactsOf } from '../release/comparison';

/** What cleared words stand on, as their evidence keeps it. */
export type Standing = {
  release: ReleaseFacts;
  previous: ReleaseFacts | null;
  houseStyleVersion: number;
  /** Null for words that claim nothing. */
  verdict: Verdict | null;
  texts: readonly LineText[];
  /** Days that were set for this sheet; null: as house style says. */
  shelfDays: number | null;
};

/** Lines that say how and of whom, not what was found. */
const AROUND_THE_CLAIM: readonly LineKind[] = ['caveat', 'caveat-short', 'caveat-one-breath', 'method-note'];

/** Whether cleared words are still the newest that could be said, and every reason why not. */
export function currencyOf(conn: Conn, sheet: SheetRow, standing: Standing, now: number): Currency {
  const style = findLatestHouseStyle(conn);
  const inForce = style && { version: style.id, body: JSON.parse(style.body) as HouseStyle };
  const reasons: (Stale | null)[] = [
    newerRelease(conn, sheet, now),
    ...newVersions(conn, sheet, standing),
    inForce && takenOff(conn, standing, inForce),
    pastShelf(standing, inForce?.body.shelfLifeDays ?? null, now),
  ];
  const told = reasons.filter((reason) => reason !== null);
  return { isCurrent: told.length === 0, reasons: told };
}

/** Out of embargo only: a release that is held is not told by what it makes old. */
function newerRelease(conn: Conn, sheet: SheetRow, now: number): Stale | null {
  const own = findWholeVersion(conn, sheet.releaseVersionId);
  if (!own) return null;
  const facts = seriesFactsOf(conn, own);
  const newer = listVersionsOfSeries(conn, own.race.id, own.pollster.id, now)
    .filter(({ version }) => version.fieldStartOn > own.version.fieldEndOn)
    .find((whole) => compareReleases(seriesFactsOf(conn, whole), facts).comparable);
  if (!newer) return null;
  const { fieldStartOn, fieldEndOn } = newer.version;
  return { reason: 'newer-release', releaseId: newer.release.publicId, fieldStartOn, fieldEndOn };
}

/** A newer version makes words old, unless a correction found that nothing of them differs on it. */
function newVersions(conn: Conn, sheet: SheetRow, { release, previous }: Standing): Stale[] {
  return ([release, previous] as const).flatMap((facts, place): Stale[] => {
    const whole = facts && findWholeVersionByPublicId(conn, facts.versionId);
    const currentId = whole?.release.currentVersionId ?? null;
    if (!whole || currentId === null || currentId === whole.version.id) return [];
    const at = findFlaggedAt(conn, sheet.id, currentId);
    if (at !== null) return [{ reason: 'source-corrected', at }];
    return [{ reason: 'new-version', part: place === 0 ? 'release' : 'comparison' }];
  });
}

function takenOff(
  conn: Conn,
  { houseStyleVersion, verdict, texts }: Standing,
  inForce: { version: number; body: HouseStyle },
): Stale | null {
  if (verdict === null || houseStyleVersion === inForce.version) return null;
  const before = findHouseStyle(conn, houseStyleVersion);
  if (!before) return null;
  const words = takenOffRung(
    texts.filter(({ kind }) => !AROUND_THE_CLAIM.includes(kind)).map(({ text }) => text),
    (JSON.parse(before.body) as HouseStyle).ladder[verdict],
    inForce.body.ladder[verdict],
  );
  return words.length === 0 ? null : { reason: 'ladder', words };
}

function pastShelf({ release, shelfDays }: Standing, deskDays: number | null, now: number): Stale | null {
  const days = shelfDays ?? deskDays;
  if (days === null) return null;
  const endedOn = shelfEnd(release.fieldEndOn, days);
  return dayInZone(now, readEnv().LEADLINE_ZONE) < endedOn ? null : { reason: 'shelf-life', endedOn };
}
