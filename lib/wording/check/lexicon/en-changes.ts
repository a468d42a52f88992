import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'up'
  | 'down'
  | 'dramatic'
  | 'momentum'
  | 'leadUp'
  | 'leadDown'
  | 'gap'
  | 'steady'
  | 'littleChanged'
  | 'raceWords'
  | 'recordWords'
  | 'recordHigh'
  | 'recordLow';

const PHRASAL = (
  'made make makes making set turned turn turns show showed shown add adds added break breaks broke pick follow ' +
  'follows wake lined ended end come came brought bring speed sum sums summed give gave open opened signed sign ' +
  'divided cleared clear grew split close drawn draw drew takes take taken taking summing runner stand stood warm ' +
  'look looked build built hold held keep keeps catch catching brings backed backs toss run line start mix pop check'
).split(' ');
const DOWN_PHRASAL =
  'break broke turned written lay laid stand stands step steps slow slowed shut tone upside narrowed calm boil boils'.split(
    ' ',
  );
const OF_PEOPLE = listed(
  `the | to | his | her | its | their | seats | seat | a | an | out | in | for | with`,
);

/** English: moving, standing still, and how high or low ever. */
export const EN_CHANGES: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  up: [
    {
      say: ['up'],
      notAfter: PHRASAL,
      notBefore: listed(`to | against | for | until | till | with | on | and | a`),
    },
    { say: ['up to'], after: ['is', 'was', 'are', 'now'] },
    { say: ['up on', 'up and up'], after: listed(`is | was | are | now | points | point | %`) },
    {
      say: listed(`
      rises | rose | risen | rising | climbs | climbed | climbing | increases | increased |
      increasing`),
    },
    {
      say: listed(`rise | climb | increase | uptick | upturn | upswing`),
      notAfter: ['tax', 'pay', 'price', 'rent'],
    },
    {
      say: ['gains', 'gained', 'gaining', 'gain'],
      notBefore: listed(`access | control | entry | office | from`),
    },
    {
      say: listed(`
      gaining ground | gains ground | gained ground | makes gains | made gains | making gains | on
      the rise`),
    },
    {
      say: listed(`grows | grew | grown | growing | grow`),
      notBefore: listed(`up | number | list | concern | economy`),
    },
    {
      say: listed(`jumps | jumped | jump | jumping | improves | improved | improving | advances | advanced`),
      notBefore: ['in', 'at', 'the', 'into'],
    },
    {
      say: listed(`jump in | improved in | increase in | rise in | growth in`),
      before: listed(`support | backing | approval | popularity | votes`),
    },
    {
      say: listed(`
      rebounds | rebounded | recovers | recovered | recovering | bounces back | bounced back | on
      the up`),
    },
    {
      say: listed(`
      ticks up | ticked up | edges up | edged up | inches up | moves up | moved up | creeps up |
      crept up`),
    },
    {
      say: listed(`
      strengthens | strengthened | picking up support | picked up support | picks up support |
      bounce`),
    },
    { say: ['win over', 'winning over', 'won over'], before: ['voters', 'more'] },
    { say: ['more popular'], notBefore: ['than'] },
  ],
  down: [
    { say: ['down'], notAfter: DOWN_PHRASAL, notBefore: listed(`the | payment | ballot | under | river`) },
    {
      say: listed(
        `falls | fell | fallen | falling | drops | dropped | dropping | slips | slipped | slipping`,
      ),
      notBefore: listed(
        `out | short | below | under | behind | into | asleep | on | within | outside | well`,
      ),
    },
    {
      say: ['fall'],
      notAfter: listed(`this | last | next | the | each | every`),
      notBefore: listed(`short | below | under | behind | into | within | outside | campaign | election`),
    },
    {
      say: listed(`slide | drop | slip | decline | decrease | dip | downturn`),
      notBefore: ['out', 'off', 'to comment', 'to answer'],
    },
    {
      say: listed(`
      declines | declined | declining | decreases | decreased | decreasing | dips | dipped |
      dipping`),
      notBefore: ['to'],
    },
    { say: ['loses', 'lost', 'losing', 'lose'], notBefore: OF_PEOPLE },
    {
      say: listed(`
      loses ground | losing ground | lost ground | losing support | lost support | loses support |
      sheds | shed`),
    },
    {
      say: listed(`
      sinks | sank | sunk | sinking | slides | slid | sliding | ebbs | ebbing | fades | fading |
      faded`),
    },
    {
      say: listed(`
      weakens | weakened | weakening | wanes | waning | shrinks | shrank | shrunk | shrinking |
      dwindles | dwindling`),
    },
    {
      say: listed(
        `ticks down | ticked down | edges down | edged down | on the slide | on the wane | in decline`,
      ),
    },
    { say: ['less popular'], notBefore: ['than'] },
  ],
  dramatic: [
    {
      say: listed(`
      surge | surges | surged | surging | soar | soars | soared | soaring | skyrockets |
      skyrocketed | rockets | rocketed`),
    },
    {
      say: listed(`
      slump | slumps | slumped | slumping | plunge | plunges | plunged | plunging | plummet |
      plummets`),
    },
    {
      say: listed(`
      plummeted | plummeting | tumble | tumbles | tumbled | tumbling | nosedive | nosedives |
      nosedived`),
    },
    {
      say: listed(`
      collapse | collapses | collapsed | collapsing | crashes | crashed | crashing | crash |
      freefall | free fall`),
      notAfter: ['car', 'bridge', 'market', 'plane'],
    },
    {
      say: listed(
        `leaps | leapt | leap | spikes | spiked | spike | haemorrhaging | hemorrhaging | meteoric | craters | cratered | cratering | tanks | tanked | implodes | imploded | implosion | meltdown | balloons | ballooned | nose dives | nose dived`,
      ),
    },
  ],
  momentum: [
    {
      say: listed(`
      momentum | tide is turning | tide has turned | turning tide | bandwagon | wind at his back |
      wind at her back | wind in his sails | wind in her sails | on a roll | gathering pace |
      gathering steam | gaining steam`),
    },
  ],
  leadUp: [
    {
      say: listed(`
      widens | widened | widening | widen | extends | extended | extending | stretches | stretched
      | doubles | doubled | expands | expanded | builds | pads | padded | trebled | tripled |
      broadens`),
    },
    {
      say: listed(
        `growing lead | increasing lead | bigger lead | larger lead | further ahead | further behind`,
      ),
    },
  ],
  leadDown: [
    {
      say: ['narrows', 'narrowed', 'narrowing', 'narrow'],
      notBefore: listed(`lead | edge | majority | margin | advantage | win | gap`),
    },
    {
      say: listed(`
      closing the gap | closes the gap | closed the gap | close the gap | closing in | closes in |
      gap closes`),
    },
    {
      say: listed(`
      gap is closing | gap has closed | tightens | tightened | tightening | halves | halved |
      evaporates`),
    },
    {
      say: listed(`
      evaporated | erodes | eroded | vanished | catching up | catches up | shrinking lead |
      narrowing lead | cuts into | cut into | cuts the lead | cut the lead | eats into`),
    },
  ],
  gap: [{ say: listed(`gap | lead | advantage | deficit | race | contest`) }],
  steady: [
    {
      say: listed(`
      steady | holds steady | holding steady | held steady | remains steady | unchanged | no
      change | not changed | not moved | not budged | stable | stalled | stalls | static |
      stagnant | stagnates | flatlines | flatlined | flatlining | stays the same | stayed the same
      | remains the same | stood still | stands still | stays put | holds firm | holding firm | no
      movement | stuck | stuck at | standstill | frozen | plateaued | plateaus`),
      notBefore: listed(`job | jobs | stream | income | hand | in traffic`),
    },
    { say: ['flat'], notAfter: ['a', 'the', 'his', 'her'], notBefore: ['rate', 'fee', 'tax', 'screen'] },
  ],
  littleChanged: [
    {
      say: listed(`
      little changed | little change | barely changed | hardly changed | scarcely changed | barely
      moved | hardly moved | virtually unchanged | almost unchanged | broadly unchanged | largely
      unchanged | essentially unchanged | broadly stable | broadly steady | largely stable |
      changed little | barely budged`),
    },
  ],
  raceWords: [
    {
      say: listed(
        `race | contest | gap | picture | standings | field | lead | views | opinion | opinions | mood | polls | figures | numbers | support`,
      ),
    },
  ],
  recordWords: [
    {
      say: listed(`
      record high | record low | record lead | record support | record level | record share | new
      record | historic high | historic low | all time high | all time low | all time | for the
      first time | first time | unprecedented | never been higher | never been lower | best ever |
      worst ever | best result yet | worst result yet | best showing yet`),
      notBefore: ['number', 'voters', 'buyers'],
    },
    {
      say: ['a record'],
      notBefore: listed(`high | low | lead | support | level | share | of | number | time`),
    },
  ],
  recordHigh: [
    { say: listed(`highest | largest | biggest | best | strongest | greatest | widest`) },
    {
      say: listed(`
      record high | record lead | record support | historic high | all time high | never been
      higher`),
    },
  ],
  recordLow: [
    { say: listed(`lowest | smallest | worst | weakest | narrowest`) },
    { say: ['record low', 'historic low', 'all time low', 'never been lower'] },
  ],
};
