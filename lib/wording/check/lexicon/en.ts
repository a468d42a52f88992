import { EN_CHANGES } from './en-changes';
import { EN_FIGURES } from './en-figures';
import { EN_LEADS } from './en-leads';
import { EN_POLLS } from './en-polls';
import { EN_SMALL_WORDS } from './en-small-words';
import { EN_WORDS } from './en-words';
import { listed } from './listed';
import type { Lexicon } from './types';

/** English, with British and American spellings. */
export const EN_LEXICON: Lexicon = {
  decimalMark: '.',
  locale: 'en-GB',
  groupsBySpace: false,
  elisions: [],
  abbreviations: listed(`
      mr | mrs | ms | dr | st | vs | approx | gov | sen | rep | jan | feb | aug | sept | sep | oct
      | nov | dec`),
  numbers: {
    zero: 0,
    one: 1,
    two: 2,
    three: 3,
    four: 4,
    five: 5,
    six: 6,
    seven: 7,
    eight: 8,
    nine: 9,
    ten: 10,
    eleven: 11,
    twelve: 12,
    thirteen: 13,
    fourteen: 14,
    fifteen: 15,
    sixteen: 16,
    seventeen: 17,
    eighteen: 18,
    nineteen: 19,
    twenty: 20,
    thirty: 30,
    forty: 40,
    fifty: 50,
    sixty: 60,
    seventy: 70,
    eighty: 80,
    ninety: 90,
  },
  oneArticles: [],
  fractions: {
    'two thirds': 200 / 3,
    'two third': 200 / 3,
    'three quarters': 75,
    'three fourths': 75,
    'a third': 100 / 3,
    'one third': 100 / 3,
    'a quarter': 25,
    'one quarter': 25,
    'a fifth': 20,
    'one fifth': 20,
    'two fifths': 40,
    'three fifths': 60,
    'four fifths': 80,
    'a tenth': 10,
    half: 50,
    'one half': 50,
  },
  inEvery: ['in', 'in every', 'out of', 'out of every'],
  to: ['to', '–', '-'],
  datesAreNames: true,
  months: [
    ['january', 'jan'],
    ['february', 'feb'],
    ['march'],
    ['april', 'apr'],
    ['may'],
    ['june'],
    ['july'],
    ['august', 'aug'],
    ['september', 'sept', 'sep'],
    ['october', 'oct'],
    ['november', 'nov'],
    ['december', 'dec'],
  ],
  weekdays: [['sunday'], ['monday'], ['tuesday'], ['wednesday'], ['thursday'], ['friday'], ['saturday']],
  nameNouns: {
    approve: listed(`approval of the governor | approval rating | approval | approves | approving`),
    disapprove: listed(
      `disapproval of the governor | disapproval rating | disapproval | disapproves | disapproving`,
    ),
    yes: ['the ayes', 'yes side', 'yes vote', 'yes camp'],
    no: ['noes', 'no side', 'no vote', 'no camp'],
    "don't know": listed(`did not know | do not know | does not know | had not decided | have not decided`),
  },
  commonNames: listed(`
      yes | no | other | others | none | someone else | remain | leave | undecided | unsure |
      better | worse | right | wrong | for | against | neither | both | don't know`),
  afterCommonName: listed(`
      is | has | leads | trails | at | on | to | ahead | behind | vote | votes | side | camp |
      campaign | voters | up | down | gains | would | will | wins | and | in | , | . | : | ; | ) |
      ! | " | 's | by | over | with | support | was | had | level | slips | rises | falls | holds
      | edges | remains | still | now | are | the | ? | surges | tied | stands | polls | above |
      below | set | looks | heading | headed | narrowly | comfortably | clearly | slightly | just
      | well | jumps | climbs | drops | loses | gaining | wins | further | against`),
  genericNameWords: listed(`party | the | list | alliance | union | league | movement | coalition`),
  notNames: listed(`
      the | a | an | in | on | at | poll | polls | survey | who | it | he | she | they | this |
      that | voters | support | most | half | both | neither | race | candidate | if | and | but |
      as | new | now | with | why | how | what | is | are | does | not | more | governor |
      exclusive | today | latest | lead | gap | no | yes | for | one | two | three | still |
      statistically | narrowly | also | there | momentum | backing | approval | figures | numbers
      | slight | we | i | his | her | its | their`),
  cues: { ...EN_LEADS, ...EN_CHANGES, ...EN_FIGURES, ...EN_POLLS, ...EN_WORDS, ...EN_SMALL_WORDS },
  populations: {
    adults: 'adults',
    'registered-voters': 'registered voters',
    'likely-voters': 'likely voters',
  },
  replacements: {
    isAheadUnsettled: 'is ahead of {b} in this poll, which cannot settle it',
    aheadNow: 'ahead',
    isAhead: 'is ahead of {b}',
    leads: 'leads',
    trails: 'trails',
    chanceGap: 'has the higher figure, but chance alone could produce that gap',
    untestedGap: 'has the higher figure, in a poll that carries no recognised margin of error',
    level: 'level in this poll',
    higherFigure: 'has the higher figure',
    higherUnsettled: 'has a higher figure, {now} against {then}, but the polls cannot settle it',
    lowerUnsettled: 'has a lower figure, {now} against {then}, but the polls cannot settle it',
    chanceChange: 'is at {now}, against {then}: a difference that chance alone could produce',
    untestedChange: 'is at {now}, against {then}; the change cannot be tested',
    sameFigure: 'has the same figure as before',
    isUp: 'is up',
    isDown: 'is down',
    points: '{n} percentage points',
    suggests: 'suggests',
    largerThanChance: 'larger than chance alone would usually produce',
    couldBeChance: 'of a size that chance alone could produce',
    atShare: '{share}',
  },
};
