import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { replicateDesign, surveyDesign, weightedProportion } from '@/lib/stats';
import { normalDraw, seeded } from '../simulation/random';
import { growth, fastestSeconds } from './measure';
import { readRows, readTimes, runR } from './r';
import type { Report } from './report';

const ROWS = 100_000;
const REPLICATES = 200;
const LEVEL = 0.95;
const TOLERANCE = 1e-9;

type File = { weights: Float64Array; answers: Uint8Array; replicateWeights: Float64Array };

/** A respondent file of 100,000 rows with 200 replicate weights, against svymean on both designs. */
export async function benchRespondents(report: Report, folder: string): Promise<void> {
  const file = respondents(ROWS, REPLICATES);
  const lines = Array.from(file.answers, (answer, row) => `${answer},${file.weights[row]}`);
  writeFileSync(join(folder, 'respondents.csv'), ['answer,weight', ...lines, ''].join('\n'));
  const { replicateWeights: matrix } = file;
  writeFileSync(join(folder, 'replicates.bin'), new Uint8Array(matrix.buffer, 0, matrix.byteLength));
  runR('respondents.R', folder, REPLICATES);

  const byWeights = surveyDesign({ weights: file.weights });
  const byReplicates = replicatesOf(file, REPLICATES);
  const designs = { weights: byWeights, replicates: byReplicates };
  for (const row of readRows(folder, 'answers.csv')) {
    const design = row.name === 'weights' ? designs.weights : designs.replicates;
    const ours = weightedProportion(design, file.answers, { level: LEVEL });
    report.same(`share by ${row.name}`, ours.estimate, Number(row.estimate), TOLERANCE);
    report.same(`standard error by ${row.name}`, ours.se, Number(row.se), TOLERANCE);
  }

  const times = readTimes(folder);
  const rOf = (name: string) => times.get(name) ?? 0;
  const linear = await fastestSeconds(() => weightedProportion(byWeights, file.answers, { level: LEVEL }));
  const replicated = await fastestSeconds(
    () => weightedProportion(byReplicates, file.answers, { level: LEVEL }),
    { time: 1500, iterations: 9 },
  );
  report.title(`A respondent file of ${ROWS} rows, parsed and its design made on both sides`);
  report.time('share with all intervals, linearized', linear);
  report.time('R: svymean, weights', rOf('weights'));
  report.aim('svymean over ours, weights', rOf('weights') / linear, 20, 'at least');
  report.time(`share with all intervals, ${REPLICATES} replicate weights`, replicated);
  report.time(`R: svymean, ${REPLICATES} replicate weights`, rOf('replicates'));
  report.aim('svymean over ours, replicate weights', rOf('replicates') / replicated, 8, 'at least');

  const whole = await fastestSeconds(() => {
    weightedProportion(surveyDesign({ weights: file.weights }), file.answers, { level: LEVEL });
  });
  report.time('the design made anew and the share, linearized', whole);
  report.time('R: svydesign and svymean', rOf('design') + rOf('weights'));
  await growthOfFiles(report);
}

async function growthOfFiles(report: Report): Promise<void> {
  const bySize = await growth([12_500, 25_000, 50_000, 100_000, 200_000], (rows) => {
    const { weights, answers } = respondents(rows, 0);
    const design = surveyDesign({ weights });
    return () => weightedProportion(design, answers, { level: LEVEL });
  });
  report.growth('shares by respondents', bySize, 1.2);
  const byReplicates = await growth([25, 50, 100, 200], (replicates) => {
    const file = respondents(20_000, replicates);
    const design = replicatesOf(file, replicates);
    return () => weightedProportion(design, file.answers, { level: LEVEL });
  });
  report.growth('shares of 20000 respondents by replicates', byReplicates, 1.2);
}

/** Degrees of freedom are stated on both sides, so that neither ranks the replicate weights. */
function replicatesOf({ weights, replicateWeights }: File, replicates: number) {
  return replicateDesign({
    weights,
    replicateWeights,
    type: 'bootstrap',
    mse: true,
    scale: 1 / replicates,
    rscales: 1,
    df: replicates - 1,
  });
}

function respondents(rows: number, replicates: number): File {
  const random = seeded(rows + replicates);
  const weights = Float64Array.from({ length: rows }, () => Math.exp(0.6 * normalDraw(random)));
  const answers = Uint8Array.from({ length: rows }, () => (random() < 0.46 ? 1 : 0));
  const replicateWeights = new Float64Array(rows * replicates);
  for (let index = 0; index < replicateWeights.length; index += 1) {
    const weight = weights[Math.floor(index / replicates)] ?? 0;
    replicateWeights[index] = -Math.log(1 - random()) * weight;
  }
  return { weights, answers, replicateWeights };
}
