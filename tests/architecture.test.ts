import { dirname } from 'node:path';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';
import {
  clientLayers,
  isWithin,
  layerOf,
  layersWithoutNode,
  mayImport,
  packagePlaces,
  pureLayers,
  topLevel,
} from './support/import-table';
import { allFiles, parse, readText, sourceFiles, topLevelFolders, type SourceFile } from './support/source';

const files = sourceFiles();
const product = files.filter((file) => !isWithin(file.path, 'tests'));
const byPath = new Map(files.map((file) => [file.path, file]));
const inAny = (path: string, places: readonly string[]) => places.some((place) => isWithin(path, place));

describe('the tree', () => {
  it('has only the folders that were agreed on', () => {
    expect(topLevelFolders().filter((name) => !topLevel.includes(name))).toEqual([]);
  });

  it('gives every product file a layer', () => {
    const homeless = product.filter((file) => !isWithin(file.path, 'root') && !isWithin(file.path, 'public'));
    expect(homeless.filter((file) => layerOf(file.path) === null).map((file) => file.path)).toEqual([]);
  });

  it('keeps files short enough to read in one go', () => {
    const limit = (file: SourceFile) => (isWithin(file.path, 'tests') ? 400 : 300);
    const long = files.filter((file) => file.text.split('\n').length - 1 > limit(file));
    expect(long.map((file) => file.path)).toEqual([]);
  });

  it('names files in kebab-case', () => {
    const odd = files.filter((file) => !/^(.*\/)?(\[.+\]|_?[a-z0-9.-]+)$/.test(file.path));
    expect(odd.map((file) => file.path)).toEqual([]);
  });
});

describe('imports', () => {
  it('follow the table', () => {
    const broken = product
      .filter((file) => !isWithin(file.path, 'public'))
      .flatMap((file) =>
        file.imports
          .filter((one) => one.own && !one.target.endsWith('.css') && !mayImport(file.path, one.target))
          .map((one) => `${file.path} imports ${one.target}`),
      );
    expect(broken).toEqual([]);
  });

  it('use relative paths inside a layer and @/ across layers', () => {
    const broken = product.flatMap((file) =>
      file.imports
        .filter((one) => one.own)
        .filter((one) => isRoundabout(file.path, one.specifier, one.target))
        .map((one) => `${file.path} imports ${one.specifier}`),
    );
    expect(broken).toEqual([]);
  });

  it('of the statistics are numbers only', () => {
    expect(packagesOf('lib/stats').filter((name) => !/ (jstat|@stdlib\/.+)$/.test(name))).toEqual([]);
  });

  it('of npm packages stay where they belong', () => {
    const broken = product.flatMap((file) =>
      file.imports
        .filter((one) => !one.own)
        .flatMap((one) => packagePlaces.filter((rule) => rule.matches.test(one.specifier)))
        .filter((rule) => !inAny(file.path, rule.places))
        .map((rule) => `${file.path} imports ${rule.name}`),
    );
    expect(broken).toEqual([]);
  });

  it('of Node are absent wherever code also runs in a browser', () => {
    const broken = layersWithoutNode.flatMap((layer) =>
      packagesOf(layer).filter((name) => / (node:|fs$|path$|crypto$)/.test(name)),
    );
    expect(broken).toEqual([]);
  });

  it('of client code stay inside what a browser may hold', () => {
    const starts = product.filter((file) => isClient(file));
    const broken = starts.flatMap((start) =>
      reached(start)
        .filter((path) => !isWithin(path, 'app') && !inAny(path, clientLayers))
        .map((path) => `${start.path} reaches ${path}`),
    );
    expect(broken).toEqual([]);
    const actions = starts.flatMap((start) => reached(start).filter((path) => isServerAction(path)));
    expect(actions, 'client code gets its actions as props').toEqual([]);
  });
});

