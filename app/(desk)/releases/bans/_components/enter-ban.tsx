'use client';

import { useRouter } from 'next/navigation';
import type { FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { ErrorSummary } from '@/components/ui/error-summary';
import { SectionHeading } from '@/components/ui/section-heading';
import { Select } from '@/components/ui/select';
import { TextArea } from '@/components/ui/text-area';
import { TextInput } from '@/components/ui/text-input';
import { BANNED_FIGURES, BANNED_FIGURES_NAMES } from '@/lib/domain/bans';
import type { ActionResult } from '@/lib/errors';
import { faultsOf, useAction } from '../../../../_components/use-action';

const IDS = {
  jurisdiction: 'ban-place',
  raceId: 'ban-race',
  bars: 'ban-bars',
  fromLocal: 'ban-from',
  toLocal: 'ban-to',
  zone: 'ban-zone',
  rule: 'ban-rule',
};
const EVERY = '';

/** An editor writes down a ban as the newsroom read its law. */
export function EnterBan({
  races,
  zone,
  enter,
}: {
  races: readonly { id: string; name: string }[];
  zone: string;
  enter: (input: unknown) => Promise<ActionResult<{ id: string }>>;
}) {
  const router = useRouter();
  const { run, isPending, failure, attempt } = useAction(enter);
  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = event.currentTarget;
    const given = Object.fromEntries(new FormData(form));
    const result = await run({ ...given, raceId: given.raceId === EVERY ? null : given.raceId });
    if (!result.ok) return;
    form.reset();
    router.refresh();
  };
  const field = (name: keyof typeof IDS) => ({ id: IDS[name], name, error: failure?.fields[name] });
  return (
    <section aria-labelledby="enter-ban" className="mt-9 max-w-form">
      <SectionHeading id="enter-ban">Enter a ban</SectionHeading>
      <form method="post" noValidate onSubmit={submit}>
        <ErrorSummary faults={faultsOf(failure, IDS)} attempt={attempt} title="No ban was entered" />
        <TextInput
          {...field('jurisdiction')}
          label="Place"
          hint="A state, a province, a town."
          maxLength={120}
        />
        <Select {...field('raceId')} label="Race">
          <option value={EVERY}>Every race that ends in a vote</option>
          {races.map((race) => (
            <option key={race.id} value={race.id}>
              {race.name}
            </option>
          ))}
        </Select>
        <Select
          {...field('bars')}
          label="What is barred"
          choices={BANNED_FIGURES.map((value) => ({ value, label: BANNED_FIGURES_NAMES[value] }))}
        />
        <div className="flex flex-wrap gap-x-5">
          <TextInput {...field('fromLocal')} type="datetime-local" label="From" />
          <TextInput
            {...field('toLocal')}
            type="datetime-local"
            label="To"
            hint="The first minute that is free again."
          />
          <TextInput {...field('zone')} label="Time zone" defaultValue={zone} maxLength={64} />
        </div>
        <TextArea
          {...field('rule')}
          label="The rule"
          hint="Name the law or the order, and who of the newsroom or its lawyers read it."
          maxLength={1000}
        />
        <Button type="submit" tone="primary" pending={isPending} pendingLabel="Entering…">
          Enter the ban
        </Button>
      </form>
    </section>
  );
}
