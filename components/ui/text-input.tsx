import type { ComponentProps } from 'react';
import { classNames } from './class-names';
import { describedBy, Field, type FieldWords } from './field';

type TextInputProps = Omit<ComponentProps<'input'>, 'id'> &
  FieldWords & {
    id: string;
    hideLabel?: boolean;
    optional?: boolean;
    /** Figures: right-aligned, tabular. */
    numeric?: boolean;
    /** A unit after the control, such as % or points. */
    suffix?: string;
    fieldClassName?: string;
  };

export function TextInput({
  id,
  label,
  hint,
  error,
  hideLabel,
  optional,
  numeric,
  suffix,
  className,
  fieldClassName,
  'aria-describedby': more,
  ...rest
}: TextInputProps) {
  const control = (
    <input
      inputMode={numeric ? 'decimal' : undefined}
      {...rest}
      id={id}
      className={classNames('control', numeric ? 'control-numeric' : null, className)}
      aria-invalid={error ? true : undefined}
      aria-describedby={describedBy(id, { hint, error }, more)}
    />
  );
  return (
    <Field {...{ id, label, hint, error, hideLabel, optional }} className={fieldClassName}>
      {suffix ? (
        <span className="control-row">
          {control}
          <span className="control-suffix">{suffix}</span>
        </span>
      ) : (
        control
      )}
    </Field>
  );
}
