import { describe, expect, test } from 'vitest';
import { judgeRelease } from '@/lib/findings/judge-release';
import type { ReleaseDocument } from '@/lib/findings/judge-types';
import { parseReleaseDocument } from '@/lib/findings/parse-release';
import { resolvePolicy } from '@/lib/findings/policy';
import { releaseScript } from '@/lib/findings/r-script/release-script';
import { expectedFigures } from '../r/expected';
import { releaseDocuments } from '../r/release-documents';
import { idleFunctions, numbersWritten, structureOf, unknownCalls } from './r-source';

const scripts = releaseDocuments.flatMap(({ id, input }) => scriptsOf(parseReleaseDocument(input), id));

function scriptsOf(document: ReleaseDocument, id: string) {
  const judgement = judgeRelease(document);
  return judgement.findings.map((finding, index) => ({
    id,
    document,
    judgement,
    finding,
    script: releaseScript(document, judgement, index),
  }));
}

const ofKind = (kind: string) => scripts.filter(({ finding }) => finding.kind === kind);

const numbersIn = (value: unknown): number[] => {
  if (typeof value === 'number') return [value];
  return typeof value === 'object' && value !== null ? Object.values(value).flatMap(numbersIn) : [];
};

describe('releaseScript', () => {
  test('is asked for every kind, tested and not', () => {
    for (const kind of [
      'lead',
      'net-score',
      'change',
      'lead-change',
      'net-score-change',
      'threshold',
      'gap',
    ]) {
      const verdicts = new Set(
        ofKind(kind).map(({ finding }) => finding.kind !== 'share' && finding.verdict),
      );
      expect(verdicts.has('cannot-be-tested'), kind).toBe(true);
      expect(verdicts.size, kind).toBeGreaterThan(1);
    }
  });

  test('is asked for every reason that only a release has', () => {
    const reasons = new Set(
      scripts.flatMap(({ finding }) => (finding.kind === 'share' ? [] : finding.reasons)),
    );
    for (const reason of [
      'shared-waves',
      'same-people',
      'rebased-size',
      'other-base',
      'below-presentation-standard',
    ]) {
      expect(reasons, reason).toContain(reason);
    }
  });

  test('is the same text for the same document', () => {
    for (const { document, judgement, finding, script } of scripts) {
      const again = structuredClone(document);
      const index = judgement.findings.indexOf(finding);
      expect(releaseScript(again, judgeRelease(again), index)).toBe(script);
    }
  });

  test('prints every figure of its finding under its name', () => {
    for (const { finding, script } of scripts) {
      const wanted = [...expectedFigures(finding, {}).keys()].map((name) =>
        name
          .replace(/^(presentation\.\w+).*$/, '$1')
          .replace(/\.(low|high)$/, '')
          .replace(/^secondTests\..*$/, 'secondTests'),
      );
      for (const name of wanted) {
        expect(script).toMatch(new RegExp(`^show(_list|_presentation)?\\("${name}", `, 'm'));
      }
    }
  });

  test('starts from every printed figure of the bases that it compares', () => {
    for (const { document, finding, script } of scripts) {
      const { comparison, release, policy } = document;
      const isOnRelease = finding.kind !== 'gap';
      const isCompared = ['change', 'lead-change', 'net-score-change'].includes(finding.kind);
      const inputs = numbersIn([
        resolvePolicy(policy),
        isOnRelease ? release.shares : null,
        isCompared ? [comparison?.base.shares, comparison?.overlap] : null,
      ]);
      const written = numbersWritten(script);
      expect(inputs.filter((value) => !written.has(value))).toEqual([]);
    }
  });

  test('gives a gap the figures of both groups, or of the whole sample and the weight', () => {
    const gaps = ofKind('gap');
    expect(gaps.length).toBeGreaterThan(5);
    for (const { document, finding, script } of gaps) {
      if (finding.kind !== 'gap') throw new Error('a gap is asked for');
      const [one] = document.subgroups ?? [];
      const asked = one?.gaps.find(
        ({ option, group }) => option === finding.option && group === finding.groups[0],
      );
      const bases = one?.groups.filter(({ name }) => finding.groups.includes(name)).map(({ base }) => base);
      const inputs = numbersIn([bases, asked, finding.groups[1] === '' ? one?.total : null]);
      const written = numbersWritten(script);
      expect(inputs.length).toBeGreaterThan(4);
      expect(inputs.filter((value) => !written.has(value))).toEqual([]);
    }
  });

  test('holds no result of the engine', () => {
    for (const { finding, script } of scripts) {
      const { working: _working, ...answered } = finding;
      const results = numbersIn(answered).filter((value) => String(value).length > 9);
      expect(results.filter((value) => script.includes(String(value)))).toEqual([]);
    }
  });

  test('needs no package, and has the functions that it uses and no other', () => {
    for (const { id, script } of scripts) {
      expect(unknownCalls(script), id).toEqual([]);
      expect(idleFunctions(script), id).toEqual([]);
    }
  });

  test('keeps names of blocs and groups inside their strings', () => {
    const plain = (document: ReleaseDocument): ReleaseDocument =>
      JSON.parse(
        JSON.stringify(document)
          .replaceAll(JSON.stringify('Coast "East"\n# all').slice(1, -1), 'Coast')
          .replaceAll(JSON.stringify('Old "er"\n').slice(1, -1), 'Old')
          .replaceAll(JSON.stringify('Vote "now"\n# x').slice(1, -1), 'Vote'),
      ) as ReleaseDocument;
    for (const { input } of releaseDocuments) {
      const hostile = scriptsOf(parseReleaseDocument(input), '').map(({ script }) => structureOf(script));
      const tame = scriptsOf(parseReleaseDocument(plain(input)), '').map(({ script }) => structureOf(script));
      expect(hostile).toEqual(tame);
    }
  });

  test('states what is no figure as a reason, and computes the others', () => {
    const untested = ofKind('net-score-change').find(({ id }) => id.startsWith('the same people asked'));
    expect(untested?.script).toContain('c("same-people"))');
    expect(untested?.script).toContain('independent_margin_pp');
    const rebased = ofKind('lead').find(({ id }) => id === 're-based, size not known');
    expect(rebased?.script).toContain('release_people_left <- NULL');
    expect(rebased?.script).not.toContain('with_stated(');
  });

  test('refuses an index without a finding', () => {
    const [one] = scripts;
    if (!one) throw new Error('there are no scripts');
    expect(() => releaseScript(one.document, one.judgement, 99)).toThrow(
      new RangeError('releaseScript requires the index of a finding of the judgement'),
    );
  });
});
