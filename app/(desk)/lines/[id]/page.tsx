import type { Metadata } from 'next';
import { cache } from 'react';
import { EmbargoBand } from '@/components/lines/embargo-band';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { readEnv } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { getAsPrinted, isAsPrintedSheet } from '@/lib/services/sheet/get-as-printed';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { AsPrintedScreen } from '../_components/as-printed-screen';
import { PresenceNote } from '../_components/presence-note';
import { SheetScreen } from '../_components/sheet-screen';
import { SheetTitle, tabOf } from '../_components/sheet-title';
import {
  addCommentAction,
  addLineAction,
  changeFiledSheetAction,
  clearSheetAction,
  createEmbedAction,
  discardSheetAction,
  fileSheetAction,
  markReviewedAction,
  pullSheetAction,
  readSecondAction,
  releaseAloneAction,
  resolveCommentAction,
  reviseSheetAction,
  sendBackAction,
  setTermsAction,
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
  comment: addCommentAction,
  settle: resolveCommentAction,
  terms: setTermsAction,
  review: markReviewedAction,
  alone: releaseAloneAction,
  second: readSecondAction,
};

type Props = { params: Promise<{ id: string }> };

/** Read once for the page and its name. */
const readPage = cache((id: string) =>
  deskPage((actor, ctx) => ({
    ...(isAsPrintedSheet(actor, id, ctx)
      ? { view: null, printed: getAsPrinted(actor, id, ctx), problem: null }
      : { ...viewOrProblem(() => getSheet(actor, id, ctx)), printed: null }),
    person: actor.publicId,
    now: ctx.now,
  })),
);

/** A refusal is answered by the page, not by its name. */
export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { id } = await params;
  const page = await readPage(id).catch(() => null);
  const printed = page?.printed && `${page.printed.release.race.name}: figures as printed`;
  return { title: page?.view ? tabOf(page.view) : (printed ?? 'Sheet') };
}

export default async function SheetPage({ params }: Props) {
  const { id } = await params;
  const { view, printed, problem, person, now } = await readPage(id);
  if (printed)
    return (
      <>
        <EmbargoBand embargo={printed.embargo} isOnList={printed.isOnList} />
        <PresenceNote id={printed.id} person={person} doing="reading" />
        <AsPrintedScreen view={printed} actions={ACTIONS} now={now} zone={readEnv().LEADLINE_ZONE} />
      </>
    );
  if (!view) return <NoClaim problem={problem} />;
  const zone = readEnv().LEADLINE_ZONE;
  return (
    <>
      <EmbargoBand embargo={view.embargo} isOnList={view.isOnList} />
      <SheetTitle view={view} now={now} zone={zone} />
      <PresenceNote id={view.id} person={person} doing={view.may.write ? 'writing' : 'reading'} />
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
