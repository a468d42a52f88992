import 'server-only';
import { findLastAct } from '@/db/queries/clearing';
import { listLineReasons } from '@/db/queries/comments';
import { findTerms, listFirstLooks } from '@/db/queries/sheet-desk';
import type { Currency } from '@/lib/domain/currency';
import { type Look, lookOf } from '@/lib/domain/look';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import type { LineKind, LineText } from '@/lib/domain/sheet';
import type { Wanted } from '@/lib/domain/wanted';
import type { Verdict } from '@/lib/findings/check-types';
import { type BanAhead, bansAheadOn, type Hold, holdsOn } from '../bans/hold';
import type { Ctx } from '../context';
import { type HeldEmbed, heldEmbedsOf } from '../embed/embed-hold';
import { currencyOf } from './currency';
import { type LanguageView, languagesOf } from './languages';
import { type CommentView, commentsOf } from './list-comments';
import type { Opened } from './sheet-state';
import { wantedOf } from './terms';

/** What the desk keeps about a sheet beside its words and evidence. None of it is ever frozen or public. */
export type DeskView = LanguageView & {
  language: string;
  comments: CommentView[];
  /** Why single lines were sent back, the last time it was. */
  lineReasons: { kind: LineKind; reason: string }[];
  wanted: Wanted | null;
  shelfDays: number | null;
  maySetTerms: boolean;
  /** Of a filed sheet: whether a second person has opened it. */
  look: Look | null;
  holds: Hold[];
  bansAhead: BanAhead[];
  /** Embeds of the same claim that an embargo or a ban holds. */
  heldEmbeds: HeldEmbed[];
  /** Of cleared words. */
  currency: Currency | null;
};

export type Frozen = {
  body: {
    release: ReleaseFacts;
    comparison?: { release: ReleaseFacts | null };
    houseStyle: { version: number };
    texts: LineText[];
  };
  verdict: Verdict | null;
};

export function deskViewOf(ctx: Ctx, actor: Actor, opened: Opened, frozen: Frozen | null): DeskView {
  const { sheet, release, state } = opened;
  const terms = findTerms(ctx.db, sheet.id);
  const filing = state === 'filed' ? findLastAct(ctx.db, sheet.id, 'filed') : null;
  const back = state === 'sent-back' ? findLastAct(ctx.db, sheet.id, 'sent-back') : null;
  const standing = frozen && state === 'cleared' ? standingOf(frozen, terms?.shelfDays ?? null) : null;
  return {
    ...languagesOf(ctx.db, sheet, release.publicId),
    language: sheet.language,
    comments: commentsOf(ctx.db, actor, opened),
    lineReasons: back ? listLineReasons(ctx.db, back.id) : [],
    wanted: wantedOf(terms),
    shelfDays: terms?.shelfDays ?? null,
    maySetTerms: state !== 'pulled' && (canActAsEditor(actor) || sheet.authorId === actor.personId),
    look: filing && lookOf(filing.at, listFirstLooks(ctx.db, [filing.id]).get(filing.id) ?? null, ctx.now),
    holds: holdsOn(ctx.db, release.raceId, ctx.now),
    bansAhead: bansAheadOn(ctx.db, release.raceId, ctx.now),
    heldEmbeds: heldEmbedsOf(ctx.db, sheet, ctx.now),
    currency: standing && currencyOf(ctx.db, sheet, standing, ctx.now),
  };
}

export function standingOf({ body, verdict }: Frozen, shelfDays: number | null) {
  return {
    release: body.release,
    previous: body.comparison?.release ?? null,
    houseStyleVersion: body.houseStyle.version,
    verdict,
    texts: body.texts,
    shelfDays,
  };
}
