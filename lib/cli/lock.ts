import { linkSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

type Holder = { pid: number; mark: string };

export class FolderInUse extends Error {}

/**
 * Takes the data folder for this process. Two processes on one folder would each believe they are
 * alone with its queue and its caches.
 * @throws FolderInUse when a living process holds it
 */
export function lockFolder(folder: string): () => void {
  const file = join(folder, 'lock');
  const own = JSON.stringify({ pid: process.pid, mark: processMark(process.pid) } satisfies Holder);
  if (!create(file, own)) {
    const before = read(file);
    if (before !== null) takeOver(file, before, folder);
    if (!create(file, own)) throw inUse(folder, parse(read(file))?.pid);
  }
  return () => {
    if (read(file) === own) rmSync(file, { force: true });
  };
}

/** Moves a dead process's lock away; if another start was quicker, its lock goes back where it was. */
function takeOver(file: string, before: string, folder: string): void {
  const holder = parse(before);
  if (holder && isAlive(holder)) throw inUse(folder, holder.pid);
  const aside = `${file}.${process.pid}`;
  try {
    renameSync(file, aside);
  } catch {
    return;
  }
  if (read(aside) !== before) linkSync(aside, file);
  rmSync(aside, { force: true });
}

function inUse(folder: string, pid: number | undefined): FolderInUse {
  const who = pid ? ` by process ${pid}` : '';
  return new FolderInUse(`The data folder ${folder} is already in use${who}. Stop it, or set LEADLINE_DATA.`);
}

function create(file: string, content: string): boolean {
  try {
    writeFileSync(file, content, { flag: 'wx', mode: 0o600 });
    return true;
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'EEXIST') return false;
    throw error;
  }
}

function read(file: string): string | null {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return null;
  }
}

function parse(text: string | null): Holder | null {
  try {
    const value: unknown = JSON.parse(text ?? '');
    if (typeof value !== 'object' || value === null || !('pid' in value)) return null;
    const { pid, mark } = value as { pid: unknown; mark?: unknown };
    return typeof pid === 'number' ? { pid, mark: typeof mark === 'string' ? mark : '' } : null;
  } catch {
    return null;
  }
}

/** A process number alone proves little: after a restart another process often has the same one. */
function isAlive({ pid, mark }: Holder): boolean {
  return isRunning(pid) && processMark(pid) === mark;
}

/** Whether some process has this number now. */
export function isRunning(pid: number): boolean {
  try {
    process.kill(pid, 0);
  } catch (error) {
    return (error as NodeJS.ErrnoException).code === 'EPERM';
  }
  return true;
}

/** When the process was started, in ticks since this boot; empty where the system does not tell. */
function processMark(pid: number): string {
  const stat = read(`/proc/${pid}/stat`);
  const boot = read('/proc/sys/kernel/random/boot_id')?.trim();
  const started = stat?.slice(stat.lastIndexOf(')') + 2).split(' ')[19];
  return started && boot ? `${boot}:${started}` : '';
}
