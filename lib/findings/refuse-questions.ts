import { CheckRefused } from './check-refused';
import type { CheckDocument, Pair } from './check-types';

export const UNKNOWN_OPTION = 'This option is not in the release.';
const REPEATED = 'This is asked already.';

/**
 * Refuses pairs, changes and thresholds that name what is not in the release, or ask twice.
 *
 * @throws CheckRefused with the path of the entry or of the option in it
 */
export function refuseFaultyQuestions(document: CheckDocument): void {
  const options = new Set(document.release.shares.map(({ option }) => option));
  refuseFaultyPairs(document.pairs ?? [], options);
  const changes = document.changes ?? [];
  if (changes.length > 0 && !document.previous) {
    throw new CheckRefused('changes', 'A change needs the release it is compared with.');
  }
  const askedChanges = new Set<string>();
  changes.forEach((option, index) => {
    if (!options.has(option)) throw new CheckRefused(`changes[${index}]`, UNKNOWN_OPTION);
    refuseRepeated(askedChanges, option, `changes[${index}]`);
  });
  const askedThresholds = new Set<string>();
  (document.thresholds ?? []).forEach(({ option, pct }, index) => {
    if (!options.has(option)) throw new CheckRefused(`thresholds[${index}].option`, UNKNOWN_OPTION);
    refuseRepeated(askedThresholds, JSON.stringify([option, pct]), `thresholds[${index}]`);
  });
}

/** Refuses pairs of unknown names, of one name, or asked twice in either order. */
export function refuseFaultyPairs(pairs: readonly Pair[], options: ReadonlySet<string>): void {
  const asked = new Set<string>();
  pairs.forEach((pair, index) => {
    pair.forEach((option, place) => {
      if (!options.has(option)) throw new CheckRefused(`pairs[${index}][${place}]`, UNKNOWN_OPTION);
    });
    if (pair[0] === pair[1]) {
      throw new CheckRefused(`pairs[${index}]`, 'A pair names two different options.');
    }
    refuseRepeated(asked, JSON.stringify([...pair].sort()), `pairs[${index}]`);
  });
}

/** Refuses what was asked before, and keeps note of it. */
export function refuseRepeated(asked: Set<string>, key: string, path: string, words = REPEATED): void {
  if (asked.has(key)) throw new CheckRefused(path, words);
  asked.add(key);
}
