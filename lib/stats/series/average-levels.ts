import { smoothedDays } from './expand-days';
import { changeOver, predictPlace } from './level-at';
import { Mixture } from './mixture';
import { houseEffectsOf } from './smooth-level-with-houses';
import { solveWeighed, type Level } from './solve-level';
import { gridWeights, type GridLikelihood } from './variance-grid';
import { weighPolls } from './weigh-polls';

/** Nodes with less weight than this move no band that could be seen. */
const LEAST_WEIGHT = 1e-6;

const square = (value: number) => value * value;

/** Everything that is asked of a level, averaged over the grid of its variances by their weights. */
export function averageLevels(level: Level, found: GridLikelihood) {
  const { days } = level.arranged;
  const { changes: spans = [], predictions: places = [] } = days;
  const { names } = level.houseList;
  const daily = new Mixture(days.lastDay - days.firstDay + 1);
  const houses = new Mixture(names.length);
  const changes = new Mixture(spans.length);
  const predictions = new Mixture(places.length);
  const variances = new Mixture(2);
  const weights = gridWeights(found);

  found.grid.extraSds.forEach((extraSd, row) => {
    weighPolls(level.arranged, square(extraSd), level.weighed);
    found.grid.stateSds.forEach((stateSd, column) => {
      const weight = weights[row]![column]!;
      if (weight < LEAST_WEIGHT) return;
      solveWeighed(level, square(stateSd));
      const smoothed = smoothedDays(level);
      daily.add(weight, smoothed.mean, smoothed.variance);
      addAll(houses, weight, houseEffectsOf(level), ({ effect, standardError }) => [
        effect,
        square(standardError),
      ]);
      const changed = spans.map((span) => changeOver(level, smoothed, span));
      addAll(changes, weight, changed, ({ change, standardError }) => [change, square(standardError)]);
      const predicted = places.map((place) => predictPlace(level, smoothed, place));
      addAll(predictions, weight, predicted, ({ mean, variance }) => [mean, variance]);
      variances.add(weight, [square(stateSd), square(extraSd)], [0, 0]);
    });
  });

  const [stateVariancePerDay = 0, extraVariance = 0] = variances.means();
  const houseMeans = momentsOf(houses);
  const changeMeans = momentsOf(changes);
  const predictionMeans = momentsOf(predictions);
  return {
    mean: daily.means(),
    variance: daily.variances(),
    houseEffects: houseMeans.map(({ mean, variance }, index) => ({
      house: names[index]!,
      effect: mean,
      standardError: Math.sqrt(variance),
    })),
    changes: changeMeans.map(({ mean, variance }, index) => ({
      ...spans[index]!,
      change: mean,
      standardError: Math.sqrt(variance),
    })),
    predictions: predictionMeans.map((moments, index) => ({ ...places[index]!, ...moments })),
    averaged: { stateVariancePerDay, extraVariance },
    weights,
  };
}

/** Adds quantities that carry their own mean and variance. */
function addAll<One>(
  mixture: Mixture,
  weight: number,
  all: readonly One[],
  moments: (one: One) => readonly [mean: number, variance: number],
): void {
  const pairs = all.map(moments);
  mixture.add(
    weight,
    pairs.map(([mean]) => mean),
    pairs.map(([, variance]) => variance),
  );
}

function momentsOf(mixture: Mixture): { mean: number; variance: number }[] {
  const variances = mixture.variances();
  return mixture.means().map((mean, index) => ({ mean, variance: variances[index]! }));
}
