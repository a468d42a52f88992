'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { loadPage } from '../../../_components/load-page';
import { ConfirmStep } from './confirm-step';
import type { PersonActions, PersonRow } from './person-row';
import { RolesStep } from './roles-step';
import { SignInCode } from './sign-in-code';

type Step = { is: 'roles' | 'disable' | 'enable' | 'renew' } | { is: 'code'; code: string };

/** Everything that can be done with one person, one decision at a time. */
export function ChangePerson({ person, actions }: { person: PersonRow; actions: PersonActions }) {
  const router = useRouter();
  const [step, setStep] = useState<Step | null>(null);

  const close = () => setStep(null);
  const reread = () => (person.isSelf ? loadPage('/') : router.refresh());
  const done = () => {
    close();
    reread();
  };
  const target = { id: person.id, version: person.version };
  const back = () => setStep({ is: 'roles' });

  return (
    <>
      <Button onClick={() => setStep({ is: 'roles' })}>
        Change<span className="sr-only"> {person.name}</span>
      </Button>
      <Dialog
        isOpen={step !== null}
        onClose={step?.is === 'code' ? done : close}
        title={titleOf(step, person.name)}
      >
        {step?.is === 'roles' ? (
          <RolesStep
            person={person}
            setRoles={(roles) => actions.setRoles({ ...target, roles })}
            onDone={done}
            onRenew={() => setStep({ is: 'renew' })}
            onSwitch={() => setStep({ is: person.state === 'disabled' ? 'enable' : 'disable' })}
          />
        ) : null}
        {step?.is === 'disable' ? (
          <ConfirmStep
            onBack={back}
            act={() => actions.setDisabled({ ...target, disabled: true })}
            onDone={done}
            label={`Disable ${person.name}`}
            isCaution
          >
            Every session of {person.name} ends at once, and signing in is refused until somebody enables the
            account again. What {person.name} logged, filed and cleared stays as it is.
          </ConfirmStep>
        ) : null}
        {step?.is === 'enable' ? (
          <ConfirmStep
            onBack={back}
            act={() => actions.setDisabled({ ...target, disabled: false })}
            onDone={done}
            label={`Enable ${person.name}`}
          >
            {person.name} can sign in again, with the same password and the roles on the list.
          </ConfirmStep>
        ) : null}
        {step?.is === 'renew' ? (
          <ConfirmStep
            onBack={back}
            act={() => actions.renewCode(target)}
            onDone={(made) => {
              setStep({ is: 'code', code: made.code });
              if (!person.isSelf) router.refresh();
            }}
            label="Make a new code"
            isCaution
          >
            The password of {person.name} stops working and every session ends. The new code lets{' '}
            {person.name} choose another password.
          </ConfirmStep>
        ) : null}
        {step?.is === 'code' ? <SignInCode name={person.name} code={step.code} onClose={done} /> : null}
      </Dialog>
    </>
  );
}

function titleOf(step: Step | null, name: string): string {
  switch (step?.is) {
    case 'disable':
      return `Disable ${name}?`;
    case 'enable':
      return `Enable ${name}?`;
    case 'renew':
    case 'code':
      return `New sign-in code for ${name}`;
    default:
      return name;
  }
}
