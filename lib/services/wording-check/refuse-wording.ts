import 'server-only';
import { z } from 'zod';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import { LINE_KINDS, type LineKind, type LineText } from '@/lib/domain/sheet';
import type { HeldPhrase, WordingOverride } from '@/lib/domain/wording-override';
import { AppError, type FieldErrors } from '@/lib/errors';
import type { WordingMark } from '@/lib/wording/check/types';
import { type LineBasis, lineChecker } from '@/lib/wording/line-check';
import { authorize } from '../context';

/** An editor's reason to file what is not supported, and the phrases that were on the screen. */
export const overrideInput = z
  .strictObject({
    reason: z.string().trim().min(10, 'Say why, in a sentence.').max(2000, 'At most 2,000 characters.'),
    marks: z
      .array(
        z.strictObject({
          kind: z.enum(LINE_KINDS),
          rule: z.string().max(40),
          phrase: z.string().max(5000),
        }),
      )
      .max(500),
  })
  .nullable()
  .default(null);
export type OverrideInput = z.output<typeof overrideInput>;

type Held = { kind: LineKind; mark: WordingMark };

/**
 * Refuses words that the figures contradict, headlines that the desk does not file, and words that the figures do not
 * support unless an editor gives a reason.
 * The marks are computed here, whatever the screen showed.
 *
 * @param actor with the roles of this moment
 * @returns what goes into the evidence; null where nothing was overridden
 * @throws AppError `invalid` by line, `forbidden` for an override by somebody else, `conflict` for one that names
 *   fewer phrases than are held back
 */
export function refuseWording(
  actor: Actor,
  basis: LineBasis,
  texts: readonly LineText[],
  draft: readonly LineText[],
  override: OverrideInput,
): WordingOverride | null {
  if (override !== null)
    authorize(canActAsEditor(actor), 'Only an editor files words against the wording check.');
  const check = lineChecker(basis);
  const held = texts.flatMap(({ kind, text }): Held[] => {
    const drafted = draft.find((line) => line.kind === kind)?.text ?? '';
    return check({ kind, text, draft: drafted }).map((mark) => ({ kind, mark }));
  });
  const alone = held.find(({ mark }) => mark.rule === 'one-poll');
  if (alone && basis.houseStyle.onePollHeadlines === 'refuse')
    throw new AppError('invalid', 'House style files no headline that rests on one poll.', {
      fields: { [alone.kind]: `${alone.mark.message} Knock it out to file the rest.` },
    });
  const wrong = held.filter(({ mark }) => mark.grade === 'wrong');
  const unsupported = held.filter(({ mark }) => mark.grade === 'not-supported');
  if (wrong.length > 0)
    throw refused('Some words contradict the figures. Mend them; no reason lifts that.', [
      ...wrong,
      ...unsupported,
    ]);
  if (unsupported.length === 0) return null;
  if (override === null)
    throw refused(
      canActAsEditor(actor)
        ? 'The figures do not support some words. Mend them, or file them with a written reason.'
        : 'The figures do not support some words. Mend them, or ask an editor, who can file them with a reason.',
      unsupported,
    );
  const seen = new Set(override.marks.map(keyOf));
  const marks = unsupported.map(({ kind, mark: { rule, phrase, message } }) => ({
    kind,
    rule,
    phrase,
    message,
  }));
  if (!marks.every((mark) => seen.has(keyOf(mark))))
    throw new AppError(
      'conflict',
      'The wording check holds back words that were not on your screen. Reload the page and read it once more.',
    );
  return { reason: override.reason, person: actor.publicId, marks };
}

const keyOf = ({ kind, rule, phrase }: HeldPhrase) => JSON.stringify([kind, rule, phrase]);

const GRADES = { wrong: 'is wrong', 'not-supported': 'is not supported' } as const;

function refused(message: string, held: readonly Held[]): AppError {
  const fields: FieldErrors = {};
  for (const { kind, mark } of held) {
    if (mark.grade !== 'wrong' && mark.grade !== 'not-supported') continue;
    const told = `“${mark.phrase}” ${GRADES[mark.grade]}. ${mark.message}`;
    fields[kind] = fields[kind] ? `${fields[kind]} ${told}` : told;
  }
  return new AppError('invalid', message, { fields });
}
