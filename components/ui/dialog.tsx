'use client';

import { useEffect, useId, useRef, type ReactNode } from 'react';

/**
 * A native modal dialog. Escape and the closing button call `onClose`; focus goes back to what opened it.
 * Put the buttons of a decision into the children's form.
 */
export function Dialog({
  isOpen,
  onClose,
  title,
  children,
  closeLabel = 'Close',
}: {
  isOpen: boolean;
  onClose: () => void;
  title: string;
  children: ReactNode;
  closeLabel?: string;
}) {
  const dialog = useRef<HTMLDialogElement>(null);
  const opener = useRef<Element | null>(null);
  const titleId = useId();

  useEffect(() => {
    const element = dialog.current;
    if (!element) return;
    if (isOpen && !element.open) {
      opener.current = document.activeElement;
      element.showModal();
    } else if (!isOpen && element.open) {
      element.close();
      if (opener.current instanceof HTMLElement) opener.current.focus();
    }
  }, [isOpen]);

  return (
    <dialog
      ref={dialog}
      className="dialog"
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
    >
      <div className="dialog-head">
        <h2 id={titleId} className="text-18 font-semibold">
          {title}
        </h2>
        <button type="button" className="dialog-close" onClick={onClose} aria-label={closeLabel}>
          <svg aria-hidden="true" viewBox="0 0 14 14" width="14" height="14">
            <path d="M2 2L12 12M12 2L2 12" />
          </svg>
        </button>
      </div>
      {isOpen ? children : null}
    </dialog>
  );
}
