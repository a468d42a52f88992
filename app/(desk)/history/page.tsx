import type { Metadata } from 'next';
import Link from 'next/link';
import { type Column, DataTable } from '@/components/ui/data-table';
import { LinkButton } from '@/components/ui/link-button';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { readEnv } from '@/lib/env';
import { formatInstant } from '@/lib/format/date';
import { type HistoryEntry, listHistory } from '@/lib/services/history/list-history';
import { aboutWords } from './_components/about-words';
import { EntryChanges } from './_components/entry-changes';
import { EntryMarks } from './_components/entry-marks';
import { HeadNote } from './_components/head-note';

export const metadata: Metadata = { title: 'History' };

type Search = { [name in 'kind' | 'entity' | 'before']?: string | string[] };

/** One thing whose history is read alone. Its kind tells apart what is only numbered, such as policies. */
type Only = { id: string; kind: string | null };

export default async function HistoryPage({ searchParams }: { searchParams: Promise<Search> }) {
  const { kind, entity, before } = await searchParams;
  const { entries, older, head } = await deskPage((actor, ctx) =>
    listHistory(actor, { entity: kind, entityId: entity, before }, ctx),
  );
  const zone = readEnv().LEADLINE_ZONE;
  const only =
    typeof entity === 'string' ? { id: entity, kind: typeof kind === 'string' ? kind : null } : null;
  return (
    <>
      <PageTitle
        title={only ? `History of one ${entries[0]?.entity ?? 'thing'}` : 'History'}
        crumbs={only ? [{ label: 'History', href: '/history' }, { label: entries[0]?.about ?? only.id }] : []}
        sub={`Who did what, newest first. Nothing here is ever changed or deleted. Times are those of ${zone}.`}
      />
      <div className="mt-6">
        <HeadNote head={head} />
        {/* An opened entry grows tall: who and when stay beside its first line. */}
        <div className="[&_tbody_td]:align-top [&_tbody_th]:align-top">
          <DataTable
            caption="Entries of the history"
            hideCaption
            columns={columnsFor(zone, only)}
            rows={entries}
            rowKey={({ seq }) => String(seq)}
            empty="No entry here."
          />
        </div>
        <nav aria-label="Pages of the history" className="flex flex-wrap gap-3">
          {before ? <LinkButton href={addressOf(only, null)}>Newest</LinkButton> : null}
          {older === null ? null : <LinkButton href={addressOf(only, older)}>Older</LinkButton>}
        </nav>
      </div>
    </>
  );
}

function addressOf(only: Only | null, before: number | null): string {
  const query = new URLSearchParams();
  if (only?.kind) query.set('kind', only.kind);
  if (only) query.set('entity', only.id);
  if (before !== null) query.set('before', String(before));
  return query.size > 0 ? `/history?${query}` : '/history';
}

function columnsFor(zone: string, only: Only | null): Column<HistoryEntry>[] {
  return [
    {
      key: 'seq',
      head: 'No.',
      numeric: true,
      cell: ({ seq, hash }) => <span title={`Hash ${hash}`}>{seq}</span>,
    },
    {
      key: 'at',
      head: 'When',
      cell: ({ at }) => (
        <time dateTime={new Date(at).toISOString()} className="whitespace-nowrap">
          {formatInstant(at, zone, 'en-GB')}
        </time>
      ),
    },
    { key: 'person', head: 'Who', cell: ({ person }) => person },
    { key: 'action', head: 'What', rowHead: true, cell: ({ action }) => action },
    {
      key: 'entity',
      head: 'About',
      cell: (entry) => (
        <>
          {only?.id === entry.entityId ? (
            aboutWords(entry)
          ) : (
            <Link href={addressOf({ id: entry.entityId, kind: entry.entity }, null)}>
              {aboutWords(entry)}
              <span className="sr-only">, its own history {entry.about === null ? entry.entityId : ''}</span>
            </Link>
          )}
          <EntryMarks marks={entry.marks} />
        </>
      ),
    },
    { key: 'changes', head: 'Before, after, why', cell: (entry) => <EntryChanges entry={entry} /> },
  ];
}
