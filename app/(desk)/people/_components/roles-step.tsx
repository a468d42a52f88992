'use client';

import type { FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { ErrorSummary } from '@/components/ui/error-summary';
import { SectionHeading } from '@/components/ui/section-heading';
import type { ActionResult } from '@/lib/errors';
import { faultsOf, useAction } from '../../../_components/use-action';
import type { PersonRow } from './person-row';
import { RoleChoice, rolesIn } from './role-choice';

type Props = {
  person: PersonRow;
  setRoles: (roles: string[]) => Promise<ActionResult<void>>;
  onDone: () => void;
  onRenew: () => void;
  onSwitch: () => void;
};

export function RolesStep({ person, setRoles, onDone, onRenew, onSwitch }: Props) {
  const { run, isPending, failure, attempt } = useAction(setRoles);
  const id = `roles-${person.id}`;

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    if ((await run(rolesIn(new FormData(event.currentTarget)))).ok) onDone();
  };

  return (
    <>
      <form method="post" noValidate onSubmit={submit}>
        <ErrorSummary
          faults={faultsOf(failure, { roles: id })}
          attempt={attempt}
          title="Nothing was changed"
        />
        <RoleChoice id={id} held={person.roles} error={failure?.fields.roles} />
        <Button type="submit" tone="primary" pending={isPending} pendingLabel="Saving…">
          Save the roles
        </Button>
        <p className="field-hint mt-2">They count from this person’s next request on.</p>
      </form>
      <div className="mt-5 border-t border-rule pt-3">
        <SectionHeading>Signing in</SectionHeading>
        <div className="mt-2 flex flex-wrap gap-3">
          <Button onClick={onRenew}>New sign-in code…</Button>
          <Button tone={person.state === 'disabled' ? 'plain' : 'caution'} onClick={onSwitch}>
            {person.state === 'disabled' ? 'Enable…' : 'Disable…'}
          </Button>
        </div>
      </div>
    </>
  );
}
