import { LINE_KIND_NAMES } from '@/lib/domain/sheet';
import { CautionNote } from '../ui/caution-note';
import { TextArea } from '../ui/text-area';
import type { HeldBack } from './use-line-marks';

/** What the wording check holds back, and the way on: mended words, or the written reason of an editor. */
export function OverrideField({
  held: { isWrong, unsupported },
  mayOverride,
  reason,
  error,
  onReason,
}: {
  held: HeldBack;
  mayOverride: boolean;
  reason: string;
  error?: string;
  onReason: (reason: string) => void;
}) {
  if (isWrong)
    return (
      <CautionNote title="Some words contradict the figures">
        <p>They cannot be filed. Mend what is marked as wrong; no reason lifts that.</p>
      </CautionNote>
    );
  if (unsupported.length === 0) return null;
  return (
    <CautionNote title="The figures do not support some words">
      <ul className="list-disc pl-5">
        {unsupported.map(({ kind, phrase }, index) => (
          <li key={index}>
            {LINE_KIND_NAMES[kind]}: “{phrase}”
          </li>
        ))}
      </ul>
      {mayOverride ? (
        <TextArea
          id="wording-override"
          label="Reason for filing them all the same"
          hint="Mend the words, or say why they stand. The reason stays in the evidence, and the second reader sees it."
          rows={2}
          maxLength={2000}
          value={reason}
          error={error}
          fieldClassName="mt-2"
          onChange={(event) => onReason(event.target.value)}
        />
      ) : (
        <p className="mt-1">Mend them, or ask an editor: an editor can file them with a written reason.</p>
      )}
    </CautionNote>
  );
}
