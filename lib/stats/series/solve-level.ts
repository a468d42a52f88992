import type { Arranged } from './arrange-polls';
import { computeColumns, makeColumns, type Columns } from './house-columns';
import type { HouseList } from './house-list';
import { computeGains, makeGains, type Gains } from './level-gains';
import { computeMeans, makeMeans, type Means } from './level-means';
import { solveHouses, type Houses } from './solve-houses';
import { makeWeighed, weighPolls, type Weighed } from './weigh-polls';

/** A series with the memory that its solutions share; each solution overwrites the one before. */
export type Level = {
  readonly arranged: Arranged;
  readonly houseList: HouseList;
  readonly isAnchored: boolean;
  readonly weighed: Weighed;
  readonly gains: Gains;
  readonly means: Means;
  readonly columns: Columns | null;
  houses: Houses | null;
  stateVariance: number;
  logLikelihoodFlat: number;
};

export function makeLevel(arranged: Arranged, houseList: HouseList): Level {
  const hasHouses = arranged.houses > 0;
  return {
    arranged,
    houseList,
    isAnchored: houseList.results.length > 0,
    weighed: makeWeighed(arranged),
    gains: makeGains(arranged),
    means: makeMeans(arranged),
    columns: hasHouses ? makeColumns(arranged) : null,
    houses: null,
    stateVariance: 0,
    logLikelihoodFlat: 0,
  };
}

/** Solves for level and house effects; the polls must have been weighed, with `weighPolls`, for their extra variance. */
export function solveWeighed(level: Level, stateVariance: number): void {
  const { arranged, weighed, gains, means, columns } = level;
  level.stateVariance = stateVariance;
  computeGains(arranged, weighed, stateVariance, gains);
  computeMeans(arranged, weighed, gains, noEffects(arranged.houses + 1), means);
  let logDeterminant = weighed.logVariances + gains.logDeterminant;
  let parameters = 1;
  if (columns) {
    computeColumns(arranged, weighed, gains, means, columns);
    level.houses = solveHouses(columns, level.houseList.isReference, level.isAnchored);
    computeMeans(arranged, weighed, gains, level.houses.effects, means);
    logDeterminant += level.houses.logDeterminant;
    if (!level.isAnchored) logDeterminant += 2 * Math.log(arranged.houses);
    parameters += level.isAnchored ? arranged.houses : arranged.houses - 1;
  }
  const degrees = arranged.observations - parameters;
  level.logLikelihoodFlat = -(degrees * Math.log(2 * Math.PI) + logDeterminant + means.squares) / 2;
}

export function solveLevel(level: Level, stateVariance: number, extraVariance: number): void {
  weighPolls(level.arranged, extraVariance, level.weighed);
  solveWeighed(level, stateVariance);
}

const noEffects = (groups: number) => new Float64Array(groups);
