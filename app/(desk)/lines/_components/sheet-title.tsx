import { betweenReleases } from '@/components/findings/between';
import { isTakenBack } from '@/components/lines/taken-back';
import { when } from '@/components/lines/when';
import { PageTitle } from '@/components/ui/page-title';
import { subjectOf } from '@/lib/findings/heading';
import { formatDayRange } from '@/lib/format/date';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { StateNote } from './state-note';

const LOCALE = 'en-GB';

/** What this sheet is and where it stands. */
export function SheetTitle({ view, now, zone }: { view: SheetView; now: number; zone: string }) {
  const { release } = view.evidence;
  const dates = formatDayRange(release.fieldStartOn, release.fieldEndOn, LOCALE);
  return (
    <PageTitle
      title={titleOf(view, now, zone)}
      crumbs={[{ label: 'Lines', href: '/lines' }, { label: release.race.name }]}
      note={<StateNote state={view.state} wanted={view.desk.wanted} now={now} />}
      isCompact
      sub={`${release.pollster.name}, ${dates}. ${agreedOf(view)}`}
    />
  );
}

/** The name of a browser tab: race and claim without a figure, since tabs and their history are seen by others. */
export function tabOf({ finding, evidence, previous }: Pick<SheetView, 'finding' | 'evidence' | 'previous'>) {
  const { race, fieldEndOn } = evidence.release;
  const between = previous ? betweenReleases(previous.fieldEndOn, fieldEndOn) : undefined;
  return `${race.name}: ${subjectOf(finding, between)}`;
}

export function titleOf({ state, author, filer, acts }: SheetView, now: number, zone: string): string {
  const last = acts.at(-1);
  const at = last ? placed(when(last.at, now, zone)) : '';
  switch (state) {
    case 'filed':
      return `Filed by ${filer?.name ?? author}${at}`;
    case 'cleared':
      return `Cleared by ${last?.person ?? 'an editor'}${at}`;
    case 'pulled':
      return `Pulled by ${last?.person ?? 'an editor'}${at}`;
    case 'sent-back':
      if (last && isTakenBack(acts)) return `Taken back by ${last.person}`;
      return last?.act === 'returned' ? `Back with ${lastFiler(acts) ?? author}` : `Sent back to ${author}`;
    default:
      return `Draft by ${author}`;
  }
}

function lastFiler(acts: SheetView['acts']): string | undefined {
  return acts.findLast(({ act }) => act === 'filed')?.person;
}

function placed(at: string): string {
  return at.includes(',') ? `, ${at}` : ` at ${at}`;
}

function agreedOf({ state, filer, notYours }: SheetView): string {
  if (state === 'cleared') return 'Two people agreed to these words on this evidence.';
  if (state === 'pulled') return 'These words were withdrawn.';
  if (state !== 'filed') return 'Nobody has agreed to these words yet.';
  if (notYours === 'filer') return 'You have agreed to these words by filing them.';
  const agreed = `${filer?.name ?? 'The filer'} has agreed by filing`;
  return notYours === null ? `${agreed}; yours is the second reading.` : `${agreed}.`;
}
