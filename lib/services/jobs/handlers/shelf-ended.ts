import 'server-only';
import { findLastAct } from '@/db/queries/clearing';
import { findSheetRow } from '@/db/queries/job-subjects';
import { tellIn } from '../../outbox/tell-in';
import { shelfEndOf } from '../../sheet/shelf-end';
import { FINISHED, type Handler } from '../handler';

/** Words that were cleared have kept as long as they may; told once, unless they or their days changed meanwhile. */
export const shelfEnded: Handler<'shelf-ended'> = (job, ctx) => (tx) => {
  const { sheet: id, clearing, endedOn } = job.payload;
  const sheet = findSheetRow(tx, id);
  if (!sheet || findLastAct(tx, sheet.id, 'cleared')?.publicId !== clearing) return FINISHED;
  if (shelfEndOf(tx, sheet)?.endedOn !== endedOn) return FINISHED;
  const subject = { entity: 'sheet' as const, entityId: id, releaseId: sheet.releaseId };
  tellIn(tx, { kind: 'shelf-ended', ...subject, refs: { endedOn } }, ctx.now);
  return FINISHED;
};
