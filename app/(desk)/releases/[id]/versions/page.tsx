import type { Metadata } from 'next';
import Link from 'next/link';
import { type Column, DataTable } from '@/components/ui/data-table';
import { LinkButton } from '@/components/ui/link-button';
import { NextBar } from '@/components/ui/next-bar';
import { PageTitle } from '@/components/ui/page-title';
import { SectionHeading } from '@/components/ui/section-heading';
import { deskPage } from '@/lib/auth/desk-page';
import { CORRECTION_SOURCE_NAMES } from '@/lib/domain/corrections';
import { readEnv } from '@/lib/env';
import { CORRECTED_ITEM_NAMES } from '@/lib/findings/what-changed';
import { formatInstant } from '@/lib/format/date';
import { getVersions, type VersionView } from '@/lib/services/correction/get-versions';
import { type VersionRow, versionRows } from './_components/version-rows';

export const metadata: Metadata = { title: 'Versions' };

export default async function VersionsPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const { versions } = await deskPage((actor, ctx) => getVersions(actor, id, ctx));
  const [newest] = versions;
  return (
    <>
      <PageTitle
        title="Versions"
        crumbs={[
          { label: 'Releases', href: '/releases' },
          { label: newest?.facts.race.name ?? 'Release', href: `/releases/${id}` },
          { label: 'Versions' },
        ]}
        sub="Every version is kept. What differs from the version before it is set in bold."
      />
      <NextBar actions={<LinkButton href={`/releases/${id}/correct`}>Correct this release</LinkButton>}>
        <strong>{versions.length === 1 ? 'One version.' : `${versions.length} versions.`}</strong> A
        correction shows what it does to everything in print before it is saved.
      </NextBar>
      <SectionHeading>Side by side, newest first</SectionHeading>
      <DataTable
        caption="Versions side by side"
        hideCaption
        columns={columnsOf(versions)}
        rows={versionRows(versions)}
        rowKey={({ key }) => key}
      />
      <SectionHeading>What happened</SectionHeading>
      <ol className="mt-2 max-w-prose" reversed>
        {versions.map((version) => (
          <li key={version.facts.version} className="border-b border-rule py-3">
            <Happened version={version} />
          </li>
        ))}
      </ol>
    </>
  );
}

function columnsOf(versions: readonly VersionView[]): Column<VersionRow>[] {
  return [
    { key: 'name', head: 'Particular', rowHead: true, cell: ({ name }) => name },
    ...versions.map(({ facts, isCurrent }, place): Column<VersionRow> => ({
      key: String(facts.version),
      head: `Version ${facts.version}${isCurrent ? ', current' : ''}`,
      cell: ({ cells }) => {
        const [now, before] = [cells[place] ?? '', cells[place + 1]];
        if (before === undefined || before === now) return now;
        return (
          <strong>
            {now}
            <span className="sr-only"> (changed)</span>
          </strong>
        );
      },
    })),
  ];
}

function Happened({ version }: { version: VersionView }) {
  const { facts, enteredBy, enteredAt, changed, correction } = version;
  const at = formatInstant(enteredAt, readEnv().LEADLINE_ZONE, 'en-GB');
  const what = changed.map((item) => CORRECTED_ITEM_NAMES[item].toLowerCase()).join(', ');
  return (
    <>
      <p>
        <strong>Version {facts.version}</strong>, {enteredBy}, {at}
        {what ? `. Differs in: ${what}.` : '.'}
      </p>
      {correction ? (
        <p className="mt-1">
          {CORRECTION_SOURCE_NAMES[correction.whose]}. {correction.explanation}{' '}
          <Link href={`/releases/corrections/${correction.id}`}>
            {correction.state === 'staged'
              ? 'Staged'
              : correction.state === 'applied'
                ? 'What it did'
                : 'Withdrawn'}
          </Link>
        </p>
      ) : null}
    </>
  );
}
