import 'server-only';
import { findPerson } from '@/db/queries/person';
import { findStyleVersionById, listStyleActs, type StyleVersionRow } from '@/db/queries/house-style';
import type { StyleAct, StyleOrigin, StyleState } from '@/lib/domain/house-style';
import { type Actor, canActAsEditor, canReadCopyDesk } from '@/lib/domain/roles';
import { authorize, type Ctx } from '../context';
import type { SentenceFault } from './sentence-fault';
import { type Change, changesBetween } from './leaves';
import { bodyOf, currentStyle, openStyle } from './open-version';
import { decide, type Typed, typedOf } from './save-draft';
import type { StyleBody } from './style-body';

export type StyleView = {
  id: string;
  number: number | null;
  state: StyleState;
  origin: StyleOrigin;
  version: number;
  note: string;
  author: string | null;
  second: string | null;
  inForceAt: number | null;
  updatedAt: number;
  hash: string | null;
  body: StyleBody;
  /** Against the version it started from, or, once in force, the one before it. */
  comparedWith: { id: string; number: number | null } | null;
  changes: Change[];
  /** Another version has come into force since this draft was started. */
  isBehind: boolean;
  acts: { act: StyleAct; person: string; at: number; comment: string | null }[];
  typed: Typed;
  faults: Record<string, SentenceFault[]>;
  may: { write: boolean; takeUp: boolean; withdraw: boolean; putInForce: boolean; sendBack: boolean };
  /** Why an editor cannot put a proposed version in force. */
  isOwnProposal: boolean;
};

export function getStyle(actor: Actor, id: string, ctx: Pick<Ctx, 'db'>): StyleView {
  authorize(canReadCopyDesk(actor), 'House style is read by the staff of this desk.');
  return viewOf(actor, openStyle(ctx.db, actor, id), ctx);
}

export function getCurrentStyle(actor: Actor, ctx: Pick<Ctx, 'db'>): StyleView {
  authorize(canReadCopyDesk(actor), 'House style is read by the staff of this desk.');
  return viewOf(actor, currentStyle(ctx.db), ctx);
}

function viewOf(actor: Actor, row: StyleVersionRow, ctx: Pick<Ctx, 'db'>): StyleView {
  const body = bodyOf(row);
  const base = row.basedOnId === null ? null : findStyleVersionById(ctx.db, row.basedOnId);
  const isOpen = row.state === 'draft' || row.state === 'proposed';
  const isAuthor = row.authorId === actor.personId;
  const typed = isAuthor ? typedOf(row.typed) : {};
  const nameOf = (personId: number | null) => (personId === null ? null : findPerson(ctx.db, personId)?.name);
  return {
    id: row.publicId,
    number: row.number,
    state: row.state,
    origin: row.origin,
    version: row.version,
    note: row.note,
    author: nameOf(row.authorId) ?? null,
    second: nameOf(row.putInForceBy) ?? null,
    inForceAt: row.inForceAt,
    updatedAt: row.updatedAt,
    hash: row.hash,
    body,
    comparedWith: base && { id: base.publicId, number: base.number },
    changes: base ? changesBetween(bodyOf(base), body) : [],
    isBehind: isOpen && row.basedOnId !== currentStyle(ctx.db).id,
    acts: listStyleActs(ctx.db, row.id).map(({ act, person }) => ({
      act: act.act,
      person,
      at: act.at,
      comment: act.comment,
    })),
    typed,
    faults: faultsOf(body, typed),
    may: permissionsOf(actor, row),
    isOwnProposal: row.state === 'proposed' && row.proposedBy === actor.personId,
  };
}

function faultsOf(body: StyleBody, typed: Typed): StyleView['faults'] {
  return Object.fromEntries(
    Object.entries(typed).map(([path, value]) => [path, decide(body, path, value).faults]),
  );
}

function permissionsOf(actor: Actor, row: StyleVersionRow): StyleView['may'] {
  const editor = canActAsEditor(actor);
  const draft = editor && row.state === 'draft';
  const proposed = editor && row.state === 'proposed';
  const isAuthor = row.authorId === actor.personId;
  return {
    write: draft && isAuthor,
    takeUp: draft && row.authorId === null,
    withdraw: draft && (isAuthor || row.authorId === null),
    putInForce: proposed && row.proposedBy !== actor.personId,
    sendBack: proposed,
  };
}

/** Two versions that are or were in force, for the list of differences. */
export function compareStyles(
  actor: Actor,
  { from, to }: { from: string; to: string },
  ctx: Pick<Ctx, 'db'>,
): { from: number | null; to: number | null; changes: Change[] } {
  authorize(canReadCopyDesk(actor), 'House style is read by the staff of this desk.');
  const [one, other] = [openStyle(ctx.db, actor, from), openStyle(ctx.db, actor, to)];
  return { from: one.number, to: other.number, changes: changesBetween(bodyOf(one), bodyOf(other)) };
}
