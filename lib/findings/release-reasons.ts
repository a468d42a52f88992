import type { ReleaseUntestedReason } from './judge-types';
import type { Question } from './settle';

/** A question of a release: what stands against testing it may come from more than its bases. */
export type ReleaseQuestion = Question<ReleaseUntestedReason>;

const ORDER: readonly ReleaseUntestedReason[] = [
  'no-sample-size',
  'no-sampling-basis',
  'too-small',
  'few-clusters',
  'not-comparable',
  'not-disclosed',
  'shared-waves',
  'same-people',
  'rebased-size',
  'other-base',
  'below-presentation-standard',
];

/**
 * A question with further reasons against testing it.
 *
 * @param asked the question as its bases allow it
 * @param further reasons that apply beyond them, in any order, repeats allowed
 * @returns all reasons once, in the fixed order; measured only where there are none
 */
export function withReasons(asked: Question, further: readonly ReleaseUntestedReason[]): ReleaseQuestion {
  if (further.length === 0) return asked;
  const all = new Set<ReleaseUntestedReason>([...asked.reasons, ...further]);
  return { ...asked, reasons: ORDER.filter((reason) => all.has(reason)), measured: null };
}
