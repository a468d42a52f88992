import 'server-only';
import type { Conn } from '@/db/client';
import { isAsPrinted } from '@/lib/domain/as-printed';
import type { LineText } from '@/lib/domain/sheet';
import type { WordingOverride } from '@/lib/domain/wording-override';
import type { LineBasis } from '@/lib/wording/line-check';
import { assembleAsPrinted } from './assemble-as-printed';
import { assemble, type Subject } from './assemble-evidence';

/** What filing and clearing need of a sheet, whatever it claims. */
export type SheetBasis = {
  draft: LineText[];
  basisHash: string;
  templateVersion: string;
  /** Internal id of the version compared with. */
  comparisonVersionId: number | null;
  /** What edited lines are held against; null where no line can be edited. */
  lineBasis: LineBasis | null;
  withTexts: (
    texts: LineText[],
    override?: WordingOverride | null,
  ) => { bytes: Buffer; hash: string; engine: string };
};

/** Everything a sheet rests on, computed anew from what is stored now. */
export function assembleSheet(conn: Conn, sheet: Subject, now: number): SheetBasis {
  const assembled = isAsPrinted(sheet) ? assembleAsPrinted(conn, sheet, now) : assemble(conn, sheet, now);
  const { draft, basisHash, computed, withTexts } = assembled;
  return {
    draft,
    basisHash,
    templateVersion: computed.settings.houseStyle.body.templateVersion,
    comparisonVersionId: isAsPrinted(sheet) ? null : computed.comparison.versionId,
    lineBasis: 'lineBasis' in assembled ? assembled.lineBasis : null,
    withTexts: (texts, override) => {
      const { bytes, hash, body } = withTexts(texts, override);
      return { bytes, hash, engine: body.engine };
    },
  };
}
