import type { ReactNode } from 'react';

/** A band that stands over a page for as long as its condition lasts, such as an embargo. */
export function Band({ word, children, label }: { word: string; children?: ReactNode; label?: string }) {
  return (
    <aside className="band" aria-label={label ?? word}>
      <strong className="band-word">{word}</strong>
      {children ? <div>{children}</div> : null}
    </aside>
  );
}
