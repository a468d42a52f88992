import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { plainText } from './comparability';

/**
 * An earlier release with its options named as the later one names them, where only case, spaces or punctuation
 * differ: comparing the two takes such options for the same, so that their figures must meet.
 *
 * @param earlier the release compared with
 * @param later the one whose names are kept
 * @returns the earlier release; options that the later one lacks keep their names
 */
export function withNamesOf(earlier: ReleaseFacts, later: Pick<ReleaseFacts, 'shares'>): ReleaseFacts {
  const names = new Set(earlier.shares.map(({ option }) => option));
  const free = later.shares.map(({ option }) => option).filter((option) => !names.has(option));
  const shares = earlier.shares.map((share) => {
    if (later.shares.some(({ option }) => option === share.option)) return share;
    const at = free.findIndex((option) => plainText(option) === plainText(share.option));
    return at < 0 ? share : { ...share, option: free.splice(at, 1)[0]! };
  });
  return { ...earlier, shares };
}
