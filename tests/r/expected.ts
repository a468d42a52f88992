import type { BaseAnswer, SecondTest } from '@/lib/findings/check-types';
import type { Figure } from './compare';

/** Names of a finding are in the script, not among its results; its working and trace are the engine's own. */
const NOT_PRINTED = new Set([
  'option',
  'pair',
  'question',
  'groups',
  'thresholdPct',
  'bloc',
  'key',
  'working',
  'trace',
]);

const SIDES = ['group', 'against'];

type Answered = Readonly<Record<string, unknown>>;

/** The figures of a finding and its bases under the names that its script prints. */
export function expectedFigures(
  finding: Answered,
  bases: Readonly<Record<string, BaseAnswer>>,
): Map<string, Figure> {
  const figures = new Map<string, Figure>();
  for (const [name, base] of Object.entries(bases)) flatten(name, base, figures);
  for (const [name, value] of Object.entries(finding)) {
    if (name === 'presentation' && Array.isArray(value)) {
      SIDES.forEach((side, place) => flatten(`${name}.${side}`, value[place], figures));
    } else if (!NOT_PRINTED.has(name)) flatten(name, value, figures);
  }
  return figures;
}

function flatten(name: string, value: unknown, into: Map<string, Figure>): void {
  if (isFigure(value)) into.set(name, value);
  else if (Array.isArray(value)) flattenList(name, value, into);
  else if (typeof value === 'object' && value !== null) {
    for (const [key, inner] of Object.entries(value)) flatten(`${name}.${key}`, inner, into);
  } else throw new TypeError(`${name} holds what no script prints`);
}

function flattenList(name: string, values: readonly unknown[], into: Map<string, Figure>): void {
  const [low, high] = values;
  if (values.length === 2 && typeof low === 'number' && typeof high === 'number') {
    into.set(`${name}.low`, low);
    into.set(`${name}.high`, high);
    return;
  }
  const isTests = (all: readonly unknown[]): all is SecondTest[] => name === 'secondTests' && all.length > 0;
  if (!isTests(values)) {
    into.set(name, values.length === 0 ? 'none' : values.join(', '));
    return;
  }
  into.set(name, values.map((test) => test.name).join(', '));
  for (const { name: own, ...fields } of values) flatten(`${name}.${own}`, fields, into);
}

function isFigure(value: unknown): value is Figure {
  return value === null || ['number', 'string', 'boolean'].includes(typeof value);
}
