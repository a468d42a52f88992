import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'majority'
  | 'most'
  | 'overHalf'
  | 'underHalf'
  | 'minority'
  | 'aboveThreshold'
  | 'belowThreshold'
  | 'thresholdNoun'
  | 'intoAssembly'
  | 'outOfAssembly'
  | 'marginNoun'
  | 'plusMinus'
  | 'withinMargin'
  | 'outsideMargin'
  | 'noMargin'
  | 'statSignificant'
  | 'significant'
  | 'clear'
  | 'sampleMarkers'
  | 'interviewed'
  | 'approximately'
  | 'almost'
  | 'decided'
  | 'percentWords'
  | 'pointWords'
  | 'sizeMarkers'
  | 'notShare';

const ASSEMBLY = listed(`parliament | the assembly | assembly | the house | the chamber | the council`);
const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));

/** English: halves, thresholds, margins, sizes and significance. */
export const EN_FIGURES: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  majority: [
    {
      say: listed(`majority | majorities | absolute majority | outright majority | clear majority`),
      notBefore: listed(`leader | government | party | rule | vote | verdict | shareholder | in`),
      notAfter: ['silent'],
    },
  ],
  most: [
    {
      say: ['most'],
      before: (
        'voters people adults respondents of back backed support supported say said want wanted favour favor ' +
        'favoured disapprove approve residents those electors likely registered oppose opposed reject agree think ' +
        'would choose chose prefer men women islanders locals'
      ).split(' '),
      notAfter: listed(`at | the | who | matters | is | are | what | among`),
    },
  ],
  overHalf: [
    {
      say: listed(`
      more than half | over half | above half | well over half | just over half | slightly more
      than half`),
    },
    {
      say: [
        ...each(
          listed(`more than | over | above | past | tops | exceeds | passes | crosses`),
          listed(`50% | 50 % | 50 percent | 50 per cent | fifty percent | the halfway mark | the 50% mark`),
        ),
      ],
    },
    { say: ['better than half', 'the better part of', 'upwards of half'] },
  ],
  underHalf: [
    {
      say: listed(`
      less than half | fewer than half | under half | below half | just under half | short of half
      | short of a majority | not a majority | no majority`),
    },
    {
      say: [
        ...each(
          ['less than', 'under', 'below', 'short of'],
          listed(`50% | 50 % | 50 percent | 50 per cent | the 50% mark`),
        ),
      ],
    },
  ],
  minority: [
    {
      say: ['minority', 'a minority'],
      notBefore: listed(`government | leader | voters | communities | groups | languages | rights`),
    },
  ],
  aboveThreshold: [
    {
      say: listed(`
      above | over | clears | clear | cleared | clearing | passes | passed | past | crosses |
      crossed | crossing | meets | makes | beats | reaches | reached | exceeds | tops | surpasses
      | vaults | over the line`),
    },
  ],
  belowThreshold: [
    {
      say: listed(`
      below | under | misses | missed | missing | short of | fails to clear | fails to reach |
      fails to pass | fails | not clear | not reach | beneath | fall short of | falls short of`),
    },
  ],
  thresholdNoun: [{ say: listed(`threshold | hurdle | bar | barrier | cut off | cutoff | minimum`) }],
  intoAssembly: [
    {
      say: [
        ...each(
          listed(`
      enters | enter | entering | into | in | returns to | a place in | seats in | stays in | back
      in`),
          ASSEMBLY,
        ),
      ],
      notBefore: listed(`election | vote | race | elections | poll | contest`),
    },
    { say: listed(`would win seats | wins seats | win seats | qualifies for seats | qualify for seats`) },
  ],
  outOfAssembly: [
    {
      say: [
        ...each(
          listed(`
      out of | miss | misses | outside | leaves | crashes out of | drops out of | locked out of |
      shut out of`),
          ASSEMBLY,
        ),
      ],
    },
    {
      say: listed(`would win no seats | wins no seats | lose all its seats | loses all its seats | no seats`),
    },
  ],
  marginNoun: [
    {
      say: listed(`
      margin of error | margins of error | margin of sampling error | error margin | sampling
      margin | moe`),
    },
  ],
  plusMinus: [{ say: listed(`± | plus or minus | +/- | + / - | plus minus | + or -`) }],
  withinMargin: [
    {
      say: listed(`
      within the margin | within margin | within its margin | within the poll's margin | inside
      the margin | within the error margin | within the survey's margin | within a margin |
      smaller than the margin | less than the margin | below the margin | under the margin |
      inside the error margin | within sampling error | within the sampling error`),
    },
  ],
  outsideMargin: [
    {
      say: listed(`
      outside the margin | outside margin | outside its margin | outside the poll's margin |
      beyond the margin | larger than the margin | bigger than the margin | greater than the
      margin | exceeds the margin | more than the margin | above the margin | outside the error
      margin | well outside the margin | wider than the margin`),
    },
  ],
  noMargin: [
    {
      say: listed(`
      no margin | no recognised margin | no recognized margin | not a margin | without a margin |
      not have a margin | no sampling margin | no such margin | states no margin | not give a
      margin | not carry a margin | no error margin`),
    },
  ],
  statSignificant: [
    {
      say: listed(`
      statistically significant | statistically significantly | statistical significance |
      statistically meaningful | statistically clear | statistically reliable`),
    },
  ],
  significant: [
    {
      say: listed(`
      significant | significantly | meaningful | beyond chance | not down to chance | not a fluke
      | no fluke | not due to chance | cannot be chance | real`),
      notBefore: listed(`other | estate | time | life | name | world | terms | number | that`),
    },
  ],
  clear: [
    {
      say: listed(`
      clear lead | clear advantage | clearly ahead | clearly leads | clear favourite | clear
      favorite | clear front runner | clear winner | clear gap | decisive lead | decisive |
      decisively | undisputed | unmistakable | solid lead | firm lead | clear rise | clear fall |
      clear drop | clear gain | clearly up | clearly down | clear shift | clear majority`),
    },
  ],
  sampleMarkers: [
    {
      say: listed(`
      sample of | sample size of | n = | n= | sample size was | sample was | sample size is |
      based on`),
    },
  ],
  interviewed: [
    {
      say: listed(`
      surveyed | polled | interviewed | asked | questioned | spoke to | sampled | talked to |
      canvassed | poll of | survey of | interviews with | answers from | responses from`),
    },
  ],
  approximately: [
    {
      say: listed(`
      about | around | roughly | some | approximately | nearly | almost | more than | over | just
      over | just under | fewer than | close to | at least | up to | under | circa`),
    },
  ],
  almost: [
    {
      say: listed(`
      nearly | almost | just under | close to | just over | about | around | roughly | some |
      approximately | more than | over | less than | under | fewer than | barely | slightly more
      than | slightly less than | well over | a little over | a little under`),
    },
  ],
  decided: [
    {
      say: listed(`
      decided voters | of those decided | excluding undecided | excluding the undecided | without
      undecided | who have decided | with a preference | excluding don't knows | excluding do not
      knows | among decided | of valid votes | of votes cast | leaving out the undecided |
      undecideds excluded | undecided voters excluded | who named a choice | who made a choice`),
    },
  ],
  percentWords: [{ say: listed(`% | percent | per cent | pct | pc`) }],
  pointWords: [
    {
      say: listed(`
      percentage points | percentage point | points | point | pts | pt | pp | ppts | % points |
      percent points`),
    },
  ],
  sizeMarkers: [
    {
      say: listed(`
      by | of | by about | by some | by around | by just | by only | by a | of about | of some |
      of just | of only | of a | by nearly | of nearly | by almost | by more than | of more than |
      by roughly | to | to just | now | is | at | stands at | is now | a`),
    },
  ],
  notShare: [
    {
      say: listed(`
      confidence | confident | level | threshold | hurdle | turnout | range | interval | response
      rate | bar | certain | chance | probability | off | discount | cut | sure | mark | precincts
      | reporting`),
    },
  ],
};
