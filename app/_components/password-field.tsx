'use client';

import { type ComponentProps, useState } from 'react';
import { Checkbox } from '@/components/ui/checkbox';
import { TextInput } from '@/components/ui/text-input';

/** A password that may be pasted, and looked at by whoever types it. */
export function PasswordField({ id, ...rest }: Omit<ComponentProps<typeof TextInput>, 'type'>) {
  const [isShown, setShown] = useState(false);
  return (
    <>
      <TextInput
        {...rest}
        id={id}
        type={isShown ? 'text' : 'password'}
        autoCapitalize="none"
        autoCorrect="off"
        spellCheck={false}
        fieldClassName="mb-1!"
      />
      <Checkbox
        id={`${id}-shown`}
        label="Show the password"
        checked={isShown}
        onChange={(event) => setShown(event.target.checked)}
      />
    </>
  );
}
