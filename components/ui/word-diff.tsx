import { Fragment } from 'react';

export type DiffPart = { text: string; change?: 'added' | 'removed' };

/** A wording beside the one it came from: struck out what went, underlaid what came; both are named aloud. */
export function WordDiff({ parts }: { parts: readonly DiffPart[] }) {
  return (
    <span className="word-diff">
      {parts.map((part, at) => (
        <Fragment key={at}>
          {part.change === 'removed' ? (
            <del>
              <span className="sr-only">(removed: </span>
              {part.text}
              <span className="sr-only">)</span>
            </del>
          ) : part.change === 'added' ? (
            <ins>
              <span className="sr-only">(added: </span>
              {part.text}
              <span className="sr-only">)</span>
            </ins>
          ) : (
            part.text
          )}
        </Fragment>
      ))}
    </span>
  );
}
