import type { ZodError } from 'zod';
import { CheckRefused } from './check-refused';

/** Faults anywhere in these are told of the whole field. */
const TOLD_WHOLE = /^(policy\.assumed\.\w+\.range|policy\.kishRange)\b.*$/;
const PAIR_NOT_OF_TWO = /^(pairs\[\d+\])\[\d+\]$/;

/** The first fault that a schema found, in the words and with the path of a refusal. */
export function refusalOf(error: ZodError): CheckRefused {
  const [issue] = error.issues;
  if (!issue) throw new TypeError('refusalOf requires an issue');
  if (issue.code === 'unrecognized_keys') {
    return new CheckRefused(
      pathOf([...issue.path, ...issue.keys.slice(0, 1)]),
      'This key is not known here.',
    );
  }
  const path = pathOf(issue.path).replace(TOLD_WHOLE, '$1');
  const isMissing = issue.code === 'invalid_type' && issue.input === undefined && issue.path.length > 0;
  if (isMissing && PAIR_NOT_OF_TWO.test(path)) {
    return new CheckRefused(path.replace(PAIR_NOT_OF_TWO, '$1'), 'A pair names two options.');
  }
  return new CheckRefused(path, issue.message);
}

function pathOf(keys: readonly PropertyKey[]): string {
  return keys.reduce<string>((path, key) => {
    if (typeof key === 'number') return `${path}[${key}]`;
    return path === '' ? String(key) : `${path}.${String(key)}`;
  }, '');
}
