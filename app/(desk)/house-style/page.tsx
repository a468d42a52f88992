import type { Metadata } from 'next';
import Link from 'next/link';
import { LANGUAGE_NAMES } from '@/components/forms/house-style/decision-words';
import { formatInstant } from '@/lib/format/date';
import { type Column, DataTable } from '@/components/ui/data-table';
import { NextBar } from '@/components/ui/next-bar';
import { PageTitle } from '@/components/ui/page-title';
import { SectionHeading } from '@/components/ui/section-heading';
import { deskPage } from '@/lib/auth/desk-page';
import { STYLE_STATE_NAMES } from '@/lib/domain/house-style';
import { canActAsEditor } from '@/lib/domain/roles';
import { readEnv } from '@/lib/env';
import { describeSentences } from '@/lib/services/house-style/describe-sentences';
import { getCurrentStyle } from '@/lib/services/house-style/get-style';
import { listStyles, type StyleItem } from '@/lib/services/house-style/list-styles';
import { listLanguages } from '@/lib/services/house-style/sign-language';
import { ActButton } from './_components/act-button';
import { SignLanguage } from './_components/sign-language';
import { StyleReading } from './_components/style-reading';
import { signLanguageAction, startStyleDraftAction, withdrawSignatureAction } from './actions';

export const metadata: Metadata = { title: 'House style' };

export default async function HouseStylePage() {
  const { current, list, languages, isEditor, sentences } = await deskPage((actor, ctx) => {
    const view = getCurrentStyle(actor, ctx);
    return {
      current: view,
      list: listStyles(actor, ctx),
      languages: listLanguages(actor, ctx),
      isEditor: canActAsEditor(actor),
      sentences: describeSentences(view.body).sentences,
    };
  });
  const zone = readEnv().LEADLINE_ZONE;
  const since = current.inForceAt === null ? '' : `since ${formatInstant(current.inForceAt, zone, 'en-GB')}`;
  const waiting = list.open.find(({ state, isMine }) => state === 'proposed' && !isMine);
  const fresh = list.open.find(
    ({ state, origin, author }) => state === 'draft' && origin === 'product' && !author,
  );
  return (
    <>
      <PageTitle
        title="House style"
        sub={`Version ${current.number} is in force ${since}, ${byWhom(current)}.`}
      />
      {isEditor ? (
        <NextBar
          actions={
            waiting || fresh ? (
              <Link href={`/house-style/${(waiting ?? fresh)!.id}`} className="button button-primary">
                {waiting ? 'Read what is proposed' : 'Read the newer wording'}
              </Link>
            ) : (
              <ActButton
                act={startStyleDraftAction}
                input={null}
                label="Change house style"
                tone="primary"
                to="/house-style/:id/edit"
              />
            )
          }
        >
          {nextWords(waiting, fresh)}
        </NextBar>
      ) : null}
      {list.open.length > 0 ? (
        <DataTable
          caption="Drafts and proposals"
          columns={columns(zone)}
          rows={list.open}
          rowKey={({ id }) => id}
        />
      ) : null}
      <StyleReading body={current.body} sentences={sentences} />
      <SectionHeading>Languages</SectionHeading>
      <ul>
        {languages.map(({ language, packHash, isReviewed, signature, isClearable }) => (
          <li
            key={language}
            className="flex flex-wrap items-center justify-between gap-3 border-b border-rule py-2"
          >
            <span>
              <strong>{LANGUAGE_NAMES[language] ?? language}</strong>{' '}
              {isReviewed
                ? 'written and reviewed by the product’s makers'
                : signature
                  ? `signed by ${signature.by}, ${formatInstant(signature.at, zone, 'en-GB')}`
                  : 'unreviewed: drafted, not cleared, until a native editor signs it'}
            </span>
            {isEditor && !isReviewed ? (
              <SignLanguage
                language={language}
                packHash={packHash}
                isSigned={isClearable}
                sign={signLanguageAction}
                withdraw={withdrawSignatureAction}
              />
            ) : null}
          </li>
        ))}
      </ul>
      <SectionHeading>Versions</SectionHeading>
      <DataTable
        caption="Versions of house style"
        hideCaption
        columns={columns(zone)}
        rows={list.versions}
        rowKey={({ id }) => id}
      />
      {list.versions.length > 1 ? (
        <p className="mt-3">
          <Link href="/house-style/compare">Compare two versions</Link>
        </p>
      ) : null}
    </>
  );
}

function byWhom({ author, second }: { author: string | null; second: string | null }): string {
  return author && second ? `by ${author} and ${second}` : 'as the product ships it';
}

function nextWords(waiting: StyleItem | undefined, fresh: StyleItem | undefined): string {
  if (waiting)
    return `${waiting.author ?? 'An editor'} proposes a version. A second editor puts it in force or sends it back.`;
  if (fresh)
    return 'The product’s own wording has a newer version. Nothing of it is in force before two editors agree.';
  return 'A change is written by one editor and put in force by another.';
}

function columns(zone: string): Column<StyleItem>[] {
  return [
    {
      key: 'number',
      head: 'Version',
      rowHead: true,
      cell: ({ id, number, isMine, state }) => (
        <Link href={`/house-style/${id}${isMine && state === 'draft' ? '/edit' : ''}`}>
          {number === null ? 'Not numbered yet' : `Version ${number}`}
        </Link>
      ),
    },
    { key: 'state', head: 'State', cell: ({ state }) => STYLE_STATE_NAMES[state] },
    { key: 'at', head: 'When', from: 'sm', cell: ({ at }) => formatInstant(at, zone, 'en-GB') },
    { key: 'author', head: 'Author', cell: ({ author }) => author ?? 'Leadline' },
    { key: 'second', head: 'Put in force by', from: 'md', cell: ({ second }) => second ?? '—' },
    { key: 'note', head: 'Note', from: 'lg', cell: ({ note }) => note },
  ];
}
