import type { ReactNode } from 'react';
import { DeskFrame } from '@/components/ui/desk-frame';
import { requireUser } from '@/lib/auth/actor';
import { DeskRail } from './_components/desk-rail';
import { ReloadRestored } from './_components/reload-restored';
import { roleNames } from './_components/role-names';
import { sectionsFor } from './_components/sections';

/**
 * The frame of the signed-in area. It shows only the sections that work and are open to the person; whether a
 * page may be seen is asked again by the page's own services. No loading.tsx beside it: that would send 200
 * before a page could answer 403 or 404.
 */
export default async function DeskLayout({ children }: { children: ReactNode }) {
  const actor = await requireUser();
  return (
    <DeskFrame
      rail={<DeskRail items={sectionsFor(actor)} name={actor.name} roles={roleNames(actor.roles)} />}
    >
      <ReloadRestored />
      {children}
    </DeskFrame>
  );
}
