'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { ErrorSummary } from '@/components/ui/error-summary';
import { TextInput } from '@/components/ui/text-input';
import type { ActionResult } from '@/lib/errors';
import { faultsOf, useAction } from '../../../_components/use-action';
import { RoleChoice, rolesIn } from './role-choice';
import { SignInCode } from './sign-in-code';

type Input = { name: string; email: string; roles: string[] };
type Add = (input: Input) => Promise<ActionResult<{ id: string; code: string }>>;

const FIELDS = { name: 'add-name', email: 'add-email', roles: 'add-roles' };

export function AddPerson({ add }: { add: Add }) {
  const router = useRouter();
  const [isOpen, setOpen] = useState(false);
  const [made, setMade] = useState<{ name: string; code: string } | null>(null);
  const { run, isPending, failure, attempt, forget } = useAction(add);

  const close = () => {
    setOpen(false);
    setMade(null);
    forget();
  };

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    const name = String(form.get('name') ?? '').trim();
    const result = await run({ name, email: String(form.get('email') ?? ''), roles: rolesIn(form) });
    if (!result.ok) return;
    setMade({ name, code: result.value.code });
    router.refresh();
  };

  return (
    <>
      <Button tone="primary" onClick={() => setOpen(true)}>
        Add a person
      </Button>
      <Dialog isOpen={isOpen} onClose={close} title={made ? `${made.name} is on the list` : 'Add a person'}>
        {made ? (
          <SignInCode name={made.name} code={made.code} onClose={close} />
        ) : (
          <form method="post" noValidate onSubmit={submit}>
            <ErrorSummary faults={faultsOf(failure, FIELDS)} attempt={attempt} title="Nobody was added" />
            <TextInput
              id="add-name"
              name="name"
              label="Name"
              hint="As it should stand beside what this person logs, files and clears."
              autoComplete="off"
              required
              maxLength={80}
              error={failure?.fields.name}
            />
            <TextInput
              id="add-email"
              name="email"
              type="email"
              label="Email"
              hint="What this person signs in with. Nothing is sent to it."
              autoComplete="off"
              autoCapitalize="none"
              spellCheck={false}
              required
              maxLength={200}
              error={failure?.fields.email}
            />
            <RoleChoice id="add-roles" held={[]} error={failure?.fields.roles} />
            <Button type="submit" tone="primary" pending={isPending} pendingLabel="Adding…">
              Add and show the code
            </Button>
          </form>
        )}
      </Dialog>
    </>
  );
}
