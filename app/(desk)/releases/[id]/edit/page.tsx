import type { Metadata } from 'next';
import { ReviseForm } from '@/components/forms/release/revise-form';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { getFormChoices } from '@/lib/services/release/form-choices';
import { getReleaseForm } from '@/lib/services/release/get-release-form';
import { reviseReleaseAction } from '../../actions';

export const metadata: Metadata = { title: 'Change figures' };

export default async function EditReleasePage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const { stored, choices, personId } = await deskPage((actor, ctx) => ({
    stored: getReleaseForm(actor, id, ctx),
    choices: getFormChoices(actor, ctx),
    personId: actor.publicId,
  }));
  const { race, whyNot, ...form } = stored;
  return (
    <>
      <PageTitle
        title="Change figures"
        crumbs={[
          { label: 'Releases', href: '/releases' },
          { label: race, href: `/releases/${form.id}` },
          { label: 'Change figures' },
        ]}
        sub="For slips in what was typed. The version of now is kept; sheets that are not cleared go over to the new figures, and whoever filed one agrees to it anew."
      />
      {whyNot ? (
        <EmptyState
          title={whyNot}
          action={<LinkButton href={`/releases/${form.id}`}>To the release</LinkButton>}
        />
      ) : (
        <div className="mt-5 border-t-2 border-ink pt-5">
          <ReviseForm
            key={form.version}
            choices={choices}
            personId={personId}
            stored={form}
            submit={reviseReleaseAction}
          />
        </div>
      )}
    </>
  );
}
