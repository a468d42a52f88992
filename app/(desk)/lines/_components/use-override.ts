import { useState } from 'react';
import type { WrittenLine } from '@/components/forms/sheet/use-lines';
import { heldBack, useLineMarks } from '@/components/wording-check/use-line-marks';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { draftsOf } from './written-lines';

/** The wording check of a sheet being written, and the reason of an editor who files against it. */
export function useOverride(view: SheetView, lines: readonly WrittenLine[]) {
  const marks = useLineMarks(view.lineBasis, lines, draftsOf(view.lines));
  const [reason, setReason] = useState('');
  const held = heldBack(lines, marks);
  const isGiven = view.mayOverride && held.unsupported.length > 0 && reason.trim() !== '';
  return {
    marks,
    /** What a filing carries. */
    override: isGiven ? { reason, marks: held.unsupported } : null,
    field: { held, mayOverride: view.mayOverride, reason, onReason: setReason },
  };
}
