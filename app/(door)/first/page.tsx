import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { PageTitle } from '@/components/ui/page-title';
import { needsFirstAdministrator } from '@/lib/services/account/first-administrator';
import { requestContext } from '@/lib/services/account/request-context';
import { FirstForm } from '../_components/first-form';
import { makeFirstAdministrator } from './actions';

export const metadata: Metadata = { title: 'The first account' };

export default function FirstPage() {
  if (!needsFirstAdministrator(requestContext())) redirect('/sign-in');
  return (
    <>
      <PageTitle
        title="Nobody is here yet"
        sub="The first account is administrator and editor. It adds everybody else."
      />
      <FirstForm create={makeFirstAdministrator} />
    </>
  );
}
