import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { check } from '@/lib/findings/check';
import type { CheckDocument } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { rScript } from '@/lib/findings/r-script/r-script';
import type { Figure } from './compare';
import { checkDocuments } from './documents';
import { expectedFigures } from './expected';

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
  return [...reference, ...checkDocuments].flatMap(({ id, document }) => casesOf(id, document));
}

function casesOf(id: string, document: CheckDocument): ScriptCase[] {
  const answer = check(document);
  return answer.findings.map((finding, index) => {
    const isChange = finding.kind === 'change' || finding.kind === 'lead-change';
    const bases = {
      base: answer.base,
      ...(isChange && answer.previousBase ? { previousBase: answer.previousBase } : {}),
    };
    const expected = expectedFigures(finding, bases);
    if (finding.kind === 'share' && !finding.intervalPct) {
      expected.set('intervalPct', null);
      expected.set('method', null);
    }
    return {
      kind: finding.kind,
      name: `${id}, finding ${index}`,
      script: rScript(document, answer, index),
      expected,
    };
  });
}
