import { getSheet, type SheetView } from '@/lib/services/sheet/get-sheet';
import { freshDatabase, makePerson } from './database';
import { logRelease } from './release';
import { sheetDesk } from './sheet';

/** A desk with a drafted sheet, for what its screen shows: the views are those of the service. */
export function deskWithSheet() {
  const desk = freshDatabase();
  const on = sheetDesk(desk.db);
  const reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
  const colleague = makePerson(desk.db, { name: 'Jory Quent', roles: ['reporter'] });
  const editor = makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] });
  const releaseId = logRelease(desk.db, reporter);
  const id = on.draft(reporter, releaseId);
  const see = (actor = reporter): SheetView => getSheet(actor, id, desk.ctx());
  return { desk, on, reporter, colleague, editor, releaseId, id, see };
}
