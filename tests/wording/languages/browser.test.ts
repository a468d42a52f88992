import { describe, expect, it } from 'vitest';
import { sourceFiles, type SourceFile } from '../../support/source';

const files = sourceFiles();
const byPath = new Map(files.map((file) => [file.path, file]));

function reachOf(start: SourceFile): Set<string> {
  const seen = new Set<string>();
  const open = [start];
  for (let file = open.pop(); file; file = open.pop()) {
    for (const { target, own, typeOnly } of file.imports) {
      if (!own || typeOnly || seen.has(target)) continue;
      seen.add(target);
      const next = byPath.get(target) ?? byPath.get(`${target}.ts`) ?? byPath.get(`${target}.tsx`);
      if (next) open.push(next);
    }
  }
  return seen;
}

describe('what a browser loads', () => {
  const client = files.filter(({ text }) => /^['"]use client['"]/.test(text));

  it('reaches the wording, and no pack but the English one', () => {
    expect(client.length).toBeGreaterThan(5);
    const reached = client.flatMap((file) => [...reachOf(file)].map((target) => `${file.path} > ${target}`));
    expect(reached.filter((one) => one.includes('lib/wording/')).length).toBeGreaterThan(0);
    expect(reached.filter((one) => /lib\/wording\/messages\/(?:es|fr|de)(?:\.ts)?$/.test(one))).toEqual([]);
    expect(reached.filter((one) => /lib\/wording\/house-style(?:\.ts)?$/.test(one))).toEqual([]);
  });
});
