import { readFileSync } from 'node:fs';
import { check } from '@/lib/findings/check';
import { CheckRefused } from '@/lib/findings/check-refused';
import { parseCheckDocument } from '@/lib/findings/parse-check';

const STANDARD_INPUT = 0;
const REFUSED = 2;
const USAGE = 'Usage: npm run check:poll -- FILE (or - for standard input)\n';

function main([file]: string[]): void {
  if (file === undefined) {
    process.stderr.write(USAGE);
    process.exitCode = 1;
    return;
  }
  const text = readText(file);
  if (text === null) return;
  try {
    print(check(parseCheckDocument(jsonOf(text))));
  } catch (error) {
    if (!(error instanceof CheckRefused)) throw error;
    print({ error: error.toRefusal() });
    process.exitCode = REFUSED;
  }
}

function readText(file: string): string | null {
  try {
    return readFileSync(file === '-' ? STANDARD_INPUT : file, 'utf8');
  } catch {
    process.stderr.write(`The file ${file} cannot be read.\n`);
    process.exitCode = 1;
    return null;
  }
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text.replace(/^\uFEFF/, ''));
  } catch {
    throw new CheckRefused('', 'The document is not JSON.');
  }
}

function print(value: unknown): void {
  process.stdout.write(`${JSON.stringify(value, null, 2)}\n`);
}

main(process.argv.slice(2));
