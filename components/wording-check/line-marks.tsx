import type { WordingMark } from '@/lib/wording/check/types';
import { GRADE_NAMES, isOfWhole } from './mark-words';

/** The marks of one line of a sheet, close below its words. */
export function LineMarks({ marks, lang }: { marks: readonly WordingMark[]; lang: string }) {
  if (marks.length === 0) return null;
  return (
    <ul className="mt-1 border-l-3 border-rule pl-3 text-13">
      {marks.map((mark, index) => (
        <li key={index} className="py-0.5">
          <strong className={isHeld(mark) ? 'font-semibold text-caution' : 'font-semibold'}>
            {GRADE_NAMES[mark.grade]}:
            {isOfWhole(mark) ? null : (
              <>
                {' '}
                <span lang={lang}>“{mark.phrase}”</span>
              </>
            )}
          </strong>{' '}
          {mark.message}
          {mark.replacement === null ? null : (
            <>
              {' '}
              May be said instead: <span lang={lang}>“{mark.replacement}”</span>
            </>
          )}
        </li>
      ))}
    </ul>
  );
}

const isHeld = ({ grade }: WordingMark) => grade === 'wrong' || grade === 'not-supported';
