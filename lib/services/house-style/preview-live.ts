import 'server-only';
import { z } from 'zod';
import { findEvidence, findLastAct } from '@/db/queries/clearing';
import { listClearedSheets } from '@/db/queries/sheet';
import { policyFor } from '@/lib/domain/house-style';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import type { LineKind } from '@/lib/domain/sheet';
import { check } from '@/lib/findings/check';
import type { Verdict } from '@/lib/findings/check-types';
import { findClaim } from '@/lib/findings/claim-key';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { carries } from '@/lib/wording/carries';
import { comparisonNote } from '@/lib/wording/comparison-words';
import { draftLine } from '@/lib/wording/draft-sheet';
import { authorize, type Ctx, parse } from '../context';
import { styleFor } from '../setup/desk-settings';
import type { EvidenceBody } from '../sheet/evidence-body';
import { bodyOf, EDITORS_ONLY, openStyle } from './open-version';
import type { StyleBody } from './style-body';

const schema = z.strictObject({
  id: z.string().min(1).max(64),
  from: z.coerce.number().int().min(0).max(100_000).default(0),
});

export type LiveChange = {
  sheet: string;
  race: string;
  pollster: string;
  verdict: { before: Verdict; after: Verdict | null };
  lines: { kind: LineKind; before: string; after: string }[];
};

export type LivePreview = {
  changes: LiveChange[];
  /** Sheets looked at so far, and in all; the next call starts where `next` says. */
  seen: number;
  total: number;
  next: number | null;
  /** More is live than is looked at. */
  isBounded: boolean;
};

/** Newest clearings looked at, and how many of them in one answer. */
const BOUND = 500;
const STEP = 20;

/**
 * What would read differently if the live sheets were drafted under this version: their frozen figures, drafted anew.
 * Nothing is changed. Called step by step, so that the screen can show how far it is and stop.
 */
export function previewLive(actor: Actor, input: unknown, ctx: Ctx): LivePreview {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  const { id, from } = parse(schema, input);
  const body = bodyOf(openStyle(ctx.db, actor, id));
  const search = { race: '', pollster: '', limit: BOUND + 1 };
  const live = listClearedSheets(ctx.db, actor, ctx.now, search);
  const total = Math.min(live.length, BOUND);
  const end = Math.min(from + STEP, total);
  const changes = live.slice(from, end).flatMap(({ sheet, race, pollster }): LiveChange[] => {
    const act = findLastAct(ctx.db, sheet.id, 'cleared');
    const evidence = act?.evidenceId ? findEvidence(ctx.db, act.evidenceId) : null;
    if (!evidence) return [];
    const found = redrafted(JSON.parse(evidence.bytes.toString('utf8')) as EvidenceBody, body);
    return found ? [{ sheet: sheet.publicId, race, pollster, ...found }] : [];
  });
  return { changes, seen: end, total, next: end < total ? end : null, isBounded: live.length > BOUND };
}

/** Verdict and drafted lines before and after, or null where nothing differs. */
export function redrafted(
  evidence: EvidenceBody,
  body: StyleBody,
): Pick<LiveChange, 'verdict' | 'lines'> | null {
  const { release, comparison, claim, claimKey, language } = evidence;
  const previous = comparison.release;
  const sources = [release, previous].flatMap((one) => (one ? [one.sampleSource] : []));
  const policy = policyFor(body.policy, sources);
  const houseStyle = styleFor(body.style, sources);
  const answer = check(parseCheckDocument({ ...evidence.document, policy }));
  const [old, now] = [evidence.answer, answer].map((one) => findClaim(one, claimKey)?.finding);
  if (!old || old.kind === 'share') return null;
  if (!now || now.kind === 'share') return { verdict: { before: old.verdict, after: null }, lines: [] };
  const told = { ...comparison, override: comparison.override && { ...comparison.override, by: '' } };
  const note = comparisonNote(told, houseStyle, language);
  const drafting = {
    claim,
    finding: now,
    answer,
    release,
    previous,
    comparison: { note },
    houseStyle,
    policy,
    language,
  };
  // A correction notice tells of what stood in print; no house style drafts it anew.
  const kinds = evidence.texts.map(({ kind }) => kind).filter((kind) => kind !== 'correction-notice');
  const lines = kinds.flatMap((kind) => {
    const before = evidence.draft.find((line) => line.kind === kind)?.text;
    const after = carries(kind, now.kind) ? draftLine(drafting, kind) : undefined;
    return before && after && before !== after ? [{ kind, before, after }] : [];
  });
  if (lines.length === 0 && old.verdict === now.verdict) return null;
  return { verdict: { before: old.verdict, after: now.verdict }, lines };
}
