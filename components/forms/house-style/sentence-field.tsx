'use client';

import { useEffect, useRef, useState } from 'react';
import { Button } from '../../ui/button';
import { Details } from '../../ui/details';
import { Select } from '../../ui/select';
import { TextArea } from '../../ui/text-area';
import { fetchJson } from '../release/fetch-json';
import { slotText, slotWords } from './slot-words';
import type { Fault } from './use-style-draft';

export type Slot = { name: string; choices: string[] };
type Filled = { text: string; pollster: string; fieldEndOn: string; isExample: boolean };

/** One sentence: its words with slots, the list that slots are inserted from, and how three releases would print it. */
export function SentenceField({
  draftId,
  path,
  label,
  hint,
  text,
  shipped,
  slots,
  faults,
  savedAt,
  onChange,
}: {
  draftId: string;
  path: string;
  label: string;
  hint?: string;
  text: string;
  shipped: string;
  slots: readonly Slot[];
  faults: readonly Fault[];
  /** Rises with every save, so that the filled sentences follow. */
  savedAt: number;
  onChange: (text: string) => void;
}) {
  const area = useRef<HTMLTextAreaElement>(null);
  const id = `sentence-${path.replace(/\./g, '-')}`;
  const filled = useFilled(draftId, path, text, savedAt);

  const insert = (name: string) => {
    const slot = slots.find((one) => one.name === name);
    const field = area.current ?? document.getElementById(id);
    if (!slot || !(field instanceof HTMLTextAreaElement)) return;
    const piece = slotText(slot);
    const [from, to] = [field.selectionStart, field.selectionEnd];
    onChange(text.slice(0, from) + piece + text.slice(to));
    requestAnimationFrame(() => {
      field.focus();
      field.setSelectionRange(from + piece.length, from + piece.length);
    });
  };

  return (
    <div className="border-b border-rule py-4">
      <TextArea
        ref={area}
        id={id}
        label={label}
        hint={hint}
        copy
        rows={3}
        spellCheck
        value={text}
        error={faults.length > 0 ? faults.map((fault) => faultWords(fault, text)).join(' ') : null}
        onChange={(event) => onChange(event.target.value)}
        fieldClassName="max-w-prose"
      />
      <div className="flex flex-wrap items-end gap-3">
        <Select
          id={`${id}-insert`}
          label="Insert"
          hideLabel
          aria-label={`Insert into ${label}`}
          value=""
          empty="Insert a slot…"
          choices={slots.map((slot) => ({
            value: slot.name,
            label: `{${slot.name}} ${slotWords(slot.name)}`,
          }))}
          onChange={(event) => insert(event.target.value)}
          fieldClassName="mb-0 w-64 max-w-full"
        />
        {text === shipped ? null : (
          <Button onClick={() => onChange(shipped)}>
            As the product ships it<span className="sr-only">: {label}</span>
          </Button>
        )}
      </div>
      <FilledList filled={filled} isRefused={faults.length > 0} label={label} />
    </div>
  );
}

function FilledList({
  filled,
  isRefused,
  label,
}: {
  filled: Filled[] | null;
  isRefused: boolean;
  label: string;
}) {
  if (isRefused)
    return <p className="mt-2 text-13 text-soft">Not saved as it is: mend it to see it filled.</p>;
  if (filled === null) return null;
  return (
    <Details
      summary={`Filled with ${filled.length === 1 ? 'one release' : `${filled.length} releases`}`}
      open
    >
      <ul aria-label={`${label}, filled`} className="space-y-2">
        {filled.map((one, at) => (
          <li key={at}>
            <p className="max-w-prose font-serif">{one.text}</p>
            <p className="text-13 text-soft">
              {one.isExample ? 'Invented example' : `${one.pollster}, field work to ${one.fieldEndOn}`}
            </p>
          </li>
        ))}
        {filled.length === 0 ? <li className="text-soft">No release that this sentence is for.</li> : null}
      </ul>
    </Details>
  );
}

/** Asked for when the sentence comes into view, and again after each save. */
function useFilled(draftId: string, path: string, text: string, savedAt: number): Filled[] | null {
  const [filled, setFilled] = useState<Filled[] | null>(null);
  const latest = useRef(text);
  const shown = useRef<string | null>(null);
  useEffect(() => {
    latest.current = text;
  }, [text]);
  useEffect(() => {
    let isGone = false;
    const asked = latest.current;
    if (shown.current === asked) return;
    const body = { path, text: asked };
    fetchJson(`/api/desk/house-style/${draftId}/filled`, { method: 'POST', body })
      .then((answer) => {
        if (isGone || !Array.isArray(answer)) return;
        shown.current = asked;
        setFilled(answer as Filled[]);
      })
      .catch(() => {
        if (!isGone) setFilled(null);
      });
    return () => {
      isGone = true;
    };
  }, [draftId, path, savedAt]);
  return filled;
}

/** A fault with its place: the characters counted as an editor counts them, from 1. */
function faultWords({ message, place }: Fault, text: string): string {
  if (!place || place.start >= text.length) return message;
  const words = text.slice(place.start, Math.min(place.end, place.start + 24));
  return `${message} (At “${words}”, character ${place.start + 1}.)`;
}
