import 'server-only';
import { findEvidence, findLastAct, listActs, type EvidenceRow } from '@/db/queries/clearing';
import { findStagedId } from '@/db/queries/corrections';
import { findEmbedOfSheet } from '@/db/queries/embed';
import { isListed } from '@/db/queries/embargo';
import { findPersonByPublicId } from '@/db/queries/person';
import { findWholeVersionByPublicId, listShares } from '@/db/queries/release';
import { listClearedLines, listEarlierAgreed, listEarlierTexts } from '@/db/queries/sheet';
import { type Actor, canActAsEditor, canReadUnpublished, type Role } from '@/lib/domain/roles';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { LineKind, LineState, RequestedLineKind } from '@/lib/domain/sheet';
import type { Language } from '@/lib/domain/vocabulary';
import { AppError } from '@/lib/errors';
import type { TestableFinding } from '@/lib/findings/check-types';
import { findClaim } from '@/lib/findings/claim-key';
import type { ComparisonTold } from '@/lib/wording/comparison-words';
import type { WordingMark } from '@/lib/wording/check/types';
import { type LineBasis, lineChecker } from '@/lib/wording/line-check';
import { authorize, type Ctx } from '../context';
import { type EmbargoView, embargoView } from '../release/get-release';
import { assemble } from './assemble-evidence';
import { type DeskView, deskViewOf } from './desk-view';
import type { EvidenceBody } from './evidence-body';
import { overrideIn } from './override-in';
import { permissionsOf, type SheetPermissions } from './sheet-permissions';
import { isUntouched, type Opened, openSheet } from './sheet-state';

export type LineView = {
  kind: LineKind;
  /** What house style drafts from the evidence shown. */
  draft: string;
  text: string;
  /** What this line said in its version before, where there was one. */
  earlier: string | null;
  /** What it said when it was last filed before, and when it was last cleared. */
  filed: string | null;
  cleared: string | null;
  knockedOut: boolean;
  changedBy: string;
  /** What the wording check says of words that are not those of the draft. */
  marks: readonly WordingMark[];
};

export type ActView = { act: string; person: string; at: number; comment: string | null };

export type SheetView = SheetPermissions & {
  id: string;
  version: number;
  state: LineState;
  claimKey: string;
  author: string;
  isAuthor: boolean;
  lines: LineView[];
  /** Kinds of line that can still be asked for. */
  addable: RequestedLineKind[];
  acts: ActView[];
  filer: { name: string; at: number } | null;
  /** Hash of the evidence that a filed or cleared sheet stands on. */
  hash: string | null;
  /** Hash of figures and draft as they are now; empty where these words cannot be filed as they are. */
  basisHash: string;
  /** What was filed no longer fits the figures or house style in force. */
  hasMoved: boolean;
  /** Words of this sheet are cleared and served now, also while newer ones are being written. */
  isServed: boolean;
  finding: TestableFinding;
  evidence: Pick<EvidenceBody, 'release' | 'document' | 'answer' | 'missing'>;
  previous: ReleaseFacts | null;
  comparison: ComparisonTold;
  enteredBy: Record<string, string>;
  embargo: EmbargoView | null;
  isOnList: boolean;
  language: Language;
  /** What the wording check holds the lines against; null of words that stand on frozen evidence alone. */
  lineBasis: LineBasis | null;
  /** Whether this person may file words that are not supported, with a reason. */
  mayOverride: boolean;
  /** Why the words shown were filed against the wording check. */
  override: { reason: string; by: string; marks: { kind: LineKind; phrase: string }[] } | null;
  embedId: string | null;
  /** The staged correction that these words wait for. */
  correctionId: string | null;
  desk: DeskView;
};

/** One sheet with its words, its evidence and what this person may do with it now. */
export function getSheet(actor: Actor, id: string, ctx: Ctx): SheetView {
  authorize(canReadUnpublished(actor), 'Sheets are written and read by reporters and editors.');
  const opened = openSheet(ctx.db, actor, id, ctx.now);
  const { sheet, release, state } = opened;
  const acts = listActs(ctx.db, sheet.id);
  const filing = findLastAct(ctx.db, sheet.id, 'filed');
  const stands = FROZEN.includes(state) ? filing : null;
  const frozen = stands?.evidenceId ? findEvidence(ctx.db, stands.evidenceId) : null;
  const shown = evidenceShown(ctx, opened, frozen);
  const finding = findingOf(shown.body);
  const filer = filing && { personId: filing.personId, roles: JSON.parse(filing.roles) as Role[] };
  const isServed = listClearedLines(ctx.db, sheet.id).length > 0;
  const { release: facts, comparison, document, answer, missing } = shown.body;
  return {
    id: sheet.publicId,
    version: sheet.version,
    state,
    claimKey: sheet.claimKey,
    author: opened.author,
    isAuthor: sheet.authorId === actor.personId,
    lines: linesOf(ctx, opened, shown),
    addable: shown.requestable.filter((kind) => !opened.lines.some(({ line }) => line.kind === kind)),
    acts: acts.map(({ act, person }) => ({ act: act.act, person, at: act.at, comment: act.comment })),
    filer: stands && { name: acts.find(({ act }) => act.id === stands.id)!.person, at: stands.at },
    hash: frozen?.hash ?? null,
    basisHash: shown.basisHash,
    hasMoved: shown.hasMoved,
    isServed,
    ...permissionsOf(actor, {
      authorId: sheet.authorId,
      state,
      filer,
      isServed,
      isReturned: acts.at(-1)?.act.act === 'returned',
    }),
    finding,
    evidence: { release: facts, document, answer, missing },
    previous: comparison.release,
    comparison: toldOf(ctx, comparison),
    enteredBy: enteredBy(ctx, facts.versionId),
    embargo: embargoView(release, Boolean(opened.isPublic)),
    isOnList: isListed(ctx.db, release.id, actor),
    language: shown.body.language,
    lineBasis: shown.lineBasis,
    mayOverride: canActAsEditor(actor),
    override: overrideOf(ctx, shown.body),
    embedId: findEmbedOfSheet(ctx.db, sheet.id)?.publicId ?? null,
    correctionId: findStagedId(ctx.db, sheet.correctionId),
    desk: deskViewOf(ctx, actor, opened, frozen && { body: shown.body, verdict: finding.verdict }),
  };
}

