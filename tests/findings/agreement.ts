const RELATIVE = 1e-9;
const ABSOLUTE = 1e-12;
const ZERO_P = 1e-300;

/** Two numbers agree to the accuracy asked of the engine. */
export function numbersAgree(actual: number, expected: number, relative = RELATIVE): boolean {
  if (Object.is(actual, expected) || actual === expected) return true;
  const difference = Math.abs(actual - expected);
  if (difference <= ABSOLUTE && Math.abs(expected) > 1e-6) return true;
  return (
    difference <= relative * Math.abs(expected) || (Math.abs(actual) < ZERO_P && Math.abs(expected) < ZERO_P)
  );
}

/** Every path where two answers differ, in keys, kinds or numbers beyond the tolerance; empty if they agree. */
export function differences(actual: unknown, expected: unknown, path = '', relative = RELATIVE): string[] {
  if (typeof actual === 'number' && typeof expected === 'number') {
    return numbersAgree(actual, expected, relative) ? [] : [`${path}: ${actual} instead of ${expected}`];
  }
  if (isRecord(actual) && isRecord(expected) && Array.isArray(actual) === Array.isArray(expected)) {
    const keys = new Set([...Object.keys(actual), ...Object.keys(expected)]);
    return [...keys].flatMap((key) => {
      const at = path === '' ? key : `${path}.${key}`;
      if (!(key in actual)) return [`${at}: missing`];
      if (!(key in expected)) return [`${at}: not expected`];
      return differences(actual[key], expected[key], at, relative);
    });
  }
  return actual === expected
    ? []
    : [`${path}: ${JSON.stringify(actual)} instead of ${JSON.stringify(expected)}`];
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null;
}
