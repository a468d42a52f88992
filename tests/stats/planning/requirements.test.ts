import { describe, expect, test } from 'vitest';
import * as stats from '@/lib/stats';

const change = {
  p1: 0.4,
  p2: 0.45,
  n: 900,
  deff: 1,
  alpha: 0.05,
  power: 0.8,
  alternative: 'two.sided' as const,
};
const lead = {
  first: 0.45,
  second: 0.4,
  n: 900,
  deff: 1,
  alpha: 0.05,
  power: 0.8,
  alternative: 'two.sided' as const,
};
const question = { ...lead, together: 0.85 };
const margin = { margin: 0.03, p: 0.5, deff: 1, level: 0.95 };
const sides = 'both' as 'two.sided';

const SHARES = 'shares from 0 to 1 that leave some variance and sum to at most 1';
const refusals: [call: () => unknown, message: string][] = [
  [
    () => stats.sampleSizeForMargin({ ...margin, margin: 0 }),
    'sampleSizeForMargin requires margin and deff above 0',
  ],
  [
    () => stats.sampleSizeForMargin({ ...margin, deff: 0 }),
    'sampleSizeForMargin requires margin and deff above 0',
  ],
  [() => stats.sampleSizeForMargin({ ...margin, p: 1.1 }), 'sampleSizeForMargin requires p from 0 to 1'],
  [
    () => stats.sampleSizeForMargin({ ...margin, level: 1 }),
    'sampleSizeForMargin requires level inside 0 and 1',
  ],
  [
    () => stats.sampleSizeForMargin({ ...margin, population: 0 }),
    'sampleSizeForMargin requires a population of at least 1',
  ],
  [
    () => stats.changePower({ ...change, p1: Number.NaN }),
    'changePower requires p1 and p2 from 0 to 1, not both 0 or 1',
  ],
  [
    () => stats.changePower({ ...change, p1: 0, p2: 1 }),
    'changePower requires p1 and p2 from 0 to 1, not both 0 or 1',
  ],
  [() => stats.changePower({ ...change, n: 0 }), 'changePower requires n and deff above 0'],
  [() => stats.changePower({ ...change, alpha: 0 }), 'changePower requires alpha inside 0 and 1'],
  [
    () => stats.changePower({ ...change, alternative: sides }),
    "changePower requires alternative 'two.sided' or 'one.sided'",
  ],
  [
    () => stats.sampleSizeForChange({ ...change, p2: 0.4 }),
    'sampleSizeForChange requires p1 and p2 that differ',
  ],
  [
    () => stats.sampleSizeForChange({ ...change, p1: 0, p2: 0 }),
    'sampleSizeForChange requires p1 and p2 from 0 to 1, not both 0 or 1',
  ],
  [() => stats.sampleSizeForChange({ ...change, deff: 0 }), 'sampleSizeForChange requires deff above 0'],
  [
    () => stats.sampleSizeForChange({ ...change, alpha: 1 }),
    'sampleSizeForChange requires alpha inside 0 and 1',
  ],
  [
    () => stats.sampleSizeForChange({ ...change, alternative: sides }),
    "sampleSizeForChange requires alternative 'two.sided' or 'one.sided'",
  ],
  [
    () => stats.sampleSizeForChange({ ...change, power: 0.05 }),
    'sampleSizeForChange requires power above alpha and below 1',
  ],
  [
    () => stats.sampleSizeForChange({ ...change, power: 1 }),
    'sampleSizeForChange requires power above alpha and below 1',
  ],
  [() => stats.detectableChange({ ...change, p1: 2 }), 'detectableChange requires p1 from 0 to 1'],
  [() => stats.detectableChange({ ...change, n: -1 }), 'detectableChange requires n and deff above 0'],
  [() => stats.detectableChange({ ...change, alpha: 1 }), 'detectableChange requires alpha inside 0 and 1'],
  [
    () => stats.detectableChange({ ...change, alternative: sides }),
    "detectableChange requires alternative 'two.sided' or 'one.sided'",
  ],
  [
    () => stats.detectableChange({ ...change, power: 0.01 }),
    'detectableChange requires power above alpha and below 1',
  ],
  [() => stats.leadPower({ ...lead, first: 1, second: 0 }), `leadPower requires ${SHARES}`],
  [() => stats.leadPower({ ...lead, first: 0.7 }), `leadPower requires ${SHARES}`],
  [() => stats.leadPower({ ...lead, deff: Infinity }), 'leadPower requires n and deff above 0'],
  [() => stats.leadPower({ ...lead, alpha: 2 }), 'leadPower requires alpha inside 0 and 1'],
  [
    () => stats.leadPower({ ...lead, alternative: sides }),
    "leadPower requires alternative 'two.sided' or 'one.sided'",
  ],
  [() => stats.sampleSizeForLead({ ...lead, first: 0, second: 0 }), `sampleSizeForLead requires ${SHARES}`],
  [() => stats.sampleSizeForLead({ ...lead, deff: 0 }), 'sampleSizeForLead requires deff above 0'],
  [() => stats.sampleSizeForLead({ ...lead, alpha: 0 }), 'sampleSizeForLead requires alpha inside 0 and 1'],
  [
    () => stats.sampleSizeForLead({ ...lead, alternative: sides }),
    "sampleSizeForLead requires alternative 'two.sided' or 'one.sided'",
  ],
  [
    () => stats.sampleSizeForLead({ ...lead, power: 0 }),
    'sampleSizeForLead requires power above alpha and below 1',
  ],
  [() => stats.sampleSizeForLead({ ...lead, second: 0.45 }), 'sampleSizeForLead requires shares that differ'],
  ...(['smallestSignificantLead', 'detectableLead'] as const).flatMap(
    (name): [call: () => unknown, message: string][] => [
      [() => stats[name]({ ...question, together: 0 }), `${name} requires together above 0 and at most 1`],
      [() => stats[name]({ ...question, together: 1.1 }), `${name} requires together above 0 and at most 1`],
      [() => stats[name]({ ...question, n: 0 }), `${name} requires n and deff above 0`],
      [() => stats[name]({ ...question, alpha: 0 }), `${name} requires alpha inside 0 and 1`],
      [
        () => stats[name]({ ...question, alternative: sides }),
        `${name} requires alternative 'two.sided' or 'one.sided'`,
      ],
    ],
  ),
  [
    () => stats.detectableLead({ ...question, power: 0.05 }),
    'detectableLead requires power above alpha and below 1',
  ],
];

describe('what a plan requires is said by what it throws', () => {
  test.each(refusals.map(([run, message]) => [message, run] as const))('%s', (message, run) => {
    expect(run).toThrow(new RangeError(message));
  });
});
