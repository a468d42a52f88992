import type { PastedShare } from '@/lib/import/paste-shares';
import { blankShare, type ShareRow } from './form-values';

/** As many as a release may have. */
export const MAX_SHARES = 30;

/**
 * The grid after a paste: a name that stands there already takes its share, others fill empty rows, then new ones.
 * Nothing typed goes away.
 */
export function mergedShares(rows: readonly ShareRow[], pasted: readonly PastedShare[]): ShareRow[] {
  const merged = [...rows];
  for (const { option, printed } of pasted) {
    const named = merged.findIndex((row) => plain(row.option) === plain(option));
    const free = merged.findIndex((row) => row.option.trim() === '' && row.printed.trim() === '');
    const at = named === -1 ? free : named;
    if (at !== -1) merged[at] = { ...(named === -1 ? blankShare(option) : merged[at]!), printed };
    else if (merged.length < MAX_SHARES) merged.push({ ...blankShare(option), printed });
  }
  return merged;
}

const plain = (name: string) => name.normalize('NFC').trim().toLowerCase().replace(/’/g, "'");
