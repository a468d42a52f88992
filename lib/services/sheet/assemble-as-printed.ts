import 'server-only';
import type { Conn } from '@/db/client';
import { findStandIn } from '@/db/queries/corrections';
import { AS_PRINTED } from '@/lib/domain/as-printed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { LineText } from '@/lib/domain/sheet';
import type { Language } from '@/lib/domain/vocabulary';
import type { MissingDisclosure } from '@/lib/findings/disclosure';
import { canonicalJson, hashOf } from '@/lib/security/canonical';
import { sha256 } from '@/lib/security/ids';
import { draftAsPrinted } from '@/lib/wording/as-printed';
import { type Computed, computeFindings } from '../release/compute-findings';
import type { Subject } from './assemble-evidence';

/** What is frozen of a sheet of figures as printed: everything of a claim's evidence but the claim and its chart. */
export type AsPrintedBody = {
  schema: 1;
  sheet: string;
  claim: { kind: typeof AS_PRINTED };
  claimKey: typeof AS_PRINTED;
  language: Language;
  release: ReleaseFacts;
  policy: { version: number };
  houseStyle: { version: number; templates: string; hash: string };
  engine: string;
  document: Computed['document'];
  answer: Computed['answer'];
  draft: LineText[];
  texts: LineText[];
  missing: MissingDisclosure[];
};

export function assembleAsPrinted(conn: Conn, sheet: Subject, now: number) {
  const computed = computeFindings(conn, sheet.releaseVersionId, now, findStandIn(conn, sheet.correctionId));
  const { facts, settings, document, answer, missing } = computed;
  const language = sheet.language as Language;
  const draft = draftAsPrinted(facts, settings.houseStyle.body, language);
  const basis: Omit<AsPrintedBody, 'texts'> = {
    schema: 1,
    sheet: sheet.publicId,
    claim: { kind: AS_PRINTED },
    claimKey: AS_PRINTED,
    language,
    release: facts,
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
    missing,
  };
  return {
    computed,
    draft,
    basisHash: hashOf(basis),
    withTexts: (texts: LineText[]) => {
      const body: AsPrintedBody = { ...basis, texts };
      const bytes = Buffer.from(canonicalJson(body), 'utf8');
      return { body, bytes, hash: sha256(bytes) };
    },
  };
}
