'use client';

import type { ComponentProps, ReactNode } from 'react';
import { type FieldPath, type UseFormReturn, useWatch } from 'react-hook-form';
import { Checkbox } from '../../ui/checkbox';
import { type Choice, Select } from '../../ui/select';
import { TextArea } from '../../ui/text-area';
import { TextInput } from '../../ui/text-input';
import { fieldId } from './field-path';
import type { ReleaseForm } from './form-values';
import { useFault } from './live';

export type Form = UseFormReturn<ReleaseForm>;
export type InForm = { form: Form };

type Path = FieldPath<ReleaseForm>;
type Words = { label: ReactNode; hint?: ReactNode; optional?: boolean; hideLabel?: boolean };
type FieldProps = InForm & Words & { path: Path };

type TextFieldProps = FieldProps &
  Omit<ComponentProps<typeof TextInput>, 'id' | 'form' | 'onChange'> & { onTyped?: (text: string) => void };

/** A text field of the form, with its faults. */
export function TextField({ form, path, onTyped, ...rest }: TextFieldProps) {
  const error = useFault(form.control, path);
  const registered = form.register(
    path,
    onTyped ? { onChange: (event: { target: { value: string } }) => onTyped(event.target.value) } : undefined,
  );
  return <TextInput autoComplete="off" {...rest} {...registered} id={fieldId(path)} error={error} />;
}

type AreaFieldProps = FieldProps & Omit<ComponentProps<typeof TextArea>, 'id' | 'form'>;

export function AreaField({ form, path, ...rest }: AreaFieldProps) {
  const error = useFault(form.control, path);
  return <TextArea {...rest} {...form.register(path)} id={fieldId(path)} error={error} />;
}

type ChoiceFieldProps = FieldProps & { choices: readonly Choice[]; empty?: string; onChoice?: () => void };

export function ChoiceField({ form, path, onChoice, ...rest }: ChoiceFieldProps) {
  const error = useFault(form.control, path);
  const registered = form.register(path, onChoice ? { onChange: onChoice } : undefined);
  return <Select {...rest} {...registered} id={fieldId(path)} error={error} />;
}

export type WithheldName = 'sponsor' | 'population' | 'mode' | 'n' | 'statedMargin' | 'wording' | 'sourceUrl';

/**
 * A particular that a pollster can withhold. "Not disclosed" is an answer of its own: what was typed stays, cannot
 * be typed over, and is not counted.
 */
export function Withholdable({
  form,
  name,
  what,
  children,
}: InForm & {
  name: WithheldName;
  /** Read aloud after "Not disclosed". */
  what: string;
  children: (isWithheld: boolean) => ReactNode;
}) {
  const path = `${name}.notDisclosed` as const;
  const isWithheld = useWatch({ control: form.control, name: path });
  return (
    <div className="min-w-0">
      {children(isWithheld)}
      <Checkbox
        {...form.register(path)}
        id={fieldId(path)}
        label={
          <>
            Not disclosed <span className="sr-only">({what})</span>
          </>
        }
        className="-mt-3 text-13"
      />
    </div>
  );
}

/** A list that a pollster can withhold; choosing from it takes the mark off. */
export function WithheldChoice({
  form,
  name,
  what,
  ...rest
}: Omit<ChoiceFieldProps, 'path'> & { name: 'population' | 'mode'; what: string }) {
  return (
    <Withholdable form={form} name={name} what={what}>
      {(isWithheld) => (
        <ChoiceField
          {...rest}
          form={form}
          path={`${name}.value`}
          empty={isWithheld ? 'Not disclosed' : 'Not entered'}
          onChoice={() => form.setValue(`${name}.notDisclosed`, false)}
        />
      )}
    </Withholdable>
  );
}

/** One group of the form. */
export function Group({ title, hint, children }: { title: string; hint?: ReactNode; children: ReactNode }) {
  return (
    <fieldset className="mb-6 min-w-0 border-t border-rule pt-3">
      <legend className="float-left mb-2 w-full text-18 font-semibold">{title}</legend>
      <div className="clear-both">
        {hint ? <p className="mb-3 max-w-prose text-13 text-soft">{hint}</p> : null}
        {children}
      </div>
    </fieldset>
  );
}

/** Fields side by side where there is room. */
export function Row({ children }: { children: ReactNode }) {
  return <div className="grid gap-x-5 sm:grid-cols-2">{children}</div>;
}
