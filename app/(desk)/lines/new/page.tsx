import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { EmbargoBand } from '@/components/lines/embargo-band';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { formatDayRange } from '@/lib/format/date';
import { LANGUAGES } from '@/lib/domain/vocabulary';
import { listLanguages } from '@/lib/services/house-style/sign-language';
import { getRelease } from '@/lib/services/release/get-release';
import { ChooseClaim } from '../_components/choose-claim';
import { StartAsPrinted } from '../_components/start-as-printed';
import { createAsPrintedAction, createSheetAction } from '../actions';

export const metadata: Metadata = { title: 'Draft a sheet' };

type Search = Record<'release' | 'claim' | 'language', string | string[] | undefined>;

export default async function NewSheetPage({ searchParams }: { searchParams: Promise<Partial<Search>> }) {
  const { release: asked, claim, language } = await searchParams;
  if (typeof asked !== 'string') notFound();
  const { release, languages } = await deskPage((actor, ctx) => ({
    release: getRelease(actor, asked, ctx),
    languages: listLanguages(actor, ctx).map((one) => ({
      language: one.language,
      isClearable: one.isClearable,
    })),
  }));
  const { facts, previous, document, answer, embargo, isOnList, houseStyle } = release;
  const preselectedLanguage = LANGUAGES.find((one) => one === language) ?? 'en';
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
        preselectedLanguage={preselectedLanguage}
        languages={languages}
        onePollHeadlines={houseStyle.onePollHeadlines}
        facts={facts}
        previous={previous}
        document={document}
        answer={answer}
        create={createSheetAction}
      />
      <StartAsPrinted
        releaseId={release.id}
        languages={languages}
        preselectedLanguage={preselectedLanguage}
        create={createAsPrintedAction}
      />
      <p className="mt-6">
        <Link href={`/releases/${release.id}`}>Back to the release</Link>
      </p>
    </>
  );
}
