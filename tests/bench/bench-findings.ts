import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { check } from '@/lib/findings/check';
import type { Base, CheckAnswer } from '@/lib/findings/check-types';
import { growth, fastestSeconds } from './measure';
import { readRows, readTimes, runR } from './r';
import { exampleRelease, releaseOf } from './release';
import type { Report } from './report';

const LEVEL = 0.95;
const TOLERANCE = 1e-9;
const RELEASES = 100_000;
/** What the heap may grow by over all those releases: less than a quarter of a byte each. */
const FLAT_BYTES = 2 ** 21;

type Row = { id: string; kind: 'one' | 'two' | 'lead'; p0: number; counts: [number, number, number, number] };

/** All findings of one release with its comparison, against the calls of prop.test that give the same figures. */
export async function benchFindings(report: Report, folder: string): Promise<void> {
  const rows = callsOf();
  const header = 'id,kind,x1,n1,x2,n2,p0,level';
  const lines = rows.map(({ id, kind, counts, p0 }) => [id, kind, ...counts, p0, LEVEL].join(','));
  writeFileSync(join(folder, 'figures.csv'), [header, ...lines, ''].join('\n'));
  runR('findings.R', folder);
  compareFigures(report, folder);

  const times = readTimes(folder);
  const ours = await fastestSeconds(() => check(exampleRelease));
  report.title('All findings of one release with its comparison');
  report.time('check', ours);
  report.time(`R: the ${rows.length} prop.test calls with the same figures`, times.get('same') ?? 0);
  report.time('R: eight prop.test calls', times.get('eight') ?? 0);
  report.aim('eight prop.test calls over one release', (times.get('eight') ?? 0) / ours, 1, 'at least');
  report.aim(
    'the same figures by prop.test over one release',
    (times.get('same') ?? 0) / ours,
    1,
    'at least',
  );
  const points = await growth([4, 8, 16, 32, 64], (options) => {
    const document = releaseOf(options);
    return () => check(document);
  });
  report.growth('findings by options', points, 1.5);
}

/** Every figure of the example that a call of prop.test gives, on effective counts. */
function callsOf(): Row[] {
  const { release, previous } = exampleRelease;
  const now = effective(release);
  const before = effective(previous ?? release);
  const count = (option: string, of = now) => of.count(option);
  return [
    ...release.shares.map(({ option }): Row => ({
      id: `share ${option}`,
      kind: 'one',
      p0: 0.5,
      counts: [count(option), now.n, 0, 1],
    })),
    { id: 'lead', kind: 'lead', p0: 0.5, counts: [count('Alder'), now.n, count('Brook'), now.n] },
    ...['Alder', 'Brook'].map((option): Row => ({
      id: `change ${option}`,
      kind: 'two',
      p0: 0.5,
      counts: [count(option, before), before.n, count(option), now.n],
    })),
    { id: 'threshold', kind: 'one', p0: 0.5, counts: [count('Alder'), now.n, 0, 1] },
  ];
}

function effective(base: Base) {
  const n = (base.n ?? 0) / (base.deff?.value ?? 1);
  const pct = (option: string) => base.shares.find((share) => share.option === option)?.pct ?? 0;
  return { n, count: (option: string) => (n * pct(option)) / 100 };
}

function compareFigures(report: Report, folder: string): void {
  const ours = figuresOf(check(exampleRelease));
  for (const row of readRows(folder, 'answers.csv')) {
    const mine = ours.get(row.id ?? '');
    if (!mine) throw new Error(`no figure for ${row.id}`);
    if (mine.p !== undefined) report.same(`p of ${row.id}`, mine.p, Number(row.p), TOLERANCE);
    if (!mine.interval) continue;
    report.same(`low end of ${row.id}`, mine.interval[0] / 100, Number(row.low), TOLERANCE);
    report.same(`high end of ${row.id}`, mine.interval[1] / 100, Number(row.high), TOLERANCE);
  }
}

type Figure = { p?: number; interval?: readonly [number, number] };

function figuresOf(answer: CheckAnswer): Map<string, Figure> {
  const figures = new Map<string, Figure>();
  for (const finding of answer.findings) {
    if (finding.kind === 'share') {
      const interval = finding.method === 'wilson' ? finding.intervalPct : undefined;
      figures.set(`share ${finding.option}`, interval ? { interval } : {});
    } else if ('secondTests' in finding) {
      const second = finding.secondTests.find(({ name }) => name === 'score' || name === 'pooled');
      const p = second && 'p' in second ? second.p : finding.p;
      const id = finding.kind === 'change' ? `change ${finding.option}` : finding.kind;
      figures.set(id, { p });
    }
  }
  return figures;
}

/** Whether anything is kept from one release to the next. */
export function benchMemory(report: Report): void {
  const collect = globalThis.gc;
  if (!collect) throw new Error('the memory is measured under node --expose-gc');
  const heap = () => {
    collect();
    collect();
    return process.memoryUsage().heapUsed;
  };
  for (let warm = 0; warm < 2000; warm += 1) check(exampleRelease);
  const start = heap();
  for (let release = 0; release < RELEASES; release += 1) check(numbered(release));
  const end = heap();
  report.title(`Memory over ${RELEASES} different releases`);
  const mib = (bytes: number) => `${(bytes / 2 ** 20).toFixed(2)} MiB`;
  report.say(`  heap in use at the start ${mib(start)}, at the end ${mib(end)}`);
  const isFlat = end - start <= FLAT_BYTES;
  report.say(`  growth ${mib(end - start)} (at most ${mib(FLAT_BYTES)}): ${isFlat ? 'flat' : 'NOT FLAT'}`);
  if (!isFlat) report.wrong.push('memory grows with the number of releases');
}

/** No two alike, so that whatever remembers its answers is found out. */
function numbered(index: number) {
  const { release } = exampleRelease;
  const deff = { source: 'design' as const, value: 1 + index / RELEASES };
  return { ...exampleRelease, release: { ...release, n: 500 + (index % 4000), deff } };
}
