import { LINE_KIND_NAMES, type LineKind } from '@/lib/domain/sheet';
import { ErrorSummary } from '../../ui/error-summary';
import type { LineComment } from '../../lines/commented-words';
import type { LineMarksOf } from '../../wording-check/use-line-marks';
import { fieldIdOf, LineField } from './line-field';
import type { ChangeLine, WrittenLine } from './use-lines';

/** Every line of a sheet being written, with what is wrong on top. */
export function LineFields({
  lines,
  drafts,
  lang,
  marks,
  comments,
  errors,
  attempt,
  onChange,
}: {
  lines: readonly WrittenLine[];
  drafts: Readonly<Record<string, string>>;
  lang: string;
  /** By line. */
  marks: LineMarksOf;
  comments: (kind: LineKind) => readonly LineComment[];
  /** By line. */
  errors: Readonly<Record<string, string>>;
  attempt: number;
  onChange: ChangeLine;
}) {
  const faults = lines.flatMap(({ kind }) => {
    const message = errors[kind];
    return message ? [{ message: `${LINE_KIND_NAMES[kind]}: ${message}`, fieldId: fieldIdOf(kind) }] : [];
  });
  return (
    <>
      <ErrorSummary faults={faults} attempt={attempt} title="Nothing was filed" />
      {lines.map((line) => (
        <LineField
          key={line.kind}
          line={line}
          draft={drafts[line.kind] ?? ''}
          lang={lang}
          marks={marks[line.kind] ?? []}
          comments={comments(line.kind)}
          error={errors[line.kind]}
          onChange={onChange}
        />
      ))}
    </>
  );
}
