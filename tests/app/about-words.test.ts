import { expect, it } from 'vitest';
import { aboutWords } from '@/app/(desk)/history/_components/about-words';

it('says whose poll an entry is about, a person by name, and only what it is where no more may be known', () => {
  const poll = 'Governor of Averil Coast, Norwater Polls';
  expect(aboutWords({ entity: 'sheet', about: poll })).toBe(`sheet: ${poll}`);
  expect(aboutWords({ entity: 'sheet', about: null })).toBe('sheet');
  expect(aboutWords({ entity: 'person', about: 'Edda Marsh' })).toBe('Edda Marsh');
});
