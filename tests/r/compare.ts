const RELATIVE = 1e-9;
const ABSOLUTE = 1e-12;
const ZERO_P = 1e-300;
const P_VALUE = /(^|\.)(p|pAdjusted)$/;

export type Figure = number | string | boolean | null;

export type Comparison = {
  faults: string[];
  /** Largest relative difference, numbers left out that agree by their nearness to 0. */
  worst: number;
};

/** Compares what R printed with what the engine answered, every name on either side. */
export function compareFigures(
  printed: ReadonlyMap<string, string>,
  expected: ReadonlyMap<string, Figure>,
): Comparison {
  const faults: string[] = [];
  let worst = 0;
  for (const name of new Set([...printed.keys(), ...expected.keys()])) {
    const text = printed.get(name);
    const figure = expected.get(name);
    if (text === undefined) faults.push(`${name} is not printed`);
    else if (figure === undefined) faults.push(`${name} is printed and not in the answer`);
    else if (typeof figure === 'number') {
      const { agrees, relative } = compareNumbers(Number(text), figure, P_VALUE.test(name));
      if (!agrees) faults.push(`${name}: R says ${text}, the engine ${figure}`);
      worst = Math.max(worst, relative);
    } else if (text !== String(figure)) {
      faults.push(`${name}: R says ${text}, the engine ${String(figure)}`);
    }
  }
  return { faults, worst };
}

function compareNumbers(
  actual: number,
  expected: number,
  isP: boolean,
): { agrees: boolean; relative: number } {
  if (actual === expected || (isP && actual < ZERO_P && expected < ZERO_P)) {
    return { agrees: true, relative: 0 };
  }
  const difference = Math.abs(actual - expected);
  const relative = difference / Math.abs(expected);
  if (relative <= RELATIVE) return { agrees: true, relative };
  return { agrees: !isP && difference <= ABSOLUTE, relative: 0 };
}
