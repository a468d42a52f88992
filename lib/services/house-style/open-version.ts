import 'server-only';
import type { Conn, Tx } from '@/db/client';
import {
  findStyleInState,
  findStyleVersion,
  insertStyleAct,
  type StyleActRow,
  type StyleVersionRow,
} from '@/db/queries/house-style';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { hashOf } from '@/lib/security/canonical';
import { authorize } from '../context';
import { appendRecord } from '../history/append-record';
import { readPolicy, readStyle, type StyleBody } from './style-body';

export const EDITORS_ONLY = 'House style belongs to the editors: only they change it.';
export const MOVED_ON =
  'Somebody changed this version meanwhile. Reload the page and look again; nothing was done.';

export function bodyOf(row: Pick<StyleVersionRow, 'houseStyle' | 'policy'>): StyleBody {
  return { style: readStyle(row.houseStyle), policy: readPolicy(row.policy) };
}

/** What two people agree to: every decision and the note that explains them. */
export function agreedHash(row: Pick<StyleVersionRow, 'houseStyle' | 'policy' | 'note'>): string {
  const [style, policy] = [JSON.parse(row.houseStyle) as unknown, JSON.parse(row.policy) as unknown];
  return hashOf({ style, policy, note: row.note });
}

/** @throws AppError `not-found`, also for a draft or proposal that the asker may not see */
export function openStyle(conn: Conn, actor: Actor, id: string): StyleVersionRow {
  const row = findStyleVersion(conn, id);
  const isOpen = row?.state === 'in-force' || row?.state === 'replaced' || canActAsEditor(actor);
  if (!row || !isOpen) throw new AppError('not-found', 'There is no such version.');
  return row;
}

/** A draft that this editor writes. @throws AppError where it is not one, or somebody else's */
export function openOwnDraft(conn: Conn, actor: Actor, id: string, version: number): StyleVersionRow {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  const row = openStyle(conn, actor, id);
  if (row.state !== 'draft')
    throw new AppError('conflict', 'This version is no draft any more. Start a new one to change it.');
  authorize(row.authorId !== null, 'Nobody has taken up this draft yet. Take it up to change it.');
  authorize(row.authorId === actor.personId, 'This draft is another editor’s. Only they change it.');
  if (row.version !== version) throw new AppError('conflict', MOVED_ON);
  return row;
}

export function currentStyle(conn: Conn): StyleVersionRow {
  const row = findStyleInState(conn, 'in-force');
  if (!row) throw new Error('no house style is in force: ensureDeskSettings was not run');
  return row;
}

export function refuseUnless(condition: boolean, message: string): asserts condition {
  if (!condition) throw new AppError('conflict', message);
}

/** One person's act on a version, with its entry in the history. */
export function recordAct(
  tx: Tx,
  actor: Actor,
  row: StyleVersionRow,
  act: { act: StyleActRow['act']; hash: string; comment?: string; before: string; after: string },
  now: number,
): void {
  const { hash, comment } = act;
  insertStyleAct(tx, {
    styleVersionId: row.id,
    act: act.act,
    personId: actor.personId,
    roles: JSON.stringify(actor.roles),
    hash,
    comment: comment ?? null,
    at: now,
  });
  const words: Record<StyleActRow['act'], string> = {
    proposed: 'proposed house style',
    'put-in-force': 'put house style in force',
    'sent-back': 'sent house style back',
    withdrawn: 'withdrew house style',
  };
  appendRecord(
    tx,
    {
      personId: actor.personId,
      action: words[act.act],
      entity: 'house style version',
      entityId: row.publicId,
      before: { state: act.before },
      after: { state: act.after, agreedTo: hash, note: row.note },
      ...(comment ? { reason: comment } : {}),
    },
    now,
  );
}
