import type { WordingMark } from '@/lib/wording/check/types';
import { GRADE_NAMES } from './mark-words';
import { segmentsOf } from './segments';

/** A text with its marks in it, each with a number that leads to its entry in the list. */
export function MarkedText({ id, text, marks }: { id: string; text: string; marks: readonly WordingMark[] }) {
  return (
    <div className="whitespace-pre-wrap">
      {segmentsOf(text, marks).map((segment, at) => (
        <Part key={at} id={id} segment={segment} marks={marks} />
      ))}
    </div>
  );
}

function Part({
  id,
  segment,
  marks,
}: {
  id: string;
  segment: ReturnType<typeof segmentsOf>[number];
  marks: readonly WordingMark[];
}) {
  const gravest = gravestOf(segment.marks.flatMap((index) => marks[index] ?? []));
  if (!gravest) return segment.text;
  return (
    <>
      <mark className="wording-mark" data-grade={gravest.grade}>
        {segment.text}
      </mark>
      {segment.ending.map((index) => (
        <a key={index} id={`${id}-at-${index}`} href={`#${id}-mark-${index}`} className="wording-number">
          <span className="sr-only">Mark </span>
          {index + 1}
          <span className="sr-only">: {GRADE_NAMES[marks[index]?.grade ?? 'cannot-judge']}</span>
        </a>
      ))}
    </>
  );
}

const GRAVITY = Object.keys(GRADE_NAMES);

function gravestOf(marks: readonly WordingMark[]): WordingMark | null {
  const [gravest = null] = [...marks].sort((a, b) => GRAVITY.indexOf(a.grade) - GRAVITY.indexOf(b.grade));
  return gravest;
}
