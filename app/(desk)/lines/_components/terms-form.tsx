'use client';

import { useRouter } from 'next/navigation';
import type { FormEvent } from 'react';
import { Fold } from '@/components/lines/fold';
import { Button } from '@/components/ui/button';
import { ErrorSummary } from '@/components/ui/error-summary';
import { TextInput } from '@/components/ui/text-input';
import type { ActionResult } from '@/lib/errors';
import type { DeskView } from '@/lib/services/sheet/desk-view';
import { faultsOf, useAction } from '../../../_components/use-action';

export type SetTerms = (input: {
  id: string;
  wanted: { local: string; zone: string } | null;
  shelfDays: number | null;
}) => Promise<ActionResult<void>>;

const IDS = { 'wanted.local': 'wanted-local', 'wanted.zone': 'wanted-zone', shelfDays: 'shelf-days' };

/** When a sheet is wanted and how long it keeps: told to everybody, set by its author and editors. */
export function TermsForm({
  id,
  desk,
  zone,
  set,
}: {
  id: string;
  desk: DeskView;
  zone: string;
  set: SetTerms;
}) {
  const router = useRouter();
  const { run, isPending, failure, attempt } = useAction(set);
  if (!desk.maySetTerms) return null;
  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const given = new FormData(event.currentTarget);
    const text = (name: string) => String(given.get(name) ?? '').trim();
    const local = text('local');
    const { ok } = await run({
      id,
      wanted: local === '' ? null : { local, zone: text('zone') },
      shelfDays: text('days') === '' ? null : Number(text('days')),
    });
    if (ok) router.refresh();
  };
  return (
    <Fold id="terms" title="When it is wanted">
      <form method="post" noValidate onSubmit={submit} className="max-w-form">
        <ErrorSummary faults={faultsOf(failure, IDS)} attempt={attempt} title="Nothing was set" />
        <div className="flex flex-wrap gap-x-5">
          <TextInput
            id={IDS['wanted.local']}
            name="local"
            type="datetime-local"
            label="Wanted by"
            optional
            defaultValue={desk.wanted?.local ?? ''}
            error={failure?.fields['wanted.local']}
          />
          <TextInput
            id={IDS['wanted.zone']}
            name="zone"
            label="Time zone"
            maxLength={64}
            defaultValue={desk.wanted?.zone ?? zone}
            error={failure?.fields['wanted.zone']}
          />
          <TextInput
            id={IDS.shelfDays}
            name="days"
            label="Keeps for"
            hint="Days after the field dates; empty: as house style says."
            suffix="days"
            numeric
            optional
            defaultValue={desk.shelfDays ?? ''}
            error={failure?.fields.shelfDays}
          />
        </div>
        <Button type="submit" pending={isPending} pendingLabel="Setting…">
          Set
        </Button>
      </form>
    </Fold>
  );
}
