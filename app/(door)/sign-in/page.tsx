import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { NextBar } from '@/components/ui/next-bar';
import { PageTitle } from '@/components/ui/page-title';
import { findActor } from '@/lib/auth/actor';
import { needsFirstAdministrator } from '@/lib/services/account/first-administrator';
import { requestContext } from '@/lib/services/account/request-context';
import { Notice } from '../_components/notice';
import { SignInForm } from '../_components/sign-in-form';
import { SignOut } from '../../(desk)/_components/sign-out';

export const metadata: Metadata = { title: 'Sign in' };

type Props = { searchParams: Promise<{ notice?: string | string[] }> };

export default async function SignInPage({ searchParams }: Props) {
  const actor = await findActor();
  if (actor) return <SignedInAlready name={actor.name} />;
  if (needsFirstAdministrator(requestContext())) redirect('/first');
  const { notice } = await searchParams;
  return (
    <>
      <PageTitle title="Sign in" sub="To the poll desk of your newsroom." />
      <Notice name={typeof notice === 'string' ? notice : undefined} />
      <SignInForm />
      <p className="mt-6 max-w-[26rem] border-t border-rule pt-3 text-soft">
        New here, or locked out? <Link href="/invitation">I have a sign-in code</Link>
      </p>
    </>
  );
}

function SignedInAlready({ name }: { name: string }) {
  return (
    <>
      <PageTitle title="You are signed in already" sub={`As ${name}.`} />
      <NextBar
        actions={
          <a href="/" className="button button-primary">
            Go on as {name}
          </a>
        }
      >
        <p>Somebody else? Sign out first.</p>
        <SignOut />
      </NextBar>
    </>
  );
}
