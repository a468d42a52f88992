import 'server-only';
import type { Conn } from '@/db/client';
import type { SheetRow } from '@/db/queries/sheet';
import { isAsPrinted } from '@/lib/domain/as-printed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { LineKind, LineText } from '@/lib/domain/sheet';
import { AppError } from '@/lib/errors';
import { canonicalJson } from '@/lib/security/canonical';
import { assembleAsPrinted } from '../sheet/assemble-as-printed';
import { assemble } from '../sheet/assemble-evidence';

/**
 * Everything that a sheet would print and show now, as one text to compare: figures, dates, names, findings, drafted
 * words of the kinds in print, chart. Numbers of versions are left out, and the link to the source where no word prints
 * it. Null where the release supports its claim no more.
 */
export function standingOf(
  conn: Conn,
  sheet: SheetRow,
  kinds: readonly LineKind[],
  now: number,
): string | null {
  const inPrint = (draft: readonly LineText[]) => draft.filter(({ kind }) => kinds.includes(kind));
  try {
    if (isAsPrinted(sheet)) {
      const { body } = assembleAsPrinted(conn, sheet, now).withTexts([]);
      return canonicalJson({
        ...body,
        release: printedOf(body.release),
        draft: inPrint(body.draft),
        missing: body.missing.filter(({ item }) => item !== 'source-link'),
      });
    }
    const { body } = assemble(conn, sheet, now).withTexts([]);
    const previous = body.comparison.release;
    return canonicalJson({
      ...body,
      release: printedOf(body.release),
      draft: inPrint(body.draft),
      comparison: { ...body.comparison, release: previous && printedOf(previous) },
      missing: body.missing.filter(({ item }) => item !== 'source-link'),
    });
  } catch (error) {
    if (error instanceof AppError && error.code === 'conflict') return null;
    throw error;
  }
}

function printedOf({ versionId: _, version: __, sourceUrl: ___, ...printed }: ReleaseFacts) {
  return printed;
}
