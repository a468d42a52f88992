import 'server-only';
import { findEvidence, findLastAct, listActs } from '@/db/queries/clearing';
import { isListed } from '@/db/queries/embargo';
import { findOneReader } from '@/db/queries/one-reader';
import { findPerson } from '@/db/queries/person';
import { findWholeVersionByPublicId, listShares } from '@/db/queries/release';
import { listClearedLines } from '@/db/queries/sheet';
import { type Actor, canActAsEditor, canReadUnpublished, type Role } from '@/lib/domain/roles';
import { isAsPrinted } from '@/lib/domain/as-printed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { LineState, LineText } from '@/lib/domain/sheet';
import type { MissingDisclosure } from '@/lib/findings/disclosure';
import { authorize, type Ctx } from '../context';
import { type EmbargoView, embargoView } from '../release/get-release';
import { type AsPrintedBody, assembleAsPrinted } from './assemble-as-printed';
import { type DeskView, deskViewOf } from './desk-view';
import type { ActView } from './get-sheet';
import { isNight, isNightRuleOn } from './release-alone';
import { permissionsOf, type SheetPermissions } from './sheet-permissions';
import { openSheet } from './sheet-state';

export type OneReaderView = { by: string; second: string | null };

export type AsPrintedView = SheetPermissions & {
  id: string;
  version: number;
  state: LineState;
  author: string;
  isAuthor: boolean;
  /** In the words of house style, as they are or would be filed. */
  lines: LineText[];
  acts: ActView[];
  filer: { name: string; at: number } | null;
  hash: string | null;
  basisHash: string;
  hasMoved: boolean;
  isServed: boolean;
  release: ReleaseFacts;
  missing: MissingDisclosure[];
  enteredBy: Record<string, string>;
  embargo: EmbargoView | null;
  isOnList: boolean;
  /** Set where one editor released it alone. */
  oneReader: OneReaderView | null;
  /** Whether this person may release it alone now, or why not. */
  alone: 'may' | 'not-night' | 'off';
  maySecond: boolean;
  desk: DeskView;
};

/** Whether a sheet gives figures as printed and claims nothing. */
export function isAsPrintedSheet(actor: Actor, id: string, ctx: Ctx): boolean {
  authorize(canReadUnpublished(actor), 'Sheets are written and read by reporters and editors.');
  return isAsPrinted(openSheet(ctx.db, actor, id, ctx.now).sheet);
}

/** A sheet of figures as printed with what this person may do with it now. */
export function getAsPrinted(actor: Actor, id: string, ctx: Ctx): AsPrintedView {
  authorize(canReadUnpublished(actor), 'Sheets are written and read by reporters and editors.');
  const opened = openSheet(ctx.db, actor, id, ctx.now);
  const { sheet, release, state } = opened;
  const acts = listActs(ctx.db, sheet.id);
  const filing = findLastAct(ctx.db, sheet.id, 'filed');
  const stands = state === 'filed' || state === 'cleared' || state === 'pulled' ? filing : null;
  const frozen = stands?.evidenceId ? findEvidence(ctx.db, stands.evidenceId) : null;
  const keeps = frozen !== null && state !== 'filed';
  const now = keeps ? null : assembleAsPrinted(ctx.db, sheet, ctx.now);
  const body = now
    ? now.withTexts(state === 'filed' ? opened.texts : now.draft).body
    : (JSON.parse(frozen!.bytes.toString('utf8')) as AsPrintedBody);
  const filer = filing && { personId: filing.personId, roles: JSON.parse(filing.roles) as Role[] };
  const isServed = listClearedLines(ctx.db, sheet.id).length > 0;
  const alone = frozen && state === 'cleared' ? findOneReader(ctx.db, frozen.id) : null;
  const nameOf = (personId: number) => findPerson(ctx.db, personId)?.name ?? '';
  const permissions = permissionsOf(actor, {
    authorId: sheet.authorId,
    state,
    filer,
    isServed,
    isReturned: acts.at(-1)?.act.act === 'returned',
  });
  const whole = findWholeVersionByPublicId(ctx.db, body.release.versionId)!;
  return {
    ...permissions,
    may: { ...permissions.may, change: false },
    id: sheet.publicId,
    version: sheet.version,
    state,
    author: opened.author,
    isAuthor: sheet.authorId === actor.personId,
    lines: body.texts,
    acts: acts.map(({ act, person }) => ({ act: act.act, person, at: act.at, comment: act.comment })),
    filer: stands && { name: acts.find(({ act }) => act.id === stands.id)!.person, at: stands.at },
    hash: frozen?.hash ?? null,
    basisHash: now?.basisHash ?? '',
    hasMoved: state === 'filed' && now !== null && now.withTexts(opened.texts).hash !== frozen?.hash,
    isServed,
    release: body.release,
    missing: body.missing,
    enteredBy: Object.fromEntries(
      listShares(ctx.db, whole.question.id).map(({ share, enteredBy }) => [share.option, enteredBy]),
    ),
    embargo: embargoView(release, Boolean(opened.isPublic)),
    isOnList: isListed(ctx.db, release.id, actor),
    oneReader: alone && {
      by: nameOf(alone.personId),
      second: alone.secondPersonId === null ? null : nameOf(alone.secondPersonId),
    },
    alone: !isNightRuleOn(ctx.db) || !canActAsEditor(actor) ? 'off' : isNight(ctx.now) ? 'may' : 'not-night',
    maySecond: alone !== null && alone.secondAt === null && alone.personId !== actor.personId,
    desk: deskViewOf(ctx, actor, opened, frozen && { body, verdict: null }),
  };
}
