import Link from 'next/link';
import type { ReactNode } from 'react';
import { EvidencePanel } from '@/components/lines/evidence-panel';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { evidenceOf } from './written-lines';

/** Words at the left, what they rest on at the right, staying in sight while the words are read. */
export function SheetColumns({ view, children }: { view: SheetView; children: ReactNode }) {
  return (
    <div className="mt-5 grid gap-x-10 gap-y-6 lg:grid-cols-2 [&_:is(a,button,summary,textarea)]:scroll-mb-28">
      <div className="min-w-0">{children}</div>
      <div className="min-w-0">
        <EvidencePanel
          evidence={evidenceOf(view)}
          action={<Link href={`/releases/${view.evidence.release.releaseId}`}>Open the release</Link>}
        />
      </div>
    </div>
  );
}
