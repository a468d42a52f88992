import type { Metadata } from 'next';
import Link from 'next/link';
import { VerdictMark } from '@/components/charts/verdict-mark';
import { type Column, DataTable } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { NextBar } from '@/components/ui/next-bar';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { beforeFigure } from '@/lib/domain/reading-order';
import { POPULATION_NAMES } from '@/lib/domain/vocabulary';
import { readEnv } from '@/lib/env';
import { formatDayRange, formatInstant } from '@/lib/format/date';
import { formatCount } from '@/lib/format/number';
import { listReleases, type ReleaseListItem } from '@/lib/services/release/list-releases';
import { VerdictRow } from './_components/verdict-row';

export const metadata: Metadata = { title: 'Releases' };

export default async function ReleasesPage() {
  const releases = await deskPage(listReleases);
  const logNew = (
    <LinkButton href="/releases/new" tone="primary">
      Log a release
    </LinkButton>
  );
  if (releases.length === 0)
    return (
      <>
        <PageTitle title="Releases" />
        <EmptyState title="No release is logged yet" action={logNew}>
          <p>
            Log what one poll measured: who was asked, how many, when, how, and the shares as printed. What
            the numbers support appears while you type.
          </p>
        </EmptyState>
      </>
    );
  const held = releases.filter((release) => release.isUnderEmbargo).length;
  return (
    <>
      <PageTitle title="Releases" sub="What polls measured, newest first." />
      <NextBar
        actions={
          <>
            <LinkButton href="/releases/bans">Publication bans</LinkButton>
            {logNew}
          </>
        }
      >
        <strong>
          {releases.length} {releases.length === 1 ? 'release' : 'releases'} on file.
        </strong>{' '}
        {held > 0 ? `${held} under embargo.` : 'None is under embargo.'}
      </NextBar>
      <DataTable
        caption="Releases"
        hideCaption
        columns={columnsIn(readEnv().LEADLINE_ZONE)}
        rows={releases}
        rowKey={(release) => release.id}
      />
      <p className="flex flex-wrap gap-x-6 gap-y-1 text-13 text-soft">
        <VerdictMark verdict="holds" />
        <VerdictMark verdict="fragile" />
        <VerdictMark verdict="does-not-hold" />
        <VerdictMark verdict="cannot-be-tested" />
      </p>
    </>
  );
}

function columnsIn(zone: string): Column<ReleaseListItem>[] {
  return [
    {
      key: 'race',
      head: 'Race, pollster',
      rowHead: true,
      cell: ({ id, race, pollster, isUnderEmbargo, verdicts, isBeingRecomputed }) => (
        <>
          <Link href={`/releases/${id}`} className="font-semibold">
            {race}
          </Link>
          <span className="block">{pollster}</span>
          {isUnderEmbargo ? (
            <strong className="text-13 font-bold tracking-wider text-caution uppercase">Embargo</strong>
          ) : null}
          {/* On a phone the column of verdicts is left out, and shares never stand without them. */}
          <div className="mt-1 min-[30rem]:hidden">
            <VerdictRow verdicts={verdicts} isBeingRecomputed={isBeingRecomputed} />
          </div>
        </>
      ),
    },
    {
      key: 'field',
      head: 'Interviews',
      cell: ({ fieldStartOn, fieldEndOn, n, population }) => (
        <>
          <span className="sm:whitespace-nowrap">
            {formatDayRange(fieldStartOn, fieldEndOn, 'en-GB', { withYear: true })}
          </span>
          <span className="block text-13 text-soft">
            {n === null ? 'Size not known' : formatCount(n, 'en-GB')},{' '}
            {population ? POPULATION_NAMES[population].toLowerCase() : 'population not known'}
          </span>
        </>
      ),
    },
    {
      key: 'shares',
      head: 'As printed',
      cell: ({ topShares }) =>
        topShares.length === 0
          ? 'No share disclosed'
          : topShares.map(({ option, printed }) => `${beforeFigure(option)} ${printed}`).join(', '),
    },
    {
      key: 'verdicts',
      head: 'Supported',
      from: 'sm',
      cell: ({ verdicts, isBeingRecomputed }) => (
        <VerdictRow verdicts={verdicts} isBeingRecomputed={isBeingRecomputed} />
      ),
    },
    {
      key: 'logged',
      head: 'Logged',
      from: 'lg',
      cell: ({ loggedBy, loggedAt }) => (
        <>
          {loggedBy}
          <time
            dateTime={new Date(loggedAt).toISOString()}
            className="block text-13 whitespace-nowrap text-soft"
          >
            {formatInstant(loggedAt, zone, 'en-GB')}
          </time>
        </>
      ),
    },
  ];
}
