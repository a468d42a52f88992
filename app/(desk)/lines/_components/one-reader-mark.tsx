import { CautionNote } from '@/components/ui/caution-note';

/** Words that one editor released at night, until a second person has read them. */
export function OneReaderMark({ oneReader }: { oneReader: { by: string; second: string | null } | null }) {
  if (!oneReader) return null;
  if (oneReader.second)
    return (
      <p className="mt-2 text-soft">
        Released by {oneReader.by} alone; read since by {oneReader.second}.
      </p>
    );
  return (
    <CautionNote title="One reader">
      <p>
        {oneReader.by} released these words alone, by the night rule. A second person has not read them yet.
      </p>
    </CautionNote>
  );
}
