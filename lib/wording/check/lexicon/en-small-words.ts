import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'ofWords'
  | 'rivals'
  | 'pollAsSubject'
  | 'everWords'
  | 'dateLinks'
  | 'heldWords'
  | 'beforeNoShare'
  | 'rangeWords'
  | 'shareLeads'
  | 'afterBareShare'
  | 'fromWords'
  | 'withWords'
  | 'ownsMargin'
  | 'orWords'
  | 'leadOrGap'
  | 'shareWords'
  | 'roundingWords'
  | 'beforeNoFraction'
  | 'afterNoFraction'
  | 'changeNouns'
  | 'countedPeople'
  | 'auxiliaries'
  | 'ownedNouns';

/** English: small words around a claim, by what they do there. */
export const EN_SMALL_WORDS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  ofWords: [{ say: ['of'] }],
  rivals: [
    {
      say: listed(`
      rival | rivals | opponent | opponents | challenger | everyone | everybody | him | them | all
      | his rival | his rivals | her rival | her rivals | his opponent | her opponent | their
      rivals | her opponents | his opponents | his challenger | her challenger | the challenger |
      the incumbent`),
    },
  ],
  pollAsSubject: [
    {
      say: listed(`
      poll | polls | survey | surveys | figures | numbers | data | results | result | findings |
      polling | research`),
    },
  ],
  everWords: [{ say: listed(`since | ever | yet | recorded | in history | on record | so far | series`) }],
  dateLinks: [{ say: listed(`– | to | and | st | nd | rd | th | the | of | .`) }],
  heldWords: [{ say: ['held', 'vote', 'voted', 'voting'] }],
  beforeNoShare: [
    { say: listed(`range | interval | between | level | above | below | over | under | than | of`) },
  ],
  rangeWords: [{ say: listed(`range | interval | z | p | run | runs | ran`) }],
  shareLeads: [{ say: ['at', 'now', 'is', 'on'] }],
  afterBareShare: [{ say: ['in', 'to', 'and', 'against'] }],
  fromWords: [{ say: ['from', 'between'] }],
  withWords: [{ say: ['with'] }],
  ownsMargin: [{ say: listed(`a | the | its | with | 's`) }],
  orWords: [{ say: ['or'] }],
  leadOrGap: [{ say: ['lead', 'gap', 'difference'] }],
  shareWords: [{ say: listed(`share | shares | figure | figures | single share`) }],
  roundingWords: [{ say: ['rounding', 'rounded', 'round', 'rounds'] }],
  beforeNoFraction: [{ say: listed(`against | from | on | than | near | to | by`) }],
  afterNoFraction: [
    {
      say: listed(
        `point | points | way | hour | hours | year | years | time | term | century | dozen | price`,
      ),
    },
  ],
  changeNouns: [{ say: listed(`change | shift | move | difference since | swing`) }],
  countedPeople: [{ say: listed(`people | respondents | interviews | residents | electors | asked`) }],
  ownedNouns: [],
  auxiliaries: [
    {
      say: listed(
        `is | are | was | has | have | had | now | still | also | 's | would | will | be | been | to`,
      ),
    },
  ],
};
