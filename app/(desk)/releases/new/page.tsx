import type { Metadata } from 'next';
import { ReleaseForm } from '@/components/forms/release/release-form';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { getFormChoices } from '@/lib/services/release/form-choices';
import { logReleaseAction } from '../actions';

export const metadata: Metadata = { title: 'Log a release' };

export default async function NewReleasePage() {
  const { choices, personId } = await deskPage((actor, ctx) => ({
    choices: getFormChoices(actor, ctx),
    personId: actor.publicId,
  }));
  return (
    <>
      <PageTitle
        title="Log a release"
        crumbs={[{ label: 'Releases', href: '/releases' }, { label: 'Log a release' }]}
        sub="Figures as printed. What the pollster withholds is marked as not disclosed; what you have not found yet stays empty."
      />
      <div className="mt-5 border-t-2 border-ink pt-5">
        <ReleaseForm choices={choices} personId={personId} submit={logReleaseAction} />
      </div>
    </>
  );
}
