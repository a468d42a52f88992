import 'server-only';
import { listWithdrawnSince } from '@/db/queries/corrections';
import { CORRECTION_SOURCE_NAMES } from '@/lib/domain/corrections';
import { type Actor, canReadCopyDesk } from '@/lib/domain/roles';
import { authorize, type Ctx } from '../context';
import { clearedTexts } from '../correction/cleared-texts';

export type Withdrawn = {
  sheetId: string;
  race: string;
  pollster: string;
  fieldStartOn: string;
  fieldEndOn: string;
  whose: string;
  explanation: string;
  at: number;
  /** The words that must not run any more, so that they can be found. */
  headline: string;
  isReplaced: boolean;
};

const WEEK_MS = 7 * 86_400_000;

/** What corrections took out of print in the last week, newest first. */
export function listWithdrawn(actor: Actor, ctx: Ctx): Withdrawn[] {
  authorize(canReadCopyDesk(actor), 'The copy desk is open to people with a role.');
  return listWithdrawnSince(ctx.db, actor, ctx.now, ctx.now - WEEK_MS).map((row) => {
    const texts = clearedTexts(ctx.db, row.evidenceId);
    return {
      sheetId: row.sheetId,
      race: row.race,
      pollster: row.pollster,
      fieldStartOn: row.fieldStartOn,
      fieldEndOn: row.fieldEndOn,
      whose: CORRECTION_SOURCE_NAMES[row.whose],
      explanation: row.explanation,
      at: row.at,
      headline: (texts.find(({ kind }) => kind === 'headline') ?? texts[0])?.text ?? '',
      isReplaced: row.effect === 'replaced',
    };
  });
}
