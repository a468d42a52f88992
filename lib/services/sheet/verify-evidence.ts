import 'server-only';
import type { Db } from '@/db/client';
import {
  type EvidenceRow,
  findEvidence,
  listAgreements,
  listClearedByNobody,
  listEvidenceIds,
} from '@/db/queries/clearing';
import { findOneReader } from '@/db/queries/one-reader';
import { isTwoPersonAgreement, type Role } from '@/lib/domain/roles';
import { inScreenOrder, type LineText } from '@/lib/domain/sheet';
import { canonicalJson } from '@/lib/security/canonical';
import { sha256 } from '@/lib/security/ids';
import type { EvidenceBody } from './evidence-body';

/** One frozen engine: a document in, its answer out. */
export type FrozenEngine = {
  parseCheckDocument: (input: unknown) => EvidenceBody['document'];
  check: (document: EvidenceBody['document']) => EvidenceBody['answer'];
};

/**
 * Re-runs every evidence on the engine version it names, and holds the stored words and acts against it. Each problem
 * is one line; none means that every stored byte fits its hash, every number comes out the same, the words are those
 * agreed to, and two people, one of them an editor, agreed to whatever was cleared.
 */
export async function verifyEvidence(
  db: Db,
  engineOf: (version: string) => Promise<FrozenEngine>,
): Promise<{ checked: number; problems: string[] }> {
  const ids = listEvidenceIds(db);
  const problems: string[] = [];
  for (const id of ids) {
    const row = findEvidence(db, id)!;
    const found = await problemsOf(db, row, engineOf);
    problems.push(...found.map((problem) => `evidence ${row.publicId} ${problem}`));
  }
  for (const publicId of listClearedByNobody(db)) problems.push(`line ${publicId} was cleared by nobody`);
  return { checked: ids.length, problems };
}

async function problemsOf(
  db: Db,
  row: EvidenceRow,
  engineOf: (version: string) => Promise<FrozenEngine>,
): Promise<string[]> {
  if (sha256(row.bytes) !== row.hash) return ['does not fit its hash'];
  const body = JSON.parse(row.bytes.toString('utf8')) as EvidenceBody;
  return [
    ...(body.engine === row.engine ? [] : ['names another engine than its row']),
    ...(await numbersDiffer(body, engineOf)),
    ...agreementProblems(db, row.id, body.texts),
  ];
}

async function numbersDiffer(
  body: EvidenceBody,
  engineOf: (version: string) => Promise<FrozenEngine>,
): Promise<string[]> {
  try {
    const engine = await engineOf(body.engine);
    const answer = engine.check(engine.parseCheckDocument(body.document));
    const isSame = canonicalJson(answer) === canonicalJson(body.answer);
    return isSame ? [] : [`comes out differently on engine ${body.engine}`];
  } catch (error) {
    return [`cannot be run: ${error instanceof Error ? error.message : String(error)}`];
  }
}

type Agreement = ReturnType<typeof listAgreements>[number];

function agreementProblems(db: Db, evidenceId: number, texts: LineText[]): string[] {
  const acts = listAgreements(db, evidenceId);
  const [filed, cleared] = (['filed', 'cleared'] as const).map((kind) =>
    acts.find(({ act }) => act === kind),
  );
  const who = (act: (typeof acts)[number]) => ({
    personId: act.personId,
    roles: JSON.parse(act.roles) as Role[],
  });
  const isAlone =
    cleared !== undefined && filed !== undefined && isReleasedAlone(db, evidenceId, filed, cleared);
  const isAgreed = !cleared || isAlone || (filed && isTwoPersonAgreement(who(filed), who(cleared)));
  return [
    ...(isAgreed ? [] : ['was not agreed to by two people of whom one was an editor']),
    ...acts
      .filter((act) => canonicalJson(inScreenOrder(act.texts, ({ kind }) => kind)) !== canonicalJson(texts))
      .map(({ act }) => `holds other words than those that were ${act}`),
  ];
}

/** The desk's night rule: one editor released figures as printed, and the database keeps who and when. */
function isReleasedAlone(db: Db, evidenceId: number, filed: Agreement, cleared: Agreement): boolean {
  const released = findOneReader(db, evidenceId);
  const roles = JSON.parse(cleared.roles) as Role[];
  return (
    released !== null &&
    [filed.personId, cleared.personId].every((personId) => personId === released.personId) &&
    roles.includes('editor')
  );
}
