import { LINE_KIND_NAMES, type LineKind } from '@/lib/domain/sheet';
import type { WordingMark } from '@/lib/wording/check/types';
import { CopyBlock } from '../ui/copy-block';
import { SectionHeading } from '../ui/section-heading';
import { WordDiff } from '../ui/word-diff';
import { LineMarks } from '../wording-check/line-marks';
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
}: {
  kind: LineKind;
  text: string;
  /** The wording that the marks compare with; null where nothing is to be marked. */
  before: string | null;
  knockedOut: boolean;
  marks: readonly WordingMark[];
  lang: string;
}) {
  const id = `line-${kind}`;
  return (
    <section aria-labelledby={id} className="keep-together mb-4">
      <SectionHeading id={id} level={3}>
        {LINE_KIND_NAMES[kind]}
        {knockedOut ? <span className="font-normal">: knocked out, not part of this sheet</span> : null}
      </SectionHeading>
      {knockedOut ? null : (
        <div className={SMALL.includes(kind) ? '[&_.copy-block]:py-2 [&_.copy-block]:text-15' : undefined}>
          <CopyBlock lang={lang} isDisplay={kind === 'headline'}>
            <div className="whitespace-pre-line">
              {before === null || before === text ? text : <WordDiff parts={diffParts(before, text)} />}
            </div>
          </CopyBlock>
          <LineMarks marks={marks} lang={lang} />
        </div>
      )}
    </section>
  );
}
