import { describe, expect, it } from 'vitest';
import { layerOf, layers, mayImport } from './support/import-table';

describe('the import table', () => {
  it('finds the layer by the longest fitting name', () => {
    expect(layerOf('components/ui/button.tsx')).toBe('components/ui');
    expect(layerOf('components/charts/sounding.tsx')).toBe('components');
    expect(layerOf('lib/services/account/sign-in.ts')).toBe('lib/services/account');
    expect(layerOf('lib/misc/thing.ts')).toBeNull();
  });

  it('lets judgement use numbers and never the other way round', () => {
    expect(mayImport('lib/findings/verdict.ts', 'lib/stats/index.ts')).toBe(true);
    expect(mayImport('lib/stats/lead.ts', 'lib/findings/verdict.ts')).toBe(false);
  });

  it('keeps pages away from the database and primitives away from everything', () => {
    expect(mayImport('app/(desk)/releases/page.tsx', 'lib/services/release/list.ts')).toBe(true);
    expect(mayImport('app/(desk)/releases/page.tsx', 'db/queries/release.ts')).toBe(false);
    expect(mayImport('components/ui/button.tsx', 'lib/domain/roles.ts')).toBe(false);
  });

  it('keeps services and sign-in apart, except for accounts', () => {
    expect(mayImport('lib/services/sheet/file.ts', 'lib/auth/session.ts')).toBe(false);
    expect(mayImport('lib/auth/options.ts', 'lib/services/account/sign-in.ts')).toBe(true);
    expect(mayImport('lib/auth/options.ts', 'lib/services/sheet/file.ts')).toBe(false);
    expect(mayImport('lib/services/account/sign-in.ts', 'db/queries/account.ts')).toBe(true);
  });

  it('lets nothing of the product import a test', () => {
    expect(Object.keys(layers).filter((layer) => mayImport(`${layer}/x.ts`, 'tests/support/db.ts'))).toEqual(
      [],
    );
    expect(mayImport('playwright.config.ts', 'tests/e2e/support.ts')).toBe(false);
  });
});
