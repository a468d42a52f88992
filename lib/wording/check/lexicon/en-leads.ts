import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'leadStrong'
  | 'leadWeak'
  | 'leadStyle'
  | 'leadNoun'
  | 'trailStrong'
  | 'trailWeak'
  | 'second'
  | 'notional'
  | 'tied'
  | 'level'
  | 'plurality';

const DETERMINERS = listed(`the | a | an | his | her | its | their | our | this | that | any | some`);
const NOT_OBJECTS = [
  ...DETERMINERS,
  'past',
  'through',
  'from',
  'back',
  'straight',
  'to',
  'into',
  'us',
  'me',
  'on',
  'off',
];
const MODALS = listed(
  `to | would | does | do | did | still | now | both | they | also | might | may | could`,
);

/** English: being ahead, behind or level. */
export const EN_LEADS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  leadStrong: [
    {
      say: ['leads', 'led'],
      notBefore: NOT_OBJECTS,
      notAfter: listed(`is | was | were | been | team | all | which`),
    },
    {
      say: listed(`leads the race | leads the field | leads the poll | leads the pack | leads the contest`),
    },
    {
      say: ['leads his', 'leads her', 'leads their', 'leads its'],
      before: listed(`rival | rivals | opponent | opponents | challenger | challengers | nearest | closest`),
    },
    { say: ['leads all', 'leads both', 'leads every'] },
    {
      say: ['leading'],
      notBefore: [
        ...NOT_OBJECTS,
        'up',
        'question',
        'role',
        'figure',
        'figures',
        'economist',
        'edge',
        'experts',
      ],
      notAfter: listed(`a | an | the | of | one | country’s | two | several | some`),
    },
    {
      say: listed(`
      leading the race | leading the field | leading the poll | leading the pack | leading the
      contest`),
    },
    { say: ['the leading candidate', 'the leading party', 'poll leader', 'race leader'] },
    { say: ['lead'], after: MODALS, notBefore: [...NOT_OBJECTS, 'for'] },
    {
      say: listed(`
      in the lead | into the lead | takes the lead | took the lead | taken the lead | holds the
      lead | in first place | first place | comes first | finishes first | in pole position | on
      top | comes out on top | out in front | well in front | clear in front | front runner |
      frontrunner | pulls ahead | pulled ahead | pulling ahead | pulls away | pulling away |
      streaks ahead | well ahead | far ahead | clearly ahead | firmly ahead | has the upper hand |
      outpolls | outpacing | outpaces | is winning | are winning | wins the poll | tops the poll |
      topping the poll`),
    },
    {
      say: listed(`
      beats | beating | defeats | pips | pipped | bests | bested | outstrips | outperforms |
      shades | noses out | nosed out | overtakes | overtook | overtaking | overtaken | has overtaken |
      leapfrogs`),
    },
    { say: ['tops'], notBefore: listed(`the | out | off | up | of`) },
    { say: ['is first', 'now first', 'ranks first'], notBefore: listed(`choice | to | in | of | past | on`) },
  ],
  leadWeak: [
    {
      say: listed(`
      slightly ahead | narrowly ahead | just ahead | marginally ahead | comfortably ahead | edges
      ahead`),
    },
    {
      say: listed(
        `edging ahead | edged ahead | nudges ahead | inches ahead | moves ahead | moved ahead | noses ahead | nosed ahead | creeps ahead | sneaks ahead | squeaks ahead | a nose ahead`,
      ),
    },
    {
      say: ['ahead'],
      notAfter: listed(`
      go | goes | going | gone | went | look | looks | looking | days | weeks | months | years |
      plan | planning | straight | road | work | think | year | week | press | pressed | task |
      lies | challenges`),
      notBefore: ['with'],
    },
    { say: ['in front'], notBefore: ['page'] },
    {
      say: listed(
        `has the edge | have the edge | holds the edge | with the edge | the edge over | an edge over`,
      ),
    },
    {
      say: listed(`slight edge | narrow edge | slim edge | small edge | clear edge | an edge | point edge`),
      notBefore: ['of'],
    },
    {
      say: ['edges', 'edged', 'edging'],
      notBefore: listed(`of | up | down | higher | lower | towards | toward | back`),
    },
  ],
  leadStyle: [
    {
      say: listed(`
      edges ahead | edging ahead | edged ahead | edges | edged | edges out | nudges ahead | inches
      ahead`),
      notBefore: ['up', 'down'],
    },
    {
      say: listed(`comfortably | comfortable | commanding | narrowly | convincingly | convincing | handily`),
    },
    {
      say: listed(
        `well ahead | far ahead | streaks ahead | pulls away | pulling away | runaway | miles ahead`,
      ),
    },
    {
      say: listed(`narrow lead | slim lead | slender lead | wide lead | huge lead | massive lead | big lead`),
    },
  ],
  leadNoun: [
    {
      say: ['lead', 'advantage', 'cushion'],
      notAfter: listed(
        `to | would | could | may | might | will | does | do | not | can | did | takes | takes the`,
      ),
      notBefore: listed(
        `to | the | a | singer | author | story | line | researcher | pollster | into | times`,
      ),
    },
  ],
  trailStrong: [
    { say: ['trails', 'trailed', 'trailing'], notBefore: ['off'] },
    { say: ['beaten by', 'being beaten', 'overtaken by', 'being overtaken'] },
    { say: ['trail'], after: [...MODALS, 'who', 'parties'] },
    { say: listed(`lags | lagging | lagged | lags behind | lagging behind | trails behind | falls behind`) },
    {
      say: listed(`
      fell behind | fallen behind | slips behind | well behind | far behind | is losing to | loses
      to`),
    },
  ],
  trailWeak: [
    {
      say: ['behind'],
      notBefore: listed(`the | closed | this | these | it | them`),
      notAfter: ['left', 'reasons', 'leave', 'story'],
    },
  ],
  second: [{ say: listed(`second place | in second | comes second | runner up | finishes second`) }],
  notional: [
    {
      say: listed(`
      statistical tie | statistically tied | statistically even | statistically level |
      statistical dead heat | statistical draw | technical tie | virtual tie | virtually tied |
      effectively tied | effective tie | dead heat | neck and neck | too close to call | photo
      finish | toss up | tossup | coin flip | on a knife edge | knife edge`),
    },
  ],
  tied: [
    { say: ['tied'], notBefore: listed(`by | to | up | down | the | a | his | her | its | their`) },
    { say: ['a tie', 'in a tie', 'tie'], notBefore: ['to', 'in', 'up'], notAfter: ['to', 'would', 'could'] },
    {
      say: listed(`
      are even | is even | dead even | about even | evenly split | evenly matched | evenly divided
      | evenly balanced | split evenly | on level terms | level pegging | running even | no gap
      between`),
      notBefore: listed(`more | less | further | closer | better | worse`),
    },
    { say: ['deadlocked', 'in deadlock', 'deadlock', 'all square'] },
  ],
  level: [
    {
      say: ['level'],
      notAfter: [
        ...DETERMINERS,
        'at',
        'confidence',
        '%',
        'percent',
        'cent',
        'high',
        'higher',
        'low',
        'lower',
        'highest',
        'lowest',
        'local',
        'national',
        'provincial',
        'same',
        'which',
        'what',
        'record',
        'significance',
        'support',
        'sea',
        'entry',
        'current',
        'top',
      ],
      notBefore: ['of', 'playing', 'crossing', 'headed'],
    },
  ],
  plurality: [
    { say: ['first choice'], notBefore: ['of', 'for'] },
    {
      say: listed(`
      plurality | largest party | biggest of | largest of | is biggest | is largest | biggest
      party | strongest party | largest single party | most popular | top choice | the favourite |
      the favorite | favourite choice | preferred choice | most common answer | largest share |
      largest group | biggest share | biggest bloc | leading choice | more popular than any | most
      support | most votes`),
    },
  ],
};
