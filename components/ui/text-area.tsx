import type { ComponentProps } from 'react';
import { classNames } from './class-names';
import { describedBy, Field, type FieldWords } from './field';

type TextAreaProps = Omit<ComponentProps<'textarea'>, 'id'> &
  FieldWords & {
    id: string;
    hideLabel?: boolean;
    optional?: boolean;
    /** Words that may be printed: set in the copy face. */
    copy?: boolean;
    fieldClassName?: string;
  };

export function TextArea({
  id,
  label,
  hint,
  error,
  hideLabel,
  optional,
  copy,
  className,
  fieldClassName,
  'aria-describedby': more,
  ...rest
}: TextAreaProps) {
  return (
    <Field {...{ id, label, hint, error, hideLabel, optional }} className={fieldClassName}>
      <textarea
        rows={3}
        {...rest}
        id={id}
        className={classNames('control', copy ? 'control-copy' : null, className)}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, { hint, error }, more)}
      />
    </Field>
  );
}
