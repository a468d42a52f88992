import type { Metadata } from 'next';
import { DefinitionList } from '@/components/ui/definition-list';
import { PageTitle } from '@/components/ui/page-title';
import { SectionHeading } from '@/components/ui/section-heading';
import { requireUser } from '@/lib/auth/actor';
import { roleNames } from '../_components/role-names';
import { PasswordForm } from './_components/password-form';
import { changePasswordAction } from './actions';

export const metadata: Metadata = { title: 'Your account' };

export default async function AccountPage() {
  const { name, roles } = await requireUser();
  return (
    <>
      <PageTitle
        title="Your account"
        sub="Name and roles are an administrator’s to change; the password is yours."
      />
      <section aria-labelledby="you" className="mt-6 max-w-[26rem]">
        <SectionHeading id="you">You</SectionHeading>
        <DefinitionList
          items={[
            { term: 'Name', value: name },
            { term: roles.length === 1 ? 'Role' : 'Roles', value: roleNames(roles) },
          ]}
        />
      </section>
      <section aria-labelledby="password" className="mt-8">
        <SectionHeading id="password">Change your password</SectionHeading>
        <PasswordForm change={changePasswordAction} />
      </section>
    </>
  );
}
