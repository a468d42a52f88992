import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { dirname, join, normalize } from 'node:path';
import { fileURLToPath } from 'node:url';
import ts from 'typescript';

export const root = fileURLToPath(new URL('../..', import.meta.url));

const madeByTools = new Set([
  '.git',
  '.next',
  '.data',
  '.e2e',
  'node_modules',
  'test-results',
  'playwright-report',
  'coverage',
]);
const generated = ['drizzle/', 'lib/findings/archive/', 'next-env.d.ts'];

export type SourceFile = { path: string; text: string; imports: Import[] };
export type Import = { specifier: string; target: string; own: boolean; typeOnly: boolean };

export function topLevelFolders(): string[] {
  return readdirSync(root, { withFileTypes: true })
    .filter((entry) => entry.isDirectory() && !madeByTools.has(entry.name))
    .map((entry) => entry.name)
    .sort();
}

/** Every file of the repository that a person wrote, as a path from its root. */
export function allFiles(folder = ''): string[] {
  return readdirSync(join(root, folder), { withFileTypes: true }).flatMap((entry) => {
    const path = folder ? `${folder}/${entry.name}` : entry.name;
    if (!entry.isDirectory()) return [path];
    return madeByTools.has(entry.name) ? [] : allFiles(path);
  });
}

/** TypeScript and JavaScript that a person wrote, with what each file imports. */
export function sourceFiles(): SourceFile[] {
  return allFiles()
    .filter((path) => /\.(ts|tsx|mjs|js)$/.test(path) && !generated.some((start) => path.startsWith(start)))
    .map((path) => {
      const text = readText(path);
      return { path, text, imports: importsOf(path, text) };
    });
}

export function readText(path: string): string {
  return readFileSync(join(root, path), 'utf8');
}

function importsOf(path: string, text: string): Import[] {
  const found: Import[] = [];
  const add = (specifier: string, typeOnly: boolean) =>
    found.push({ specifier, typeOnly, ...resolveImport(specifier, path) });

  const visit = (node: ts.Node): void => {
    if (ts.isImportDeclaration(node) && ts.isStringLiteral(node.moduleSpecifier)) {
      add(node.moduleSpecifier.text, isTypeOnly(node.importClause));
    } else if (
      ts.isExportDeclaration(node) &&
      node.moduleSpecifier &&
      ts.isStringLiteral(node.moduleSpecifier)
    ) {
      add(node.moduleSpecifier.text, node.isTypeOnly);
    } else if (ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword) {
      const [first] = node.arguments;
      if (first && ts.isStringLiteral(first)) add(first.text, false);
    } else if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) {
      if (ts.isStringLiteral(node.argument.literal)) add(node.argument.literal.text, true);
    }
    ts.forEachChild(node, visit);
  };
  visit(parse(path, text));
  return found;
}

function isTypeOnly(clause: ts.ImportClause | undefined): boolean {
  if (!clause) return false;
  if (clause.phaseModifier === ts.SyntaxKind.TypeKeyword) return true;
  const named = clause.namedBindings;
  if (clause.name || !named || !ts.isNamedImports(named)) return false;
  return named.elements.length > 0 && named.elements.every((element) => element.isTypeOnly);
}

export function parse(path: string, text: string): ts.SourceFile {
  return ts.createSourceFile(path, text, ts.ScriptTarget.Latest, true);
}

function resolveImport(specifier: string, from: string): { target: string; own: boolean } {
  if (specifier.startsWith('@/')) return { target: existing(specifier.slice(2)), own: true };
  if (specifier.startsWith('.'))
    return { target: existing(normalize(join(dirname(from), specifier))), own: true };
  return { target: specifier, own: false };
}

/** The file a bare path means: imports leave the ending out. */
function existing(path: string): string {
  const endings = ['', '.ts', '.tsx', '.mjs', '/index.ts', '/index.tsx'];
  const ending = endings.find((end) => {
    const place = join(root, path + end);
    return existsSync(place) && statSync(place).isFile();
  });
  return path + (ending ?? '');
}
