import type { ReactNode } from 'react';
import { classNames } from './class-names';

export type FieldWords = { label: ReactNode; hint?: ReactNode; error?: string | null };

type FieldProps = FieldWords & {
  id: string;
  /** The label is read aloud only: where a table column or heading already shows it. */
  hideLabel?: boolean;
  optional?: boolean;
  className?: string;
  children: ReactNode;
};

/** Ids of hint and error, for the control's aria-describedby. */
export function describedBy(id: string, { hint, error }: Pick<FieldWords, 'hint' | 'error'>, more?: string) {
  const ids = [more, hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter(Boolean);
  return ids.length > 0 ? ids.join(' ') : undefined;
}

/** Label, hint, control, error: in this order for eye and ear. */
export function Field({ id, label, hint, error, hideLabel, optional, className, children }: FieldProps) {
  return (
    <div className={classNames('field', error ? 'field-wrong' : null, className)}>
      <label htmlFor={id} className={hideLabel ? 'sr-only' : 'field-label'}>
        {label}
        {optional ? <span className="field-optional"> optional</span> : null}
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="field-hint">
          {hint}
        </p>
      ) : null}
      {children}
      <FieldError id={id} error={error} />
    </div>
  );
}

export function FieldError({ id, error }: { id: string; error?: string | null }) {
  if (!error) return null;
  return (
    <p id={`${id}-error`} className="field-error">
      <span className="sr-only">Error: </span>
      {error}
    </p>
  );
}
