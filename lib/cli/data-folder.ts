import { randomBytes } from 'node:crypto';
import {
  chmodSync,
  closeSync,
  existsSync,
  fsyncSync,
  mkdirSync,
  openSync,
  readFileSync,
  renameSync,
  writeFileSync,
} from 'node:fs';
import { dirname, join } from 'node:path';
import { lockFolder } from './lock';

export type DataFolder = {
  folder: string;
  /** Where the database is, or will be after the first start. */
  database: string;
  accounts: string;
  secret: string;
  release: () => void;
};

export function openDataFolder(folder: string): DataFolder {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const release = lockFolder(folder);
  return {
    folder,
    database: join(folder, 'leadline.db'),
    accounts: join(folder, 'accounts.json'),
    secret: readOrMakeSecret(join(folder, 'secret')),
    release,
  };
}

/** Signs the session cookies: made once, so that nobody is signed out by a restart. */
function readOrMakeSecret(file: string): string {
  if (!existsSync(file)) writePrivately(file, randomBytes(32).toString('base64url'));
  chmodSync(file, 0o600);
  return readFileSync(file, 'utf8').trim();
}

/** Writes a file only its owner can read, whole or not at all. */
export function writePrivately(file: string, content: string): void {
  const unfinished = `${file}.new`;
  const handle = openSync(unfinished, 'w', 0o600);
  try {
    writeFileSync(handle, content);
    fsyncSync(handle);
  } finally {
    closeSync(handle);
  }
  moveIntoPlace(unfinished, file);
}

/** A rename survives a power cut only once the folder itself is on disk. */
export function moveIntoPlace(from: string, to: string): void {
  renameSync(from, to);
  const folder = openSync(dirname(to), 'r');
  try {
    fsyncSync(folder);
  } finally {
    closeSync(folder);
  }
}
