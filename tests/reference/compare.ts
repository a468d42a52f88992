import type { Tolerance } from './tolerances';

/** The tolerance of a field such as `ci.logit_t`, or null where there is none. */
export type ToleranceOf = (field: string) => Tolerance | null;

export type Comparison = {
  /** Leaves of the expectation that were held against the answer. */
  readonly figures: number;
  readonly faults: readonly string[];
  /** The largest relative error among the numbers that agree by part of themselves. */
  readonly worst: { readonly relative: number; readonly at: string } | null;
  /** Numbers so near 0 that only the absolute part of their tolerance lets them agree, and how far off at most. */
  readonly bySize: { readonly count: number; readonly largest: number };
};

export const nothing: Comparison = { figures: 0, faults: [], worst: null, bySize: { count: 0, largest: 0 } };

/**
 * Holds an answer against what is expected, at every depth. Lists must be equally long, null is no number, and a
 * number needs a row in the table. Keys that only the answer has are left alone unless `closed`.
 */
export function compare(
  actual: unknown,
  expected: unknown,
  toleranceOf: ToleranceOf,
  { closed = false }: { closed?: boolean } = {},
): Comparison {
  const walk = (given: unknown, wanted: unknown, field: string, at: string): Comparison => {
    if (Array.isArray(wanted)) {
      if (!Array.isArray(given)) return fault(at, given, wanted);
      if (given.length !== wanted.length)
        return failed(`${at}: ${given.length} of ${wanted.length} elements`);
      return combine(wanted.map((one, index) => walk(given[index], one, field, `${at}[${index}]`)));
    }
    if (isRecord(wanted)) {
      if (!isRecord(given)) return fault(at, given, wanted);
      const unasked = closed ? Object.keys(given).filter((key) => !(key in wanted)) : [];
      return combine([
        ...unasked.map((key) => failed(`${inside(at, key)}: not expected`)),
        ...Object.entries(wanted).map(([key, one]) =>
          given[key] === undefined
            ? failed(`${inside(at, key)}: missing`)
            : walk(given[key], one, inside(field, key), inside(at, key)),
        ),
      ]);
    }
    if (typeof wanted === 'number') return compareNumbers(given, wanted, toleranceOf(field), at);
    return given === wanted ? { ...nothing, figures: 1 } : fault(at, given, wanted);
  };
  return walk(actual, expected, '', '');
}

function compareNumbers(given: unknown, wanted: number, tolerance: Tolerance | null, at: string): Comparison {
  if (!tolerance) return failed(`${at}: no tolerance in the table`);
  if (typeof given !== 'number') return fault(at, given, wanted);
  const { relative, absolute, vanishing = 0 } = tolerance;
  const difference = Math.abs(given - wanted);
  const error = difference === 0 ? 0 : difference / Math.abs(wanted);
  if (error <= relative) return { ...nothing, figures: 1, worst: { relative: error, at } };
  const isNearZero = Math.abs(given) < vanishing && Math.abs(wanted) < vanishing;
  if (difference <= absolute || isNearZero) {
    return { ...nothing, figures: 1, bySize: { count: 1, largest: difference } };
  }
  return failed(`${at}: ${given} instead of ${wanted}, off by ${error.toExponential(1)} of it`);
}

/** Counts, faults and the worst of several comparisons. */
export function combine(parts: readonly Comparison[]): Comparison {
  return parts.reduce(
    (sum, one) => ({
      figures: sum.figures + one.figures,
      faults: one.faults.length === 0 ? sum.faults : [...sum.faults, ...one.faults],
      worst: !sum.worst || (one.worst && one.worst.relative > sum.worst.relative) ? one.worst : sum.worst,
      bySize: {
        count: sum.bySize.count + one.bySize.count,
        largest: Math.max(sum.bySize.largest, one.bySize.largest),
      },
    }),
    nothing,
  );
}

function failed(what: string): Comparison {
  return { ...nothing, figures: 1, faults: [what] };
}

function fault(at: string, given: unknown, wanted: unknown): Comparison {
  return failed(`${at}: ${inShort(given)} instead of ${inShort(wanted)}`);
}

function inShort(value: unknown): string {
  if (typeof value === 'number') return String(value);
  const text = JSON.stringify(value) ?? 'nothing';
  return text.length > 80 ? `${text.slice(0, 77)}…` : text;
}

const inside = (path: string, key: string) => (path === '' ? key : `${path}.${key}`);

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
