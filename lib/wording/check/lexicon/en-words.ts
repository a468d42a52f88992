import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'poll'
  | 'compare'
  | 'fieldworkWords'
  | 'publishedWords'
  | 'eventWords'
  | 'relativeDates'
  | 'earlierWords'
  | 'periodWords'
  | 'openers'
  | 'relatives'
  | 'withinWords'
  | 'outsideWords'
  | 'comparatives'
  | 'conditionals'
  | 'negators'
  | 'clauseBreaks'
  | 'pronouns'
  | 'objectMarkers'
  | 'backs';

const MARGIN_STARTS = listed(`the | its | a | any | that | this | ± | margin | error | poll | survey`);

/** English: words of the trade, of time, and those that open, deny or part a claim. */
export const EN_WORDS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  poll: [
    {
      say: listed(`
      poll | polls | survey | surveys | polling | pollster | pollsters | respondents | support |
      figures | numbers | voters | race | election | candidate | candidates | rivals | contest |
      challenger | incumbent | opinion | fieldwork`),
    },
  ],
  compare: [
    {
      say: listed(`
      than | compared with | compared to | difference between | differs | differ | disagree | gap
      between the polls | gap between the two polls | contrast`),
    },
  ],
  fieldworkWords: [
    {
      say: listed(`
      conducted | interviewers | surveyed | interviewed | interviews | interviewing | fieldwork |
      carried out | polled | taken | asked | in the field | questioned | surveying | ran from |
      field dates | was done | were done | spoke to`),
    },
  ],
  publishedWords: [
    {
      say: listed(
        `published | released | publication | release | out on | came out | appeared | poll of | poll`,
      ),
    },
  ],
  eventWords: [
    {
      say: listed(`
      election | election day | vote | voting | referendum | debate | ballot | polling day |
      campaign | polls open | deadline | conference | resigned | strike | storm | speech | scandal
      | hearing | launch | launched | budget | trial`),
    },
  ],
  relativeDates: [
    {
      say: listed(`
      this week | last week | this month | last month | yesterday | today | this weekend | last
      weekend | earlier this week | earlier this month | this year | last year | recently | days
      ago | weeks ago | a week ago | a month ago | in recent days | in recent weeks | over the
      weekend`),
    },
  ],
  earlierWords: [
    {
      say: listed(`
      was | were | had | earlier | previous | previously | last | from | against | compared |
      since | then | before | ago | on | same figure as | in its poll | in the poll by`),
    },
  ],
  periodWords: [
    {
      say: listed(`
      last year | a year ago | last month | a month ago | since spring | since summer | since
      winter | since last year | last week | a week ago | two weeks ago | six months ago | since
      the last election | since the debate | since the last vote | at the last election | in the
      last election | this year | in recent weeks | in recent months | over the past year | over
      the year | for months | for weeks | since the scandal | since the budget | year on year | in
      a week | in a fortnight | in two weeks | since the election`),
    },
  ],
  openers: [
    {
      say: listed(`
      whether | needs | needed | not read | wrong to read | whichever | whoever | what | warned
      against | cautioned against | nobody should | nothing | nothing in | who | which of | which
      candidate | which party | which side | can not say | can not tell | can not settle | can not
      show | could not say | can not conclude | not possible to say | impossible to say | not safe
      to say | no sign | no evidence | not evidence | no proof | not proof | no reason | not clear
      | unclear | not known | unknown | not certain | uncertain | not establish | not mean | not
      say | not show | not support | not confirm | not prove | not be taken | not enough | too
      early | too small to | too few | would have to | would need to | needs to | need to | needed
      to | has to | must | question of | unless | without knowing | rather than | far from |
      nothing to say | nor does | nobody can say | hard to say | cannot be said | may | might |
      chance alone | error alone | chance could | range runs | range would run | it would run | it
      could run | a true change | not that | no guarantee | not a forecast | not a prediction |
      wrong to say | denied | denies | could`),
      notBefore: listed(`has | said | have | backed | support | voted`),
    },
    { say: ['who has', 'who is'], after: listed(`say | tell | of | on | about | know`) },
  ],
  relatives: [{ say: ['who', 'which', 'whom'] }],
  withinWords: [
    { say: listed(`within | inside | smaller than | less than | below | under`), before: MARGIN_STARTS },
  ],
  outsideWords: [
    {
      say: listed(`
      outside | well outside | beyond | larger than | bigger than | greater than | wider than |
      exceeds | more than | above | well above | over`),
      before: MARGIN_STARTS,
    },
  ],
  comparatives: [
    {
      say: listed(`
      better | worse | stronger | weaker | higher | lower | bigger | smaller | larger | wider |
      narrower | points more | points fewer | points less | points above | points below | more
      support | less support | more popular | less popular | points better | points worse | points
      apart | point above | point below`),
    },
  ],
  conditionals: [
    { say: ['were', 'had the'], after: ['', '.', ',', '"', ':'] },
    {
      say: listed(`if | even if | unless | provided | suppose | suppose that`),
      notAfter: listed(`they | we | who | voters | adults | people | interviews | and`),
    },
  ],
  negators: [
    {
      say: listed(`
      not | never | no longer | nor | neither | no | hardly | without | nobody | fails to | failed
      to | stops short of`),
    },
  ],
  clauseBreaks: [
    { say: listed(`; | : | – | but | while | although | though | however | whereas | yet | because`) },
  ],
  pronouns: [
    {
      say: listed(`
      he | she | they | it | his | her | their | its | the candidate | the party | the incumbent |
      the challenger | the governor | the leader`),
    },
  ],
  objectMarkers: [
    {
      say: listed(`
      for | of | over | against | than | to | from | with | behind | leads | leading | led | lead
      | beats | beating | defeats | trails | trailing | trailed | overtakes | overtaken | overtook
      | passes | edges | out | tops | and`),
    },
  ],
  backs: [
    {
      say: listed(`
      for | back | backs | backed | backing | support | supports | supported | supporting | favour
      | favor | choose | chose | say | said | saying | prefer | preferred | would vote | vote |
      want | wanted | chosen | named | name | names | choosing | picked | pick | approve |
      disapprove`),
    },
  ],
};
