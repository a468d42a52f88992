'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { entryIdOf, passageIdOf } from '@/components/lines/commented-words';
import { Fold } from '@/components/lines/fold';
import { whenSaid } from '@/components/lines/when';
import { Button } from '@/components/ui/button';
import { ErrorSummary } from '@/components/ui/error-summary';
import { Select } from '@/components/ui/select';
import { TextArea } from '@/components/ui/text-area';
import { LINE_KIND_NAMES, type LineKind, type LineText } from '@/lib/domain/sheet';
import type { ActionResult } from '@/lib/errors';
import type { CommentView } from '@/lib/services/sheet/list-comments';
import { faultsOf, useAction } from '../../../_components/use-action';
import { openComments } from './line-comments-of';

export type CommentActions = {
  comment: (input: unknown) => Promise<ActionResult<{ id: string }>>;
  settle: (input: { id: string }) => Promise<ActionResult<void>>;
};

type Props = {
  id: string;
  lines: readonly LineText[];
  comments: readonly CommentView[];
  actions: CommentActions;
  /** While words are being written or read. */
  isOpen: boolean;
  /** Open ones are in sight from the start. */
  isUnfolded: boolean;
  now: number;
  zone: string;
};

const IDS = { quote: 'comment-quote', body: 'comment-body' };

/** What people noted on passages of the lines. It is the desk's own: never evidence, never public. */
export function Comments({ id, lines, comments, actions, isOpen, isUnfolded, now, zone }: Props) {
  if (!isOpen && comments.length === 0) return null;
  const open = openComments(comments);
  return (
    <Fold id="comments" title={`Comments (${open.length} open)`} isOpen={isUnfolded && open.length > 0}>
      <ul className="border-t border-rule">
        {comments.map((comment) => (
          <Entry
            key={comment.id}
            comment={comment}
            number={open.indexOf(comment) + 1}
            settle={actions.settle}
            now={now}
            zone={zone}
          />
        ))}
      </ul>
      {isOpen ? <AddComment id={id} lines={lines} add={actions.comment} /> : null}
    </Fold>
  );
}

function Entry({
  comment,
  number,
  settle,
  now,
  zone,
}: {
  comment: CommentView;
  /** As it is marked in the words; 0 once it is settled. */
  number: number;
  settle: CommentActions['settle'];
  now: number;
  zone: string;
}) {
  const router = useRouter();
  const { run, isPending, failure } = useAction(settle);
  const take = async () => {
    const { ok } = await run({ id: comment.id });
    if (ok) router.refresh();
  };
  return (
    <li id={entryIdOf(comment.id)} tabIndex={-1} className="border-b border-rule py-2">
      <p className="text-13 text-soft">
        {number > 0 ? <strong>{number}. </strong> : null}
        {comment.by} {whenSaid(comment.at, now, zone)} on the {LINE_KIND_NAMES[comment.kind].toLowerCase()}:{' '}
        <a href={`#${passageIdOf(comment.id)}`} className="font-serif text-15">
          “{comment.quote}”
        </a>
        {comment.anchor.kind === 'changed' ? <strong> (the words have changed)</strong> : null}
      </p>
      <p className="max-w-prose whitespace-pre-line">{comment.body}</p>
      {comment.resolved ? (
        <p className="text-13 text-soft">
          Settled by {comment.resolved.by} {whenSaid(comment.resolved.at, now, zone)}.
        </p>
      ) : null}
      {comment.maySettle ? (
        <Button className="mt-1" pending={isPending} pendingLabel="Settling…" onClick={take}>
          Settle<span className="sr-only"> the comment on “{comment.quote}”</span>
        </Button>
      ) : null}
      {failure ? <p role="alert">{failure.message}</p> : null}
    </li>
  );
}

function AddComment({
  id,
  lines,
  add,
}: {
  id: string;
  lines: readonly LineText[];
  add: CommentActions['comment'];
}) {
  const router = useRouter();
  const { run, isPending, failure, attempt } = useAction(add);
  const [kind, setKind] = useState<LineKind>(lines[0]?.kind ?? 'headline');
  const [quote, setQuote] = useState('');
  const [missing, setMissing] = useState(false);
  const [body, setBody] = useState('');

  /** What is selected on the page, where it stands in one of the lines. */
  const takeSelection = () => {
    const selected = window.getSelection()?.toString().trim() ?? '';
    const found = selected === '' ? undefined : lines.find(({ text }) => text.includes(selected));
    if (!found) return;
    setKind(found.kind);
    setQuote(selected);
  };
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    const text = lines.find((line) => line.kind === kind)?.text ?? '';
    const words = quote.trim() === '' ? text : quote.trim();
    const start = text.indexOf(words);
    setMissing(start === -1);
    if (start === -1) return;
    const result = await run({ id, kind, start, end: start + words.length, quote: words, body });
    if (!result.ok) return;
    setQuote('');
    setBody('');
    router.refresh();
  };
  return (
    <form method="post" noValidate onSubmit={submit} className="mt-3 max-w-form">
      <ErrorSummary faults={faultsOf(failure, IDS)} attempt={attempt} title="No comment was made" />
      <Select
        id="comment-line"
        label="Comment on"
        value={kind}
        onChange={(event) => setKind(event.target.value as LineKind)}
        choices={lines.map((line) => ({ value: line.kind, label: LINE_KIND_NAMES[line.kind] }))}
      />
      <TextArea
        id={IDS.quote}
        label="Its words"
        hint="Select them above and press “Take the selection”, or type them. Left empty: the whole line."
        optional
        copy
        rows={1}
        value={quote}
        onChange={(event) => setQuote(event.target.value)}
        error={missing ? 'These words do not stand in that line.' : failure?.fields.quote}
      />
      <p className="mb-3">
        <Button onMouseDown={(event) => event.preventDefault()} onClick={takeSelection}>
          Take the selection
        </Button>
      </p>
      <TextArea
        id={IDS.body}
        label="What about them?"
        rows={2}
        maxLength={2000}
        value={body}
        onChange={(event) => setBody(event.target.value)}
        error={failure?.fields.body}
      />
      <Button type="submit" pending={isPending} pendingLabel="Saving…">
        Comment
      </Button>
    </form>
  );
}
