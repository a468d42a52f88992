'use client';

import { type ReactNode, useMemo } from 'react';
import { useWatch } from 'react-hook-form';
import { Checkbox } from '../../ui/checkbox';
import { fieldId } from './field-path';
import { Group, type InForm, TextField } from './fields';

/** When people were asked, when it comes out, and until when it is held. */
export function DatesGroup({ form, children }: InForm & { children: ReactNode }) {
  return (
    <Group title="Dates">
      <div className="grid gap-x-5 sm:grid-cols-3">
        <TextField form={form} path="fieldStartOn" label="First day of interviews" type="date" />
        <TextField form={form} path="fieldEndOn" label="Last day of interviews" type="date" />
        <TextField form={form} path="publishedOn" label="Publication date" type="date" />
      </div>
      {children}
    </Group>
  );
}

/** Until when a new release is held, where it is. */
export function EmbargoFields({ form, zone }: InForm & { zone: string }) {
  const isHeld = useWatch({ control: form.control, name: 'embargo' }) !== null;
  return (
    <>
      <Checkbox
        id={fieldId('embargo.on')}
        label="Under embargo"
        checked={isHeld}
        onChange={(event) => form.setValue('embargo', event.target.checked ? { local: '', zone } : null)}
      />
      {isHeld ? <Embargo form={form} /> : null}
    </>
  );
}

function Embargo({ form }: InForm) {
  const zones = useMemo(() => ['UTC', ...Intl.supportedValuesOf('timeZone')], []);
  return (
    <div className="grid items-start gap-x-5 border-l-2 border-rule pl-4 sm:grid-cols-2">
      <TextField
        form={form}
        path="embargo.local"
        label="Embargo ends"
        hint="Date and time on the clocks of that zone."
        type="datetime-local"
        step={1}
      />
      <TextField
        form={form}
        path="embargo.zone"
        label="Time zone"
        hint="A place, such as Etc/UTC: the release says which."
        list="time-zones"
        maxLength={64}
      />
      <datalist id="time-zones">
        {zones.map((zone) => (
          <option key={zone} value={zone} />
        ))}
      </datalist>
    </div>
  );
}
