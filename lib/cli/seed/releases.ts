import type { ReleaseFormValues } from '@/lib/domain/release-input';
import { dayFrom, type DemoRelease } from './form';

type NewRace = Extract<ReleaseFormValues['race'], { kind: 'new' }>['race'];

export const RACES = {
  governor: {
    name: 'Governor of Averil Coast',
    kind: 'candidate',
    options: ['Alder', 'Brook', 'Someone else'],
    thresholds: [{ option: 'Alder', pct: '50', base: 'valid-votes' }],
  },
  toll: {
    name: 'Bridge-toll referendum',
    kind: 'referendum',
    options: ['Keep the toll', 'End the toll'],
    thresholds: [{ option: 'End the toll', pct: '50', base: 'valid-votes' }],
  },
  approval: {
    name: 'Approval of the governor',
    kind: 'approval',
    options: ['Approve', 'Disapprove'],
    thresholds: [],
  },
  assembly: {
    name: 'Averil Assembly',
    kind: 'party-list',
    options: ['Harbour Party', 'Inland Union', 'Lantern Party', 'Commons List', 'Saltmarsh Alliance'],
    thresholds: [
      { option: 'Commons List', pct: '5', base: 'valid-votes' },
      { option: 'Saltmarsh Alliance', pct: '5', base: 'valid-votes' },
    ],
  },
} satisfies Record<string, NewRace>;

export type RaceKey = keyof typeof RACES;

const VOTE = 'If the election for governor were held today, for whom would you vote?';
const TOLL = 'Should the toll on the estuary bridge be kept or ended?';
const APPROVE = 'Do you approve or disapprove of how the governor does the job?';
const ASSEMBLY = 'Which list would you vote for if the Assembly were elected tomorrow?';

export type DemoKey =
  | 'kelmouthEarlier'
  | 'kelmouth'
  | 'norwater'
  | 'quillon'
  | 'quillonModelled'
  | 'tollEarlier'
  | 'toll'
  | 'approvalEarlier'
  | 'approval'
  | 'assembly'
  | 'embargoed';

type Demo = Omit<DemoRelease, 'race'> & { race: RaceKey };

/** Invented releases that between them show every verdict. Days are counted from the first start. */
export function demoReleases(now: number): Record<DemoKey, Demo> {
  const kelmouth = { race: 'governor', pollster: 'Kelmouth Research', wording: VOTE } as const;
  const approval = {
    race: 'approval',
    pollster: 'Norwater Polls',
    wording: APPROVE,
    population: 'adults',
    deff: { source: 'design', value: '1.3', df: '92' },
  } as const;
  return {
    tollEarlier: {
      race: 'toll',
      pollster: 'Kelmouth Research',
      field: [-47, -44],
      n: '1,100',
      shares: [
        ['Keep the toll', '45'],
        ['End the toll', '43'],
        ['Undecided', '12', false],
      ],
      wording: TOLL,
      margin: '3.5',
    },
    approvalEarlier: {
      ...approval,
      field: [-41, -36],
      n: '1,512',
      shares: [
        ['Approve', '51'],
        ['Disapprove', '40'],
        ['No opinion', '9', false],
      ],
    },
    kelmouthEarlier: {
      ...kelmouth,
      field: [-38, -35],
      n: '1,004',
      shares: [
        ['Alder', '46'],
        ['Brook', '43'],
        ['Someone else', '4'],
        ['Don’t know', '7', false],
      ],
      margin: '3.1',
    },
    assembly: {
      race: 'assembly',
      pollster: 'Norwater Polls',
      field: [-20, -16],
      n: '1,204',
      shares: [
        ['Harbour Party', '38.4'],
        ['Inland Union', '33.9'],
        ['Lantern Party', '19.6'],
        ['Commons List', '5.4'],
        ['Saltmarsh Alliance', '2.7'],
      ],
      wording: ASSEMBLY,
      deff: { source: 'kish', value: '1.24', df: '' },
      note: 'Shares are of those who named a list. Weighted by age, sex, district and education.\n\n- **Targets:** the provincial register\n- **Trimming:** weights above 5',
    },
    quillon: {
      race: 'governor',
      pollster: 'The Quillon Panel',
      sponsor: null,
      field: [-12, -10],
      n: '2,310',
      shares: [
        ['Alder', '45'],
        ['Brook', '44'],
        ['Someone else', '5'],
        ['Don’t know', '6', false],
      ],
      source: 'opt-in',
      mode: 'online',
      wording: null,
      link: null,
    },
    toll: {
      race: 'toll',
      pollster: 'Kelmouth Research',
      field: [-11, -8],
      n: '1,108',
      shares: [
        ['Keep the toll', '44'],
        ['End the toll', '44'],
        ['Undecided', '12', false],
      ],
      wording: TOLL,
      margin: '3.5',
    },
    approval: {
      ...approval,
      field: [-9, -5],
      n: '1,498',
      shares: [
        ['Approve', '42'],
        ['Disapprove', '48'],
        ['No opinion', '10', false],
      ],
    },
    quillonModelled: {
      race: 'toll',
      pollster: 'The Quillon Panel',
      sponsor: 'Coalition for Free Crossings',
      field: [-7, -6],
      n: '1,950',
      shares: [
        ['Keep the toll', '40'],
        ['End the toll', '51'],
        ['Undecided', '9', false],
      ],
      source: 'opt-in',
      mode: 'online',
      modelled: '3.1',
      wording: TOLL,
    },
    norwater: {
      race: 'governor',
      pollster: 'Norwater Polls',
      field: [-6, -3],
      n: '2,004',
      shares: [
        ['Alder', '51'],
        ['Brook', '40'],
        ['Someone else', '3'],
        ['Don’t know', '6', false],
      ],
      wording: VOTE,
      deff: { source: 'design', value: '1.32', df: '118' },
      margin: '2.5',
    },
    kelmouth: {
      ...kelmouth,
      field: [-5, -2],
      n: '1,012',
      shares: [
        ['Alder', '49'],
        ['Brook', '41'],
        ['Someone else', '4'],
        ['Don’t know', '6', false],
      ],
      margin: '3.1',
    },
    embargoed: {
      race: 'assembly',
      pollster: 'Kelmouth Research',
      field: [-3, -1],
      published: 1,
      n: '1,006',
      shares: [
        ['Harbour Party', '33'],
        ['Inland Union', '31'],
        ['Lantern Party', '15'],
        ['Commons List', '6'],
        ['Saltmarsh Alliance', '3'],
        ['Don’t know', '12', false],
      ],
      wording: ASSEMBLY,
      margin: '3.6',
      embargo: { local: `${dayFrom(now, 1)}T18:00`, zone: 'Etc/UTC' },
    },
  };
}
