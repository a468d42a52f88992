import type { LineKind } from '@/lib/domain/sheet';
import type { LineView, SheetView } from '@/lib/services/sheet/get-sheet';

/** The words of a sheet as a form holds them. */
export function writtenLines(lines: readonly LineView[]) {
  return lines.map(({ kind, text, knockedOut }) => ({ kind, text, knockedOut }));
}

export function draftsOf(lines: readonly LineView[]): Record<string, string> {
  return Object.fromEntries(lines.map(({ kind, draft }): [LineKind, string] => [kind, draft]));
}

/** A refusal that is told at a line or at the reason, not on its own. */
export function isAtField(
  failure: { fields: Record<string, string> } | null,
  lines: readonly { kind: LineKind }[],
): boolean {
  return [...lines.map(({ kind }) => kind as string), 'override.reason'].some(
    (field) => failure?.fields[field],
  );
}

/** What the panel beside the words shows. */
export function evidenceOf(view: SheetView) {
  const { finding, previous, comparison, enteredBy, evidence } = view;
  return { finding, previous, comparison, enteredBy, ...evidence };
}
