import type { Metadata } from 'next';
import { CorrectForm } from '@/components/forms/release/correct-form';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { stagedCorrectionOf } from '@/lib/services/correction/staged-correction';
import { getFormChoices } from '@/lib/services/release/form-choices';
import { getReleaseForm } from '@/lib/services/release/get-release-form';
import { correctReleaseAction, previewCorrectionAction } from '../../actions';

export const metadata: Metadata = { title: 'Correct a release' };

export default async function CorrectReleasePage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const { stored, choices, personId, staged } = await deskPage((actor, ctx) => ({
    stored: getReleaseForm(actor, id, ctx),
    choices: getFormChoices(actor, ctx),
    personId: actor.publicId,
    staged: stagedCorrectionOf(actor, id, ctx),
  }));
  return (
    <>
      <PageTitle
        title="Correct this release"
        crumbs={[
          { label: 'Releases', href: '/releases' },
          { label: stored.race, href: `/releases/${stored.id}` },
          { label: 'Correct' },
        ]}
        sub="Type what is right. Before anything is saved you see every line, chart and comparison in print that it touches."
      />
      {staged ? (
        <EmptyState
          title="A correction of this release is staged already"
          action={<LinkButton href={`/releases/corrections/${staged}`}>To that correction</LinkButton>}
        >
          <p>It is applied or withdrawn before another one begins.</p>
        </EmptyState>
      ) : (
        <div className="mt-5 border-t-2 border-ink pt-5">
          <CorrectForm
            key={stored.version}
            choices={choices}
            personId={personId}
            stored={stored}
            preview={previewCorrectionAction}
            correct={correctReleaseAction}
          />
        </div>
      )}
    </>
  );
}
