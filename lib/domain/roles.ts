export const ROLES = ['reporter', 'editor', 'copy-desk', 'administrator'] as const;
export type Role = (typeof ROLES)[number];

export const ROLE_NAMES: Record<Role, string> = {
  reporter: 'Reporter',
  editor: 'Editor',
  'copy-desk': 'Copy desk',
  administrator: 'Administrator',
};

/** Whoever acts: read from the database at every request, never from a token. */
export type Actor = {
  personId: number;
  publicId: string;
  name: string;
  roles: readonly Role[];
  sessionId: number;
};

type Who = Pick<Actor, 'roles'>;

const has = (who: Who, ...roles: Role[]) => roles.some((role) => who.roles.includes(role));

export const canLogReleases = (who: Who) => has(who, 'reporter', 'editor');
export const canDraftSheets = (who: Who) => has(who, 'reporter', 'editor');
export const canReadUnpublished = (who: Who) => has(who, 'reporter', 'editor');
export const canActAsEditor = (who: Who) => has(who, 'editor');
/** Everybody on the staff: what is cleared is printable, and an embargo hides what it hides whoever asks. */
export const canReadCopyDesk = (who: Who) => has(who, ...ROLES);
export const canMakeEmbeds = (who: Who) => has(who, 'reporter', 'editor', 'copy-desk');
export const canManagePeople = (who: Who) => has(who, 'administrator');
export const canManageJobs = (who: Who) => has(who, 'administrator');
export const canReadHistory = (who: Who) => has(who, 'reporter', 'editor', 'administrator');

/**
 * Two different people have agreed, and one of them was an editor when they acted.
 * Roles are those held at the moment of each act.
 */
export function isTwoPersonAgreement(
  filer: { personId: number; roles: readonly Role[] },
  second: { personId: number; roles: readonly Role[] },
): boolean {
  return filer.personId !== second.personId && (has(filer, 'editor') || has(second, 'editor'));
}
