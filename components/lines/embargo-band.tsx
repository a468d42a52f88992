import { Band } from '../ui/band';

export type Embargo = { isRunning: boolean; local: string; zone: string } | null;

/** Stands over everything that comes from a release under embargo. */
export function EmbargoBand({ embargo, isOnList }: { embargo: Embargo; isOnList?: boolean }) {
  if (!embargo?.isRunning) return null;
  return (
    <Band word="Embargo">
      until {embargoEnd(embargo)}. Nothing of this leaves the desk before.
      {isOnList === false ? ' You are not on its embargo list, so you cannot copy from it.' : null}
    </Band>
  );
}

/** As it was typed, in its own zone: "2026-09-17 12:00 (Etc/UTC)". */
export function embargoEnd({ local, zone }: { local: string; zone: string }): string {
  return `${local.replace('T', ' ')} (${zone})`;
}
