import { LINE_KIND_NAMES, type LineKind } from '@/lib/domain/sheet';
import type { WordingMark } from '@/lib/wording/check/types';
import { CopyBlock } from '../ui/copy-block';
import { SectionHeading } from '../ui/section-heading';
import { LineMarks } from '../wording-check/line-marks';
import { CommentedWords, type LineComment } from './commented-words';
import { diffParts } from './diff-parts';

/** Set smaller, so that claim, sentence and evidence fit one screen. */
const SMALL: readonly LineKind[] = [
  'caveat',
  'caveat-short',
  'caveat-one-breath',
  'method-note',
  'chart-title',
  'alt-text',
];

/** One line as it would be printed, marked against the wording it came from. */
export function PrintableLine({
  kind,
  text,
  before,
  knockedOut,
  marks,
  lang,
  comments = [],
}: {
  kind: LineKind;
  text: string;
  /** The wording that the marks compare with; null where nothing is to be marked. */
  before: string | null;
  knockedOut: boolean;
  marks: readonly WordingMark[];
  lang: string;
  /** Open ones on this line. */
  comments?: readonly LineComment[];
}) {
  const id = `line-${kind}`;
  return (
    <section aria-labelledby={id} className="printable-line keep-together">
      <SectionHeading id={id} level={3}>
        {LINE_KIND_NAMES[kind]}
        {knockedOut ? <span className="font-normal">: knocked out, not part of this sheet</span> : null}
      </SectionHeading>
      {knockedOut ? null : (
        <div className={SMALL.includes(kind) ? 'printable-small' : undefined}>
          <CopyBlock lang={lang} isDisplay={kind === 'headline'}>
            <div className="whitespace-pre-line">
              <CommentedWords
                parts={before === null || before === text ? [{ text }] : diffParts(before, text)}
                comments={comments}
              />
            </div>
          </CopyBlock>
          <LineMarks marks={marks} lang={lang} />
        </div>
      )}
    </section>
  );
}
