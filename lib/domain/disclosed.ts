/**
 * A particular that a pollster can give or withhold. "Not disclosed" is an answer of its own:
 * it is not empty (`not-entered`) and not zero.
 */
export type Disclosed<T> =
  | { status: 'given'; value: T }
  | { status: 'not-disclosed' }
  | { status: 'not-entered' }
  | { status: 'not-applicable' };

export type DisclosureStatus = Disclosed<unknown>['status'];

export const given = <T>(value: T): Disclosed<T> => ({ status: 'given', value });
export const NOT_DISCLOSED = { status: 'not-disclosed' } as const;
export const NOT_ENTERED = { status: 'not-entered' } as const;
export const NOT_APPLICABLE = { status: 'not-applicable' } as const;

/** The value where it was given, else null. */
export function valueOf<T>(disclosed: Disclosed<T>): T | null {
  return disclosed.status === 'given' ? disclosed.value : null;
}
