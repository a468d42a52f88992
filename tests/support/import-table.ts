/**
 * Who may import whom. A layer is a folder (or one file); the longest name that fits a path is its
 * layer. Every layer may import itself; whatever is not listed is forbidden.
 */
export const layers: Record<string, readonly string[]> = {
  'lib/stats': [],
  'lib/domain': [],
  'lib/format': ['lib/domain'],
  'lib/findings': ['lib/stats', 'lib/domain'],
  'lib/wording': ['lib/findings', 'lib/domain', 'lib/format'],
  'lib/charts': ['lib/findings', 'lib/domain', 'lib/format'],
  'lib/import': ['lib/domain', 'lib/format'],
  'lib/markdown': ['lib/domain', 'lib/format'],
  'lib/errors.ts': ['lib/domain'],
  'lib/env.ts': ['lib/domain', 'package.json'],
  'lib/security': ['lib/errors.ts', 'lib/env.ts'],
  db: ['lib/domain', 'lib/env.ts'],
  'lib/mail': ['lib/domain', 'lib/errors.ts', 'lib/env.ts', 'lib/security'],
  'lib/storage': ['lib/domain', 'lib/errors.ts', 'lib/env.ts', 'lib/security'],
  'lib/webhooks': ['lib/domain', 'lib/errors.ts', 'lib/env.ts', 'lib/security'],
  'lib/services': [
    'lib/stats',
    'lib/domain',
    'lib/format',
    'lib/findings',
    'lib/wording',
    'lib/charts',
    'lib/import',
    'lib/markdown',
    'lib/errors.ts',
    'lib/env.ts',
    'lib/security',
    'lib/mail',
    'lib/storage',
    'lib/webhooks',
    'db',
  ],
  'lib/services/account': ['lib/services'],
  'lib/auth': ['lib/services/account', 'lib/security', 'lib/domain', 'lib/errors.ts', 'lib/env.ts'],
  'lib/fakes': ['lib/env.ts'],
  'lib/cli': ['lib', 'db', 'components', 'app', 'package.json'],
  'components/ui': [],
  components: [
    'components/ui',
    'lib/charts',
    'lib/domain',
    'lib/findings',
    'lib/format',
    'lib/import',
    'lib/markdown',
    'lib/stats',
    'lib/wording',
  ],
  app: ['components', 'lib'],
};

/** Pure layers know no database, React, clock, locale default or Node. */
export const pureLayers = [
  'lib/stats',
  'lib/domain',
  'lib/format',
  'lib/findings',
  'lib/wording',
  'lib/charts',
];

/** Layers that run in a browser too, so nothing of Node may be in them. */
export const layersWithoutNode = [...pureLayers, 'lib/import', 'lib/markdown'];

/** What code with 'use client' may reach. */
export const clientLayers = ['components', ...(layers.components ?? [])];

/** npm packages that only some places may import; a place is a folder, a file, or "root" for the root's own files. */
export const packagePlaces: { name: string; matches: RegExp; places: readonly string[] }[] = [
  { name: 'drizzle and better-sqlite3', matches: /^(drizzle-orm|better-sqlite3)(\/|$)/, places: ['db'] },
  { name: 'React', matches: /^react(-dom)?(\/|$)/, places: ['app', 'components', 'root'] },
  {
    name: 'Next',
    matches: /^next(-auth)?(\/|$)/,
    places: ['app', 'components', 'lib/auth', 'lib/cli', 'root'],
  },
  { name: 'msw', matches: /^msw(\/|$)/, places: ['lib/fakes', 'lib/cli', 'root'] },
];

export const topLevel = ['.ci', 'app', 'components', 'db', 'drizzle', 'lib', 'public', 'tests'];

export function isWithin(path: string, place: string): boolean {
  return place === 'root' ? !path.includes('/') : path === place || path.startsWith(`${place}/`);
}

/** The layer of a file: the longest entry of the table that holds it, or null when it has none. */
export function layerOf(path: string): string | null {
  const fitting = Object.keys(layers).filter((layer) => isWithin(path, layer));
  return fitting.sort((a, b) => b.length - a.length)[0] ?? null;
}

export function mayImport(from: string, target: string): boolean {
  if (isWithin(target, 'tests')) return false;
  if (isWithin(from, 'root')) return true;
  const layer = layerOf(from);
  if (!layer) return false;
  const allowed = [...(layers[layer] ?? []), layer];
  if (layer.startsWith('lib/services')) allowed.push('lib/services', ...(layers['lib/services'] ?? []));
  return allowed.some((place) => isWithin(target, place));
}
