import type { Disclosed } from '@/lib/domain/disclosed';

const WITHOUT = {
  'not-disclosed': 'not disclosed',
  'not-entered': 'not entered',
  'not-applicable': 'does not apply',
} as const;

/** What a release says of one thing, or that it does not. */
export function said<T>(disclosed: Disclosed<T>, say: (value: T) => string): string {
  return disclosed.status === 'given' ? say(disclosed.value) : WITHOUT[disclosed.status];
}
