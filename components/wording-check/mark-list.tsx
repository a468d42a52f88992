import type { WordingMark } from '@/lib/wording/check/types';
import { GRADE_NAMES, isOfWhole, RULE_NAMES } from './mark-words';

/** Every mark in words: the phrase, how grave it is, which rule, why, and what may be said in its place. */
export function MarkList({
  id,
  marks,
  releases,
  lang,
}: {
  id: string;
  marks: readonly WordingMark[];
  /** Names of the releases that marks rest on, by their index. */
  releases: readonly string[];
  lang: string;
}) {
  return (
    <ol>
      {marks.map((mark, index) => (
        <li
          key={index}
          id={`${id}-mark-${index}`}
          tabIndex={-1}
          className="wording-item keep-together flex gap-3 border-b border-rule py-3"
        >
          <span aria-hidden="true" className="wording-number self-start">
            {index + 1}
          </span>
          <div className="min-w-0 flex-1">
            <p>
              <strong className="font-semibold">{GRADE_NAMES[mark.grade]}</strong>
              {': '}
              {isOfWhole(mark) ? 'the text as a whole' : <Phrase phrase={mark.phrase} lang={lang} />}
              {mark.quoted ? ' (quoted words)' : null}
            </p>
            <p className="text-13 text-soft">
              {RULE_NAMES[mark.rule]}
              {mark.release === null ? null : <>, against {releases[mark.release] ?? 'the release'}</>}
            </p>
            <p className="mt-1 max-w-prose">{mark.message}</p>
            {mark.replacement === null ? null : (
              <p className="mt-1 max-w-prose">
                <span className="font-semibold">May be said instead:</span>{' '}
                <Phrase phrase={mark.replacement} lang={lang} />
              </p>
            )}
            {isOfWhole(mark) ? null : (
              <a href={`#${id}-at-${index}`} className="no-print inline-block py-1 text-13">
                Back to the place<span className="sr-only"> of mark {index + 1} in the text</span>
              </a>
            )}
          </div>
        </li>
      ))}
    </ol>
  );
}

function Phrase({ phrase, lang }: { phrase: string; lang: string }) {
  return (
    <span lang={lang} className="font-serif text-18">
      “{phrase}”
    </span>
  );
}
