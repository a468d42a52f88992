import 'server-only';
import {
  type Actor,
  canActAsEditor,
  canDraftSheets,
  isTwoPersonAgreement,
  type Role,
} from '@/lib/domain/roles';
import type { LineState } from '@/lib/domain/sheet';

export type SheetPermissions = {
  may: { write: boolean; change: boolean; clear: boolean; sendBack: boolean; pull: boolean; revise: boolean };
  /** Why a filed sheet cannot be cleared by this reader. */
  notYours: 'filer' | 'needs-editor' | null;
  /** This person filed it, the evidence changed, and their one key files it again. */
  agreesAnew: boolean;
};

/** What somebody may do with a sheet as it stands; the services ask again at the act. */
export function permissionsOf(
  actor: Actor,
  sheet: {
    authorId: number;
    state: LineState;
    /** Of the newest filing. */
    filer: { personId: number; roles: Role[] } | null;
    isServed: boolean;
    isReturned: boolean;
  },
): SheetPermissions {
  const { state, filer } = sheet;
  const editor = canActAsEditor(actor);
  const writer = editor || (sheet.authorId === actor.personId && canDraftSheets(actor));
  const isFiler = filer?.personId === actor.personId;
  const filed = state === 'filed' && filer !== null;
  const second = filed && isTwoPersonAgreement(filer, actor);
  const write = (state === 'draft' || state === 'sent-back') && writer;
  return {
    may: {
      write,
      change: filed && editor && !isFiler,
      clear: second,
      sendBack: second || (filed && isFiler),
      pull: sheet.isServed && editor,
      revise: (state === 'cleared' || state === 'pulled') && writer,
    },
    notYours: !filed || second ? null : isFiler ? 'filer' : 'needs-editor',
    agreesAnew: write && state === 'sent-back' && sheet.isReturned && isFiler,
  };
}
