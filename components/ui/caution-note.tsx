import type { ReactNode } from 'react';

/** Something that can mislead readers if it is overlooked. The one place for the caution colour besides verdicts. */
export function CautionNote({ title, children }: { title?: ReactNode; children: ReactNode }) {
  return (
    <div className="caution-note" role="note">
      {title ? <p className="font-semibold">{title}</p> : null}
      {children}
    </div>
  );
}
