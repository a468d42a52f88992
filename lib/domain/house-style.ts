import { z } from 'zod';

/** Words of house style: the states of a version, who may do what with it, and the choices it is made of. */

export const STYLE_STATES = ['draft', 'proposed', 'in-force', 'replaced', 'withdrawn'] as const;
export type StyleState = (typeof STYLE_STATES)[number];
export const STYLE_STATE_NAMES: Record<StyleState, string> = {
  draft: 'Draft',
  proposed: 'Proposed',
  'in-force': 'In force',
  replaced: 'Replaced',
  withdrawn: 'Withdrawn',
};

export const STYLE_ORIGINS = ['desk', 'product'] as const;
export type StyleOrigin = (typeof STYLE_ORIGINS)[number];

export const STYLE_ACTS = ['proposed', 'put-in-force', 'sent-back', 'withdrawn'] as const;
export type StyleAct = (typeof STYLE_ACTS)[number];

/** Kinds of sample that have no margin of sampling error; a desk may compute as if random for some of them. */
export const NOT_RANDOM = ['quota', 'opt-in', 'blended', 'unknown'] as const;
export type NotRandom = (typeof NOT_RANDOM)[number];

const ratio = z.number().positive('A number above 0.').max(10, 'At most 10.');
const range = z.tuple([ratio, ratio]).refine(([low, high]) => low <= high, 'The lower end comes first.');
const assumed = z
  .strictObject({ value: ratio.min(0.5, 'At least 0.5.'), range })
  .refine(
    ({ value, range: [low, high] }) => low >= 0.5 && low <= value && value <= high,
    'The range starts at 0.5 or above and contains the value.',
  );

/** What a desk decides about its statistics; the check document of a release gets its own kind of sample's part. */
export const deskPolicySchema = z.strictObject({
  level: z.number().gt(0.5, 'From 50 to 99.9.').max(0.999, 'From 50 to 99.9.'),
  assumed: z.strictObject({ weighted: assumed, clustered: assumed, unweighted: assumed }),
  kishRange: range.refine(([low, high]) => low <= 1 && high >= 1, 'The range contains 1.'),
  comparisonBasis: z.strictObject({
    quota: z.boolean(),
    'opt-in': z.boolean(),
    blended: z.boolean(),
    unknown: z.boolean(),
  }),
  indifferencePp: z.number().positive('A number above 0.').max(50, 'At most 50.'),
  minimumNEff: z.number().min(1, 'At least 1.').max(100_000, 'At most 100,000.'),
});
export type DeskPolicy = z.output<typeof deskPolicySchema>;

/**
 * The policy of a check document on these kinds of sample.
 *
 * @param policy the desk's
 * @param sources of the release and, where there is one, of the release it is compared with
 * @returns the same with one comparison basis: on where the desk has one for every sample that is not random
 */
export function policyFor<P extends { comparisonBasis: Record<NotRandom, boolean> }>(
  policy: P,
  sources: readonly ('probability' | NotRandom)[],
): Omit<P, 'comparisonBasis'> & { comparisonBasis: boolean } {
  const odd = sources.filter((source): source is NotRandom => source !== 'probability');
  const comparisonBasis = odd.length > 0 && odd.every((source) => policy.comparisonBasis[source]);
  return { ...policy, comparisonBasis };
}
