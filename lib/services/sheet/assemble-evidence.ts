import 'server-only';
import type { Conn } from '@/db/client';
import { findStandIn } from '@/db/queries/corrections';
import { findPerson } from '@/db/queries/person';
import { listNewestLines, type SheetRow } from '@/db/queries/sheet';
import { ENGLISH_CHART_WORDS } from '@/lib/charts/chart-words';
import { soundingScene } from '@/lib/charts/sounding-scene';
import { soundingSpecOf } from '@/lib/charts/sounding-spec-of';
import { inScreenOrder, type Claim, type LineText, type RequestedLineKind } from '@/lib/domain/sheet';
import type { Language } from '@/lib/domain/vocabulary';
import type { WordingOverride } from '@/lib/domain/wording-override';
import { AppError } from '@/lib/errors';
import type { TestableFinding } from '@/lib/findings/check-types';
import { findClaim } from '@/lib/findings/claim-key';
import { canonicalJson, hashOf } from '@/lib/security/canonical';
import { sha256 } from '@/lib/security/ids';
import { comparisonNote } from '@/lib/wording/comparison-words';
import { requestable } from '@/lib/wording/carries';
import { isOfTwoReleases } from '@/lib/wording/draft-input';
import { draftLine, draftSheet } from '@/lib/wording/draft-sheet';
import type { LineBasis } from '@/lib/wording/line-check';
import { type Computed, computeFindings } from '../release/compute-findings';
import { correctedFrom } from './corrected-from';
import type { EvidenceBody } from './evidence-body';

const SCENE_PX = 640;

export type Subject = Pick<SheetRow, 'publicId' | 'claim' | 'claimKey' | 'language' | 'releaseVersionId'> & {
  /** Absent of a sheet that is being made. */
  id?: number;
  /** Of a sheet that takes another one's place once a correction is applied. */
  correctionId?: number | null;
  replacesSheetId?: number | null;
};

export type Assembled = {
  finding: TestableFinding;
  findingIndex: number;
  computed: Computed;
  draft: LineText[];
  /** Kinds of line that this claim can carry beside the standing ones, on the sheet or not yet. */
  requestable: RequestedLineKind[];
  draftRequested: (kind: RequestedLineKind) => string;
  /** The evidence that these texts would be cleared on. */
  withTexts: (
    texts: LineText[],
    override?: WordingOverride | null,
  ) => { body: EvidenceBody; bytes: Buffer; hash: string };
  /** What the wording check holds the lines against. */
  lineBasis: LineBasis;
  /** Hash of everything but the texts: what a writer has in front of them. */
  basisHash: string;
};

/** Everything a sheet rests on, computed anew from what is stored now. */
export function assemble(conn: Conn, sheet: Subject, now: number): Assembled {
  const computed = computeFindings(conn, sheet.releaseVersionId, now, findStandIn(conn, sheet.correctionId));
  const { facts, previous, comparison, settings, document, answer, missing } = computed;
  const found = findClaim(answer, sheet.claimKey);
  if (!found || found.finding.kind === 'share')
    throw new AppError(
      'conflict',
      'This release supports no such claim any more. Draft a new sheet from it.',
    );
  const finding = found.finding;
  const claim = JSON.parse(sheet.claim) as Claim;
  const language = sheet.language as Language;
  // What a replacement puts right is what the sheet in print says.
  const correctedId = sheet.replacesSheetId ?? sheet.id;
  const corrected = correctedId === undefined ? undefined : correctedFrom(conn, correctedId, facts, previous);
  const input = {
    claim,
    finding,
    answer,
    release: facts,
    previous,
    comparison: { note: comparisonNote(comparison, settings.houseStyle.body, language) },
    houseStyle: settings.houseStyle.body,
    policy: settings.policy.body,
    language,
    ...(corrected ? { corrected } : {}),
  };
  const offered = requestable(input);
  const asked = sheet.id === undefined ? [] : listNewestLines(conn, sheet.id).map(({ line }) => line.kind);
  const requested = offered.filter((kind) => asked.includes(kind));
  const draft = inScreenOrder<LineText>(
    [...draftSheet(input), ...requested.map((kind) => ({ kind, text: draftLine(input, kind) }))],
    ({ kind }) => kind,
  );
  const spec = soundingSpecOf(finding, document, ENGLISH_CHART_WORDS);
  if (!spec) throw new AppError('conflict', 'There is no figure to write about: a share is not disclosed.');
  const overridePerson = comparison.override && findPerson(conn, comparison.override.personId);
  const basis: Omit<EvidenceBody, 'texts'> = {
    schema: 1,
    sheet: sheet.publicId,
    claim,
    claimKey: sheet.claimKey,
    language,
    release: facts,
    comparison: {
      release: previous,
      reason: comparison.reason,
      unknowns: comparison.unknowns,
      differences: comparison.differences,
      passedOver: comparison.passedOver,
      override:
        comparison.override && overridePerson
          ? { reason: comparison.override.reason, person: overridePerson.publicId }
          : null,
    },
    policy: { version: settings.policy.version },
    houseStyle: {
      version: settings.houseStyle.version,
      templates: settings.houseStyle.body.templateVersion,
      hash: hashOf(settings.houseStyle.body),
    },
    engine: answer.engine,
    document,
    answer,
    draft,
    chart: {
      spec,
      rows: facts.shares.map((share) => ({
        option: share.option,
        isAnswer: share.isAnswer,
        share: shareSpec(computed, share.option),
      })),
      scene: soundingScene(spec, { widthPx: SCENE_PX, kind: 'full' }, ENGLISH_CHART_WORDS),
    },
    missing,
  };
  return {
    finding,
    findingIndex: found.index,
    computed,
    draft,
    requestable: offered,
    draftRequested: (kind) => draftLine(input, kind),
    basisHash: hashOf(basis),
    lineBasis: { ...lineBasisOf(computed, claim, language), ...(corrected ? { was: corrected.was } : {}) },
    withTexts: (texts, override) => {
      const body: EvidenceBody = {
        ...basis,
        texts,
        ...(override ? { wordingOverride: override } : {}),
      };
      const bytes = Buffer.from(canonicalJson(body), 'utf8');
      return { body, bytes, hash: sha256(bytes) };
    },
  };
}

function lineBasisOf(computed: Computed, claim: Claim, language: Language): LineBasis {
  const { facts, previous, answer, comparison, settings } = computed;
  const { messages: _, ...houseStyle } = settings.houseStyle.body;
  const { differences, unknowns, override } = comparison;
  return {
    release: facts,
    previous,
    answer,
    comparison: { differences, unknowns, isOverridden: override !== null },
    policy: settings.policy.body,
    houseStyle,
    language,
    polls: isOfTwoReleases(claim.kind) ? 2 : 1,
  };
}

function shareSpec({ answer, document }: Computed, option: string) {
  const finding = answer.findings.find((entry) => entry.kind === 'share' && entry.option === option);
  return finding ? soundingSpecOf(finding, document, ENGLISH_CHART_WORDS) : null;
}
