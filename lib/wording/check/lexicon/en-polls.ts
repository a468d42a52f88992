import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'forecast'
  | 'proof'
  | 'shows'
  | 'subgroup'
  | 'amongst'
  | 'wholeSample'
  | 'everybody'
  | 'people'
  | 'voters'
  | 'likelyVoters'
  | 'registeredVoters'
  | 'adults';

const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));
const WIN = listed(`
      win | lose | be elected | prevail | triumph | beat | defeat | be the next | become governor
      | be governor | take office | carry the | sweep | succeed | be defeated | cruise | govern |
      form the next | be re elected | victory`);

/** English: what polls are said to do, and who was asked. */
export const EN_POLLS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  forecast: [
    {
      say: [
        ...each(
          listed(`
      will | would | is going to | are going to | is set to | are set to | set to | is likely to |
      likely to | on course to | on track to | expected to | poised to | bound to | certain to |
      sure to | destined to | looks set to | is about to | on the way to | should | headed to |
      favoured to | favored to | predicted to | forecast to | due to | ready to | guaranteed to`),
          WIN,
        ),
      ],
    },
    {
      say: [
        ...each(
          listed(`
      on course for | on track for | heading for | headed for | set for | poised for | cruising to
      | marching to | on the way to | heading towards | cruising towards | on the road to | bound
      for`),
          listed(`
      victory | a victory | a win | win | defeat | a defeat | a landslide | office | the
      governorship | an easy win | a clear win | a narrow win | a comfortable win | a majority | a
      second term | government | power`),
        ),
      ],
    },
    {
      say: listed(`
      landslide | victory is certain | all but certain | unstoppable | unbeatable | shoo in |
      governor in waiting | a done deal | foregone conclusion | has it in the bag`),
      notBefore: ['damage', 'warning', 'risk'],
    },
    {
      say: listed(`
      poll predicts | polls predict | poll forecasts | survey predicts | polls forecast | poll
      foretells | predicts | predict | is a forecast | projects | projected winner | projected to
      win`),
      notBefore: ['of', 'that'],
    },
    { say: ['predicts that', 'predict that'] },
  ],
  proof: [
    { say: listed(`proves | proved | prove | proven | proof | proving`) },
    {
      say: listed(`
      confirms | confirmed | confirm | confirming | establishes | established | demonstrates |
      demonstrated | demonstrate | leaves no doubt | beyond doubt | settles | without doubt |
      makes certain`),
    },
  ],
  shows: [{ say: listed(`shows | show | showed | showing | shown | reveals | revealed`) }],
  subgroup: [
    {
      say: [
        ...each(
          listed(`
      young | younger | older | elderly | female | male | rural | urban | suburban | first time |
      working class | middle class | independent | undecided | swing | student | retired | poor |
      poorer | wealthy | richer | university educated | college educated | unemployed | married |
      northern | southern | coastal | inland | city | island`),
          listed(`voters | people | adults | men | women | respondents | residents`),
        ),
        'women',
        'men',
        'pensioners',
        'graduates',
        'students',
        'retirees',
        'young people',
        'adults under',
        'voters under',
        'people under',
        'adults over',
        'voters over',
        'people over',
        'adults aged',
        'voters aged',
        'people aged',
        'those aged',
        'parishes',
        'island parishes',
        'districts',
        'suburbs',
        'villages',
        'countryside',
        'under 25s',
        'under 30s',
        'under 35s',
        'under 40s',
        'over 50s',
        'over 60s',
        'over 65s',
        'independents',
        'homeowners',
        'renters',
        'parents',
        'farmers',
        'commuters',
        'fishermen',
        'millennials',
      ],
    },
  ],
  amongst: [{ say: ['among', 'amongst'] }],
  wholeSample: [
    {
      say: listed(`
      all | members | panellists | everyone | those | likely | registered | voters | adults |
      people | respondents | the | several | so many | them | decided | other | candidates |
      parties | options | electors | polls | recent | more than | its | his | her | their | these
      | those who | a | an | many | others`),
    },
    { say: ['1'] },
  ],
  everybody: [
    {
      say: listed(`
      the country | the nation | the province | the whole province | the population | the public |
      the electorate | the entire electorate | citizens | residents | inhabitants | everyone in |
      islanders | locals | the whole country | the entire country | the people of | the people |
      all adults`),
      notBefore: listed(`whom | who | is | at | election`),
    },
  ],
  people: [
    {
      say: ['people', 'of the population'],
      after: listed(`
      of | % | percent | cent | most | more | fewer | half | three | four | five | ten | two |
      many`),
      notBefore: listed(`asked | surveyed | polled | interviewed | were | who | whom | the`),
    },
  ],
  voters: [
    {
      say: ['voters', 'electors', 'voter'],
      notAfter: listed(`likely | registered | decided | probable | eligible | all`),
      notBefore: listed(`registration | turnout | suppression | roll | rolls`),
    },
  ],
  likelyVoters: [
    {
      say: listed(`
      likely voters | likely voter | probable voters | those likely to vote | people likely to
      vote`),
    },
  ],
  registeredVoters: [{ say: ['registered voters', 'registered voter', 'registered electors'] }],
  adults: [{ say: ['adults', 'adult'], notBefore: ['education', 'son', 'daughter'] }],
};
