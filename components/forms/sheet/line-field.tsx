import { LINE_KIND_NAMES, REQUIRED_LINE_KINDS } from '@/lib/domain/sheet';
import type { WordingMark } from '@/lib/wording/check/types';
import type { LineComment } from '../../lines/commented-words';
import { diffParts } from '../../lines/diff-parts';
import { LineComments } from '../../lines/line-comments';
import { Button } from '../../ui/button';
import { TextArea } from '../../ui/text-area';
import { WordDiff } from '../../ui/word-diff';
import { LineMarks } from '../../wording-check/line-marks';
import type { ChangeLine, WrittenLine } from './use-lines';

/** One line being written: its words, what they changed of the draft, and what the wording check says of them. */
export function LineField({
  line,
  draft,
  lang,
  marks,
  comments,
  error,
  onChange,
}: {
  line: WrittenLine;
  draft: string;
  lang: string;
  marks: readonly WordingMark[];
  /** Open ones on this line. */
  comments: readonly LineComment[];
  error?: string;
  onChange: ChangeLine;
}) {
  const { kind, text, knockedOut } = line;
  const id = fieldIdOf(kind);
  const name = LINE_KIND_NAMES[kind];
  const isChanged = text !== draft;
  const about = [isChanged ? `${id}-draft` : null, comments.length > 0 ? `${id}-comments` : null];
  return (
    <div className="mb-5 border-b border-rule pb-3">
      {knockedOut ? (
        <p className="mb-2">
          <span className="font-semibold">{name}</span>{' '}
          <span className="text-soft">is knocked out. It is not part of this sheet.</span>
        </p>
      ) : (
        <>
          <TextArea
            id={id}
            label={name}
            copy
            rows={kind === 'headline' || kind === 'chart-title' ? 2 : 4}
            maxLength={5000}
            spellCheck
            lang={lang}
            value={text}
            error={error}
            aria-describedby={about.filter((one) => one !== null).join(' ') || undefined}
            fieldClassName="mb-1!"
            onChange={(event) => onChange(kind, { text: event.target.value })}
          />
          <div aria-live="polite">
            <LineMarks marks={marks} lang={lang} />
          </div>
          <LineComments id={`${id}-comments`} comments={comments} />
          {isChanged ? (
            <div id={`${id}-draft`} className="mt-1 max-w-prose font-serif whitespace-pre-line">
              <span className="font-sans text-13 text-soft">Against the draft: </span>
              <WordDiff parts={diffParts(draft, text)} />
            </div>
          ) : null}
        </>
      )}
      <div className="mt-2 flex flex-wrap gap-2">
        {REQUIRED_LINE_KINDS.includes(kind) ? null : (
          <Button aria-pressed={knockedOut} onClick={() => onChange(kind, { knockedOut: !knockedOut })}>
            {knockedOut ? 'Put back' : 'Knock out'}
            <span className="sr-only"> the {name.toLowerCase()}</span>
          </Button>
        )}
        {isChanged && !knockedOut ? (
          <Button onClick={() => onChange(kind, { text: draft })}>
            Back to the draft<span className="sr-only"> of the {name.toLowerCase()}</span>
          </Button>
        ) : null}
      </div>
    </div>
  );
}

export function fieldIdOf(kind: WrittenLine['kind']): string {
  return `line-${kind}`;
}
