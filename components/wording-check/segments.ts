import type { WordingMark } from '@/lib/wording/check/types';
import { isOfWhole } from './mark-words';

export type Segment = {
  text: string;
  /** Indexes of the marks that lie over it. */
  marks: number[];
  /** Those of them that end with it; their numbers stand behind it. */
  ending: number[];
};

/** A text cut wherever a mark starts or ends, since marks of different rules may overlap. */
export function segmentsOf(text: string, marks: readonly WordingMark[]): Segment[] {
  const inText = marks.flatMap((mark, index) => (isOfWhole(mark) ? [] : [{ ...mark, index }]));
  const cuts = [...new Set([0, text.length, ...inText.flatMap(({ start, end }) => [start, end])])]
    .filter((cut) => cut >= 0 && cut <= text.length)
    .sort((a, b) => a - b);
  return cuts.slice(1).map((to, at) => {
    const from = cuts[at] ?? 0;
    const over = inText.filter(({ start, end }) => start <= from && to <= end);
    return {
      text: text.slice(from, to),
      marks: over.map(({ index }) => index),
      ending: over.filter(({ end }) => end === to).map(({ index }) => index),
    };
  });
}
