import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import manifest from '@/lib/findings/archive/manifest.json';
import { check } from '@/lib/findings/check';
import type { CheckAnswer, CheckDocument } from '@/lib/findings/check-types';
import { ENGINE_VERSION } from '@/lib/findings/engine-version';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { canonicalJson } from '@/lib/security/canonical';
import cases from '../reference/findings/cases.json';
import refused from '../reference/findings/refused.json';
import { differences } from './agreement';

type FrozenEngine = {
  ENGINE_VERSION: string;
  check: (document: CheckDocument) => CheckAnswer;
  parseCheckDocument: (input: unknown) => CheckDocument;
};

const versions = Object.entries(manifest as Record<string, { sha256: string }>);
const load = async (version: string) =>
  (await import(`../../lib/findings/archive/${version}.mjs`)) as FrozenEngine;
const SAME = 1e-12;

describe('the archive of engines', () => {
  test.each(versions)('%s still has the bytes it was frozen with', (version, { sha256 }) => {
    const bytes = readFileSync(`lib/findings/archive/${version}.mjs`);
    expect(createHash('sha256').update(bytes).digest('hex')).toBe(sha256);
  });

  test.each(versions)('%s names itself and asks nothing of Node or of a machine', async (version) => {
    const text = readFileSync(`lib/findings/archive/${version}.mjs`, 'utf8');
    expect((await load(version)).ENGINE_VERSION).toBe(version);
    expect(text).not.toMatch(/from ?["']|\brequire\(["']node:|["']node:|\/home\/|\/Users\//);
  });

  test('holds the engine of this source, with the same answers to 1e-12', async () => {
    expect(Object.keys(manifest), `run npm run engine:freeze for ${ENGINE_VERSION}`).toContain(
      ENGINE_VERSION,
    );
    const frozen = await load(ENGINE_VERSION);
    for (const { id, input } of cases) {
      const moved = differences(
        check(parseCheckDocument(input)),
        frozen.check(frozen.parseCheckDocument(input)),
        id,
        SAME,
      );
      expect(moved, 'an answer has moved: raise ENGINE_VERSION and run npm run engine:freeze').toEqual([]);
    }
  });

  test('gives the answers of this source to the byte, since evidence is verified so', async () => {
    const frozen = await load(ENGINE_VERSION);
    const answersOf = (engine: Pick<FrozenEngine, 'check' | 'parseCheckDocument'>) =>
      cases.map(({ input }) => canonicalJson(engine.check(engine.parseCheckDocument(input))));
    expect(answersOf(frozen)).toEqual(answersOf({ check, parseCheckDocument }));
  });

  test('refuses what this source refuses, at the same path', async () => {
    const frozen = await load(ENGINE_VERSION);
    for (const { path, input } of refused) {
      expect(() => frozen.parseCheckDocument(input)).toThrow(expect.objectContaining({ path }));
    }
  });
});
