import type { ComponentProps, ReactNode } from 'react';
import { classNames } from './class-names';
import { describedBy, FieldError, type FieldWords } from './field';

export type RadioChoice = { value: string; label: ReactNode; hint?: ReactNode };

type RadiosProps = Omit<ComponentProps<'input'>, 'id' | 'type' | 'value' | 'defaultValue'> &
  FieldWords & {
    /** Id of the group; the first choice carries it, so that an error summary can lead there. */
    id: string;
    name: string;
    choices: readonly RadioChoice[];
    value?: string;
    defaultValue?: string;
    /** Side by side where there is room. */
    inline?: boolean;
  };

export function Radios({
  id,
  name,
  label,
  hint,
  error,
  choices,
  value,
  defaultValue,
  inline,
  className,
  ...rest
}: RadiosProps) {
  return (
    <fieldset
      className={classNames('field', error ? 'field-wrong' : null, className)}
      aria-describedby={describedBy(id, { hint, error })}
    >
      <legend className="field-label">{label}</legend>
      {hint ? (
        <p id={`${id}-hint`} className="field-hint">
          {hint}
        </p>
      ) : null}
      <div className={inline ? 'radios radios-inline' : 'radios'}>
        {choices.map((choice, at) => {
          const choiceId = at === 0 ? id : `${id}-${at}`;
          return (
            <div key={choice.value}>
              <label htmlFor={choiceId} className="tick-line">
                <input
                  {...rest}
                  id={choiceId}
                  type="radio"
                  name={name}
                  value={choice.value}
                  checked={value === undefined ? undefined : value === choice.value}
                  defaultChecked={defaultValue === undefined ? undefined : defaultValue === choice.value}
                  className="tick-box"
                  aria-describedby={choice.hint ? `${choiceId}-about` : undefined}
                />
                <span>{choice.label}</span>
              </label>
              {choice.hint ? (
                <p id={`${choiceId}-about`} className="field-hint tick-hint">
                  {choice.hint}
                </p>
              ) : null}
            </div>
          );
        })}
      </div>
      <FieldError id={id} error={error} />
    </fieldset>
  );
}
