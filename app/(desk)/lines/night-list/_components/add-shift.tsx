'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { ErrorSummary } from '@/components/ui/error-summary';
import { SectionHeading } from '@/components/ui/section-heading';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { WEEKDAY_NAMES, WEEKDAYS } from '@/lib/domain/weekdays';
import type { ActionResult } from '@/lib/errors';
import { faultsOf, useAction } from '../../../../_components/use-action';

type Input = {
  personId: string;
  when: { weekday: number } | { onDay: string };
  fromTime: string;
  toTime: string;
  zone: string;
};

const ONE_DATE = 'date';
const IDS = {
  personId: 'shift-person',
  'when.onDay': 'shift-day',
  fromTime: 'shift-from',
  toTime: 'shift-to',
  zone: 'shift-zone',
};

/** Puts an editor on the night list. */
export function AddShift({
  editors,
  zone,
  add,
}: {
  editors: readonly { id: string; name: string }[];
  zone: string;
  add: (input: Input) => Promise<ActionResult<{ id: string }>>;
}) {
  const router = useRouter();
  const { run, isPending, failure, attempt } = useAction(add);
  const [when, setWhen] = useState('1');
  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = event.currentTarget;
    const given = new FormData(form);
    const text = (name: string) => String(given.get(name) ?? '');
    const result = await run({
      personId: text('person'),
      when: when === ONE_DATE ? { onDay: text('day') } : { weekday: Number(when) },
      fromTime: text('from'),
      toTime: text('to'),
      zone: text('zone'),
    });
    if (!result.ok) return;
    form.reset();
    setWhen('1');
    router.refresh();
  };
  const error = (field: string) => failure?.fields[field];
  return (
    <section aria-labelledby="add-shift" className="mt-8 max-w-form">
      <SectionHeading id="add-shift">Put an editor on the list</SectionHeading>
      <form method="post" noValidate onSubmit={submit}>
        <ErrorSummary faults={faultsOf(failure, IDS)} attempt={attempt} title="Nothing was put on the list" />
        <Select
          id={IDS.personId}
          name="person"
          label="Editor"
          empty="Choose"
          choices={editors.map(({ id, name }) => ({ value: id, label: name }))}
          error={error('personId')}
        />
        <div className="flex flex-wrap gap-x-5">
          <Select
            id="shift-when"
            label="When"
            value={when}
            onChange={(event) => setWhen(event.target.value)}
            choices={[
              ...WEEKDAYS.map((day) => ({ value: String(day), label: `Every ${WEEKDAY_NAMES[day]}` })),
              { value: ONE_DATE, label: 'One date' },
            ]}
          />
          {when === ONE_DATE ? (
            <TextInput
              id={IDS['when.onDay']}
              name="day"
              type="date"
              label="Date"
              error={error('when.onDay')}
            />
          ) : null}
          <TextInput
            id={IDS.fromTime}
            name="from"
            type="time"
            label="From"
            defaultValue="22:00"
            error={error('fromTime')}
          />
          <TextInput
            id={IDS.toTime}
            name="to"
            type="time"
            label="To"
            hint="The next day if it is not later."
            defaultValue="06:00"
            error={error('toTime')}
          />
          <TextInput
            id={IDS.zone}
            name="zone"
            label="Time zone"
            defaultValue={zone}
            maxLength={64}
            error={error('zone')}
          />
        </div>
        <Button type="submit" tone="primary" pending={isPending} pendingLabel="Saving…">
          Put on the list
        </Button>
      </form>
    </section>
  );
}
