import * as z from 'zod';

export const JOB_KINDS = [
  'embargo-ended',
  'shelf-ended',
  'filing-unread',
  'recompute-findings',
  'purge-embeds',
] as const;
export type JobKind = (typeof JOB_KINDS)[number];

export const JOB_KIND_NAMES: Record<JobKind, string> = {
  'embargo-ended': 'End of an embargo',
  'shelf-ended': 'End of a shelf life',
  'filing-unread': 'Filed sheet nobody opened',
  'recompute-findings': 'Findings computed anew',
  'purge-embeds': 'Embeds taken from caches',
};

/** What is lost for the desk where a job of this kind never runs. */
export const JOB_KIND_LOSSES: Record<JobKind, string> = {
  'embargo-ended': 'Its figures are public by the clock all the same; marks of later polls stay as they are.',
  'shelf-ended': 'The words are marked old by the clock all the same; nobody is told.',
  'filing-unread': 'The queue shows the sheet all the same; nobody is told.',
  'recompute-findings': 'The list of releases leaves out marks; each release itself is computed when opened.',
  'purge-embeds': 'Caches keep what they have for up to 60 seconds, 300 where Leadline cannot be reached.',
};

const id = z.string().min(1).max(64);
const day = z.string().regex(/^\d{4}-\d{2}-\d{2}$/);

export const JOB_PAYLOADS = {
  'embargo-ended': z.strictObject({ release: id }),
  /** The clearing whose words end, and the first day on which they are not current. */
  'shelf-ended': z.strictObject({ sheet: id, clearing: id, endedOn: day }),
  'filing-unread': z.strictObject({ sheet: id, filing: id }),
  'recompute-findings': z.strictObject({ policy: z.number().int(), engine: z.string().min(1).max(40) }),
  'purge-embeds': z.discriminatedUnion('of', [
    z.strictObject({ of: z.literal('embed'), id }),
    z.strictObject({ of: z.literal('ban'), id }),
    z.strictObject({ of: z.literal('release'), id }),
  ]),
} as const satisfies Record<JobKind, z.ZodType>;

export type JobPayload<Kind extends JobKind> = z.output<(typeof JOB_PAYLOADS)[Kind]>;

export const JOB_STATES = ['waiting', 'running', 'done', 'dead', 'cancelled'] as const;
export type JobState = (typeof JOB_STATES)[number];
export const JOB_STATE_NAMES: Record<JobState, string> = {
  waiting: 'Waiting',
  running: 'Running',
  done: 'Done',
  dead: 'Given up',
  cancelled: 'Cancelled',
};

/** Kinds that run beside one another: a slow cache or a long computation never holds up the clock. */
export const JOB_LANES: readonly (readonly JobKind[])[] = [
  ['embargo-ended', 'shelf-ended', 'filing-unread'],
  ['purge-embeds'],
  ['recompute-findings'],
];

/** How often a job is begun without getting any further before it is given up. */
export const MAX_ATTEMPTS = 8;

const FIRST_WAIT_MS = 5_000;
const LONGEST_WAIT_MS = 6 * 60 * 60_000;

/**
 * When a job that failed is tried again: after 5 seconds, then four times as long each time, at most six hours.
 *
 * @param now the instant of the failure, in milliseconds UTC
 * @param attempts how often it has been tried, this time included
 * @throws RangeError `retryAt requires at least one attempt`
 * @example retryAt(0, 2) // => 20000
 */
export function retryAt(now: number, attempts: number): number {
  if (!(attempts >= 1)) throw new RangeError('retryAt requires at least one attempt');
  return now + Math.min(FIRST_WAIT_MS * 4 ** (attempts - 1), LONGEST_WAIT_MS);
}

/** After so long without a sign of life the process that runs jobs counts as gone. */
export const SILENT_AFTER_MS = 15_000;

/**
 * Whether the process that runs jobs lives.
 *
 * @param beatAt its last sign of life, or null where there was none
 * @param now the instant that is asked about
 * @example isAnswering(0, 15000) // => true
 */
export function isAnswering(beatAt: number | null, now: number): boolean {
  return beatAt !== null && now - beatAt <= SILENT_AFTER_MS;
}
