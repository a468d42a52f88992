import type { Metadata } from 'next';
import { cache } from 'react';
import { EmbargoBand } from '@/components/lines/embargo-band';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { readEnv } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { SheetScreen } from '../_components/sheet-screen';
import { SheetTitle, tabOf } from '../_components/sheet-title';
import {
  addLineAction,
  changeFiledSheetAction,
  clearSheetAction,
  createEmbedAction,
  discardSheetAction,
  fileSheetAction,
  pullSheetAction,
  reviseSheetAction,
  sendBackAction,
} from '../actions';

const ACTIONS = {
  add: addLineAction,
  file: fileSheetAction,
  change: changeFiledSheetAction,
  clear: clearSheetAction,
  sendBack: sendBackAction,
  pull: pullSheetAction,
  revise: reviseSheetAction,
  discard: discardSheetAction,
  embed: createEmbedAction,
};

type Props = { params: Promise<{ id: string }> };

/** Read once for the page and its name. */
const readPage = cache((id: string) =>
  deskPage((actor, ctx) => ({
    ...viewOrProblem(() => getSheet(actor, id, ctx)),
    person: actor.publicId,
    now: ctx.now,
  })),
);

/** A refusal is answered by the page, not by its name. */
export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { id } = await params;
  const page = await readPage(id).catch(() => null);
  return { title: page?.view ? tabOf(page.view) : 'Sheet' };
}

export default async function SheetPage({ params }: Props) {
  const { id } = await params;
  const { view, problem, person, now } = await readPage(id);
  if (!view) return <NoClaim problem={problem} />;
  const zone = readEnv().LEADLINE_ZONE;
  return (
    <>
      <EmbargoBand embargo={view.embargo} isOnList={view.isOnList} />
      <SheetTitle view={view} now={now} zone={zone} />
      <SheetScreen view={view} actions={ACTIONS} person={person} now={now} zone={zone} />
    </>
  );
}

type Found = { view: ReturnType<typeof getSheet>; problem: null } | { view: null; problem: string };

/** A sheet whose figures no longer support any such claim cannot be drafted; that is told, not an error. */
function viewOrProblem(read: () => ReturnType<typeof getSheet>): Found {
  try {
    return { view: read(), problem: null };
  } catch (error) {
    if (error instanceof AppError && error.code === 'conflict') return { view: null, problem: error.message };
    throw error;
  }
}

function NoClaim({ problem }: { problem: string | null }) {
  return (
    <>
      <PageTitle title="This sheet has nothing to stand on" crumbs={[{ label: 'Lines', href: '/lines' }]} />
      <EmptyState title={problem} action={<LinkButton href="/lines">To the queue</LinkButton>} />
    </>
  );
}
