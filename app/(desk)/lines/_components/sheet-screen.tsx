'use client';

import Link from 'next/link';
import { useEffect, useRef, useState } from 'react';
import { ActsList } from '@/components/lines/acts-list';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { Cleared } from './cleared';
import { Comments } from './comments';
import { KeyList } from './key-list';
import { PullDialog } from './pull-dialog';
import { Reading } from './reading';
import type { SheetActions } from './sheet-actions';
import { StandingNotes } from './standing-notes';
import { TermsForm } from './terms-form';
import { Waiting } from './waiting';
import { Writing } from './writing';

type Props = {
  view: SheetView;
  actions: SheetActions;
  /** Public id of whoever looks. */
  person: string;
  now: number;
  zone: string;
};

/** Words that nobody writes on any more. */
const STANDING: readonly SheetView['state'][] = ['cleared', 'agreed', 'pulled'];

/** One sheet in the face that its state and its reader call for. */
export function SheetScreen({ view, actions, person, now, zone }: Props) {
  const [done, setDone] = useState('');
  const said = useRef<HTMLParagraphElement>(null);
  useEffect(() => {
    if (done !== '') said.current?.focus();
  }, [done]);
  const seen = `${view.state} ${view.version} ${view.hash} ${view.basisHash}`;
  // In the bar of a sheet that is read, to fit one screen; elsewhere in sight from the start.
  const isRead = view.state === 'filed';
  const folds = (
    <div className="sheet-folds">
      <Comments
        id={view.id}
        lines={view.lines.filter(({ knockedOut }) => !knockedOut)}
        comments={view.desk.comments}
        actions={actions}
        isOpen={!STANDING.includes(view.state)}
        isUnfolded={!isRead}
        now={now}
        zone={zone}
      />
      <TermsForm id={view.id} desk={view.desk} zone={zone} set={actions.terms} />
      <ActsList acts={view.acts} isUnfolded={!isRead} now={now} zone={zone} />
      <KeyList />
    </div>
  );
  const isBeingRewritten = view.isServed && view.state !== 'cleared';
  return (
    <>
      <p ref={said} tabIndex={-1} role="status" className="mt-2 font-semibold empty:m-0">
        {done}
      </p>
      <StandingNotes id={view.id} desk={view.desk} review={actions.review} />
      {view.correctionId ? (
        <p className="mt-2">
          These words wait for <Link href={`/releases/corrections/${view.correctionId}`}>a correction</Link>{' '}
          that is staged: nothing of them is printed before it is applied.
        </p>
      ) : null}
      {isBeingRewritten ? (
        <div className="mt-2 flex flex-wrap items-center gap-3">
          <p>An earlier version of these words is cleared and served until this one is cleared.</p>
          {view.may.pull ? <PullDialog view={view} pull={actions.pull} onDone={setDone} /> : null}
        </div>
      ) : null}
      {view.state === 'filed' ? (
        <Reading key={seen} view={view} actions={actions} folds={folds} onDone={setDone} />
      ) : STANDING.includes(view.state) ? (
        <Cleared key={seen} view={view} actions={actions} now={now} zone={zone} onDone={setDone} />
      ) : view.may.write ? (
        <Writing
          key={seen}
          view={view}
          actions={actions}
          person={person}
          now={now}
          zone={zone}
          onDone={setDone}
        />
      ) : (
        <Waiting view={view} now={now} zone={zone} />
      )}
      {isRead ? null : folds}
    </>
  );
}
