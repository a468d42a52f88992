import { LANGUAGE_NAMES, type Language } from '@/lib/domain/vocabulary';
import { Select } from '../ui/select';

export type OfferedLanguage = { language: Language; isClearable: boolean };

/** The language of a sheet, and what is still needed before words in it can be cleared. */
export function LanguageChoice({
  id,
  languages,
  value,
  onChange,
}: {
  id: string;
  languages: readonly OfferedLanguage[];
  value: Language;
  onChange: (language: Language) => void;
}) {
  const chosen = languages.find(({ language }) => language === value);
  return (
    <>
      <Select
        id={id}
        label="Language of the sheet"
        hint="Every language is a sheet of its own, written and cleared by itself."
        choices={languages.map(({ language, isClearable }) => ({
          value: language,
          label: `${LANGUAGE_NAMES[language]}${isClearable ? '' : ' (not signed yet)'}`,
        }))}
        value={value}
        onChange={(event) => {
          const found = languages.find(({ language }) => language === event.target.value);
          if (found) onChange(found.language);
        }}
        fieldClassName="mb-1!"
      />
      <p role="status" className="mb-4 max-w-prose text-soft">
        {chosen?.isClearable === false
          ? 'No native editor of this desk has signed these sentences. The sheet can be drafted and filed; it is cleared once House style shows a signature.'
          : ''}
      </p>
    </>
  );
}
