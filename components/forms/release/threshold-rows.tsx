'use client';

import { useFieldArray, useWatch } from 'react-hook-form';
import { THRESHOLD_BASE_NAMES, THRESHOLD_BASES } from '@/lib/domain/vocabulary';
import { Button } from '../../ui/button';
import { choicesOf } from './choices-of';
import { ChoiceField, type InForm, TextField } from './fields';

const MAX = 10;

/** Rules that the race has, such as a majority or an entry hurdle, each on the base that the rule counts. */
export function ThresholdRows({ form }: InForm) {
  const { fields, append, remove } = useFieldArray({ control: form.control, name: 'race.race.thresholds' });
  const options = (useWatch({ control: form.control, name: 'race.race.options' }) ?? [])
    .map((name) => name.trim())
    .filter(Boolean);
  return (
    <fieldset className="mb-4 min-w-0">
      <legend className="field-label">
        Thresholds <span className="field-optional">optional</span>
      </legend>
      <p className="field-hint">
        A majority or an entry hurdle of the race’s own rules. It is tested only where the shares count what
        the rule counts.
      </p>
      {fields.map((row, at) => (
        <div
          key={row.id}
          role="group"
          aria-label={`Threshold ${at + 1}`}
          className="grid items-end gap-x-4 sm:grid-cols-[1fr_6rem_1fr_auto]"
        >
          <ChoiceField
            form={form}
            path={`race.race.thresholds.${at}.option`}
            label="Option"
            empty="Choose"
            choices={options.map((name) => ({ value: name, label: name }))}
          />
          <TextField
            form={form}
            path={`race.race.thresholds.${at}.pct`}
            label="Threshold"
            numeric
            suffix="%"
            maxLength={20}
          />
          <ChoiceField
            form={form}
            path={`race.race.thresholds.${at}.base`}
            label="Of"
            choices={choicesOf(THRESHOLD_BASES, THRESHOLD_BASE_NAMES)}
          />
          <Button className="mb-4" onClick={() => remove(at)} aria-label={`Remove threshold ${at + 1}`}>
            Remove
          </Button>
        </div>
      ))}
      {fields.length < MAX ? (
        <Button onClick={() => append({ option: '', pct: '', base: 'valid-votes' })}>Add a threshold</Button>
      ) : null}
    </fieldset>
  );
}
