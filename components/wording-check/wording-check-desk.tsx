'use client';

import { useState } from 'react';
import { LANGUAGE_NAMES } from '@/lib/domain/vocabulary';
import { type TextPart, type WordingLanguage, WORDING_LANGUAGES } from '@/lib/wording/check/types';
import { Button } from '../ui/button';
import { CautionNote } from '../ui/caution-note';
import { CopyBlock } from '../ui/copy-block';
import { SectionHeading } from '../ui/section-heading';
import { Select } from '../ui/select';
import { TextArea } from '../ui/text-area';
import { MarkList } from './mark-list';
import { countWords } from './mark-words';
import { MarkedText } from './marked-text';
import { nameOf, type OfferedRelease, ReleaseChoice } from './release-choice';
import { type Answered, type CheckState, useWordingCheck } from './use-wording-check';

const ID = 'wording';
const PARTS: { value: TextPart; label: string }[] = [
  { value: 'whole', label: 'A text that stands alone' },
  { value: 'headline', label: 'A headline' },
  { value: 'line', label: 'A sentence beside its caveat' },
  { value: 'spoken', label: 'Words that are said aloud' },
];
const CHOICES = WORDING_LANGUAGES.map((value) => ({ value, label: LANGUAGE_NAMES[value] }));

/** A text and what it is about at the left, what it says beyond its figures at the right. */
export function WordingCheckDesk({
  releases,
  maxText,
  maxReleases,
  personId,
}: {
  releases: readonly OfferedRelease[];
  maxText: number;
  maxReleases: number;
  personId: string;
}) {
  const [text, setText] = useState('');
  const [language, setLanguage] = useState<WordingLanguage>('en');
  const [part, setPart] = useState<TextPart>('whole');
  const [chosen, setChosen] = useState<string[]>([]);
  const check = useWordingCheck({ text, language, part, releases: chosen }, personId);
  const left = maxText - text.length;
  return (
    <div className="mt-5 grid gap-x-10 gap-y-6 lg:grid-cols-2">
      <div className="min-w-0">
        <div className="no-print">
          <TextArea
            id="wording-text"
            label="Text"
            copy
            rows={8}
            lang={language}
            maxLength={maxText}
            value={text}
            hint={`A headline, a sentence or paragraphs, up to ${maxText.toLocaleString('en-GB')} characters. The text is read on this desk’s own server while you type, and is not stored.`}
            onChange={(event) => setText(event.target.value)}
            className="max-h-[60vh]"
          />
          {left < maxText / 10 ? (
            <p role="status" className="mb-3 text-13">
              {left.toLocaleString('en-GB')} characters left.
            </p>
          ) : null}
          <Select
            id="wording-language"
            label="Language of the text"
            choices={CHOICES}
            value={language}
            onChange={(event) => setLanguage(languageOf(event.target.value))}
          />
          <Select
            id="wording-part"
            label="What it is"
            choices={PARTS}
            value={part}
            onChange={(event) =>
              setPart(PARTS.find(({ value }) => value === event.target.value)?.value ?? 'whole')
            }
          />
        </div>
        <ReleaseChoice releases={releases} chosen={chosen} max={maxReleases} onChange={setChosen} />
      </div>
      <section aria-labelledby="wording-result" className="min-w-0">
        <SectionHeading id="wording-result">What the check says</SectionHeading>
        <p role="status" className="mt-1 mb-3">
          {statusOf(check, text)}
        </p>
        <Failure check={check} />
        {check.answer ? <Result answer={check.answer} /> : null}
      </section>
    </div>
  );
}

function languageOf(value: string): WordingLanguage {
  return WORDING_LANGUAGES.find((one) => one === value) ?? 'en';
}

function statusOf({ answer, isBehind, failure }: CheckState, text: string): string {
  if (text.trim() === '') return 'Write or paste a text: its marks appear here.';
  if (failure) return 'Not checked.';
  if (isBehind || !answer) return 'Checking…';
  const { marks } = answer;
  if (marks.length === 0)
    return 'No mark. That means only that no rule objects, not that the text is right in every respect.';
  return `${marks.length === 1 ? '1 mark' : `${marks.length} marks`}: ${countWords(marks)}.`;
}

function Failure({ check: { failure, again } }: { check: CheckState }) {
  return (
    <div role="alert">
      {failure ? (
        <CautionNote title="The text was not checked">
          <p>{failure.message}</p>
          <Button className="mt-2" onClick={again}>
            Check again
          </Button>
        </CautionNote>
      ) : null}
    </div>
  );
}

function Result({ answer }: { answer: Answered }) {
  const { asked, marks, cannotJudge } = answer;
  const names = answer.releases.map(nameOf);
  return (
    <>
      <CopyBlock lang={asked.language}>
        <MarkedText id={ID} text={asked.text} marks={marks} />
      </CopyBlock>
      <p className="mt-2 text-13 text-soft">
        {names.length === 0 ? 'Checked against no release.' : `Checked against ${names.join('; ')}.`}
      </p>
      {marks.length > 0 ? (
        <div className="mt-4">
          <SectionHeading level={3}>Marks</SectionHeading>
          <MarkList id={ID} marks={marks} releases={names} lang={asked.language} />
        </div>
      ) : null}
      <div className="mt-4">
        <SectionHeading level={3}>What it cannot judge</SectionHeading>
        <ul className="max-w-prose list-disc pl-5 text-soft">
          {cannotJudge.map((sentence) => (
            <li key={sentence}>{sentence}</li>
          ))}
          <li>Whether the poll was well made, and anything the text says beside polls.</li>
          <li>Meaning: it reads phrases, names and numbers. Irony, hints and pictures pass it by.</li>
        </ul>
      </div>
    </>
  );
}
