import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { CheckAnswer, Policy } from '@/lib/findings/check-types';
import type { Comparability } from '@/lib/findings/comparability';
import { checkedReleaseOf } from './check/checked-release';
import { checkWording } from './check/check-wording';
import { onePollMarks } from './check/one-poll';
import type {
  CheckedRelease,
  TextPart,
  WordingGrade,
  WordingCheckInput,
  WordingLanguage,
  WordingMark,
} from './check/types';
import type { LineKind } from '@/lib/domain/sheet';
import type { HouseStyle } from './house-style';

/** What the words of one sheet are checked against; plain data, the same in the server and the browser. */
export type LineBasis = {
  release: ReleaseFacts;
  previous: ReleaseFacts | null;
  /** Findings that the sheet's evidence holds. */
  answer: CheckAnswer;
  comparison: Pick<Comparability, 'differences' | 'unknowns'> & { isOverridden: boolean };
  policy: Policy;
  houseStyle: Omit<HouseStyle, 'messages'>;
  language: WordingLanguage;
  /** What stood in print before: a correction notice quotes its figures. */
  was?: Pick<LineBasis, 'release' | 'previous'>;
  /** How many polls the claim rests on. */
  polls: number;
};

export type CheckedLine = { kind: LineKind; text: string; draft: string };

const KEPT = 200;

/**
 * The wording check for the lines of one sheet.
 *
 * Make it once per sheet and keep it: the release is read at the first line that needs it, and a text that was
 * checked before is answered from memory. Words that are still those of the draft are the house style's own, which
 * was checked when it was put in force; they carry no mark but the one of a headline that rests on one poll.
 *
 * @param basis what the sheet rests on
 * @returns for the text of a line and its draft, the marks in the order of the text
 * @throws RangeError `checkWording requires a text of at most 20000 characters`, when a line is checked
 */
export function lineChecker(basis: LineBasis): (line: CheckedLine) => readonly WordingMark[] {
  const known = new Map<string, readonly WordingMark[]>();
  let checked: CheckedRelease | null = null;
  const { language, houseStyle, policy, polls } = basis;
  return ({ kind, text, draft }) => {
    if (text.trim() === '') return NONE;
    const part = PARTS[kind] ?? 'line';
    const common = { text, language, houseStyle, policy, part, polls };
    if (text === draft) return onePollMarks({ ...common, releases: [] });
    const key = `${kind === 'correction-notice' ? kind : part} ${text}`;
    const before = known.get(key);
    if (before) return before;
    checked ??= releaseOf(basis);
    const now = checkWording({ ...common, releases: [checked] }).marks;
    const marks = kind === 'correction-notice' && basis.was ? inBoth(now, common, basis) : now;
    if (known.size >= KEPT) known.clear();
    known.set(key, marks);
    return marks;
  };
}

const PARTS: Partial<Record<LineKind, TextPart>> = { headline: 'headline', 'spoken-line': 'spoken' };

const NONE: readonly WordingMark[] = [];

function releaseOf({ release, previous, answer, comparison, policy }: LineBasis): CheckedRelease {
  const { differences, unknowns, isOverridden } = comparison;
  const comparability = previous && {
    comparable: differences.length === 0,
    differences,
    unknowns,
    isOverridden,
  };
  return checkedReleaseOf(release, previous, policy, { answer, comparability });
}

/** A correction tells of two versions: only what neither of them supports is marked. */
function inBoth(
  now: readonly WordingMark[],
  common: Omit<WordingCheckInput, 'releases'>,
  { was, release, previous, policy }: LineBasis,
): readonly WordingMark[] {
  const before = checkedReleaseOf(was?.release ?? release, was?.previous ?? previous, policy);
  const then = checkWording({ ...common, releases: [before] }).marks;
  return now.filter((mark) => then.some((one) => one.start <= mark.end && mark.start <= one.end));
}

/** The marks of a grade; `wrong` and `not-supported` are what filing refuses. */
export function ofGrade<Mark extends Pick<WordingMark, 'grade'>>(
  marks: readonly Mark[],
  grade: WordingGrade,
): Mark[] {
  return marks.filter((mark) => mark.grade === grade);
}
