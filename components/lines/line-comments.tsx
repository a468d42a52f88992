import type { LineComment } from './commented-words';

/** The open comments on a line that is being written, under its field: a field can carry no marks. */
export function LineComments({ id, comments }: { id: string; comments: readonly LineComment[] }) {
  if (comments.length === 0) return null;
  return (
    <ul id={id} className="mt-1 border-l-3 border-water-4 pl-3 text-13">
      {comments.map(({ id: comment, number, by, quote, body, anchor }) => (
        <li key={comment} className="py-0.5">
          <strong className="font-semibold">
            Comment {number} by {by} on <span className="font-serif">“{quote}”</span>
            {anchor.kind === 'changed' ? ' (these words have changed)' : null}:
          </strong>{' '}
          {body}
        </li>
      ))}
    </ul>
  );
}
