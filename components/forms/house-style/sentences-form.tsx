'use client';

import { useState } from 'react';
import type { Verdict } from '@/lib/findings/check-types';
import { SectionHeading } from '../../ui/section-heading';
import { Select } from '../../ui/select';
import { CLAIM_NAMES, LANGUAGE_NAMES, PART_NAMES, stateName, VERDICT_NAMES } from './decision-words';
import { SentenceField, type Slot } from './sentence-field';
import type { Faults } from './use-style-draft';

export type Sentence = {
  path: string;
  language: string;
  part: string;
  claim: string | null;
  verdict: Verdict | null;
  text: string;
  shipped: string;
  slots: string;
};

/** The sentences of one language, part and claim at a time. */
export function SentencesForm({
  draftId,
  sentences,
  slots,
  values,
  faults,
  savedAt,
  onChange,
}: {
  draftId: string;
  sentences: readonly Sentence[];
  slots: Record<string, Slot[]>;
  values: Readonly<Record<string, unknown>>;
  faults: Faults;
  savedAt: number;
  onChange: (path: string, text: string) => void;
}) {
  const [language, setLanguage] = useState(sentences[0]?.language ?? 'en');
  const [part, setPart] = useState('headline');
  const [claim, setClaim] = useState('lead');
  const ofLanguage = sentences.filter((one) => one.language === language);
  const ofPart = ofLanguage.filter((one) => one.part === part);
  const claims = namesIn(ofPart.map((one) => one.claim ?? ''));
  const asked = claims.includes(claim) ? claim : (claims[0] ?? '');
  const shown = ofPart.filter((one) => (one.claim ?? '') === asked);
  return (
    <section aria-labelledby="style-sentences">
      <SectionHeading id="style-sentences">Sentences</SectionHeading>
      <p className="mb-3 max-w-prose text-soft">
        Slots stand in braces and are filled from the release. A sentence that could claim more than its
        verdict, or leaves out what its verdict needs, is refused; what you typed stays here until you mend
        it.
      </p>
      <div className="mb-2 flex flex-wrap gap-x-4">
        <Choose
          id="sentences-language"
          label="Language"
          value={language}
          set={setLanguage}
          names={LANGUAGE_NAMES}
          keys={namesIn(sentences.map((one) => one.language))}
        />
        <Choose
          id="sentences-part"
          label="Line"
          value={part}
          set={setPart}
          names={PART_NAMES}
          keys={namesIn(ofLanguage.map((one) => one.part))}
        />
        {claims.length > 1 ? (
          <Choose
            id="sentences-claim"
            label="Claim"
            value={asked}
            set={setClaim}
            names={CLAIM_NAMES}
            keys={claims}
          />
        ) : null}
      </div>
      {shown.map((one) => (
        <SentenceField
          key={one.path}
          draftId={draftId}
          path={one.path}
          label={stateName(one.path.split('.').at(-1) ?? '')}
          hint={one.verdict ? `Verdict: ${VERDICT_NAMES[one.verdict]}` : undefined}
          text={textOf(values[one.path], one.text)}
          shipped={one.shipped}
          slots={slots[one.slots] ?? []}
          faults={faults[one.path] ?? []}
          savedAt={savedAt}
          onChange={(text) => onChange(one.path, text)}
        />
      ))}
    </section>
  );
}

function Choose({
  id,
  label,
  value,
  set,
  names,
  keys,
}: {
  id: string;
  label: string;
  value: string;
  set: (value: string) => void;
  names: Record<string, string>;
  keys: string[];
}) {
  return (
    <Select
      id={id}
      label={label}
      value={value}
      choices={keys.map((key) => ({ value: key, label: names[key] ?? key }))}
      onChange={(event) => set(event.target.value)}
      fieldClassName="w-56 max-w-full"
    />
  );
}

const namesIn = (keys: readonly string[]) => [...new Set(keys)];
const textOf = (value: unknown, stored: string) => (typeof value === 'string' ? value : stored);
