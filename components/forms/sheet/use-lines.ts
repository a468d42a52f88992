import { useState } from 'react';
import type { LineKind } from '@/lib/domain/sheet';

export type WrittenLine = { kind: LineKind; text: string; knockedOut: boolean };

/** The words of a sheet while somebody types them. */
export function useLines(initial: readonly WrittenLine[]) {
  const [lines, setLines] = useState<WrittenLine[]>(() =>
    initial.map(({ kind, text, knockedOut }) => ({ kind, text, knockedOut })),
  );
  const change = (kind: LineKind, part: Partial<WrittenLine>) =>
    setLines((before) => before.map((line) => (line.kind === kind ? { ...line, ...part } : line)));
  return { lines, change, replace: setLines };
}

export type ChangeLine = ReturnType<typeof useLines>['change'];

export function sameLines(one: readonly WrittenLine[], other: readonly WrittenLine[]): boolean {
  return JSON.stringify(one) === JSON.stringify(other);
}
