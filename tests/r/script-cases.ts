import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { check } from '@/lib/findings/check';
import type { BaseAnswer, CheckDocument, Finding } from '@/lib/findings/check-types';
import { judgeRelease } from '@/lib/findings/judge-release';
import type { ReleaseDocument, ReleaseFinding, ReleaseJudgement } from '@/lib/findings/judge-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { parseReleaseDocument } from '@/lib/findings/parse-release';
import { releaseScript } from '@/lib/findings/r-script/release-script';
import { rScript } from '@/lib/findings/r-script/r-script';
import type { Figure } from './compare';
import { checkDocuments } from './documents';
import { expectedFigures } from './expected';
import { releaseDocuments } from './release-documents';

/** One finding with its script and the figures that it must print. */
export type ScriptCase = {
  kind: string;
  /** The document and the place of the finding in it. */
  name: string;
  script: string;
  expected: ReadonlyMap<string, Figure>;
};

/** Every finding of the reference documents and of the project's own. */
export function scriptCases(): ScriptCase[] {
  const file = join(process.env.REFERENCE_DIR ?? 'tests/reference', 'findings/cases.json');
  const reference = (JSON.parse(readFileSync(file, 'utf8')) as { id: string; input: unknown }[]).map(
    ({ id, input }) => ({ id, document: parseCheckDocument(input) }),
  );
  return [
    ...[...reference, ...checkDocuments].flatMap(({ id, document }) => casesOf(id, document)),
    ...releaseDocuments.flatMap(({ id, input }) => releaseCasesOf(id, parseReleaseDocument(input))),
  ];
}

function releaseCasesOf(id: string, document: ReleaseDocument): ScriptCase[] {
  const judgement = judgeRelease(document);
  return judgement.findings.map((finding, index) => ({
    kind: `release ${finding.kind}`,
    name: `${id}, finding ${index}`,
    script: releaseScript(document, judgement, index),
    expected: expectedOf(finding, releaseBasesOf(finding, judgement)),
  }));
}

function releaseBasesOf(finding: ReleaseFinding, judgement: ReleaseJudgement): Record<string, BaseAnswer> {
  if (finding.kind === 'gap') {
    const groups = judgement.subgroups.find(({ question }) => question === finding.question)?.groups ?? [];
    const [group, against] = finding.groups.map((name) => groups.find((one) => one.name === name)?.base);
    return { ...(group ? { group } : {}), ...(against ? { against } : {}) };
  }
  const { base, comparison } = judgement;
  return isChange(finding) && comparison ? { base, 'comparison.base': comparison.base } : { base };
}

function isChange({ kind }: { kind: string }): boolean {
  return ['change', 'lead-change', 'net-score-change'].includes(kind);
}

/** A share without an interval prints that it has none. */
function expectedOf(
  finding: Finding | ReleaseFinding,
  bases: Record<string, BaseAnswer>,
): Map<string, Figure> {
  const expected = expectedFigures(finding, bases);
  if (finding.kind === 'share' && !finding.intervalPct) {
    expected.set('intervalPct', null);
    expected.set('method', null);
  }
  return expected;
}

function casesOf(id: string, document: CheckDocument): ScriptCase[] {
  const answer = check(document);
  return answer.findings.map((finding, index) => ({
    kind: finding.kind,
    name: `${id}, finding ${index}`,
    script: rScript(document, answer, index),
    expected: expectedOf(finding, {
      base: answer.base,
      ...(isChange(finding) && answer.previousBase ? { previousBase: answer.previousBase } : {}),
    }),
  }));
}