describe('the layers', () => {
  it('of pure code read no clock, chance or default locale', () => {
    const impure =
      /\bDate\.now\(|new Date\(\)|Math\.random\(|performance\.now\(|toLocale\w*String\(\)|Intl\.\w+\(\s*\)|process\.env/;
    expect(matching(impure, pureLayers)).toEqual([]);
  });

  it('that hold secrets or data can never be bundled for a browser', () => {
    const guarded = product.filter((file) =>
      inAny(file.path, ['db/client.ts', 'db/queries', 'lib/services', 'lib/auth']),
    );
    const open = guarded.filter((file) => !file.imports.some((one) => one.specifier === 'server-only'));
    expect(open.map((file) => file.path)).toEqual([]);
  });

  it('keep the schema readable to the migration tool', () => {
    const schema = product.filter((file) => inAny(file.path, ['db/schema.ts', 'db/schema']));
    expect(schema.filter((file) => /server-only/.test(file.text)).map((file) => file.path)).toEqual([]);
  });

  it('write through one helper, and never across an await', () => {
    const raw = product.filter((file) => /\.transaction\(/.test(file.text) && file.path !== 'db/write.ts');
    expect(raw.map((file) => file.path)).toEqual([]);
    expect(
      matching(/transaction\(\s*async|\bwrite\(\w+,\s*async/, ['app', 'components', 'db', 'lib']),
    ).toEqual([]);
  });

  it('have no file that only passes others on', () => {
    const entriesOfTools = ['db/schema.ts', 'lib/findings/engine-entry.ts'];
    const allowed = ['lib/stats/index.ts', ...entriesOfTools];
    const barrels = product.filter((file) => isBarrel(file) && !allowed.includes(file.path));
    expect(barrels.map((file) => file.path)).toEqual([]);
  });
});

describe('what is written down', () => {
  const texts = allFiles().filter((path) => /\.(ts|tsx|mjs|js|css|md|json|sql|ya?ml)$|\.ci\//.test(path));

  it('names no path of one machine and no host of a registry', () => {
    const home = ['work', 'root', 'home', 'Users'].map((name) => `/${name}/`);
    const words = [...home, ['registry', 'npmjs'].join('.'), '"resolved":'];
    const found = texts.flatMap((path) => {
      const text = readText(path);
      return words.filter((word) => text.includes(word)).map((word) => `${path} says ${word}`);
    });
    expect(found.filter((line) => !line.startsWith('tests/architecture.test.ts'))).toEqual([]);
  });

  it('leaves nothing for later and switches no check off', () => {
    const word = (start: string, end: string) => start + end;
    const excuses = [
      word('TO', 'DO'),
      word('FIX', 'ME'),
      word('@ts-', 'ignore'),
      word('@ts-', 'nocheck'),
      word('eslint-', 'disable'),
    ];
    const found = files.flatMap((file) =>
      excuses.filter((excuse) => file.text.includes(excuse)).map((excuse) => `${file.path} has ${excuse}`),
    );
    expect(found).toEqual([]);
  });

  it('runs every test it has', () => {
    const switchedOff = /\b(it|test|describe)\.(skip|only|todo|fixme|fails|skipIf|runIf)\b/;
    expect(matching(switchedOff, ['tests'])).toEqual([]);
  });
});

function matching(pattern: RegExp, places: readonly string[]): string[] {
  return files
    .filter((file) => inAny(file.path, places) && pattern.test(file.text))
    .map((file) => `${file.path}: ${pattern.exec(file.text)?.[0]}`);
}

function packagesOf(layer: string): string[] {
  return product
    .filter((file) => isWithin(file.path, layer))
    .flatMap((file) => file.imports.filter((one) => !one.own).map((one) => `${file.path} ${one.specifier}`));
}

/** A relative path may not leave its layer, and a path from the root may not lead back into the same folder. */
function isRoundabout(from: string, specifier: string, target: string): boolean {
  if (specifier.startsWith('@/')) return from.includes('/') && dirname(from) === dirname(target);
  return specifier.startsWith('..') && topLayerOf(from) !== topLayerOf(target);
}

function topLayerOf(path: string): string {
  return path
    .split('/')
    .slice(0, path.startsWith('lib/') ? 2 : 1)
    .join('/');
}

function firstDirective(file: SourceFile): string | null {
  const [first] = parse(file.path, file.text).statements;
  if (!first || !ts.isExpressionStatement(first) || !ts.isStringLiteral(first.expression)) return null;
  return first.expression.text;
}

function isClient(file: SourceFile): boolean {
  return file.text.includes('use client') && firstDirective(file) === 'use client';
}

function isServerAction(path: string): boolean {
  const file = byPath.get(path);
  return file !== undefined && file.text.includes('use server') && firstDirective(file) === 'use server';
}

function isBarrel(file: SourceFile): boolean {
  if (!/^export (type )?[{*]/m.test(file.text)) return false;
  const statements = [...parse(file.path, file.text).statements];
  const passesOn = (one: ts.Statement) => ts.isExportDeclaration(one) && one.moduleSpecifier !== undefined;
  return statements.length > 0 && statements.every(passesOn);
}

/** Own files that come along when this one is bundled; types are erased and bring nothing. */
function reached(start: SourceFile): string[] {
  const seen = new Set<string>();
  const queue = [start];
  for (let file = queue.pop(); file; file = queue.pop()) {
    for (const one of file.imports) {
      if (!one.own || one.typeOnly || one.target.endsWith('.css') || seen.has(one.target)) continue;
      seen.add(one.target);
      const next = byPath.get(one.target);
      if (next) queue.push(next);
    }
  }
  return [...seen];
}
