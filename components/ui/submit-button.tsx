'use client';

import type { ComponentProps } from 'react';
import { useFormStatus } from 'react-dom';
import { Button } from './button';

/** The button of a form whose action is awaited: pending while it runs. */
export function SubmitButton({ pending, ...rest }: ComponentProps<typeof Button>) {
  const status = useFormStatus();
  return <Button {...rest} type="submit" pending={pending || status.pending} />;
}
