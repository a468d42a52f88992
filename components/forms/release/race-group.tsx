'use client';

import { useRef } from 'react';
import { Controller, get, useFormState, useWatch } from 'react-hook-form';
import { RACE_KIND_NAMES, RACE_KINDS } from '@/lib/domain/vocabulary';
import { Select } from '../../ui/select';
import { TextArea } from '../../ui/text-area';
import { TextInput } from '../../ui/text-input';
import { choicesOf } from './choices-of';
import { fieldId, messageOf } from './field-path';
import { ChoiceField, Group, type InForm, Row, TextField } from './fields';
import type { RaceChoice } from './form-choices';
import { blankRace, blankShare, type NewRace } from './form-values';
import { useFault } from './live';
import { ThresholdRows } from './threshold-rows';

const ADD = 'add';

/** Which contest or series it is: one on file, or one added here. */
export function RaceGroup({ form, races }: InForm & { races: readonly RaceChoice[] }) {
  const race = useWatch({ control: form.control, name: 'race' });
  const error = useFault(form.control, 'race.id');
  const kept = useRef<NewRace>(blankRace());
  const isNew = race.kind === 'new';

  function choose(value: string) {
    const current = form.getValues('race');
    if (current.kind === 'new') kept.current = current.race;
    if (value === ADD) form.setValue('race', { kind: 'new', race: kept.current });
    else {
      form.setValue('race', { kind: 'existing', id: value });
      offerOptions(races.find((one) => one.id === value)?.options ?? []);
    }
    form.clearErrors('race');
  }

  /** Names of the options come with the race, unless figures were typed already: those are never taken away. */
  function offerOptions(names: readonly string[]) {
    const rows = form.getValues('shares');
    const isUntouched = rows.every((row) => row.printed.trim() === '' && !row.notDisclosed);
    if (names.length > 0 && isUntouched) form.setValue('shares', names.map(blankShare));
  }

  return (
    <Group title="Race">
      <Select
        id={fieldId('race.id')}
        label="Race"
        hint="One contest, or one question series that is asked again and again."
        error={error}
        empty="Choose a race"
        choices={[...races.map(({ id, name }) => ({ value: id, label: name })), ADDED]}
        value={isNew ? ADD : race.id}
        onChange={(event) => choose(event.target.value)}
        name="race"
      />
      {isNew ? (
        <div className="border-l-2 border-rule pl-4">
          <Row>
            <TextField form={form} path="race.race.name" label="Name of the race" maxLength={120} />
            <ChoiceField
              form={form}
              path="race.race.kind"
              label="Kind"
              choices={choicesOf(RACE_KINDS, RACE_KIND_NAMES)}
            />
          </Row>
          <RaceOptions form={form} onSettled={offerOptions} />
          <ThresholdRows form={form} />
        </div>
      ) : null}
    </Group>
  );
}

/** The race of a release that is on file: it stays. */
export function FixedRace({ form, races }: InForm & { races: readonly RaceChoice[] }) {
  const race = useWatch({ control: form.control, name: 'race' });
  const error = useFault(form.control, 'race.id');
  const name = race.kind === 'existing' ? races.find(({ id }) => id === race.id)?.name : race.race.name;
  return (
    <Group title="Race">
      <TextInput
        id={fieldId('race.id')}
        label="Race"
        hint="A release stays with its race. Log it anew for another one."
        error={error}
        value={name ?? ''}
        readOnly
      />
    </Group>
  );
}

const ADDED = { value: ADD, label: 'Add a race…' };

function RaceOptions({ form, onSettled }: InForm & { onSettled: (names: string[]) => void }) {
  const whole = useFault(form.control, 'race.race.options');
  const { errors } = useFormState({ control: form.control });
  const lines: unknown = get(errors, 'race.race.options');
  const ofLine = Array.isArray(lines) ? lines.map(messageOf).find(Boolean) : undefined;
  return (
    <Controller
      control={form.control}
      name="race.race.options"
      render={({ field }) => (
        <TextArea
          id={fieldId('race.race.options')}
          ref={field.ref}
          name={field.name}
          label="Answer options"
          hint="One a line, as the releases name them. Leave out don’t know and the like."
          error={whole ?? ofLine}
          rows={4}
          value={(field.value ?? []).join('\n')}
          onChange={(event) => field.onChange(event.target.value.split('\n'))}
          onBlur={() => {
            field.onBlur();
            onSettled((field.value ?? []).map((name) => name.trim()).filter(Boolean));
          }}
        />
      )}
    />
  );
}
