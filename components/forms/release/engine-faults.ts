import { CheckRefused } from '@/lib/findings/check-refused';
import type { Base, Policy } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { releaseInput } from '@/lib/domain/release-input';
import type { ReleaseForm } from './form-values';
import { liveDocument } from './live-document';
import { formFieldOf } from './live-findings';

export type EngineFault = { field: string; message: string };

/** More than a form can have at once. */
const MOST = 40;

/**
 * Everything that the engine refuses in what can be read of a form. It names one fault at a time, so each is put
 * aside before it is asked again.
 */
export function engineFaults(values: ReleaseForm, policy: Policy): EngineFault[] {
  const live = liveDocument(values, { policy, previous: null, thresholds: [] });
  if (!live) return [];
  // A margin is held against the sample size only where it is known that no design effect replaces it.
  const isDeffRead = releaseInput.shape.deff.safeParse(values.deff).success;
  let release: Base = isDeffRead ? live.document.release : { ...live.document.release, n: null };
  const faults: EngineFault[] = [];
  while (faults.length < MOST) {
    const refusal = refusalOf(release, policy);
    if (!refusal) break;
    const field = formFieldOf(refusal.path, live.rows);
    if (field === '' || faults.some((fault) => fault.field === field)) break;
    faults.push({ field, message: refusal.message });
    release = without(release, refusal.path);
  }
  return faults;
}

function refusalOf(release: Base, policy: Policy): CheckRefused | null {
  try {
    parseCheckDocument({ release, policy });
    return null;
  } catch (error) {
    if (error instanceof CheckRefused) return error;
    throw error;
  }
}

/** The base with what was refused put aside. */
function without(release: Base, path: string): Base {
  const at = /^release\.shares\[(\d+)\]/.exec(path)?.[1];
  if (at !== undefined) {
    const shares = release.shares.map((share, row) =>
      row === Number(at) ? { ...share, option: `${share.option} (row ${row})` } : share,
    );
    return { ...release, shares };
  }
  if (path.startsWith('release.shares'))
    return { ...release, shares: release.shares.map((share) => ({ ...share, pct: null })) };
  if (path.startsWith('release.deff')) return { ...release, deff: null };
  if (path.startsWith('release.statedMargin')) return { ...release, statedMargin: null };
  if (path.startsWith('release.modelledInterval')) return { ...release, modelledInterval: null };
  return { ...release, n: null };
}
