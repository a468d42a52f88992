import 'server-only';
import type { Conn, Tx } from '@/db/client';
import { findLatestHouseStyle, findLatestPolicy, insertHouseStyle, insertPolicy } from '@/db/queries/desk';
import {
  findLatestShipped,
  findStyleInState,
  insertStyleVersion,
  nextStyleNumber,
} from '@/db/queries/house-style';
import { type DeskPolicy, type NotRandom, policyFor } from '@/lib/domain/house-style';
import type { Policy } from '@/lib/findings/check-types';
import { canonicalJson, hashOf } from '@/lib/security/canonical';
import { newId } from '@/lib/security/ids';
import { DEFAULT_HOUSE_STYLE, type HouseStyle } from '@/lib/wording/house-style';
import { type Ctx, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { carriedOver } from '../house-style/leaves';
import { DEFAULT_DESK_POLICY, readPolicy, readStyle } from '../house-style/style-body';

export type DeskSettings = {
  policy: { version: number; body: Policy };
  houseStyle: { version: number; body: HouseStyle };
};

/**
 * Gives a new database its first policy and house style, in force at once since nothing was agreed before. Where
 * the product has newer wording than an existing desk, that becomes a draft for its editors, never more.
 * Run at every start.
 */
export function ensureDeskSettings(ctx: Ctx): void {
  transact(ctx, (tx) => {
    const isNew = findLatestHouseStyle(tx) === null;
    ensureFirst(tx, ctx.now);
    ensureNumbered(tx, ctx.now);
    if (!isNew) draftNewerWording(tx, ctx.now, DEFAULT_HOUSE_STYLE);
  });
}

function ensureFirst(tx: Tx, now: number): void {
  if (findLatestPolicy(tx) === null) {
    const id = insertPolicy(tx, canonicalJson(DEFAULT_DESK_POLICY), now);
    const entry = { personId: null, action: 'set policy', entity: 'policy', entityId: String(id) };
    appendRecord(tx, { ...entry, after: DEFAULT_DESK_POLICY }, now);
  }
  if (findLatestHouseStyle(tx) === null) {
    const id = insertHouseStyle(tx, canonicalJson(DEFAULT_HOUSE_STYLE), now);
    const entry = { personId: null, action: 'set house style', entity: 'house style', entityId: String(id) };
    appendRecord(tx, { ...entry, after: DEFAULT_HOUSE_STYLE }, now);
  }
}

/** What is in force without a numbered version gets one: the first of a desk, or of a database from before. */
function ensureNumbered(tx: Tx, now: number): void {
  if (findStyleInState(tx, 'in-force')) return;
  const [style, policy] = [findLatestHouseStyle(tx)!, findLatestPolicy(tx)!];
  insertStyleVersion(tx, {
    publicId: newId(),
    number: nextStyleNumber(tx),
    origin: 'product',
    state: 'in-force',
    note: 'As the product ships it.',
    houseStyle: style.body,
    policy: policy.body,
    shipped: style.body,
    hash: hashOf({ style: JSON.parse(style.body), policy: JSON.parse(policy.body) }),
    houseStyleId: style.id,
    policyId: policy.id,
    inForceAt: style.createdAt,
    createdAt: style.createdAt,
    updatedAt: now,
  });
}

/** A draft of the desk's own house style with the product's newer wording where the desk had changed nothing. */
export function draftNewerWording(tx: Tx, now: number, shipped: HouseStyle): string | null {
  const inForce = findStyleInState(tx, 'in-force')!;
  const known = findLatestShipped(tx);
  const before = known?.shipped ? readStyle(known.shipped) : null;
  if (!before || before.templateVersion === shipped.templateVersion) return null;
  const merged = carriedOver(before, readStyle(inForce.houseStyle), shipped);
  const style = { ...merged.body, templateVersion: shipped.templateVersion };
  const kept = merged.contested.length;
  const note =
    `The product’s own wording has a newer version, ${shipped.templateVersion}.` +
    (kept > 0
      ? ` ${kept === 1 ? 'One decision' : `${kept} decisions`} of this desk stood against it and were kept.`
      : '');
  const row = insertStyleVersion(tx, {
    publicId: newId(),
    origin: 'product',
    state: 'draft',
    note,
    houseStyle: canonicalJson(style),
    policy: canonicalJson(readPolicy(inForce.policy)),
    shipped: canonicalJson(shipped),
    basedOnId: inForce.id,
    createdAt: now,
    updatedAt: now,
  });
  const entry = { personId: null, action: 'drafted newer wording', entity: 'house style version' };
  appendRecord(tx, { ...entry, entityId: row.publicId, after: { templates: shipped.templateVersion } }, now);
  return row.publicId;
}

/** The policy and house style in force, for releases of these kinds of sample; none named means a random one. */
export function readDeskSettings(conn: Conn, sources: readonly SampleSource[] = []): DeskSettings {
  const policy = findLatestPolicy(conn);
  const houseStyle = findLatestHouseStyle(conn);
  if (!policy || !houseStyle) throw new Error('the desk has no settings: ensureDeskSettings was not run');
  return {
    policy: { version: policy.id, body: policyFor(readPolicy(policy.body), sources) },
    houseStyle: { version: houseStyle.id, body: styleFor(readStyle(houseStyle.body), sources) },
  };
}

/** Which kinds of sample the desk computes as if random. */
export function readComparisonBasis(conn: Conn): DeskPolicy['comparisonBasis'] {
  const stored = findLatestPolicy(conn);
  return (stored ? readPolicy(stored.body) : DEFAULT_DESK_POLICY).comparisonBasis;
}

type SampleSource = 'probability' | NotRandom;

/** The house style for a release: the rule that is printed is the one of its kind of sample. */
export function styleFor(style: HouseStyle, sources: readonly SampleSource[]): HouseStyle {
  const own = sources.flatMap((source) => (source === 'probability' ? [] : [style.comparisonRules[source]]));
  const rule = own.find((text) => text !== '');
  return rule === undefined ? style : { ...style, comparisonRule: rule };
}
