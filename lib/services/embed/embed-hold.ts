import 'server-only';
import type { Conn } from '@/db/client';
import { findPublicEmbed, listEmbedsOfClaim } from '@/db/queries/embed';
import { barOn } from '../bans/hold';

type Found = NonNullable<ReturnType<typeof findPublicEmbed>>;

/** Why a public address does not show the newest cleared version now, and until when. */
export type EmbedHold =
  /** It answers as if it did not exist. */
  | { kind: 'embargo'; untilAt: number; zone: string }
  /** All figures are barred: a note without a figure stands in its place. */
  | { kind: 'taken-down'; untilAt: number }
  /** New figures are barred: it shows the version that was public when the ban began. */
  | { kind: 'frozen'; untilAt: number; version: number }
  /** New figures are barred, and nothing of it was public before. */
  | { kind: 'not-shown'; untilAt: number };

/** The version that was public when a ban began; nothing that came after it is shown while it lasts. */
export function versionBefore(
  conn: Conn,
  found: Found,
  number: number | null,
  sinceAt: number,
  now: number,
): Found | null {
  const before = findPublicEmbed(conn, found.embedId, number, now, sinceAt);
  return before && before.publicSince < sinceAt && before.version.state !== 'pulled' ? before : null;
}

/** What holds an embed now; null where its newest version is public, or withdrawn. */
export function holdOfEmbed(conn: Conn, publicId: string, now: number): EmbedHold | null {
  const found = findPublicEmbed(conn, publicId, null, now);
  if (!found || found.version.state === 'pulled') return null;
  if (!found.isPublic)
    return { kind: 'embargo', untilAt: found.embargoAt ?? now, zone: found.embargoZone ?? 'UTC' };
  const { figures, sinceAt, untilAt } = barOn(conn, found.raceId, now);
  if (sinceAt === null || untilAt === null) return null;
  const before = versionBefore(conn, found, null, sinceAt, now);
  if (!before) return { kind: 'not-shown', untilAt };
  if (figures === 'all-figures') return { kind: 'taken-down', untilAt };
  return { kind: 'frozen', untilAt, version: before.version.number };
}

export type HeldEmbed = { id: string; language: string; hold: EmbedHold };

/** The embeds of one claim of one release, in every language, that an embargo or a ban holds now. */
export function heldEmbedsOf(
  conn: Conn,
  claim: { releaseId: number; claimKey: string },
  now: number,
): HeldEmbed[] {
  return listEmbedsOfClaim(conn, claim).flatMap(({ publicId, language }) => {
    const hold = holdOfEmbed(conn, publicId, now);
    return hold ? [{ id: publicId, language, hold }] : [];
  });
}
