'use client';

import { useRef } from 'react';
import { type InForm, TextField } from './fields';
import { marginUnit } from './form-values';

/** A half-width as the pollster prints it: points, what they are rounded to, at which level. */
export function Interval({
  form,
  name,
  label,
  isReadOnly,
}: InForm & { name: 'statedMargin' | 'modelledInterval'; label: string; isReadOnly: boolean }) {
  const guessed = useRef(marginUnit(form.getValues(`${name}.pp`)) ?? '0.1');

  /** The unit follows what is typed until somebody says otherwise. */
  function guessUnit(printed: string) {
    const unit = marginUnit(printed);
    if (unit === null || form.getValues(`${name}.unit`) !== guessed.current) return;
    guessed.current = unit;
    form.setValue(`${name}.unit`, unit);
  }

  /** What the engine said of points, unit and level together goes with a change to any of them. */
  function clearJudged() {
    if (form.getFieldState(`${name}.pp`).error?.type === 'engine') form.clearErrors(`${name}.pp`);
  }

  return (
    <div
      role="group"
      aria-label={`${label}, as printed`}
      onChange={clearJudged}
      className="grid items-start gap-x-5 sm:grid-cols-3"
    >
      <TextField
        form={form}
        path={`${name}.pp`}
        label={label}
        numeric
        suffix="± points"
        readOnly={isReadOnly}
        maxLength={20}
        onTyped={guessUnit}
      />
      <TextField
        form={form}
        path={`${name}.unit`}
        label="Rounded to"
        numeric
        suffix="points"
        readOnly={isReadOnly}
        maxLength={20}
      />
      <TextField
        form={form}
        path={`${name}.level`}
        label="Level"
        numeric
        suffix="%"
        readOnly={isReadOnly}
        maxLength={20}
      />
    </div>
  );
}
