import type { ReactNode } from 'react';
import { NextBar } from '@/components/ui/next-bar';

/** The one thing to do next with a sheet, in reach however long its lines are. */
export function ActBar({ children, actions }: { children: ReactNode; actions?: ReactNode }) {
  return (
    <div className="bottom-0 z-10 bg-paper md:sticky print:static! [&_.next-bar]:mb-0">
      <NextBar actions={actions}>{children}</NextBar>
    </div>
  );
}
