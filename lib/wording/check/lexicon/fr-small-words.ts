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
  | 'ownedNouns'
  | 'otherMatters';

/** French: small words around a claim, by what they do there. */
export const FR_SMALL_WORDS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  ofWords: [{ say: ['de', "d'", 'du', 'des', 'de la', "de l'"] }],
  rivals: [
    {
      say: listed(
        `son rival | sa rivale | ses rivaux | son adversaire | ses adversaires | tous | toutes | lui | elle | eux`,
      ),
    },
  ],
  pollAsSubject: [
    {
      say: listed(
        `sondage | sondages | enquête | enquêtes | chiffres | résultat | résultats | étude | baromètre | données`,
      ),
    },
  ],
  everWords: [
    {
      say: listed(`jamais | de la série | à ce jour | historique | de l'histoire | enregistré | enregistrée`),
    },
  ],
  dateLinks: [{ say: listed(`– | au | à | et | du | le | de | er`) }],
  heldWords: [{ say: listed(`avait lieu | se tenait | se tenaient | avaient lieu | voteraient | voterait`) }],
  beforeNoShare: [
    {
      say: listed(`
      fil des | seuil de | seuil des | barre de | barre des | plus de | moins de | au-dessus de | au-dessus des
      | en dessous de | en dessous des | atteindre | atteindre les | sous les | entre | dépasser | dépasser les
      | règle des | règle de | intervalle de | minimum de | franchir les`),
    },
  ],
  rangeWords: [
    {
      say: listed(
        `intervalle | fourchette | va de | vont de | irait de | iraient de | allant de | oscille | z | p | irait`,
      ),
    },
  ],
  shareLeads: [{ say: ['à', 'jusqu’à', 'avec', 'en'] }],
  afterBareShare: [{ say: ['à', 'et', 'contre', 'dans'] }],
  fromWords: [{ say: ['entre', 'depuis'] }, { say: ['de'], notAfter: ['était', 'est', 'maintenant'] }],
  withWords: [{ say: ['avec', 'avec les', 'avec ses'] }],
  ownsMargin: [{ say: listed(`une | la | sa | avec | cette`) }],
  orWords: [{ say: ['ou', 'ou à', 'ou de'] }],
  leadOrGap: [{ say: ['avance', 'écart', 'différence'] }],
  shareWords: [
    { say: listed(`pourcentage | pourcentages | score | scores | chiffre | chiffres | chaque pourcentage`) },
  ],
  roundingWords: [
    { say: listed(`arrondi | arrondis | arrondie | arrondies | arrondir | arrondit | l'arrondi`) },
  ],
  beforeNoFraction: [{ say: listed(`contre | en | sur | près de | par | à`) }],
  afterNoFraction: [
    {
      say: listed(
        `semaine | semaines | jour | jours | mois | point | points | heure | heures | an | ans | année | siècle | douzaine | place | position`,
      ),
    },
  ],
  changeNouns: [{ say: listed(`changement | évolution | mouvement | variation | différence depuis`) }],
  countedPeople: [{ say: listed(`personnes | sondés | entretiens | habitants | répondants | interrogés`) }],
  auxiliaries: [
    {
      say: listed(`
      est | sont | a | ont | était | avait | toujours | encore | se | s' | va | vont | reste | restent | déjà |
      aussi | apparaît | maintenant | désormais | serait | aurait | nettement | largement | légèrement | l'`),
    },
  ],
  ownedNouns: [
    {
      say: listed(`
      avance | avantage | hausse | baisse | progression | recul | chute | remontée | montée | percée |
      effondrement | envolée | plongeon | dynamique | élan | augmentation | déclin`),
    },
  ],
  otherMatters: [
    {
      say: listed(`
      prix | carburant | inflation | chômage | impôt | impôts | salaire | salaires | loyer | loyers |
      température | bourse | dette | budget | actions | participation`),
    },
  ],
};
