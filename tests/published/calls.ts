import type { Call } from './calls/call';
import { coverageCalls } from './calls/coverage';
import { differenceCalls } from './calls/differences';
import { plainCalls } from './calls/plain-figures';
import { presentationCalls } from './calls/presentation';
import { sampleAndSeriesCalls } from './calls/samples-and-series';
import { singleIntervalCalls } from './calls/single-intervals';

const calls: Readonly<Record<string, Call>> = {
  ...coverageCalls,
  ...differenceCalls,
  ...plainCalls,
  ...presentationCalls,
  ...sampleAndSeriesCalls,
  ...singleIntervalCalls,
};

/** What runs an entry on the engine: the call of its own name, or of the longest beginning of it. */
export function callOf(id: string): Call | null {
  const names = Object.keys(calls).filter((name) => id === name || id.startsWith(`${name}_`));
  const [name] = names.sort((one, other) => other.length - one.length);
  return name === undefined ? null : (calls[name] ?? null);
}

/** The names under which calls are found. */
export const callNames = Object.keys(calls);
