/** Every finding computed again in R by its own script, and held against the engine. */
import { say } from '@/lib/cli/process.mjs';
import { compareFigures } from './compare';
import { ensureR } from './ensure-r';
import { scriptCases, type ScriptCase } from './script-cases';
import { runAlone, runTogether, type Printed } from './run-scripts';

if (!(await ensureR())) process.exit(1);

type Tally = { passed: number; failed: number; worst: number };

const cases = scriptCases();
const tallies = new Map<string, Tally>();

runTogether(cases.map(({ script }) => script)).forEach((printed, index) => judge(cases[index], printed));
for (const one of firstOfEachKind(cases)) judge({ ...one, kind: 'on its own' }, runAlone(one.script));

let passed = 0;
let failed = 0;
for (const [kind, tally] of tallies) {
  passed += tally.passed;
  failed += tally.failed;
  const count = String(tally.passed + tally.failed).padStart(4);
  say(`${kind.padEnd(18)} ${count} findings, worst relative error ${tally.worst.toExponential(1)}`);
}
say(`${passed} passed, ${failed} failed`);
process.exit(failed > 0 || passed === 0 ? 1 : 0);

function judge(one: ScriptCase | undefined, { figures, complaints }: Printed): void {
  if (!one) throw new Error('R printed more scripts than there are');
  const { faults, worst } = compareFigures(figures, one.expected);
  const told = [...complaints, ...faults];
  const tally = tallies.get(one.kind) ?? { passed: 0, failed: 0, worst: 0 };
  tallies.set(one.kind, {
    passed: tally.passed + (told.length === 0 ? 1 : 0),
    failed: tally.failed + (told.length === 0 ? 0 : 1),
    worst: Math.max(tally.worst, worst),
  });
  if (told.length > 0) say(`${one.name}\n  ${told.join('\n  ')}`);
}

function firstOfEachKind(all: readonly ScriptCase[]): ScriptCase[] {
  const first = new Map<string, ScriptCase>();
  for (const one of all) if (!first.has(one.kind)) first.set(one.kind, one);
  return [...first.values()];
}
