import type { ClaimMessages } from '../language-pack';
import { FR_GAP } from './fr-gap';
import { FR_NET_SCORE, FR_NET_SCORE_CHANGE } from './fr-net-score';
import { aboveOrBelow, ASKED, higherOrLower, UNSETTLED_POLLS, upOrDown } from './fr-parts';

const BOTH = '{a} {aShare}, {b} {bShare}';
const BOTH_NOW = '{a} {aNow}, {b} {bNow}';
const UNSETTLED = 'mais il ne permet pas de trancher';

/** Headline claims in French: the name is never the subject, so that nothing has to agree with it. */
export const FR_HEADLINE: ClaimMessages = {
  lead: {
    'holds-twice':
      '{setting, select, contest {Un sondage {pollster} suggère une avance pour {a} sur {b}, {aShare} contre {bShare}} other {La réponse {a} plus fréquente que la réponse {b}, {aShare} contre {bShare}, suggère un sondage {pollster}}}',
    holds:
      '{setting, select, contest {Le sondage {pollster} donne {a} devant {b}, {aShare} contre {bShare}} other {La réponse {a} plus fréquente que la réponse {b} dans le sondage {pollster}, {aShare} contre {bShare}}}',
    fragile: `Le sondage {pollster} donne un chiffre plus élevé pour {a} que pour {b}, {aShare} contre {bShare}, ${UNSETTLED}`,
    level: 'Même chiffre pour {a} et {b} dans le sondage {pollster} : {aShare}',
    'not-shown': `${BOTH} dans le sondage {pollster} : un écart que le hasard seul pourrait produire`,
    family: `${BOTH} dans le sondage {pollster} : un écart que le hasard pourrait produire parmi plusieurs comparaisons`,
    untested: `{reason, select, notDisclosed {Le sondage {pollster} omet des chiffres nécessaires pour comparer {a} et {b}} noSamplingBasis {${BOTH} dans un sondage {pollster} sans marge d’erreur reconnue} noSampleSize {${BOTH} dans un sondage {pollster} qui ne dit pas combien de personnes ont répondu} tooSmall {${BOTH} dans un sondage {pollster} aux entretiens trop peu nombreux pour comparer} other {${BOTH} dans le sondage {pollster} : l’écart ne peut pas être testé}}`,
  },
  change: {
    'holds-twice': upOrDown(
      (noun) => `En ${noun} depuis le sondage {prevDates} : {option}, suggèrent les sondages {pollsters}`,
    ),
    holds: upOrDown(
      (noun) =>
        `${noun === 'hausse' ? 'Hausse' : 'Baisse'} pour {option} dans les sondages {pollsters} depuis celui {prevDates}`,
    ),
    fragile: higherOrLower(
      (word) =>
        `Chiffre plus ${word} pour {option} que dans le sondage {prevDates}, {now} contre {then}, ${UNSETTLED_POLLS}`,
    ),
    level: '{option} : {now} dans le sondage {pollster}, le même chiffre que dans celui {prevDates}',
    'not-shown':
      '{option} : {now} dans le sondage {pollster}, contre {then} dans celui {prevDates}, une différence que le hasard seul pourrait produire',
    family:
      '{option} : {now} dans le sondage {pollster}, contre {then} dans celui {prevDates}, une différence que le hasard pourrait produire parmi plusieurs comparaisons',
    'little-changed': 'Peu de changement pour {option} depuis le sondage {prevDates}, selon {pollsters}',
    untested:
      '{reason, select, notDisclosed {Les sondages {pollsters} omettent des chiffres nécessaires pour comparer {option} avec le sondage {prevDates}} notComparable {{option} : {now} dans le sondage {pollster}, qui ne peut pas être comparé à celui {prevDates}} noSamplingBasis {{option} : {now} dans un sondage {pollster} sans marge d’erreur reconnue} other {{option} : {now} dans le sondage {pollster} ; l’évolution depuis celui {prevDates} ne peut pas être testée}}',
  },
  'lead-change': {
    'holds-twice':
      'L’écart entre {a} et {b} s’est déplacé vers {toward} depuis le sondage {prevDates}, suggèrent les sondages {pollsters}',
    holds:
      'L’écart entre {a} et {b} s’est déplacé vers {toward} dans les sondages {pollsters} depuis celui {prevDates}',
    fragile: `L’écart entre {a} et {b} penche davantage vers {toward} que dans le sondage {prevDates}, ${UNSETTLED_POLLS}`,
    level: 'L’écart entre {a} et {b} a le même chiffre dans le sondage {pollster} que dans celui {prevDates}',
    'not-shown': `${BOTH_NOW} dans le sondage {pollster} : le hasard seul pourrait expliquer la différence d’écart avec celui {prevDates}`,
    family: `${BOTH_NOW} dans le sondage {pollster} : parmi plusieurs comparaisons, le hasard pourrait expliquer la différence d’écart avec celui {prevDates}`,
    untested: `{reason, select, notDisclosed {Les sondages {pollsters} omettent des chiffres nécessaires pour comparer l’écart entre {a} et {b}} notComparable {${BOTH_NOW} dans le sondage {pollster} ; l’écart ne peut pas être comparé au sondage {prevDates}} noSamplingBasis {${BOTH_NOW} dans un sondage {pollster} sans marge d’erreur reconnue} other {${BOTH_NOW} dans le sondage {pollster} ; l’évolution de l’écart depuis celui {prevDates} ne peut pas être testée}}`,
  },
  threshold: {
    'holds-twice': aboveOrBelow(
      (place) =>
        `Un sondage {pollster} suggère un score pour {option} ${place} de la {line}, {share}${ASKED}`,
    ),
    holds: aboveOrBelow(
      (place) => `Le sondage {pollster} place {option} ${place} de la {line}, avec {share}${ASKED}`,
    ),
    fragile: aboveOrBelow(
      (place) =>
        `Le sondage {pollster} place {option} ${place} de la {line}, avec {share}${ASKED}, ${UNSETTLED}`,
    ),
    level: 'Le sondage {pollster} place {option} exactement sur la {line}',
    'not-shown': `{option} : {share}${ASKED} dans le sondage {pollster}, trop près de la {line} pour dire de quel côté`,
    family: `{option} : {share}${ASKED} dans le sondage {pollster}, trop près de la {line} pour dire de quel côté`,
    untested:
      '{reason, select, notDisclosed {Le sondage {pollster} omet le chiffre pour {option}} noSamplingBasis {{option} : {share} dans un sondage {pollster} sans marge d’erreur reconnue} noSampleSize {{option} : {share} dans un sondage {pollster} qui ne dit pas combien de personnes ont répondu} tooSmall {{option} : {share} dans un sondage {pollster} aux entretiens trop peu nombreux pour une comparaison avec la {line}} other {{option} : {share} dans le sondage {pollster}, qui ne peut pas être testé par rapport à la {line}}}',
  },
  'net-score': FR_NET_SCORE.headline,
  'net-score-change': FR_NET_SCORE_CHANGE.headline,
  gap: FR_GAP.headline,
};
