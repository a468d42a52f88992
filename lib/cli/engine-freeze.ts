import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';
import { ENGINE_VERSION } from '@/lib/findings/engine-version';

const root = join(dirname(fileURLToPath(import.meta.url)), '../..');
const archive = join(root, 'lib/findings/archive');
const manifestFile = join(archive, 'manifest.json');

type Manifest = Record<string, { sha256: string }>;

async function bundle(): Promise<Uint8Array> {
  const { outputFiles } = await build({
    absWorkingDir: root,
    entryPoints: ['lib/findings/engine-entry.ts'],
    bundle: true,
    write: false,
    format: 'esm',
    platform: 'browser',
    target: 'es2022',
    charset: 'utf8',
    minify: true,
    legalComments: 'eof',
    alias: { '@': root },
    logLevel: 'error',
  });
  const [file] = outputFiles;
  if (!file) throw new Error('esbuild wrote no bundle');
  if (file.text.includes(root)) throw new Error('the bundle names a folder of this machine');
  return file.contents;
}

async function freeze(): Promise<void> {
  const bytes = await bundle();
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  const file = join(archive, `${ENGINE_VERSION}.mjs`);
  const manifest: Manifest = existsSync(manifestFile)
    ? (JSON.parse(readFileSync(manifestFile, 'utf8')) as Manifest)
    : {};
  const frozen = manifest[ENGINE_VERSION]?.sha256;
  if (frozen !== undefined && frozen !== sha256) {
    process.stderr.write(
      `Engine ${ENGINE_VERSION} is frozen with other bytes. Raise ENGINE_VERSION if a number of an answer moved; otherwise leave the archive as it is.\n`,
    );
    process.exitCode = 1;
    return;
  }
  mkdirSync(archive, { recursive: true });
  writeFileSync(file, bytes);
  writeFileSync(manifestFile, `${JSON.stringify({ ...manifest, [ENGINE_VERSION]: { sha256 } }, null, 2)}\n`);
  process.stdout.write(`Engine ${ENGINE_VERSION}: ${bytes.length} bytes, SHA-256 ${sha256}\n`);
}

await freeze();
