'use client';

import { Button, type ButtonTone } from '@/components/ui/button';
import type { ActionResult } from '@/lib/errors';
import { loadPage } from '../../../_components/load-page';
import { useAction } from '../../../_components/use-action';

/** One act on a version: done at a press, then the page that shows its result. */
export function ActButton({
  act,
  input,
  label,
  tone,
  to,
}: {
  act: (input: unknown) => Promise<ActionResult<unknown>>;
  input: unknown;
  label: string;
  tone?: ButtonTone;
  /** `:id` is the id that the act answers with. */
  to: string;
}) {
  const { run, isPending, failure } = useAction(act);
  const press = async () => {
    const result = await run(input);
    if (result.ok) loadPage(to.replace(':id', idIn(result.value)));
  };
  return (
    <>
      <Button tone={tone} pending={isPending} onClick={() => void press()}>
        {label}
      </Button>
      {failure ? (
        <p role="alert" className="field-error">
          {failure.message}
        </p>
      ) : null}
    </>
  );
}

function idIn(value: unknown): string {
  return typeof value === 'object' && value !== null && 'id' in value ? String(value.id) : '';
}
