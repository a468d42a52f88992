import 'server-only';
import { z } from 'zod';
import { findRelease } from '@/db/queries/release';
import { type Actor, canReadCopyDesk, canReadUnpublished } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { CheckRefused } from '@/lib/findings/check-refused';
import type { CheckRefusal } from '@/lib/findings/check-types';
import { refusalOf } from '@/lib/findings/refusal-of';
import { checkWording, MAX_TEXT } from '@/lib/wording/check/check-wording';
import {
  type CheckedRelease,
  TEXT_PARTS,
  type WordingCheck,
  WORDING_LANGUAGES,
} from '@/lib/wording/check/types';
import { tokenBuckets } from '../check/token-bucket';
import { authorize, type Ctx } from '../context';
import { computeFindings } from '../release/compute-findings';
import { recordEmbargoViews } from '../release/record-embargo-views';
import { readDeskSettings } from '../setup/desk-settings';
import { checkedOnce, checkedStored } from './checked-releases';
import { readGivenRelease } from './given-release';
import { isPublicNow } from './is-held';

export const MAX_RELEASES = 5;

const schema = z.strictObject(
  {
    text: z.string({ error: 'Give the text.' }).max(MAX_TEXT, 'At most 20,000 characters.'),
    language: z.enum(WORDING_LANGUAGES, 'The language is en, es, fr or de.').default('en'),
    part: z.enum(TEXT_PARTS, 'The part is whole, line, headline or spoken.').default('whole'),
    releases: z
      .array(
        z.union([z.string().min(1).max(64), z.record(z.string(), z.unknown())], 'Give an id or a release.'),
      )
      .max(MAX_RELEASES, `At most ${MAX_RELEASES} releases at once.`)
      .default([]),
  },
  'Send one object with text, language, part and releases.',
);

export type UsedRelease = {
  /** null where the release came with the request. */
  id: string | null;
  race: string;
  pollster: string;
  fieldStartOn: string;
  fieldEndOn: string;
};

export type TextChecked = WordingCheck & { releases: UsedRelease[] };

export type TextOutcome =
  | { kind: 'answer'; answer: TextChecked }
  | { kind: 'refused'; error: CheckRefusal }
  | { kind: 'too-many'; retryAfterMs: number };

/** Fast typists pause some two times in three seconds. */
const take = tokenBuckets({ capacity: 90, perMinute: 120 });
const CHARACTERS_PER_TOKEN = 4000;
const TOKENS_PER_GIVEN = 3;

/**
 * Checks a text against releases of the desk that the asker may see, and against releases that come with it.
 * Nothing of the text is kept, logged or passed on.
 *
 * @param input parsed JSON
 * @throws AppError `not-found` for a release that is not there or not visible to the asker: both look the same
 */
export function checkText(actor: Actor, input: unknown, ctx: Ctx): TextOutcome {
  authorize(canReadCopyDesk(actor), 'The wording check is for the people of the desk.');
  const result = schema.safeParse(input);
  const cost = result.success ? costOf(result.data) : 0;
  const retryAfterMs = take(actor.personId, ctx.now, 1 + cost);
  if (retryAfterMs > 0) return { kind: 'too-many', retryAfterMs };
  try {
    if (!result.success) throw refusalOf(result.error);
    return { kind: 'answer', answer: answerTo(actor, result.data, ctx) };
  } catch (error) {
    if (!(error instanceof CheckRefused)) throw error;
    return { kind: 'refused', error: error.toRefusal() };
  }
}

function costOf({ text, releases }: z.output<typeof schema>): number {
  const given = releases.filter((release) => typeof release !== 'string').length;
  return Math.floor(text.length / CHARACTERS_PER_TOKEN) + given * TOKENS_PER_GIVEN;
}

function answerTo(actor: Actor, asked: z.output<typeof schema>, ctx: Ctx): TextChecked {
  const settings = readDeskSettings(ctx.db);
  const checked = asked.releases.map((release, index) =>
    typeof release === 'string'
      ? { id: release, ...storedRelease(actor, release, ctx) }
      : { id: null, heldId: null, checked: givenRelease(release, index, ctx) },
  );
  const held = new Set(checked.flatMap(({ heldId }) => (heldId === null ? [] : [heldId])));
  if (!canReadUnpublished(actor)) recordEmbargoViews(ctx, actor, held, 'wording check');
  const { marks, cannotJudge } = checkWording({
    text: asked.text,
    language: asked.language,
    part: asked.part,
    releases: checked.map((one) => one.checked),
    houseStyle: settings.houseStyle.body,
    policy: settings.policy.body,
  });
  return { marks, cannotJudge, releases: checked.map(({ id, checked: { facts } }) => usedOf(id, facts)) };
}

function storedRelease(actor: Actor, id: string, ctx: Ctx) {
  const release = findRelease(ctx.db, id, actor, ctx.now);
  if (!release?.currentVersionId || release.archivedAt !== null)
    throw new AppError('not-found', 'There is no such release.');
  const computed = computeFindings(ctx.db, release.currentVersionId, ctx.now);
  return { heldId: isPublicNow(release, ctx.now) ? null : release.id, checked: checkedStored(computed) };
}

function givenRelease(input: unknown, index: number, { db }: Ctx): CheckedRelease {
  try {
    const { facts, previous } = readGivenRelease(input, index);
    const sources = [facts, ...(previous ? [previous] : [])].map(({ sampleSource }) => sampleSource);
    return checkedOnce(facts, previous, readDeskSettings(db, sources).policy.body);
  } catch (error) {
    if (!(error instanceof CheckRefused)) throw error;
    const path = error.path === '' ? '' : `.${error.path}`;
    throw new CheckRefused(`releases[${index}]${path}`, error.message);
  }
}

function usedOf(id: string | null, { race, pollster, fieldStartOn, fieldEndOn }: CheckedRelease['facts']) {
  return { id, race: race.name, pollster: pollster.name, fieldStartOn, fieldEndOn };
}
