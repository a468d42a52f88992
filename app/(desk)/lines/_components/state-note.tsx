import { LINE_STATE_NAMES, type LineState } from '@/lib/domain/sheet';
import type { Wanted } from '@/lib/domain/wanted';
import { wantedWords } from './work-marks';

/** Where a sheet stands and by when it is wanted, beside its title. */
export function StateNote({ state, wanted, now }: { state: LineState; wanted: Wanted | null; now: number }) {
  return (
    <>
      {wanted && state !== 'pulled' ? (
        <>
          <span className={wanted.at <= now ? 'font-semibold text-caution' : undefined}>
            {wantedWords(wanted, now)}
          </span>
          <span aria-hidden="true"> · </span>
        </>
      ) : null}
      <span className="font-semibold">{LINE_STATE_NAMES[state]}</span>
    </>
  );
}
