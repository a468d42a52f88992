import type { ComponentProps } from 'react';
import { classNames } from './class-names';
import { describedBy, Field, type FieldWords } from './field';

export type Choice = { value: string; label: string };

type SelectProps = Omit<ComponentProps<'select'>, 'id'> &
  FieldWords & {
    id: string;
    /** The choices, or <option> children instead. */
    choices?: readonly Choice[];
    /** An empty first choice, such as "Choose a race". */
    empty?: string;
    hideLabel?: boolean;
    optional?: boolean;
    fieldClassName?: string;
  };

export function Select({
  id,
  label,
  hint,
  error,
  choices,
  empty,
  hideLabel,
  optional,
  className,
  fieldClassName,
  children,
  'aria-describedby': more,
  ...rest
}: SelectProps) {
  return (
    <Field {...{ id, label, hint, error, hideLabel, optional }} className={fieldClassName}>
      <select
        {...rest}
        id={id}
        className={classNames('control control-select', className)}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, { hint, error }, more)}
      >
        {empty === undefined ? null : <option value="">{empty}</option>}
        {choices?.map((choice) => (
          <option key={choice.value} value={choice.value}>
            {choice.label}
          </option>
        ))}
        {children}
      </select>
    </Field>
  );
}
