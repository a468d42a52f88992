import { readBase, type BaseFigures } from './base-figures';
import { withBlocs, type BlocOnBase } from './blocs';
import type { Base, Policy } from './check-types';
import type { QuestionBase } from './judge-types';

/** A base of a question as it is judged, and as it stood before anyone was taken out. */
export type ReadQuestion = {
  /** What the findings stand on: re-based where the shares are, with blocs. */
  figures: BaseFigures;
  /** Everyone asked: where the design effect comes from. */
  everyone: { base: Base; figures: BaseFigures };
  rebasedN: number | null | undefined;
};

/**
 * Reads the base of a question. Re-based shares stand on the people left in, with the design effect of everyone
 * asked; where that number is not disclosed they have no margin.
 *
 * @param base of a parsed document
 * @param policy the desk's policy, complete
 * @param blocs as they are on this base
 */
export function readQuestion(
  { rebased, population: _population, ...base }: QuestionBase,
  policy: Policy,
  blocs: readonly BlocOnBase[],
): ReadQuestion {
  if (rebased && rebased.n !== null && base.n === null) {
    // A stated margin belongs to everyone asked, whose number is not known, so that it says nothing here.
    const left: Base = { ...base, n: rebased.n, statedMargin: null };
    const figures = readBase(left, policy);
    return {
      figures: withBlocs(figures, blocs),
      everyone: { base: left, figures },
      rebasedN: rebased.n,
    };
  }
  const figures = readBase(base, policy);
  return {
    figures: withBlocs(rebased ? onPeopleLeft(figures, rebased.n) : figures, blocs),
    everyone: { base, figures },
    rebasedN: rebased?.n,
  };
}

/** The same base with fewer people. */
export function onPeopleLeft(figures: BaseFigures, n: number | null): BaseFigures {
  const { sampled } = figures;
  if (n === null || !sampled) return { ...figures, sampled: null };
  return { ...figures, sampled: { ...sampled, n, nEff: n / sampled.deff.value } };
}
