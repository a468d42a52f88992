import 'server-only';
import { z } from 'zod';
import { updateStyleVersion } from '@/db/queries/house-style';
import { deskPolicySchema } from '@/lib/domain/house-style';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import type { Verdict } from '@/lib/findings/check-types';
import { canonicalJson } from '@/lib/security/canonical';
import { claimsAbove } from '@/lib/wording/never-says-more';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { faultsOfSentence } from './check-sentences';
import type { SentenceFault } from './sentence-fault';
import { leafAt, withLeaf } from './leaves';
import { bodyOf, EDITORS_ONLY, MOVED_ON, openOwnDraft, refuseUnless } from './open-version';
import { SENTENCE, type StyleBody, STYLE_FIELDS } from './style-body';
import { target } from './start-draft';

const schema = target.extend({
  changes: z
    .array(z.strictObject({ path: z.string().min(1).max(200), value: z.json() }))
    .max(50, 'Too many changes at once.'),
  note: z.string().trim().max(2000, 'At most 2,000 characters.').optional(),
});

export type Saved = {
  version: number;
  /** By path, of the decisions that were sent: what keeps one from being part of the draft. */
  faults: Record<string, SentenceFault[]>;
};

/**
 * Saves what an editor decides. A decision with a fault is refused: it never becomes part of the draft, and what was
 * typed is kept beside it, so that nothing is lost.
 */
export function saveStyleDraft(actor: Actor, input: unknown, ctx: Ctx): Saved {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  const { id, version, changes, note } = parse(schema, input);
  const opened = openOwnDraft(ctx.db, actor, id, version);
  // Drafting over the table takes a moment, so it is done before the write lock is taken.
  const { body, typed, faults } = applied(bodyOf(opened), typedOf(opened.typed), changes);
  return transact(ctx, (tx) => {
    const row = openOwnDraft(tx, actingNow(tx, actor), id, version);
    const set = {
      houseStyle: canonicalJson(body.style),
      policy: canonicalJson(body.policy),
      typed: canonicalJson(typed),
      ...(note === undefined ? {} : { note }),
      updatedAt: Math.max(ctx.now, row.updatedAt),
    };
    refuseUnless(updateStyleVersion(tx, row, set), MOVED_ON);
    return { version: version + 1, faults };
  });
}

export type Typed = Record<string, unknown>;

export function typedOf(stored: string): Typed {
  return JSON.parse(stored) as Typed;
}

function applied(from: StyleBody, before: Typed, changes: { path: string; value: unknown }[]) {
  let body = from;
  const typed = { ...before };
  const faults: Record<string, SentenceFault[]> = {};
  for (const { path, value } of changes) {
    const found = decide(body, path, value);
    if (found.faults.length > 0) {
      faults[path] = found.faults;
      if (isKnown(body, path)) typed[path] = value;
    } else {
      body = found.body;
      delete typed[path];
    }
  }
  return { body, typed, faults };
}

const isKnown = (body: StyleBody, path: string) => leafAt(body, path) !== undefined;
const fault = (message: string, phrase: string | null = null): SentenceFault => ({
  message,
  place: null,
  phrase,
});
type Decided = { body: StyleBody; faults: SentenceFault[] };

/** One decision on a body: the body with it, or why it is refused. */
export function decide(body: StyleBody, path: string, value: unknown): Decided {
  const refused = (...faults: SentenceFault[]): Decided => ({ body, faults });
  if (!isKnown(body, path)) return refused(fault('There is no such decision in a house style.'));
  if (path.startsWith('policy.')) return decidePolicy(body, path, value);
  if (path.startsWith('style.messages.')) return decideSentence(body, path, value);
  const field = STYLE_FIELDS[path];
  if (!field) return refused(fault('This cannot be changed here.'));
  const parsed = field.safeParse(value);
  if (!parsed.success) return refused(fault(firstMessage(parsed.error)));
  const rung = /^style\.ladder\.(.+)$/.exec(path)?.[1];
  const above = rung ? ladderFaults(rung as Verdict, parsed.data as string[]) : [];
  return above.length > 0 ? refused(...above) : { body: withLeaf(body, path, parsed.data), faults: [] };
}

function decidePolicy(body: StyleBody, path: string, value: unknown): Decided {
  const changed = withLeaf(body, path, value);
  const parsed = deskPolicySchema.safeParse(changed.policy);
  if (!parsed.success) return { body, faults: [fault(firstMessage(parsed.error))] };
  return { body: { ...body, policy: parsed.data }, faults: [] };
}

function decideSentence(body: StyleBody, path: string, value: unknown): Decided {
  const now = leafAt(body, path);
  if (Array.isArray(now)) return decideList(body, path, value, now);
  const parsed = SENTENCE.safeParse(value);
  if (!parsed.success) return { body, faults: [fault(firstMessage(parsed.error))] };
  const faults = faultsOfSentence(path, parsed.data, body.style);
  return faults.length > 0 ? { body, faults } : { body: withLeaf(body, path, parsed.data), faults: [] };
}

function decideList(body: StyleBody, path: string, value: unknown, now: readonly unknown[]): Decided {
  const parsed = z.array(z.string().trim().max(80)).length(now.length).safeParse(value);
  if (!parsed.success) return { body, faults: [fault(`This list has ${now.length} words, in this order.`)] };
  return { body: withLeaf(body, path, parsed.data), faults: [] };
}

function ladderFaults(verdict: Verdict, verbs: readonly string[]): SentenceFault[] {
  const isTerse = new Set(['up', 'down', 'above', 'below', 'higher', 'lower']);
  return verbs
    .filter((verb) => !isTerse.has(verb))
    .flatMap((verb) => claimsAbove(verdict, verb).map((phrase) => ({ verb, phrase })))
    .map(({ verb, phrase }) => fault(`“${verb}” says more than this verdict supports.`, phrase));
}

const firstMessage = (error: z.ZodError) => error.issues[0]?.message ?? 'This cannot be read.';
