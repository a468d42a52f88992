import { Fragment, type MouseEvent, type ReactNode } from 'react';
import type { Anchor } from '@/lib/domain/comments';
import type { DiffPart } from '../ui/word-diff';
import { type CommentedPart, commentedParts } from './commented-parts';
import { goTo } from './go-to';

/** An open comment on a passage of a line, with the number that it has on the whole sheet. */
export type LineComment = {
  id: string;
  number: number;
  by: string;
  quote: string;
  body: string;
  anchor: Anchor;
};

/** Where its entry stands in the list of comments. */
export const entryIdOf = (id: string) => `comment-${id}`;
/** Where its passage stands in the words. */
export const passageIdOf = (id: string) => `passage-${id}`;

/** Words with what came and went, and with the passages that were commented on marked in them. */
export function CommentedWords({
  parts,
  comments,
}: {
  parts: readonly DiffPart[];
  comments: readonly LineComment[];
}) {
  const cut = commentedParts(
    parts,
    comments.map(({ anchor }) => anchor),
  );
  const firstOf = (index: number) => cut.findIndex((part) => part.comments.includes(index));
  return (
    <span className="word-diff">
      {cut.map((part, at) => (
        <Fragment key={at}>
          <Change part={part}>
            {part.comments.length === 0 ? (
              part.text
            ) : (
              <Passage
                text={part.text}
                comments={part.comments.map((index) => comments[index]!)}
                begins={part.comments
                  .filter((index) => firstOf(index) === at)
                  .map((index) => comments[index]!)}
              />
            )}
          </Change>
        </Fragment>
      ))}
      {comments.map(({ id, number, by, body }) => (
        <span key={id} id={noteIdOf(id)} hidden>
          Comment {number} by {by}: {body}
        </span>
      ))}
    </span>
  );
}

function Change({ part, children }: { part: CommentedPart; children: ReactNode }) {
  if (part.change === undefined) return children;
  const Tag = part.change === 'removed' ? 'del' : 'ins';
  return (
    <Tag>
      <span className="sr-only">({part.change}: </span>
      {children}
      <span className="sr-only">)</span>
    </Tag>
  );
}

/** A link where a passage begins, so that a comment is one stop on the way through the words. */
function Passage({
  text,
  comments,
  begins,
}: {
  text: string;
  comments: readonly LineComment[];
  begins: readonly LineComment[];
}) {
  const [first] = begins;
  if (!first) return <mark className="comment-mark">{text}</mark>;
  const show = (event: MouseEvent) => {
    event.preventDefault();
    goTo(document.getElementById(entryIdOf(first.id)));
  };
  return (
    <a
      id={passageIdOf(first.id)}
      href={`#${entryIdOf(first.id)}`}
      className="comment-mark"
      aria-describedby={comments.map(({ id }) => noteIdOf(id)).join(' ')}
      aria-details={entryIdOf(first.id)}
      onClick={show}
    >
      {text}
      {begins.map(({ id, number }) => (
        <sup key={id}>
          <span className="sr-only"> comment </span>
          {number}
        </sup>
      ))}
    </a>
  );
}

const noteIdOf = (id: string) => `note-${id}`;
