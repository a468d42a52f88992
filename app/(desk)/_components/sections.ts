import {
  type Actor,
  canLogReleases,
  canMakeEmbeds,
  canManageJobs,
  canManagePeople,
  canReadCopyDesk,
  canReadHistory,
  canReadUnpublished,
} from '@/lib/domain/roles';

type Who = Pick<Actor, 'roles'>;

const SECTIONS: { href: string; label: string; isOpenTo: (who: Who) => boolean }[] = [
  { href: '/releases', label: 'Releases', isOpenTo: canLogReleases },
  { href: '/lines', label: 'Lines', isOpenTo: canReadUnpublished },
  { href: '/copy-desk', label: 'Copy desk', isOpenTo: canReadCopyDesk },
  { href: '/embeds', label: 'Embeds', isOpenTo: canMakeEmbeds },
  { href: '/wording-check', label: 'Wording check', isOpenTo: canReadCopyDesk },
  { href: '/house-style', label: 'House style', isOpenTo: canReadCopyDesk },
  { href: '/people', label: 'People', isOpenTo: canManagePeople },
  { href: '/jobs', label: 'Jobs', isOpenTo: canManageJobs },
  { href: '/history', label: 'History', isOpenTo: canReadHistory },
];

/** The sections that this person's roles open, in the order of the rail. */
export function sectionsFor(who: Who): { href: string; label: string }[] {
  return SECTIONS.filter(({ isOpenTo }) => isOpenTo(who)).map(({ href, label }) => ({ href, label }));
}

/** Where somebody lands: the section of their own work. */
export function homeOf(who: Who): string {
  if (canLogReleases(who)) return '/releases';
  if (canMakeEmbeds(who)) return '/copy-desk';
  return canManagePeople(who) ? '/people' : '/account';
}

/** The section that an address lies in, or null. */
export function sectionOf(pathname: string, hrefs: readonly string[]): string | null {
  return hrefs.find((href) => pathname === href || pathname.startsWith(`${href}/`)) ?? null;
}
