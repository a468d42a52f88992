'use client';

import { type ClipboardEvent, type KeyboardEvent, useState } from 'react';
import { useFieldArray, useWatch } from 'react-hook-form';
import { parsePastedShares } from '@/lib/import/paste-shares';
import { Button } from '../../ui/button';
import { Checkbox } from '../../ui/checkbox';
import { CopyStatus } from '../../ui/copy-status';
import { FieldError } from '../../ui/field';
import { fieldId } from './field-path';
import { Group, type InForm, TextField } from './fields';
import { blankShare, looksLikeNonAnswer } from './form-values';
import { useFault } from './live';
import { MAX_SHARES, mergedShares } from './merge-shares';

/** The figures as printed, one option a row; two pasted columns fill it. */
export function SharesGrid({ form }: InForm) {
  const { fields, append, remove, move } = useFieldArray({ control: form.control, name: 'shares' });
  const [told, setTold] = useState<string | null>(null);
  const whole = useFault(form.control, 'shares') ?? undefined;

  function paste(event: ClipboardEvent) {
    const pasted = parsePastedShares(event.clipboardData.getData('text/plain'));
    if (pasted.length === 0) return;
    event.preventDefault();
    form.setValue('shares', mergedShares(form.getValues('shares'), pasted), { shouldDirty: true });
    setTold(`${pasted.length} ${pasted.length === 1 ? 'option' : 'options'} taken from what was pasted.`);
  }

  function shift(at: number, by: -1 | 1) {
    const to = at + by;
    if (to < 0 || to >= fields.length) return;
    const place = document.activeElement?.id.replace(`-${at}-`, `-${to}-`);
    move(at, to);
    setTold(`Moved to row ${to + 1}.`);
    if (place) requestAnimationFrame(() => document.getElementById(place)?.focus());
  }

  function drop(at: number) {
    remove(at);
    setTold(`Row ${at + 1} removed.`);
    const next = fieldId(`shares.${Math.max(0, Math.min(at, fields.length - 2))}.option`);
    requestAnimationFrame(() => document.getElementById(next)?.focus());
  }

  function onKeyDown(event: KeyboardEvent, at: number) {
    if (!event.altKey || (event.key !== 'ArrowUp' && event.key !== 'ArrowDown')) return;
    event.preventDefault();
    shift(at, event.key === 'ArrowUp' ? -1 : 1);
  }

  return (
    <Group
      title="Shares as printed"
      hint="Type every decimal that is printed: 47.0 is not 47. Two columns pasted from a spreadsheet or table fill the rows. Alt with the up or down arrow moves a row."
    >
      <div onPaste={paste}>
        {fields.map((row, at) => (
          <ShareFields
            key={row.id}
            form={form}
            at={at}
            count={fields.length}
            onKeyDown={(event) => onKeyDown(event, at)}
            onShift={(by) => shift(at, by)}
            onDrop={() => drop(at)}
          />
        ))}
      </div>
      <FieldError id={fieldId('shares.whole')} error={whole} />
      <div className="flex flex-wrap items-center gap-4">
        {fields.length < MAX_SHARES ? (
          <Button onClick={() => append(blankShare(), { focusName: `shares.${fields.length}.option` })}>
            Add an option
          </Button>
        ) : null}
        <ShareSum form={form} />
      </div>
      <CopyStatus message={told} />
    </Group>
  );
}

function ShareFields({
  form,
  at,
  count,
  onKeyDown,
  onShift,
  onDrop,
}: InForm & {
  at: number;
  count: number;
  onKeyDown: (event: KeyboardEvent) => void;
  onShift: (by: -1 | 1) => void;
  onDrop: () => void;
}) {
  const row = `shares.${at}` as const;
  const isWithheld = useWatch({ control: form.control, name: `${row}.notDisclosed` });
  const isAnswer = useWatch({ control: form.control, name: `${row}.isAnswer` });
  const number = at + 1;

  /** A name that reads like don't know is marked, and taken back, while it is typed. */
  function guessAnswer(option: string) {
    if (looksLikeNonAnswer(option)) form.setValue(`${row}.isAnswer`, false);
  }

  return (
    <div
      role="group"
      aria-label={`Row ${number}`}
      onKeyDown={onKeyDown}
      className="mb-3 border-b border-rule pb-2"
    >
      <div className="grid grid-cols-[minmax(0,1fr)_7rem] items-start gap-x-4">
        <TextField
          form={form}
          path={`${row}.option`}
          label={`Option ${number}`}
          maxLength={120}
          onTyped={guessAnswer}
          fieldClassName="mb-1"
        />
        <TextField
          form={form}
          path={`${row}.printed`}
          label="Share"
          numeric
          suffix="%"
          readOnly={isWithheld}
          maxLength={20}
          fieldClassName="mb-1"
        />
      </div>
      <div className="flex flex-wrap items-center gap-x-5 gap-y-1 text-13">
        <Checkbox
          id={fieldId(`${row}.isAnswer`)}
          label="Not an answer"
          checked={!isAnswer}
          onChange={(event) => form.setValue(`${row}.isAnswer`, !event.target.checked)}
          className="mb-0"
        />
        <Checkbox
          {...form.register(`${row}.notDisclosed`)}
          id={fieldId(`${row}.notDisclosed`)}
          label="Not disclosed"
          className="mb-0"
        />
        <span className="ml-auto flex gap-2">
          <RowButton id={`shares-${at}-up`} isOff={at === 0} onPress={() => onShift(-1)} sign="↑">
            Move option {number} up
          </RowButton>
          <RowButton id={`shares-${at}-down`} isOff={at === count - 1} onPress={() => onShift(1)} sign="↓">
            Move option {number} down
          </RowButton>
          <RowButton id={`shares-${at}-drop`} isOff={count === 1} onPress={onDrop} sign="×">
            Remove option {number}
          </RowButton>
        </span>
      </div>
    </div>
  );
}

function RowButton({
  id,
  isOff,
  onPress,
  sign,
  children,
}: {
  id: string;
  isOff: boolean;
  onPress: () => void;
  sign: string;
  children: React.ReactNode;
}) {
  return (
    <Button
      id={id}
      className="min-h-7! px-2! py-0.5!"
      aria-disabled={isOff || undefined}
      onClick={isOff ? undefined : onPress}
    >
      <span aria-hidden="true">{sign}</span>
      <span className="sr-only">{children}</span>
    </Button>
  );
}

/** What the shares sum to, so that a slip of the finger shows. */
function ShareSum({ form }: InForm) {
  const rows = useWatch({ control: form.control, name: 'shares' });
  const figures = rows.map((row) => Number(row.printed.trim().replace(/\s*%$/, '').replace(',', '.')));
  const known = figures.filter((figure, at) => rows[at]?.printed.trim() && Number.isFinite(figure));
  if (known.length < 2) return null;
  const sum = Number(known.reduce((total, figure) => total + figure, 0).toFixed(6));
  return <p className="text-soft">Together {sum}%</p>;
}
