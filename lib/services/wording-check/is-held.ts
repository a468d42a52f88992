import 'server-only';
import type { ReleaseRow } from '@/db/queries/release';

/** The embargo is over, or there was none. */
export function isPublicNow(
  { embargoAt, embargoLiftedAt }: Pick<ReleaseRow, 'embargoAt' | 'embargoLiftedAt'>,
  now: number,
): boolean {
  return embargoAt === null || embargoLiftedAt !== null || embargoAt <= now;
}
