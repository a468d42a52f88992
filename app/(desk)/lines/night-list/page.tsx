import type { Metadata } from 'next';
import { CautionNote } from '@/components/ui/caution-note';
import { DataTable } from '@/components/ui/data-table';
import { NextBar } from '@/components/ui/next-bar';
import { PageTitle } from '@/components/ui/page-title';
import { WEEKDAY_NAMES, type Weekday } from '@/lib/domain/weekdays';
import { deskPage } from '@/lib/auth/desk-page';
import { readEnv } from '@/lib/env';
import { formatDay, formatInstant } from '@/lib/format/date';
import { getNightList, type ShiftView } from '@/lib/services/on-call/on-call';
import { AddShift } from './_components/add-shift';
import { RemoveShift } from './_components/remove-shift';
import { addShiftAction, removeShiftAction } from './actions';

export const metadata: Metadata = { title: 'Night list' };

export default async function NightListPage() {
  const zone = readEnv().LEADLINE_ZONE;
  const list = await deskPage((actor, ctx) => getNightList(actor, ctx));
  const mayChange = list.editors.length > 0;
  return (
    <>
      <PageTitle
        title="Night list"
        crumbs={[{ label: 'Lines', href: '/lines' }]}
        sub="Editors on call. A filed sheet that no second person has opened within 10 minutes is theirs."
      />
      <NextBar label="On call now">
        {list.now.length === 0 ? (
          'Nobody is on call now.'
        ) : (
          <>
            <strong>On call now:</strong>{' '}
            {list.now
              .map(({ name, until }) => `${name}, until ${formatInstant(until, zone, 'en-GB')}`)
              .join('; ')}
            .
          </>
        )}
      </NextBar>
      <DataTable
        caption="Turns"
        hideCaption
        rows={list.shifts}
        rowKey={({ id }) => id}
        empty="No turn is on the list yet."
        columns={[
          { key: 'who', head: 'Editor', rowHead: true, cell: ({ name }) => name },
          { key: 'when', head: 'When', cell: whenOf },
          { key: 'from', head: 'From–to', cell: ({ fromTime, toTime }) => timesOf(fromTime, toTime) },
          { key: 'zone', head: 'Zone', cell: (shift) => shift.zone, from: 'md' },
          {
            key: 'now',
            head: 'Now',
            cell: ({ isOnNow, mayBeCalled }) =>
              mayBeCalled ? isOnNow ? <strong>on call</strong> : '' : 'is no editor now',
          },
          ...(mayChange
            ? [
                {
                  key: 'off',
                  head: <span className="sr-only">Change</span>,
                  cell: (shift: ShiftView) => (
                    <RemoveShift
                      id={shift.id}
                      about={`${shift.name}, ${whenOf(shift)}`}
                      remove={removeShiftAction}
                    />
                  ),
                },
              ]
            : []),
        ]}
      />
      {mayChange ? <AddShift editors={list.editors} zone={zone} add={addShiftAction} /> : null}
      <CautionNote>
        <p>
          Times are those of the clocks in the zone of each turn. In a night in which the clocks change, a
          turn is an hour shorter or longer.
        </p>
      </CautionNote>
    </>
  );
}

function whenOf({ weekday, onDay }: ShiftView): string {
  if (onDay !== null) return formatDay(onDay, 'en-GB');
  return `every ${WEEKDAY_NAMES[(weekday ?? 1) as Weekday]}`;
}

function timesOf(from: string, to: string): string {
  return to <= from ? `${from}–${to}, the next day` : `${from}–${to}`;
}
