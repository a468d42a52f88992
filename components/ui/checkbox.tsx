import type { ComponentProps } from 'react';
import { classNames } from './class-names';
import { describedBy, FieldError, type FieldWords } from './field';

type CheckboxProps = Omit<ComponentProps<'input'>, 'id' | 'type'> & FieldWords & { id: string };

/** One yes-or-no. Label to the right; the whole line is the target. */
export function Checkbox({ id, label, hint, error, className, ...rest }: CheckboxProps) {
  return (
    <div className={classNames('field', error ? 'field-wrong' : null, className)}>
      <label htmlFor={id} className="tick-line">
        <input
          {...rest}
          id={id}
          type="checkbox"
          className="tick-box"
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(id, { hint, error })}
        />
        <span>{label}</span>
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="field-hint tick-hint">
          {hint}
        </p>
      ) : null}
      <FieldError id={id} error={error} />
    </div>
  );
}
