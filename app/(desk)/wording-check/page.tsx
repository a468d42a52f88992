import type { Metadata } from 'next';
import { PageTitle } from '@/components/ui/page-title';
import { WordingCheckDesk } from '@/components/wording-check/wording-check-desk';
import { deskPage } from '@/lib/auth/desk-page';
import { MAX_RELEASES } from '@/lib/services/wording-check/check-text';
import { listCheckable } from '@/lib/services/wording-check/list-checkable';
import { MAX_TEXT } from '@/lib/wording/check/check-wording';

export const metadata: Metadata = { title: 'Wording check' };

export default async function WordingCheckPage() {
  const { releases, personId } = await deskPage((actor, ctx) => ({
    releases: listCheckable(actor, ctx),
    personId: actor.publicId,
  }));
  return (
    <>
      <PageTitle
        title="Wording check"
        sub="Every phrase about a poll that says more than its figures, with what may be said instead."
      />
      <WordingCheckDesk
        releases={releases}
        maxText={MAX_TEXT}
        maxReleases={MAX_RELEASES}
        personId={personId}
      />
    </>
  );
}