/** Words that stand on the evidence they were filed on. */
const FROZEN: readonly LineState[] = ['filed', 'agreed', 'cleared', 'pulled'];

type Shown = {
  body: EvidenceBody;
  basisHash: string;
  hasMoved: boolean;
  requestable: RequestedLineKind[];
  lineBasis: LineBasis | null;
};

const NOTHING_TO_ADD = { basisHash: '', requestable: [], lineBasis: null };

/** Cleared words are shown on the evidence they were cleared on, everything else on the figures of now. */
function evidenceShown(ctx: Ctx, opened: Opened, frozen: EvidenceRow | null): Shown {
  if (frozen && opened.state !== 'filed') return { ...NOTHING_TO_ADD, body: bodyOf(frozen), hasMoved: false };
  try {
    const assembled = assemble(ctx.db, opened.sheet, ctx.now);
    const { body, hash } = assembled.withTexts(opened.texts, overrideIn(frozen));
    const { basisHash, requestable, lineBasis } = assembled;
    return { body, basisHash, hasMoved: frozen !== null && frozen.hash !== hash, requestable, lineBasis };
  } catch (error) {
    if (!frozen || !(error instanceof AppError)) throw error;
    return { ...NOTHING_TO_ADD, body: bodyOf(frozen), hasMoved: true };
  }
}

function bodyOf(evidence: EvidenceRow): EvidenceBody {
  return JSON.parse(evidence.bytes.toString('utf8')) as EvidenceBody;
}

function findingOf({ answer, claimKey }: EvidenceBody): TestableFinding {
  const found = findClaim(answer, claimKey)?.finding;
  if (!found || found.kind === 'share') throw new Error('the evidence of a sheet lacks its claim');
  return found;
}

function overrideOf(ctx: Ctx, { wordingOverride: override }: EvidenceBody): SheetView['override'] {
  if (!override) return null;
  const by = findPersonByPublicId(ctx.db, override.person)?.name ?? 'An editor';
  return {
    reason: override.reason,
    by,
    marks: override.marks.map(({ kind, phrase }) => ({ kind, phrase })),
  };
}

function linesOf(ctx: Ctx, opened: Opened, { body, lineBasis }: Shown): LineView[] {
  const check = lineBasis ? lineChecker(lineBasis) : () => [];
  const draftOf = (kind: LineKind, before: string) =>
    body.draft.find((line) => line.kind === kind)?.text ?? before;
  const earlier = listEarlierTexts(ctx.db, opened.sheet.id);
  const agreed = listEarlierAgreed(ctx.db, opened.sheet.id);
  const isWritten = opened.state === 'draft' || opened.state === 'sent-back';
  return opened.lines.map(({ line, version, changedBy }) => {
    const draft = draftOf(line.kind, version.draftText);
    // Words that nobody edited follow figures and house style for as long as the sheet is being written.
    const text = isWritten && isUntouched(version) ? draft : version.text;
    return {
      kind: line.kind,
      draft,
      text,
      earlier: earlier.get(line.id) ?? null,
      filed: agreed.filed.get(line.id) ?? null,
      cleared: agreed.cleared.get(line.id) ?? null,
      knockedOut: line.knockedOut,
      changedBy,
      marks: check({ kind: line.kind, text, draft }),
    };
  });
}

function toldOf(ctx: Ctx, { override, ...told }: EvidenceBody['comparison']): ComparisonTold {
  const { reason, unknowns, differences, passedOver } = told;
  const by = override && (findPersonByPublicId(ctx.db, override.person)?.name ?? 'An editor');
  return {
    reason,
    unknowns,
    differences,
    passedOver,
    override: override && by ? { reason: override.reason, by } : null,
  };
}

/** Of the version shown: pulled words keep their evidence when the release has moved on. */
function enteredBy(ctx: Ctx, versionId: string): Record<string, string> {
  const whole = findWholeVersionByPublicId(ctx.db, versionId)!;
  return Object.fromEntries(
    listShares(ctx.db, whole.question.id).map(({ share, enteredBy }) => [share.option, enteredBy]),
  );
}
