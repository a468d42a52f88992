'use client';

import { type ClipboardEvent, type KeyboardEvent, useEffect, useRef, useState } from 'react';
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
  /** Where the cursor goes once the rows are drawn anew. */
  const next = useRef<string | null>(null);
  useEffect(() => {
    if (next.current) focusOn(next.current);
    next.current = null;
  }, [fields]);
  const whole = useFault(form.control, 'shares') ?? undefined;

  /** A fault of all rows together goes with the next change; the live one stays as long as it is true. */
  const clearWhole = () => form.clearErrors('shares.root' as 'shares');

  function paste(event: ClipboardEvent) {
    const pasted = parsePastedShares(event.clipboardData.getData('text/plain'));
    if (pasted.length === 0) return;
    event.preventDefault();
    clearWhole();
    form.setValue('shares', mergedShares(form.getValues('shares'), pasted), { shouldDirty: true });
    setTold(`${pasted.length} ${pasted.length === 1 ? 'option' : 'options'} taken from what was pasted.`);
  }

  function shift(at: number, by: -1 | 1) {
    const to = at + by;
    if (to < 0 || to >= fields.length) return;
    const place = document.activeElement?.id.replace(`-${at}-`, `-${to}-`);
    next.current = place ?? null;
    move(at, to);
    setTold(`Moved to row ${to + 1}.`);
  }

  function drop(at: number) {
    if (fields.length === 1) return;
    clearWhole();
    next.current = fieldId(`shares.${Math.min(at, fields.length - 2)}.option`);
    remove(at);
    setTold(`Row ${at + 1} removed.`);
  }

  function add() {
    append(blankShare(), { focusName: `shares.${fields.length}.option` });
  }

  /** Down the column of shares; after the last one comes a new row, unless that one still is empty. */
  function goDown(at: number) {
    if (at + 1 < fields.length) return focusOn(fieldId(`shares.${at + 1}.printed`));
    const { option, printed, notDisclosed } = form.getValues(`shares.${at}`);
    const isUsed = option.trim() !== '' || printed.trim() !== '' || notDisclosed;
    if (isUsed && fields.length < MAX_SHARES) add();
  }

  function onKeyDown(event: KeyboardEvent, at: number) {
    const act = actOf(event, at);
    if (!act) return;
    event.preventDefault();
    act();
  }

  function actOf({ key, altKey, ctrlKey, metaKey, target }: KeyboardEvent, at: number) {
    if (altKey && key === 'ArrowUp') return () => shift(at, -1);
    if (altKey && key === 'ArrowDown') return () => shift(at, 1);
    if (altKey && key === 'Delete') return () => drop(at);
    const isShare = target instanceof HTMLElement && target.id === fieldId(`shares.${at}.printed`);
    return key === 'Enter' && isShare && !altKey && !ctrlKey && !metaKey ? () => goDown(at) : null;
  }

  return (
    <Group
      title="Shares as printed"
      hint="Type every decimal that is printed: 47.0 is not 47. Two columns pasted from a spreadsheet or table fill the rows. Enter in a share goes on to the next row. Alt with the up or down arrow moves a row, Alt with Delete removes it."
    >
      <div onPaste={paste} onChange={clearWhole}>
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
        {fields.length < MAX_SHARES ? <Button onClick={add}>Add an option</Button> : null}
        <ShareSum form={form} />
      </div>
      <CopyStatus message={told} />
    </Group>
  );
}

function focusOn(id: string) {
  document.getElementById(id)?.focus();
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
      tabIndex={-1}
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
