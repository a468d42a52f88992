'use client';

import { Checkbox } from '../../ui/checkbox';
import { Radios } from '../../ui/radios';
import { TextArea } from '../../ui/text-area';
import { TextInput } from '../../ui/text-input';
import { CHOICES, decisionName } from './decision-words';
import type { Fault } from './use-style-draft';

export type SettingProps = {
  path: string;
  value: unknown;
  faults: readonly Fault[];
  onChange: (value: unknown) => void;
  hint?: string;
};

export const fieldId = (path: string) => `decision-${path.replace(/\./g, '-')}`;
const errorOf = (faults: readonly Fault[]) =>
  faults.length > 0 ? faults.map(({ message }) => message).join(' ') : null;

export function TextSetting({ path, value, faults, onChange, hint }: SettingProps) {
  return (
    <TextInput
      id={fieldId(path)}
      label={decisionName(path)}
      hint={hint}
      error={errorOf(faults)}
      value={String((value ?? '') as string | number)}
      onChange={(event) => onChange(event.target.value)}
      fieldClassName="max-w-prose"
    />
  );
}

export function ChoiceSetting({
  path,
  value,
  faults,
  onChange,
  hint,
  offered,
}: SettingProps & { offered: string[] }) {
  return (
    <Radios
      id={fieldId(path)}
      name={path}
      label={decisionName(path)}
      hint={hint}
      error={errorOf(faults)}
      inline
      choices={offered.map((one) => ({ value: one, label: CHOICES[path]?.[one] ?? one }))}
      value={String(value as string)}
      onChange={(event) => onChange(event.target.value)}
    />
  );
}

export function YesNoSetting({ path, value, faults, onChange, hint }: SettingProps) {
  return (
    <Checkbox
      id={fieldId(path)}
      label={decisionName(path)}
      hint={hint}
      error={errorOf(faults)}
      checked={value === true}
      onChange={(event) => onChange(event.target.checked)}
    />
  );
}

/** Numbers are shown as typed; what does not read as one is sent as it stands, and refused at the field. */
export function NumberSetting({
  path,
  value,
  faults,
  onChange,
  hint,
  factor = 1,
  suffix,
  mayBeEmpty,
}: SettingProps & { factor?: number; suffix?: string; mayBeEmpty?: boolean }) {
  const shown =
    typeof value === 'number' ? String(Number((value * factor).toFixed(6))) : String((value ?? '') as string);
  const read = (text: string): unknown => {
    if (text.trim() === '') return mayBeEmpty ? null : text;
    const number = Number(text.replace(',', '.'));
    return Number.isFinite(number) && !/[.,]$/.test(text) ? Number((number / factor).toFixed(8)) : text;
  };
  return (
    <TextInput
      id={fieldId(path)}
      label={decisionName(path)}
      hint={hint}
      error={errorOf(faults)}
      numeric
      suffix={suffix}
      value={shown}
      onChange={(event) => onChange(read(event.target.value))}
      fieldClassName="max-w-64"
    />
  );
}

/** A range as two numbers with a word between, in one field: "1.2 to 2". */
export function RangeSetting({ path, value, faults, onChange, hint }: SettingProps) {
  const shown = Array.isArray(value) ? value.join(' to ') : String((value ?? '') as string);
  const read = (text: string): unknown => {
    const ends = text
      .split(/\s*(?:to|–|-)\s*/)
      .map((end) => (end === '' ? NaN : Number(end.replace(',', '.'))));
    return ends.length === 2 && ends.every(Number.isFinite) && !/[.,]$/.test(text) ? ends : text;
  };
  return (
    <TextInput
      id={fieldId(path)}
      label={decisionName(path)}
      hint={hint ?? 'Low end to high end, such as 1.2 to 2.'}
      error={errorOf(faults)}
      value={shown}
      onChange={(event) => onChange(read(event.target.value))}
      fieldClassName="max-w-64"
    />
  );
}

/** A list, one entry a line. Empty lines are kept while typing and not sent. */
export function ListSetting({
  path,
  value,
  faults,
  onChange,
  hint,
  text,
  onText,
  read = (line) => line,
}: SettingProps & { text: string; onText: (text: string) => void; read?: (line: string) => unknown }) {
  return (
    <TextArea
      id={fieldId(path)}
      label={decisionName(path)}
      hint={hint ?? 'One a line.'}
      error={errorOf(faults)}
      rows={Math.max(3, Array.isArray(value) ? value.length : 3)}
      value={text}
      onChange={(event) => {
        onText(event.target.value);
        const lines = event.target.value.split('\n').map((line) => line.trim());
        onChange(lines.filter((line) => line !== '').map(read));
      }}
      fieldClassName="max-w-prose"
    />
  );
}
