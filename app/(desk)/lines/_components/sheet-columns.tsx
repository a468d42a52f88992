import Link from 'next/link';
import type { ReactNode } from 'react';
import { EvidencePanel } from '@/components/lines/evidence-panel';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { StandingPlaces } from './standing-places';
import { evidenceOf } from './written-lines';

/** Words being written at the left, what they rest on at the right. */
export function SheetColumns({ view, children }: { view: SheetView; children: ReactNode }) {
  return (
    <div className="mt-5 grid gap-x-10 gap-y-6 lg:grid-cols-2 [&_:is(a,button,summary,textarea)]:scroll-mb-28">
      <div className="min-w-0">{children}</div>
      <div className="min-w-0">
        <SheetEvidence view={view} />
      </div>
    </div>
  );
}

/** All that a sheet rests on, with what stands over it. */
export function SheetEvidence({ view }: { view: SheetView }) {
  return (
    <EvidencePanel
      evidence={evidenceOf(view)}
      places={<StandingPlaces desk={view.desk} />}
      action={<Link href={`/releases/${view.evidence.release.releaseId}`}>Open the release</Link>}
    />
  );
}
