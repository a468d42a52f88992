import { LINE_KIND_NAMES, type LineKind } from '@/lib/domain/sheet';
import { CautionNote } from '../ui/caution-note';

type Told = { reason: string; by: string; marks: { kind: LineKind; phrase: string }[] };

/** That words were filed against the wording check, by whom and why: part of what the second reader agrees to. */
export function OverrideNote({ override }: { override: Told | null }) {
  if (!override) return null;
  return (
    <CautionNote title="Filed against the wording check">
      <ul className="list-disc pl-5">
        {override.marks.map(({ kind, phrase }, index) => (
          <li key={index}>
            {LINE_KIND_NAMES[kind]}: “{phrase}” is not supported by the figures.
          </li>
        ))}
      </ul>
      <p className="mt-1">
        {override.by}: “{override.reason}”
      </p>
    </CautionNote>
  );
}
