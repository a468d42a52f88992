import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { demoFakes } from '@/lib/cli/demo-fakes.mjs';

const folder = mkdtempSync(join(tmpdir(), 'leadline-demo-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));
const env = { LEADLINE_DATA: folder };

describe('stand-ins of hosted services', () => {
  it('come with a demo, not with an empty desk, and not where a service is named', () => {
    expect(demoFakes([], env)).toEqual({ LEADLINE_FAKES: '1' });
    expect(demoFakes(['--empty'], env)).toEqual({});
    expect(demoFakes([], { ...env, LEADLINE_FAKES: '0' })).toEqual({});
    expect(demoFakes([], { ...env, LEADLINE_PURGE_URL: 'https://cache.example/purge' })).toEqual({});
  });

  it('come again at later starts of a demo, and never to a desk of its own', () => {
    writeFileSync(join(folder, 'leadline.db'), '');
    expect(demoFakes([], env)).toEqual({});
    writeFileSync(join(folder, 'accounts.json'), '[]');
    expect(demoFakes([], env)).toEqual({ LEADLINE_FAKES: '1' });
  });
});
