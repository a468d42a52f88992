import type { Db } from '@/db/client';
import type { Actor } from '@/lib/domain/roles';
import { getStyle } from '@/lib/services/house-style/get-style';
import { proposeStyle } from '@/lib/services/house-style/propose';
import { putStyleInForce } from '@/lib/services/house-style/put-in-force';
import { saveStyleDraft } from '@/lib/services/house-style/save-draft';
import { startStyleDraft } from '@/lib/services/house-style/start-draft';
import { NOW } from './database';

export const FRAGILE_LEAD = 'style.messages.en.headline.lead.fragile';
export const OWN_FRAGILE =
  '{among, select, several {Of the two, {a} has} other {{a} has}} the higher figure, {aShare} to {bShare} for {b}, in poll by {pollster}, but the poll cannot settle it';

/** What editors do with versions, each act as it would come from the screen they have open. */
export function styleDesk(db: Db) {
  const ctx = (later = 0) => ({ db, now: NOW + later });
  const see = (actor: Actor, id: string) => getStyle(actor, id, ctx());
  return {
    ctx,
    see,
    start: (actor: Actor) => startStyleDraft(actor, ctx()).id,
    save(actor: Actor, id: string, changes: Record<string, unknown>) {
      const list = Object.entries(changes).map(([path, value]) => ({ path, value }));
      return saveStyleDraft(actor, { id, version: see(actor, id).version, changes: list }, ctx());
    },
    propose: (actor: Actor, id: string, note = 'A note of what changes.') =>
      proposeStyle(actor, { id, version: see(actor, id).version, note }, ctx()).hash,
    putInForce: (actor: Actor, id: string, later = 0) =>
      putStyleInForce(actor, { id, hash: see(actor, id).hash }, ctx(later)),

    /** Decided and proposed by the first, put in force by the second. */
    inForce(author: Actor, second: Actor, changes: Record<string, unknown>) {
      const id = this.start(author);
      this.save(author, id, changes);
      this.propose(author, id);
      this.putInForce(second, id);
      return id;
    },
  };
}
