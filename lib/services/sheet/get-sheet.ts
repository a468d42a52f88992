import 'server-only';
import { findEvidence, findLastAct, listActs } from '@/db/queries/clearing';
import { findEmbedOfSheet } from '@/db/queries/embed';
import { isListed } from '@/db/queries/embargo';
import { findWholeVersion, listShares } from '@/db/queries/release';
import {
  type Actor,
  canActAsEditor,
  canReadUnpublished,
  isTwoPersonAgreement,
  type Role,
} from '@/lib/domain/roles';
import type { LineKind, LineState } from '@/lib/domain/sheet';
import { claimsAbove } from '@/lib/wording/never-says-more';
import { authorize, type Ctx } from '../context';
import { type EmbargoView, embargoView } from '../release/get-release';
import { type Assembled, assemble } from './assemble-evidence';
import { openSheet } from './sheet-state';

export type LineView = {
  kind: LineKind;
  draft: string;
  text: string;
  knockedOut: boolean;
  changedBy: string;
  /** Phrases that say more than the verdict, as a caution. */
  above: string[];
};

export type ActView = { act: string; person: string; at: number; comment: string | null };

export type SheetView = {
  id: string;
  version: number;
  state: LineState;
  claimKey: string;
  author: string;
  lines: LineView[];
  acts: ActView[];
  filer: { name: string; at: number } | null;
  /** Hash of the evidence that a filed or cleared sheet stands on. */
  hash: string | null;
  /** Hash of figures and draft as they are now. */
  basisHash: string;
  /** What was filed no longer fits the figures or house style in force. */
  hasMoved: boolean;
  may: { write: boolean; change: boolean; clear: boolean; sendBack: boolean; pull: boolean; revise: boolean };
  /** Why a filed sheet cannot be cleared by this reader. */
  notYours: 'filer' | 'needs-editor' | null;
  finding: Assembled['finding'];
  findingIndex: number;
  computed: Pick<Assembled['computed'], 'facts' | 'previous' | 'document' | 'answer' | 'missing'>;
  comparison: { unknowns: string[]; differences: string[]; override: { reason: string; by: string } | null };
  enteredBy: Record<string, string>;
  embargo: EmbargoView | null;
  isOnList: boolean;
  embedId: string | null;
};

/** One sheet with its words, its evidence and what this person may do with it now. */
export function getSheet(actor: Actor, id: string, ctx: Ctx): SheetView {
  authorize(canReadUnpublished(actor), 'Sheets are written and read by reporters and editors.');
  const opened = openSheet(ctx.db, actor, id, ctx.now);
  const { sheet, release, state } = opened;
  const assembled = assemble(ctx.db, sheet);
  const acts = listActs(ctx.db, sheet.id);
  const filing = findLastAct(ctx.db, sheet.id, 'filed');
  const stands = state === 'filed' || state === 'cleared' ? filing : null;
  const evidence = stands?.evidenceId ? findEvidence(ctx.db, stands.evidenceId) : null;
  const hasMoved =
    state === 'filed' && evidence !== null && assembled.withTexts(opened.texts).hash !== evidence.hash;
  const whole = findWholeVersion(ctx.db, sheet.releaseVersionId)!;
  const { comparison, facts, previous, document, answer, missing } = assembled.computed;
  const filer = stands && { personId: stands.personId, roles: JSON.parse(stands.roles) as Role[] };
  return {
    id: sheet.publicId,
    version: sheet.version,
    state,
    claimKey: sheet.claimKey,
    author: opened.author,
    lines: opened.lines.map(({ line, version, changedBy }) => ({
      kind: line.kind,
      draft: version.draftText,
      text: version.text,
      knockedOut: line.knockedOut,
      changedBy,
      above: claimsAbove(assembled.finding.verdict, version.text),
    })),
    acts: acts.map(({ act, person }) => ({ act: act.act, person, at: act.at, comment: act.comment })),
    filer: stands && { name: acts.find(({ act }) => act.id === stands.id)!.person, at: stands.at },
    hash: evidence?.hash ?? null,
    basisHash: assembled.basisHash,
    hasMoved,
    ...permissions(actor, sheet.authorId, state, filer),
    finding: assembled.finding,
    findingIndex: assembled.findingIndex,
    computed: { facts, previous, document, answer, missing },
    comparison: {
      unknowns: comparison.unknowns,
      differences: comparison.differences.map(({ item }) => item),
      override: comparison.override && { reason: comparison.override.reason, by: comparison.override.by },
    },
    enteredBy: Object.fromEntries(
      listShares(ctx.db, whole.question.id).map(({ share, enteredBy }) => [share.option, enteredBy]),
    ),
    embargo: embargoView(release, Boolean(opened.isPublic)),
    isOnList: isListed(ctx.db, release.id, actor),
    embedId: findEmbedOfSheet(ctx.db, sheet.id)?.publicId ?? null,
  };
}

function permissions(
  actor: Actor,
  authorId: number,
  state: LineState,
  filer: { personId: number; roles: Role[] } | null,
): Pick<SheetView, 'may' | 'notYours'> {
  const editor = canActAsEditor(actor);
  const mine = authorId === actor.personId;
  const filed = state === 'filed' && filer !== null;
  const isFiler = filed && filer.personId === actor.personId;
  const second = filed && isTwoPersonAgreement(filer, actor);
  return {
    may: {
      write: (state === 'draft' || state === 'sent-back') && (mine || editor),
      change: filed && editor && !isFiler,
      clear: second,
      sendBack: second || isFiler,
      pull: state === 'cleared' && editor,
      revise: (state === 'cleared' || state === 'pulled') && (mine || editor),
    },
    notYours: !filed || second ? null : isFiler ? 'filer' : 'needs-editor',
  };
}
