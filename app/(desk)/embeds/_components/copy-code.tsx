'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { CopyStatus } from '@/components/ui/copy-status';
import { TextArea } from '@/components/ui/text-area';

/** The code for an article. It holds no words or figures, only the address and the title. */
export function CopyCode({ id, code }: { id: string; code: string }) {
  const [message, setMessage] = useState<string | null>(null);
  const copy = () =>
    Promise.resolve()
      .then(() => navigator.clipboard.writeText(code))
      .then(
        () => setMessage('The code is copied.'),
        () => setMessage('This browser does not let the page copy. Select the code and copy it from there.'),
      );
  return (
    <div className="mt-2 max-w-prose">
      <TextArea
        id={`code-${id}`}
        label="Code for an article"
        readOnly
        rows={3}
        value={code}
        spellCheck={false}
        className="text-13"
        fieldClassName="mb-2!"
        onFocus={(event) => event.currentTarget.select()}
      />
      <Button onClick={copy}>Copy the code</Button>
      <CopyStatus message={message} />
    </div>
  );
}
