import type { Metadata } from 'next';
import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { PageTitle } from '@/components/ui/page-title';
import { TextInput } from '@/components/ui/text-input';
import { deskPage } from '@/lib/auth/desk-page';
import { readEnv } from '@/lib/env';
import { listCopyDesk } from '@/lib/services/copy/list-copy-desk';
import { listWithdrawn } from '@/lib/services/copy/list-withdrawn';
import { ClearedSheet } from './_components/cleared-sheet';
import { WithdrawnLately } from './_components/withdrawn-lately';
import { createEmbedAction } from './actions';

export const metadata: Metadata = { title: 'Copy desk' };

type Search = { race?: string | string[]; pollster?: string | string[] };

const one = (value: string | string[] | undefined) => (typeof value === 'string' ? value : '');

export default async function CopyDeskPage({ searchParams }: { searchParams: Promise<Search> }) {
  const asked = await searchParams;
  const search = { race: one(asked.race), pollster: one(asked.pollster) };
  const { sheets, withdrawn, now } = await deskPage((actor, ctx) => ({
    sheets: listCopyDesk(actor, search, ctx),
    withdrawn: listWithdrawn(actor, ctx),
    now: ctx.now,
  }));
  const zone = readEnv().LEADLINE_ZONE;
  const isSearched = search.race !== '' || search.pollster !== '';
  return (
    <>
      <PageTitle
        title="Copy desk"
        sub="Cleared words, newest first. Each copy is fetched when you press, so that nothing withdrawn is pasted."
      />
      <WithdrawnLately withdrawn={withdrawn} zone={zone} />
      <SearchForm search={search} isSearched={isSearched} />
      <p className="mb-3 text-soft">{countWords(sheets.length, isSearched)}</p>
      {sheets.length === 0 ? (
        <EmptyState title={isSearched ? 'No cleared sheet fits that search' : 'Nothing is cleared yet'}>
          <p>
            {isSearched
              ? 'Search for part of the name of a race or a pollster.'
              : 'Sheets come here once two people have agreed to them.'}
          </p>
        </EmptyState>
      ) : (
        sheets.map((sheet) => (
          <ClearedSheet key={sheet.id} sheet={sheet} now={now} zone={zone} createEmbed={createEmbedAction} />
        ))
      )}
    </>
  );
}

/** A plain form: the search stands in the address, and works without a script. */
function SearchForm({
  search,
  isSearched,
}: {
  search: { race: string; pollster: string };
  isSearched: boolean;
}) {
  return (
    <search className="mt-5">
      <form action="/copy-desk" className="flex flex-wrap items-end gap-x-4 [&_.field]:mb-3">
        <TextInput id="race" name="race" label="Race" defaultValue={search.race} maxLength={120} />
        <TextInput
          id="pollster"
          name="pollster"
          label="Pollster"
          defaultValue={search.pollster}
          maxLength={120}
        />
        <p className="mb-3 flex items-center gap-4">
          <Button type="submit">Search</Button>
          {isSearched ? <Link href="/copy-desk">All sheets</Link> : null}
        </p>
      </form>
    </search>
  );
}

function countWords(count: number, isSearched: boolean): string {
  if (count === 100) return 'The newest 100 sheets. Search for older ones.';
  const sheets = count === 1 ? '1 sheet' : `${count} sheets`;
  return isSearched ? `${sheets} found.` : `${sheets}.`;
}
