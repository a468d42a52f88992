import { useDeferredValue, useMemo } from 'react';
import type { HeldPhrase } from '@/lib/domain/wording-override';
import type { WordingMark } from '@/lib/wording/check/types';
import { type LineBasis, lineChecker } from '@/lib/wording/line-check';
import type { WrittenLine } from '../forms/sheet/use-lines';

export type LineMarksOf = Readonly<Record<string, readonly WordingMark[]>>;

/** Marks of every kept line while somebody types, computed in this browser, behind the typing. */
export function useLineMarks(
  basis: LineBasis | null,
  lines: readonly WrittenLine[],
  drafts: Readonly<Record<string, string>>,
): LineMarksOf {
  const check = useMemo(() => (basis ? lineChecker(basis) : () => []), [basis]);
  const typed = useDeferredValue(lines);
  const draftsAsText = JSON.stringify(drafts);
  return useMemo(() => {
    const draftOf = JSON.parse(draftsAsText) as Record<string, string>;
    return Object.fromEntries(
      typed
        .filter(({ knockedOut }) => !knockedOut)
        .map(({ kind, text }) => [kind, check({ kind, text, draft: draftOf[kind] ?? '' })]),
    );
  }, [check, typed, draftsAsText]);
}

export type HeldBack = {
  isWrong: boolean;
  unsupported: HeldPhrase[];
};

/** What keeps lines from being filed, as far as this page knows; the service asks again. */
export function heldBack(lines: readonly WrittenLine[], marks: LineMarksOf): HeldBack {
  const held = lines
    .filter(({ knockedOut }) => !knockedOut)
    .flatMap(({ kind }) => (marks[kind] ?? []).map((mark) => ({ kind, mark })));
  return {
    isWrong: held.some(({ mark }) => mark.grade === 'wrong'),
    unsupported: held.flatMap(({ kind, mark: { grade, rule, phrase } }) =>
      grade === 'not-supported' ? [{ kind, rule, phrase }] : [],
    ),
  };
}
