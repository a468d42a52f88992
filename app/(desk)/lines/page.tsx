import type { Metadata } from 'next';
import { LinkButton } from '@/components/ui/link-button';
import { NextBar } from '@/components/ui/next-bar';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { readEnv } from '@/lib/env';
import { onCallAt } from '@/lib/services/on-call/on-call';
import { listOpenSheets } from '@/lib/services/sheet/list-open-sheets';
import { Queue } from './_components/queue';

export const metadata: Metadata = { title: 'Lines' };

export default async function LinesPage() {
  const { initial, person } = await deskPage((actor, ctx) => ({
    initial: {
      sheets: listOpenSheets(actor, ctx),
      onCall: onCallAt(ctx.db, ctx.now).map(({ name }) => name),
      readAt: ctx.now,
    },
    person: actor.publicId,
  }));
  return (
    <>
      <PageTitle
        title="Lines"
        sub="Sheets that are being written, and those that wait for a second reader."
      />
      <NextBar
        actions={
          <>
            <LinkButton href="/lines/night-list">Night list</LinkButton>
            <LinkButton href="/releases">Choose a release</LinkButton>
          </>
        }
      >
        A sheet starts from a release: open it and draft one from a finding.
      </NextBar>
      <Queue initial={initial} person={person} zone={readEnv().LEADLINE_ZONE} />
    </>
  );
}
