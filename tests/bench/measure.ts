import { Bench } from 'tinybench';

/**
 * Seconds of the fastest of many calls by the clock, after a warm-up. R's side is the fastest batch in processor time:
 * its batches are too long to be left alone on a busy machine, and no call takes less time by the clock.
 */
export async function fastestSeconds(run: () => void, { time = 400, iterations = 9 } = {}): Promise<number> {
  const bench = new Bench({ time, iterations, warmupTime: Math.min(200, time), warmupIterations: 10 });
  bench.add('run', run, { async: false });
  const [task] = await bench.run();
  if (task?.result.state !== 'completed') throw new Error('a measured call failed', { cause: task?.result });
  return task.result.latency.min / 1000;
}

export type Point = { size: number; seconds: number };

/** How time grows with size: 1 is in proportion, 2 with the square. Least squares on the logarithms. */
export function slope(points: readonly Point[]): number {
  const logs = points.map(({ size, seconds }) => ({ x: Math.log(size), y: Math.log(seconds) }));
  const mean = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
  const x = mean(logs.map((one) => one.x));
  const y = mean(logs.map((one) => one.y));
  const above = logs.reduce((sum, one) => sum + (one.x - x) * (one.y - y), 0);
  return above / logs.reduce((sum, one) => sum + (one.x - x) ** 2, 0);
}

export async function growth(
  sizes: readonly number[],
  prepare: (size: number) => () => void,
): Promise<Point[]> {
  const points: Point[] = [];
  for (const size of sizes) {
    points.push({ size, seconds: await fastestSeconds(prepare(size), { time: 300, iterations: 40 }) });
  }
  return points;
}
