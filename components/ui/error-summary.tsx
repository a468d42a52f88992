'use client';

import { useEffect, useRef } from 'react';

export type FieldFault = {
  message: string;
  /** Id of the control, if the fault has one. */ fieldId?: string;
};

/**
 * Everything that is wrong, on top of the form. Takes focus when it appears and whenever `attempt` changes, so
 * that a second failed submit is announced too.
 */
export function ErrorSummary({
  faults,
  title = 'Something needs another look',
  attempt = 0,
}: {
  faults: readonly FieldFault[];
  title?: string;
  attempt?: number;
}) {
  const box = useRef<HTMLDivElement>(null);
  const isShown = faults.length > 0;

  useEffect(() => {
    if (isShown) box.current?.focus();
  }, [isShown, attempt]);

  if (!isShown) return null;
  return (
    <div ref={box} tabIndex={-1} role="group" aria-labelledby="error-summary-title" className="error-summary">
      <h2 id="error-summary-title" className="text-18 font-semibold">
        {title}
      </h2>
      <ul>
        {faults.map(({ message, fieldId }) => (
          <li key={`${fieldId ?? ''} ${message}`}>
            {fieldId ? (
              <a href={`#${fieldId}`} onClick={(event) => focusField(event, fieldId)}>
                {message}
              </a>
            ) : (
              message
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}

/** A link to a hash only scrolls; the writer wants the cursor in the field. */
function focusField(event: { preventDefault(): void }, fieldId: string) {
  const field = document.getElementById(fieldId);
  if (!field) return;
  event.preventDefault();
  field.focus();
  field.scrollIntoView({ block: 'center' });
}
