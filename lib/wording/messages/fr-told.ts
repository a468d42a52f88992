import type { ClaimMessages } from '../language-pack';
import { FR_GAP } from './fr-gap';
import { FR_NET_SCORE, FR_NET_SCORE_CHANGE } from './fr-net-score';
import { aboveOrBelow, ASKED, higherOrLower, UNSETTLED_BY_TWO, upOrDown } from './fr-parts';

const UNSETTLED = 'mais il ne permet pas de trancher';
const BOTH = 'Le sondage donne {a} à {aShare} et {b} à {bShare}';
const BOTH_NOW = 'Le sondage donne {a} à {aNow} et {b} à {bNow}';
const GAP_NOW = `${BOTH_NOW}, contre {aThen} et {bThen} dans {prevPoll}`;
const AT = 'Le sondage donne {option} à {now}';
const AT_BOTH = `${AT}, contre {then} dans {prevPoll}`;
const SHARE = `Le sondage donne {option} à {share}${ASKED}`;
const AHEAD = (poll: string, answer: string) =>
  `{setting, select, contest {${poll} donne {a} devant {b}, {aShare} contre {bShare}, un écart qui dépasse ce que le hasard produit d’ordinaire.} other {${answer} {a} est plus fréquente que la réponse {b}, {aShare} contre {bShare}, un écart qui dépasse ce que le hasard produit d’ordinaire.}}`;
const MOVED = `s’est déplacé vers {toward} depuis {prevPoll} : {aNow} contre {bNow}, après {aThen} contre {bThen}.`;
const SHARED =
  'ce sondage partage des entretiens avec {prevPoll}, si bien que l’évolution ne peut pas être testée';
const TWICE =
  'les mêmes personnes ont été interrogées les deux fois, si bien que l’évolution ne peut pas être testée';
const NO_MARGIN = 'Un sondage sans marge d’erreur reconnue donne';
const NO_SIZE = 'Un sondage qui ne dit pas combien de personnes ont répondu donne';

/** One sentence per finding that can stand in any line, in French. */
export const FR_TOLD: ClaimMessages = {
  lead: {
    'holds-twice': AHEAD('Le sondage', 'La réponse'),
    holds: AHEAD('Ce sondage', 'Dans ce sondage, la réponse'),
    fragile: `Ce sondage donne un chiffre plus élevé pour {a} que pour {b}, {aShare} contre {bShare}, ${UNSETTLED}.`,
    level: 'Ce sondage donne le même chiffre pour {a} et {b} : {aShare}.',
    'not-shown': `${BOTH}, un écart que le hasard seul pourrait produire.`,
    family: `${BOTH}, un écart que le hasard pourrait produire parmi plusieurs comparaisons.`,
    untested: `{reason, select, notDisclosed {Le sondage ne communique pas les chiffres nécessaires pour comparer {a} et {b}.} noSamplingBasis {${NO_MARGIN} {a} à {aShare} et {b} à {bShare}.} noSampleSize {${NO_SIZE} {a} à {aShare} et {b} à {bShare}.} tooSmall {Un sondage aux entretiens trop peu nombreux pour comparer donne {a} à {aShare} et {b} à {bShare}.} other {${BOTH}, un écart que ce sondage ne permet pas de tester.}}`,
  },
  change: {
    'holds-twice': upOrDown(
      (noun) => `Le chiffre pour {option} est en ${noun} depuis {prevPoll} : {now} contre {then}.`,
    ),
    holds: upOrDown(
      (noun) =>
        `Dans ce sondage, le chiffre pour {option} est en ${noun} depuis {prevPoll} : {now} contre {then}.`,
    ),
    fragile: higherOrLower(
      (word) =>
        `Le chiffre pour {option} est plus ${word} que dans {prevPoll}, {now} contre {then}, ${UNSETTLED_BY_TWO}.`,
    ),
    level: `${AT}, le même chiffre que dans {prevPoll}.`,
    'not-shown': `${AT_BOTH}, une différence que le hasard seul pourrait produire.`,
    family: `${AT_BOTH}, une différence que le hasard pourrait produire parmi plusieurs comparaisons.`,
    'little-changed': 'Le chiffre pour {option} change peu depuis {prevPoll} : {now} contre {then}.',
    untested: `{reason, select, notDisclosed {Les chiffres nécessaires pour comparer {option} avec {prevPoll} ne sont pas communiqués.} notComparable {${AT}, sans comparaison possible avec {prevPoll}.} sharedWaves {${AT} ; ${SHARED}.} samePeople {${AT_BOTH} ; ${TWICE}.} noSamplingBasis {${AT_BOTH}, sans marge d’erreur reconnue.} other {${AT} ; l’évolution depuis {prevPoll} ne peut pas être testée.}}`,
  },
  'lead-change': {
    'holds-twice': `L’écart entre {a} et {b} ${MOVED}`,
    holds: `Dans ce sondage, l’écart entre {a} et {b} ${MOVED}`,
    fragile: `L’écart entre {a} et {b} penche davantage vers {toward} que dans {prevPoll}, {aNow} contre {bNow} après {aThen} contre {bThen}, ${UNSETTLED_BY_TWO}.`,
    level:
      'L’écart entre {a} et {b}, {aNow} contre {bNow}, a le même chiffre que dans {prevPoll}, {aThen} contre {bThen}.',
    'not-shown': `${GAP_NOW} ; le hasard seul pourrait expliquer la différence d’écart.`,
    family: `${GAP_NOW} ; parmi plusieurs comparaisons, le hasard pourrait expliquer la différence d’écart.`,
    untested: `{reason, select, notDisclosed {Les chiffres nécessaires pour comparer l’écart entre {a} et {b} avec {prevPoll} ne sont pas communiqués.} notComparable {${BOTH_NOW}, un écart sans comparaison possible avec {prevPoll}.} sharedWaves {${BOTH_NOW} ; ${SHARED}.} samePeople {${GAP_NOW} ; ${TWICE}.} noSamplingBasis {${GAP_NOW}, sans marge d’erreur reconnue.} other {${BOTH_NOW} ; l’évolution de l’écart depuis {prevPoll} ne peut pas être testée.}}`,
  },
  threshold: {
    'holds-twice': aboveOrBelow(
      (place) =>
        `Le sondage place {option} ${place} de la {line}, avec {share}${ASKED}, à une distance qui dépasse ce que le hasard produit d’ordinaire.`,
    ),
    holds: aboveOrBelow(
      (place) =>
        `Ce sondage place {option} ${place} de la {line}, avec {share}${ASKED}, à une distance qui dépasse ce que le hasard produit d’ordinaire.`,
    ),
    fragile: aboveOrBelow(
      (place) => `Ce sondage place {option} ${place} de la {line}, avec {share}${ASKED}, ${UNSETTLED}.`,
    ),
    level: 'Ce sondage place {option} exactement sur la {line}.',
    'not-shown': `${SHARE}, trop près de la {line} pour dire de quel côté.`,
    family: `${SHARE} ; parmi plusieurs tests, c’est trop près de la {line} pour dire de quel côté.`,
    untested: `{reason, select, notDisclosed {Le sondage ne communique pas le chiffre pour {option}.} noSamplingBasis {${NO_MARGIN} {option} à {share}${ASKED}.} noSampleSize {${NO_SIZE} {option} à {share}${ASKED}.} other {${SHARE}, ce que ce sondage ne permet pas de tester par rapport à la {line}.}}`,
  },
  'net-score': FR_NET_SCORE.told,
  'net-score-change': FR_NET_SCORE_CHANGE.told,
  gap: FR_GAP.told,
};
