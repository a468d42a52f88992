import 'server-only';
import { findEvidence } from '@/db/queries/clearing';
import { listEmbeds as listRows } from '@/db/queries/embed';
import { isListed } from '@/db/queries/embargo';
import { listUnread } from '@/db/queries/one-reader';
import { isReleasePublic } from '@/db/queries/sheet';
import { type Actor, canMakeEmbeds } from '@/lib/domain/roles';
import { readEnv } from '@/lib/env';
import { authorize, type Ctx } from '../context';
import { recordEmbargoViews } from '../release/record-embargo-views';
import type { EvidenceBody } from '../sheet/evidence-body';
import { type EmbedHold, holdOfEmbed } from './embed-hold';

export type EmbedItem = {
  id: string;
  url: string;
  sheetId: string;
  race: string;
  pollster: string;
  chartTitle: string;
  version: number;
  state: 'live' | 'waiting' | 'pulled';
  embargoAt: number | null;
  pulledAt: number | null;
  createdBy: string;
  createdAt: number;
  /** The editor who released its words alone, until a second person has read them. */
  oneReader: string | null;
  /** What keeps its newest version from the public now. */
  hold: EmbedHold | null;
};

/** Every embed with where it stands; one under embargo waits, its address exists already. */
export function listEmbeds(actor: Actor, ctx: Ctx): EmbedItem[] {
  authorize(canMakeEmbeds(actor), 'Embeds are made by reporters, editors and the copy desk.');
  const rows = newestOf(listRows(ctx.db, actor, ctx.now, 200));
  const isPublicNow = (row: (typeof rows)[number]) => isReleasePublic(ctx.db, row.release.id, ctx.now);
  const held = rows.filter((row) => !isPublicNow(row) && isListed(ctx.db, row.release.id, actor));
  recordEmbargoViews(ctx, actor, new Set(held.map(({ release }) => release.id)), 'embeds');
  const unread = listUnread(
    ctx.db,
    rows.map(({ evidenceId }) => evidenceId),
  );
  return rows.map((row) => {
    const isPublic = isPublicNow(row);
    const body = JSON.parse(findEvidence(ctx.db, row.evidenceId)!.bytes.toString('utf8')) as EvidenceBody;
    return {
      id: row.embed.publicId,
      url: embedUrl(row.embed.publicId),
      sheetId: row.sheet.publicId,
      race: row.race,
      pollster: row.pollster,
      chartTitle: body.texts.find(({ kind }) => kind === 'chart-title')?.text ?? '',
      version: row.version.number,
      state: row.version.state === 'pulled' ? 'pulled' : isPublic ? 'live' : 'waiting',
      embargoAt: isPublic ? null : row.release.embargoAt,
      pulledAt: row.version.pulledAt,
      createdBy: row.createdBy,
      createdAt: row.embed.createdAt,
      oneReader: unread.get(row.evidenceId) ?? null,
      hold: holdOfEmbed(ctx.db, row.embed.publicId, ctx.now),
    };
  });
}

/** After a pull every version of an embed is pulled: the newest one speaks for it. */
function newestOf<Row extends { embed: { id: number }; version: { number: number } }>(rows: Row[]): Row[] {
  const newest = new Map<number, Row>();
  for (const row of rows) {
    const known = newest.get(row.embed.id);
    if (!known || known.version.number < row.version.number) newest.set(row.embed.id, row);
  }
  return [...newest.values()];
}

export function embedUrl(id: string): string {
  return `${readEnv().LEADLINE_ORIGIN}/embed/${id}`;
}
