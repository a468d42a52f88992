import 'server-only';
import type { Conn } from '@/db/client';
import { findLatestHouseStyle, findLatestPolicy, insertHouseStyle, insertPolicy } from '@/db/queries/desk';
import type { Policy } from '@/lib/findings/check-types';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import { canonicalJson } from '@/lib/security/canonical';
import { DEFAULT_HOUSE_STYLE, type HouseStyle } from '@/lib/wording/house-style';
import { type Ctx, transact } from '../context';
import { appendRecord } from '../history/append-record';

export type DeskSettings = {
  policy: { version: number; body: Policy };
  houseStyle: { version: number; body: HouseStyle };
};

/** Gives a new database its first policy and house style. Run at every start; does nothing the second time. */
export function ensureDeskSettings(ctx: Ctx): void {
  transact(ctx, (tx) => {
    if (findLatestPolicy(tx) === null) {
      const id = insertPolicy(tx, canonicalJson(DEFAULT_POLICY), ctx.now);
      const entry = { personId: null, action: 'set policy', entity: 'policy', entityId: String(id) };
      appendRecord(tx, { ...entry, after: DEFAULT_POLICY }, ctx.now);
    }
    if (findLatestHouseStyle(tx) === null) {
      const id = insertHouseStyle(tx, canonicalJson(DEFAULT_HOUSE_STYLE), ctx.now);
      const entry = {
        personId: null,
        action: 'set house style',
        entity: 'house style',
        entityId: String(id),
      };
      appendRecord(tx, { ...entry, after: DEFAULT_HOUSE_STYLE }, ctx.now);
    }
  });
}

/** The policy and house style in force. */
export function readDeskSettings(conn: Conn): DeskSettings {
  const policy = findLatestPolicy(conn);
  const houseStyle = findLatestHouseStyle(conn);
  if (!policy || !houseStyle) throw new Error('the desk has no settings: ensureDeskSettings was not run');
  return {
    policy: { version: policy.id, body: JSON.parse(policy.body) as Policy },
    houseStyle: { version: houseStyle.id, body: JSON.parse(houseStyle.body) as HouseStyle },
  };
}
