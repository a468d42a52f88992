import type { CheckDocument, Pair } from './check-types';
import type { BaseFigures } from './base-figures';

/**
 * The pairs a document asks about: those it names, else the two answer options with the largest disclosed shares,
 * larger first, ties in order of appearance; none where fewer than two are disclosed.
 */
export function askedPairs(document: Pick<CheckDocument, 'pairs'>, release: BaseFigures): readonly Pair[] {
  if (document.pairs) return document.pairs;
  const ranked = release.answers
    .flatMap((option) => {
      const units = release.units.get(option);
      return typeof units === 'number' ? [{ option, units }] : [];
    })
    .sort((a, b) => b.units - a.units);
  const [first, second] = ranked;
  return first && second ? [[first.option, second.option]] : [];
}

/**
 * The options whose change a document asks about: those it names, else the options of the pairs, without repeats,
 * where they are answers in both bases.
 */
export function askedChanges(
  document: CheckDocument,
  pairs: readonly Pair[],
  release: BaseFigures,
  previous: BaseFigures | null,
): readonly string[] {
  if (!previous) return [];
  if (document.changes) return document.changes;
  const options = [...new Set(pairs.flat())];
  return options.filter((option) => release.answers.includes(option) && previous.answers.includes(option));
}

/** The pairs whose change of lead is asked about: those with both options in the earlier base too. */
export function askedLeadChanges(pairs: readonly Pair[], previous: BaseFigures | null): readonly Pair[] {
  if (!previous) return [];
  return pairs.filter((pair) => pair.every((option) => previous.units.has(option)));
}
