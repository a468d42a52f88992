import 'server-only';
import { z } from 'zod';
import { findRelease, findWholeVersion, insertOverride } from '@/db/queries/release';
import { isReleasePublic } from '@/db/queries/sheet';
import { plainName } from '@/lib/domain/plain-name';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { compareReleases } from '@/lib/findings/comparability';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { mayBeCompared, seriesFactsOf } from './comparison';
import { computeFindings } from './compute-findings';
import { indexFindings } from './index-findings';

const id = z.string().min(1).max(64);
const schema = z.strictObject({
  id,
  comparedWith: id,
  reason: z.string().overwrite(plainName).min(10, 'Say in a sentence why the two may be compared.').max(1000),
});

/** Compares a release with one that differs, for a written reason that travels into the method note. */
export function overrideComparison(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canActAsEditor(actor), 'Only an editor overrides a comparison.');
  const { id: publicId, comparedWith, reason } = parse(schema, input);
  transact(ctx, (tx) => {
    const [current, earlier] = [publicId, comparedWith].map((one) => {
      const release = findRelease(tx, one, actor, ctx.now);
      const whole = release?.currentVersionId ? findWholeVersion(tx, release.currentVersionId) : null;
      if (!whole) throw new AppError('not-found', 'There is no such release.');
      return whole;
    }) as [
      NonNullable<ReturnType<typeof findWholeVersion>>,
      NonNullable<ReturnType<typeof findWholeVersion>>,
    ];
    if (!isReleasePublic(tx, earlier.release.id, ctx.now))
      throw new AppError(
        'invalid',
        'That release is under embargo, and its figures would show. Compare with it once the embargo is over.',
      );
    const { differences } = compareReleases(seriesFactsOf(tx, current), seriesFactsOf(tx, earlier));
    if (!mayBeCompared(current, earlier, differences))
      throw new AppError(
        'invalid',
        'A comparison is with a release of the same race whose interviews ended before these began.',
      );
    insertOverride(tx, {
      releaseVersionId: current.version.id,
      comparisonVersionId: earlier.version.id,
      reason,
      personId: actor.personId,
      at: ctx.now,
    });
    indexFindings(tx, current.version.id, computeFindings(tx, current.version.id, ctx.now));
    const subject = { entity: 'release', entityId: publicId, releaseId: current.release.id };
    const after = { comparedWith, differences: differences.map(({ item }) => item) };
    appendRecord(
      tx,
      { personId: actor.personId, action: 'overrode comparison', ...subject, after, reason },
      ctx.now,
    );
  });
}
