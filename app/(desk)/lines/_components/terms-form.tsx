'use client';

import { useRouter } from 'next/navigation';
import type { FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Details } from '@/components/ui/details';
import { ErrorSummary } from '@/components/ui/error-summary';
import { TextInput } from '@/components/ui/text-input';
import type { ActionResult } from '@/lib/errors';
import type { DeskView } from '@/lib/services/sheet/desk-view';
import { faultsOf, useAction } from '../../../_components/use-action';
import { wantedWords } from './work-marks';

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
  now,
  set,
}: {
  id: string;
  desk: DeskView;
  zone: string;
  now: number;
  set: SetTerms;
}) {
  const router = useRouter();
  const { run, isPending, failure, attempt } = useAction(set);
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
    <section aria-label="When it is wanted" className="mt-6">
      <p>{desk.wanted ? wantedWords(desk.wanted, now) : 'No time is set by which it is wanted.'}</p>
      {desk.maySetTerms ? (
        <Details summary="Set when it is wanted and how long it keeps" className="mt-1">
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
        </Details>
      ) : null}
    </section>
  );
}
