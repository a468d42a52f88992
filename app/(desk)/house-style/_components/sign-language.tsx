'use client';

import { useState } from 'react';
import { LANGUAGE_NAMES } from '@/components/forms/house-style/decision-words';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/checkbox';
import { Dialog } from '@/components/ui/dialog';
import type { ActionResult } from '@/lib/errors';
import { loadPage } from '../../../_components/load-page';
import { useAction } from '../../../_components/use-action';

type Act = (input: unknown) => Promise<ActionResult<unknown>>;

/** A native editor vouches for a language's sentences, or takes that back. */
export function SignLanguage({
  language,
  packHash,
  isSigned,
  sign,
  withdraw,
}: {
  language: string;
  packHash: string;
  isSigned: boolean;
  sign: Act;
  withdraw: Act;
}) {
  const [isOpen, setOpen] = useState(false);
  const [isNative, setNative] = useState(false);
  const { run, isPending, failure, forget } = useAction(isSigned ? withdraw : sign);
  const name = LANGUAGE_NAMES[language] ?? language;
  const close = () => {
    setOpen(false);
    forget();
  };
  const submit = async () => {
    const result = await run(isSigned ? { language, packHash } : { language, packHash, isNative });
    if (result.ok) loadPage('/house-style');
  };
  return (
    <>
      <Button onClick={() => setOpen(true)}>
        {isSigned ? `Withdraw signature: ${name}` : `Sign ${name}`}
      </Button>
      <Dialog
        isOpen={isOpen}
        onClose={close}
        title={isSigned ? `Withdraw the signature of ${name}?` : `Sign the sentences of ${name}?`}
      >
        {failure ? <p role="alert">{Object.values(failure.fields)[0] ?? failure.message}</p> : null}
        {isSigned ? (
          <p className="mb-4">Sheets in {name} can be drafted and not cleared from now on.</p>
        ) : (
          <Checkbox
            id={`native-${language}`}
            label={`I read ${name} as a native and have read its sentences in this version.`}
            checked={isNative}
            onChange={(event) => setNative(event.target.checked)}
          />
        )}
        <div className="flex flex-wrap gap-3">
          <Button onClick={close}>Back</Button>
          <Button tone="primary" pending={isPending} onClick={() => void submit()}>
            {isSigned ? 'Withdraw' : 'Sign'}
          </Button>
        </div>
      </Dialog>
    </>
  );
}
