import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { check } from '@/lib/findings/check';
import type { CheckDocument } from '@/lib/findings/check-types';
import { labelsOf } from '@/lib/findings/r-script/r-literal';
import { rScript } from '@/lib/findings/r-script/r-script';
import { resolvePolicy } from '@/lib/findings/policy';
import { checkDocuments } from '../r/documents';
import { expectedFigures } from '../r/expected';
import cases from '../reference/findings/cases.json';
import { idleFunctions, numbersWritten, piecesOf, readString, structureOf, unknownCalls } from './r-source';

const documents = [
  ...cases.map(({ input }) => input as unknown as CheckDocument),
  ...checkDocuments.map(({ document }) => document),
];

const scripts = documents.flatMap((document) => {
  const answer = check(document);
  return answer.findings.map((finding, index) => ({
    document,
    answer,
    finding,
    script: rScript(document, answer, index),
  }));
});

const numbersIn = (value: unknown): number[] => {
  if (typeof value === 'number') return [value];
  return typeof value === 'object' && value !== null ? Object.values(value).flatMap(numbersIn) : [];
};

describe('rScript', () => {
  test('is asked for every kind and every verdict', () => {
    const seen = new Set(
      scripts.map(({ finding }) => `${finding.kind} ${'verdict' in finding ? finding.verdict : ''}`),
    );
    const verdicts = ['holds', 'fragile', 'does-not-hold', 'cannot-be-tested'];
    const kinds = ['lead', 'change', 'lead-change', 'threshold'];
    const wanted = kinds.flatMap((kind) => verdicts.map((verdict) => `${kind} ${verdict}`));
    expect([...seen].sort()).toEqual([...wanted, 'share '].sort());
  });

  test('is the same text for the same document', () => {
    for (const { document, answer, finding, script } of scripts) {
      const again = structuredClone(document);
      expect(rScript(again, check(again), answer.findings.indexOf(finding))).toBe(script);
    }
  });

  test('prints every figure of its finding under its name', () => {
    for (const { answer, finding, script } of scripts) {
      const wanted = [...expectedFigures(finding, { base: answer.base }).keys()]
        .filter((name) => !name.startsWith('base.'))
        .map((name) => name.replace(/\.(low|high)$/, '').replace(/^secondTests\..*$/, 'secondTests'));
      for (const name of wanted) expect(script).toMatch(new RegExp(`^show(_list)?\\("${name}", `, 'm'));
    }
  });

  test('starts from every printed figure of its bases and its policy', () => {
    for (const { document, finding, script } of scripts) {
      const isChange = finding.kind === 'change' || finding.kind === 'lead-change';
      const inputs = numbersIn([
        resolvePolicy(document.policy),
        document.release,
        isChange ? document.previous : null,
        finding.kind === 'threshold' ? finding.thresholdPct : null,
      ]);
      const written = numbersWritten(script);
      expect(inputs.filter((value) => !written.has(value))).toEqual([]);
    }
  });

  test('holds no result of the engine', () => {
    for (const { finding, script } of scripts) {
      const results = numbersIn(finding).filter((value) => String(value).length > 9);
      expect(results.filter((value) => script.includes(String(value)))).toEqual([]);
    }
  });

  test('needs no package, and defines every function that base R lacks', () => {
    for (const { script } of scripts) {
      expect(script).not.toMatch(/\b(library|require|requireNamespace|source|system|eval|parse)\(|::/);
      expect(unknownCalls(script)).toEqual([]);
    }
  });

  test('defines no function that it does not use', () => {
    for (const { script } of scripts) {
      expect(idleFunctions(script)).toEqual([]);
    }
  });

  test('is ASCII, with brackets that close', () => {
    for (const { script } of scripts) {
      expect(script).toMatch(/^[\n -~]*\n$/);
      const code = structureOf(script).replace(/#.*/g, '');
      expect(code).not.toMatch(/['`]/);
      for (const [open = '', close = ''] of ['()', '{}', '[]'].map((both) => both.split(''))) {
        expect(code.split(open).length).toBe(code.split(close).length);
      }
    }
  });

  test('computes the whole family of a finding, and nothing of another', () => {
    const [one] = scripts.filter(({ finding }) => finding.kind === 'lead');
    const pairs = one?.document.pairs ?? [];
    expect(pairs.length).toBeGreaterThan(2);
    for (const [first, second] of pairs)
      expect(one?.script).toContain(`lead(release, "${first}", "${second}")`);
    expect(one?.script).not.toContain('threshold(release');
  });

  test('refuses an index without a finding', () => {
    const [one] = scripts;
    if (!one) throw new Error('there are no scripts');
    expect(() => rScript(one.document, one.answer, 99)).toThrow(
      new RangeError('rScript requires the index of a finding of the answer'),
    );
  });
});

describe('names in a script', () => {
  const part = fc.oneof(
    fc.constantFrom('"', '\\', '\n', '\r\n', '#', "'", '`', '"); stop("', '\u2028', '\u0000', '\uD83D'),
    fc.string({ unit: 'binary', maxLength: 3 }),
  );
  const option = fc.array(part, { maxLength: 6 }).map((parts) => parts.join(''));
  const documentOf = ([a = '', b = '']: readonly string[]): CheckDocument => {
    const shares = [
      { option: a, pct: 30 },
      { option: b, pct: 25 },
    ];
    const release = {
      sampleSource: 'probability' as const,
      n: 900,
      design: 'weighted' as const,
      decimals: 0,
      shares,
    };
    return { release, previous: release, thresholds: [{ option: a, pct: 50 }] };
  };
  const scriptsOf = (document: CheckDocument) => {
    const answer = check(document);
    return answer.findings.map((_, index) => rScript(document, answer, index));
  };
  const plain = scriptsOf(documentOf(['A', 'B'])).map(structureOf);

  test('change nothing but the strings they stand in', () => {
    const two = fc.uniqueArray(option, { minLength: 2, maxLength: 2 });
    fc.assert(
      fc.property(two, (options) => {
        expect(scriptsOf(documentOf(options)).map(structureOf)).toEqual(plain);
      }),
    );
  });

  test('read back from the strings of the script', () => {
    const two = fc.uniqueArray(option, { minLength: 2, maxLength: 2 });
    fc.assert(
      fc.property(two, (options) => {
        const labels = [...labelsOf(options).values()];
        for (const script of scriptsOf(documentOf(options))) {
          const strings = piecesOf(script).flatMap(({ kind, text }) =>
            kind === 'string' ? [readString(text)] : [],
          );
          for (const label of labels) expect(strings).toContain(label);
        }
      }),
    );
  });
});
