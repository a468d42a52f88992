import { describe, expect, it } from 'vitest';
import { roleNames } from '@/app/(desk)/_components/role-names';
import { homeOf, sectionOf, sectionsFor } from '@/app/(desk)/_components/sections';
import type { Role } from '@/lib/domain/roles';

const labels = (...roles: Role[]) => sectionsFor({ roles }).map(({ label }) => label);

describe('the rail', () => {
  it('shows each role the sections that are open to it', () => {
    expect(labels('reporter')).toEqual([
      'Releases',
      'Lines',
      'Copy desk',
      'Embeds',
      'Wording check',
      'House style',
      'History',
    ]);
    expect(labels('editor')).toEqual([
      'Releases',
      'Lines',
      'Copy desk',
      'Embeds',
      'Wording check',
      'House style',
      'History',
    ]);
    expect(labels('copy-desk')).toEqual(['Copy desk', 'Embeds', 'Wording check', 'House style']);
    expect(labels('administrator')).toEqual([
      'Copy desk',
      'Wording check',
      'House style',
      'People',
      'Jobs',
      'History',
    ]);
  });

  it('adds up the sections of several roles', () => {
    expect(labels('copy-desk', 'administrator')).toEqual([
      'Copy desk',
      'Embeds',
      'Wording check',
      'House style',
      'People',
      'Jobs',
      'History',
    ]);
    expect(labels()).toEqual([]);
  });

  it('sends everybody to a first page that is open to them', () => {
    expect(homeOf({ roles: ['reporter'] })).toBe('/releases');
    expect(homeOf({ roles: ['administrator', 'editor'] })).toBe('/releases');
    expect(homeOf({ roles: ['copy-desk'] })).toBe('/copy-desk');
    expect(homeOf({ roles: ['administrator'] })).toBe('/people');
    expect(homeOf({ roles: [] })).toBe('/account');
  });

  it('knows the section of an address by whole parts of it', () => {
    const hrefs = ['/releases', '/lines'];
    expect(sectionOf('/releases', hrefs)).toBe('/releases');
    expect(sectionOf('/lines/abc/clear', hrefs)).toBe('/lines');
    expect(sectionOf('/releases-old', hrefs)).toBeNull();
    expect(sectionOf('/account', hrefs)).toBeNull();
  });

  it('names roles always in the same order', () => {
    expect(roleNames(['administrator', 'copy-desk', 'reporter'])).toBe('Reporter, Copy desk, Administrator');
  });
});
