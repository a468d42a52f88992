import type { ReactNode } from 'react';
import { classNames } from './class-names';

/** Words that may be printed, set in the copy face so that they always look like copy. */
export function CopyBlock({
  children,
  isDisplay = false,
  lang,
}: {
  children: ReactNode;
  /** Headline size. */
  isDisplay?: boolean;
  lang?: string;
}) {
  return (
    <div lang={lang} className={classNames('copy-block', isDisplay ? 'copy-block-display' : null)}>
      {children}
    </div>
  );
}
