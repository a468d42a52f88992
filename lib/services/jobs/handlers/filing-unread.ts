import 'server-only';
import { findLastAct } from '@/db/queries/clearing';
import { findSheetRow } from '@/db/queries/job-subjects';
import { listNewestLines } from '@/db/queries/sheet';
import { listFirstLooks } from '@/db/queries/sheet-desk';
import { lookOf } from '@/lib/domain/look';
import { tellIn } from '../../outbox/tell-in';
import { FINISHED, type Handler } from '../handler';

/** A filed sheet that no second person has opened in time: somebody has to be fetched. */
export const filingUnread: Handler<'filing-unread'> = (job, ctx) => (tx) => {
  const sheet = findSheetRow(tx, job.payload.sheet);
  const filing = sheet && findLastAct(tx, sheet.id, 'filed');
  if (!filing || filing.publicId !== job.payload.filing) return FINISHED;
  const kept = listNewestLines(tx, sheet.id).filter(({ line }) => !line.knockedOut);
  if (kept[0]?.version.state !== 'filed') return FINISHED;
  const firstLook = listFirstLooks(tx, [filing.id]).get(filing.id) ?? null;
  if (lookOf(filing.at, firstLook, ctx.now).kind !== 'escalated') return FINISHED;
  const subject = { entity: 'sheet' as const, entityId: sheet.publicId, releaseId: sheet.releaseId };
  tellIn(tx, { kind: 'filing-unread', ...subject }, ctx.now);
  return FINISHED;
};
