import { describe } from 'vitest';
import { type Acceptance, type Refusal, release, testRefusals } from './refusals';
import { sample } from './release-documents';

const group = (name: string, by: string, n: number | null, pct: number | null) => ({
  name,
  by,
  base: sample(n, { A: pct }),
});
const groups = [
  group('Coast', 'region', 480, 36),
  group('Hills', 'region', 520, 26),
  group('Young', 'age', 300, 20),
];
const total = { name: 'Everyone', base: sample(1000, { A: 31 }) };
const asked = (gaps: object[], more: object = {}) => ({
  release,
  subgroups: [{ question: 'Toll', total, groups, gaps, ...more }],
});
const against = (other: unknown, name = 'Coast', option = 'A') => ({ option, group: name, against: other });
const rest = (restOfWeightPct: unknown) => against({ restOfWeightPct });

const REFUSED: Refusal[] = [
  [
    'the same question twice',
    { release, subgroups: [0, 1].map(() => asked([]).subgroups[0]) },
    'subgroups[1].question',
    'This is asked already.',
  ],
  [
    'a group with the name of the whole',
    asked([], { groups: [group('Everyone', 'region', 9, 36)] }),
    'subgroups[0].groups[0].name',
    'This name is in the list already.',
  ],
  [
    'a group named twice',
    asked([], { groups: [groups[0], groups[0]] }),
    'subgroups[0].groups[1].name',
    'This name is in the list already.',
  ],
  [
    'groups with more people than the whole',
    asked([], { groups: [groups[0], group('Hills', 'region', 521, 26)] }),
    'subgroups[0].groups[1].base.n',
    'The groups have more people than the whole sample.',
  ],
  [
    'a faulty group',
    asked([], { groups: [group('Coast', 'region', 480, 136)] }),
    'subgroups[0].groups[0].base.shares[0].pct',
    'A share lies from 0 to 100 percent.',
  ],
  [
    'a faulty whole',
    asked([], { total: { ...total, base: sample(1000, { A: 31, B: 80 }) } }),
    'subgroups[0].total.base.shares',
    'The shares sum to more than 100 percent and rounding allow.',
  ],
  [
    'a gap of a group with itself',
    asked([against('Coast')]),
    'subgroups[0].gaps[0]',
    'A gap is between two different groups.',
  ],
  [
    'a gap across characteristics',
    asked([against('Young')]),
    'subgroups[0].gaps[0]',
    'Groups of two characteristics have people in common.',
  ],
  [
    'a gap against the whole',
    asked([against('Everyone')]),
    'subgroups[0].gaps[0].against',
    'A subgroup is part of the whole sample: compare it with the rest, given as a group or by restOfWeightPct.',
  ],
  [
    'a gap of the whole',
    asked([against('Coast', 'Everyone')]),
    'subgroups[0].gaps[0].group',
    'A subgroup is part of the whole sample: compare it with the rest, given as a group or by restOfWeightPct.',
  ],
  [
    'a gap of a group that is not there',
    asked([against('Coast', 'Isles')]),
    'subgroups[0].gaps[0].group',
    'This group is not in the list.',
  ],
  [
    'a gap against a group that is not there',
    asked([against('Isles')]),
    'subgroups[0].gaps[0].against',
    'This group is not in the list.',
  ],
  [
    'an option that no group has',
    asked([against('Hills', 'Coast', 'B')]),
    'subgroups[0].gaps[0].option',
    'A group of this gap does not have the option.',
  ],
  [
    'a gap asked twice, the other way round',
    asked([against('Hills'), against('Coast', 'Hills')]),
    'subgroups[0].gaps[1]',
    'This is asked already.',
  ],
  ['a rest asked twice', asked([rest(48), rest(49)]), 'subgroups[0].gaps[1]', 'This is asked already.'],
  [
    'a rest without the whole',
    asked([rest(48)], { total: undefined }),
    'subgroups[0].gaps[0].against',
    'The rest of a sample needs the whole sample.',
  ],
  [
    'a rest in which nobody is left',
    asked([rest(48)], { groups: [group('Coast', 'region', 1000, 31)] }),
    'subgroups[0].gaps[0].against',
    'Nobody is left in the rest of the sample.',
  ],
  [
    'a rest below nothing',
    asked([rest(95)]),
    'subgroups[0].gaps[0].against.restOfWeightPct',
    'Group, whole and weight do not fit: the rest would lie outside 0 to 100 percent.',
  ],
  [
    'a rest above everything',
    asked([rest(75)], { groups: [group('Coast', 'region', 480, 5)] }),
    'subgroups[0].gaps[0].against.restOfWeightPct',
    'Group, whole and weight do not fit: the rest would lie outside 0 to 100 percent.',
  ],
  [
    'a weight of the whole',
    asked([rest(100)]),
    'subgroups[0].gaps[0].against.restOfWeightPct',
    "A group's share of the sample lies between 0 and 100 percent.",
  ],
  [
    'a weight of nothing',
    asked([rest(0)]),
    'subgroups[0].gaps[0].against.restOfWeightPct',
    "A group's share of the sample lies between 0 and 100 percent.",
  ],
  [
    'a gap against a number',
    asked([against(3)]),
    'subgroups[0].gaps[0].against',
    'A gap is against another group or the rest of the sample.',
  ],
  [
    'a gap without its group',
    asked([{ option: 'A', against: 'Hills' }]),
    'subgroups[0].gaps[0].group',
    'A gap needs the name of a group.',
  ],
  [
    'a group without its characteristic',
    asked([], { groups: [group('Coast', ' ', 480, 36)] }),
    'subgroups[0].groups[0].by',
    'A group needs the characteristic it is one of.',
  ],
  [
    'a group without a name',
    asked([], { groups: [group('', 'region', 480, 36)] }),
    'subgroups[0].groups[0].name',
    'A group needs its name.',
  ],
  [
    'a whole without a name',
    asked([], { total: { ...total, name: '' } }),
    'subgroups[0].total.name',
    'The whole sample needs a name.',
  ],
  [
    'a question without a name',
    asked([], { question: '  ' }),
    'subgroups[0].question',
    'A question needs its name.',
  ],
];

const ACCEPTED: Acceptance[] = [
  ['groups of one characteristic that are the whole sample', asked([])],
  [
    'groups of two characteristics, each within the sample',
    asked([], { groups: [...groups, group('Old', 'age', 700, 36)] }),
  ],
  [
    'two gaps of one pair, in two options',
    asked([against('Hills'), against('Hills', 'Coast', 'B')], {
      groups: groups.map((one) => ({ ...one, base: sample(one.base.n, { A: 30, B: 30 }) })),
      total: undefined,
    }),
  ],
  [
    'a rest of a group whose size is not known',
    asked([rest(48)], { groups: [group('Coast', 'region', null, 36)] }),
  ],
  [
    'a rest of a whole whose size is not known',
    asked([rest(48)], { total: { name: 'Everyone', base: sample(null, { A: 31 }) } }),
  ],
  [
    'a rest of a share that is not known',
    asked([rest(95)], { groups: [group('Coast', 'region', 480, null)] }),
  ],
  ['a rest of exactly nothing', asked([rest(50)], { groups: [group('Coast', 'region', 480, 62)] })],
  [
    'a rest of exactly everyone',
    asked([rest(50)], {
      total: { name: 'Everyone', base: sample(1000, { A: 60 }) },
      groups: [group('Coast', 'region', 480, 20)],
    }),
  ],
];

describe('subgroups are refused at their fault, in words for whoever wrote them', () => {
  testRefusals(REFUSED, ACCEPTED);
});
