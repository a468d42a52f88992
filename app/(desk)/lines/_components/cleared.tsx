'use client';

import Link from 'next/link';
import { PrintableLine } from '@/components/lines/printable-line';
import { whenSaid } from '@/components/lines/when';
import { Button } from '@/components/ui/button';
import { SectionHeading } from '@/components/ui/section-heading';
import { OverrideNote } from '@/components/wording-check/override-note';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { ActBar } from './act-bar';
import { HashLine } from './hash-line';
import { PullDialog } from './pull-dialog';
import { ReadingColumns } from './reading-columns';
import { RefusedNote } from './refused-note';
import type { SheetActions } from './sheet-actions';
import { useAct } from './use-act';

type Props = {
  view: SheetView;
  actions: SheetActions;
  now: number;
  zone: string;
  onDone: (words: string) => void;
};

const HEADINGS: Partial<Record<SheetView['state'], string>> = {
  cleared: 'Cleared words',
  pulled: 'Pulled words, not to be printed',
  agreed: 'Agreed words, not to be printed before their correction',
};

/** Words that are cleared, agreed to or pulled, on the evidence that two people agreed to. */
export function Cleared({ view, actions, now, zone, onDone }: Props) {
  const embed = useAct(actions.embed, () => onDone('The embed is made.'));
  const revise = useAct(actions.revise, () => onDone('A new version is open.'));
  const isCleared = view.state === 'cleared';
  return (
    <>
      <OverrideNote override={view.override} />
      <ReadingColumns
        view={view}
        head={
          <div className="reading-head">
            <SectionHeading>{HEADINGS[view.state] ?? 'Words'}</SectionHeading>
          </div>
        }
        line={({ kind, text, marks, knockedOut }) =>
          knockedOut ? null : (
            <PrintableLine
              key={kind}
              {...{ kind, text, marks }}
              before={null}
              knockedOut={false}
              lang={view.language}
            />
          )
        }
        foot={view.hash ? <HashLine hash={view.hash} /> : null}
      />
      <RefusedNote failure={embed.failure ?? revise.failure} />
      <ActBar
        actions={
          <>
            {view.may.pull ? <PullDialog view={view} pull={actions.pull} onDone={onDone} /> : null}
            {view.may.revise ? (
              <Button
                pending={revise.isPending}
                pendingLabel="Opening…"
                onClick={() => revise.act({ id: view.id, version: view.version })}
              >
                Start a new version
              </Button>
            ) : null}
            {isCleared && view.embedId === null ? (
              <Button
                tone="primary"
                pending={embed.isPending}
                pendingLabel="Making…"
                onClick={() => embed.act({ sheetId: view.id })}
              >
                Make an embed
              </Button>
            ) : null}
          </>
        }
      >
        {isCleared ? agreedWords(view, now, zone) : 'These words were withdrawn. Nothing of them is served.'}
        {view.embedId ? (
          <>
            {' '}
            <Link href={`/embeds#embed-${view.embedId}`}>Its embed</Link>
          </>
        ) : null}
      </ActBar>
    </>
  );
}

function agreedWords({ acts, filer }: SheetView, now: number, zone: string): string {
  const cleared = acts.findLast(({ act }) => act === 'cleared');
  if (!cleared || !filer) return 'Two people agreed to these words.';
  const [first, second] = [whenSaid(filer.at, now, zone), whenSaid(cleared.at, now, zone)];
  return `Agreed by ${filer.name} ${first} and by ${cleared.person} ${second}.`;
}
