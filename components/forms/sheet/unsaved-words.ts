import { LINE_KINDS } from '@/lib/domain/sheet';
import type { WrittenLine } from './use-lines';

/** Words that could not be saved, kept in this browser until they are saved or given up. */
export function keepUnsaved(key: string, lines: readonly WrittenLine[]): void {
  try {
    localStorage.setItem(key, JSON.stringify(lines));
  } catch {
    // A full or closed store: the words are still on the screen.
  }
}

export function forgetUnsaved(key: string): void {
  try {
    localStorage.removeItem(key);
  } catch {
    // Nothing is kept where there is no store.
  }
}

export function findUnsaved(key: string): WrittenLine[] | null {
  try {
    const kept: unknown = JSON.parse(localStorage.getItem(key) ?? 'null');
    return Array.isArray(kept) && kept.length > 0 && kept.every(isLine) ? kept : null;
  } catch {
    return null;
  }
}

function isLine(value: unknown): value is WrittenLine {
  if (typeof value !== 'object' || value === null) return false;
  const { kind, text, knockedOut } = value as Partial<WrittenLine>;
  return (
    LINE_KINDS.some((one) => one === kind) && typeof text === 'string' && typeof knockedOut === 'boolean'
  );
}
