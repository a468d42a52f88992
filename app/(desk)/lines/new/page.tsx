import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { EmbargoBand } from '@/components/lines/embargo-band';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { formatDayRange } from '@/lib/format/date';
import { getRelease } from '@/lib/services/release/get-release';
import { ChooseClaim } from '../_components/choose-claim';
import { StartAsPrinted } from '../_components/start-as-printed';
import { createAsPrintedAction, createSheetAction } from '../actions';

export const metadata: Metadata = { title: 'Draft a sheet' };

type Search = { release?: string | string[]; claim?: string | string[] };

export default async function NewSheetPage({ searchParams }: { searchParams: Promise<Search> }) {
  const { release: asked, claim } = await searchParams;
  if (typeof asked !== 'string') notFound();
  const release = await deskPage((actor, ctx) => getRelease(actor, asked, ctx));
  const { facts, previous, document, answer, embargo, isOnList } = release;
  const dates = formatDayRange(facts.fieldStartOn, facts.fieldEndOn, 'en-GB');
  return (
    <>
      <EmbargoBand embargo={embargo} isOnList={isOnList} />
      <PageTitle
        title="Draft a sheet"
        crumbs={[
          { label: 'Releases', href: '/releases' },
          { label: facts.race.name, href: `/releases/${release.id}` },
        ]}
        sub={`${facts.race.name}. ${facts.pollster.name}, ${dates}. One sheet makes one claim.`}
      />
      <ChooseClaim
        releaseId={release.id}
        preselected={typeof claim === 'string' ? claim : null}
        facts={facts}
        previous={previous}
        document={document}
        answer={answer}
        create={createSheetAction}
      />
      <StartAsPrinted releaseId={release.id} create={createAsPrintedAction} />
      <p className="mt-6">
        <Link href={`/releases/${release.id}`}>Back to the release</Link>
      </p>
    </>
  );
}
