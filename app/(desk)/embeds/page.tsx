import type { Metadata } from 'next';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { canReadUnpublished } from '@/lib/domain/roles';
import { readEnv } from '@/lib/env';
import { listEmbeds } from '@/lib/services/embed/list-embeds';
import { EmbedEntry } from './_components/embed-entry';

export const metadata: Metadata = { title: 'Embeds' };

export default async function EmbedsPage() {
  const { embeds, opensSheets, now } = await deskPage((actor, ctx) => ({
    embeds: listEmbeds(actor, ctx),
    opensSheets: canReadUnpublished(actor),
    now: ctx.now,
  }));
  const zone = readEnv().LEADLINE_ZONE;
  return (
    <>
      <PageTitle
        title="Embeds"
        sub="Charts with a public address, made from cleared evidence. An article shows them by the code below."
      />
      {embeds.length === 0 ? (
        <EmptyState
          title="No embed is made yet"
          action={<LinkButton href="/copy-desk">To the copy desk</LinkButton>}
        >
          <p>Make one from a cleared sheet, on the copy desk or on the sheet itself.</p>
        </EmptyState>
      ) : (
        <div className="mt-6">
          {embeds.map((embed) => (
            <EmbedEntry key={embed.id} embed={embed} opensSheets={opensSheets} now={now} zone={zone} />
          ))}
        </div>
      )}
    </>
  );
}
