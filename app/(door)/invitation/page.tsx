import type { Metadata } from 'next';
import Link from 'next/link';
import { PageTitle } from '@/components/ui/page-title';
import { InvitationForm } from '../_components/invitation-form';
import { redeemInvitation } from './actions';

export const metadata: Metadata = { title: 'Use a sign-in code' };

export default function InvitationPage() {
  return (
    <>
      <PageTitle
        title="Use a sign-in code"
        sub="An administrator gave you a code. It works once, for a week, and lets you choose a password."
      />
      <InvitationForm redeem={redeemInvitation} />
      <p className="mt-6 max-w-[26rem] border-t border-rule pt-3 text-soft">
        You have a password? <Link href="/sign-in">Sign in</Link>
      </p>
    </>
  );
}
