'use client';

import { BANNED_FIGURES_NAMES } from '@/lib/domain/bans';
import type { ActionResult } from '@/lib/errors';
import { formatInstant } from '@/lib/format/date';
import type { BanView } from '@/lib/services/bans/bans';
import { ReasonDialog } from '../../../../_components/reason-dialog';
import { useDecision } from '../../[id]/_components/use-decision';

type End = (input: unknown) => Promise<ActionResult<void>>;

const LOCALE = 'en-GB';

/** One ban: where, when, what it bars, by which rule, and who entered and ended it. */
export function BanEntry({ ban, zone, end }: { ban: BanView; zone: string; end: End | null }) {
  return (
    <li className="border-b border-rule py-3">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
        <h3 className="text-18 font-semibold">
          {ban.jurisdiction}: {ban.race ?? 'every race that ends in a vote'}
        </h3>
        {end && ban.state !== 'over' ? <EndBan id={ban.id} end={end} /> : null}
      </div>
      <p>
        {spanOf(ban)}. {BANNED_FIGURES_NAMES[ban.bars]}.
      </p>
      <p className="max-w-prose text-soft">“{ban.rule}”</p>
      <p className="text-13 text-soft">
        Entered by {ban.enteredBy}, {formatInstant(ban.enteredAt, zone, LOCALE)}.
        {ban.ended
          ? ` Ended by ${ban.ended.by}, ${formatInstant(ban.ended.at, zone, LOCALE)}: “${ban.ended.reason}”`
          : null}
      </p>
    </li>
  );
}

/** Both ends on the clocks of the place, and in UTC where those differ. */
export function spanOf({ fromAt, toAt, zone }: Pick<BanView, 'fromAt' | 'toAt' | 'zone'>): string {
  const [from, to] = [fromAt, toAt].map((at) => formatInstant(at, zone, LOCALE));
  const [fromUtc, toUtc] = [fromAt, toAt].map((at) => formatInstant(at, 'UTC', LOCALE));
  const there = `From ${from} to ${to} in ${zone}`;
  return from === fromUtc && to === toUtc ? there : `${there} (UTC: ${fromUtc} to ${toUtc})`;
}

function EndBan({ id, end }: { id: string; end: End }) {
  const decision = useDecision(`end-${id}`, (reason) => end({ id, reason }));
  return (
    <ReasonDialog
      {...decision}
      opener="End it"
      title="End this ban?"
      label="Why does it end?"
      hint="It stays in the history with your name. What it held can be cleared and copied at once."
      decide="End the ban"
      tone="caution"
      keep="Keep it"
    />
  );
}
