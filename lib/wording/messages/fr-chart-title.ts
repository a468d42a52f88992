import type { ClaimMessages } from '../language-pack';
import { FR_GAP } from './fr-gap';
import { FR_NET_SCORE, FR_NET_SCORE_CHANGE } from './fr-net-score';
import { aboveOrBelow, ASKED, higherOrLower, UNSETTLED, upOrDown } from './fr-parts';

const BOTH = '{a} {aShare}, {b} {bShare}';
const UNSETTLED_POLLS = 'mais les sondages ne permettent pas de trancher';
const capital = (noun: string) => noun.charAt(0).toUpperCase() + noun.slice(1);

/** Chart titles in French: pollster and dates stand beneath the chart. */
export const FR_CHART_TITLE: ClaimMessages = {
  lead: {
    'holds-twice':
      '{setting, select, contest {Avance pour {a} sur {b}, {aShare} contre {bShare}} other {La réponse {a} plus fréquente que la réponse {b}, {aShare} contre {bShare}}}',
    holds:
      '{setting, select, contest {Avance pour {a} sur {b} dans ce sondage, {aShare} contre {bShare}} other {La réponse {a} plus fréquente que la réponse {b} dans ce sondage, {aShare} contre {bShare}}}',
    fragile: `Chiffre plus élevé pour {a} que pour {b} dans ce sondage, {aShare} contre {bShare}, ${UNSETTLED}`,
    level: 'Même chiffre pour {a} et {b} dans ce sondage : {aShare}',
    'not-shown': `${BOTH} : le hasard seul pourrait produire cet écart`,
    family: `${BOTH} : le hasard pourrait produire cet écart parmi plusieurs comparaisons`,
    untested: `{reason, select, notDisclosed {Écart entre {a} et {b} : chiffres non communiqués} noSamplingBasis {${BOTH}, sans marge d’erreur reconnue} other {${BOTH} : l’écart ne peut pas être testé}}`,
  },
  change: {
    'holds-twice': upOrDown((noun) => `${capital(noun)} pour {option} depuis le sondage {prevDates}`),
    holds: upOrDown((noun) => `${capital(noun)} pour {option} dans ce sondage depuis celui {prevDates}`),
    fragile: higherOrLower(
      (word) => `Chiffre plus ${word} pour {option} que dans le sondage {prevDates}, ${UNSETTLED_POLLS}`,
    ),
    level: 'Même chiffre pour {option} que dans le sondage {prevDates}',
    'not-shown':
      '{option} : {now}, contre {then} dans le sondage {prevDates}, une différence que le hasard seul pourrait produire',
    family:
      '{option} : {now}, contre {then} dans le sondage {prevDates}, une différence que le hasard pourrait produire parmi plusieurs comparaisons',
    'little-changed': 'Peu de changement pour {option} depuis le sondage {prevDates}',
    untested:
      '{reason, select, notDisclosed {{option} : chiffres non communiqués} notComparable {{option} : {now} ; non comparable au sondage {prevDates}} noSamplingBasis {{option} : {now}, sans marge d’erreur reconnue} other {{option} : {now} ; l’évolution depuis le sondage {prevDates} ne peut pas être testée}}',
  },
  'lead-change': {
    'holds-twice': 'L’écart entre {a} et {b} s’est déplacé vers {toward} depuis le sondage {prevDates}',
    holds: 'L’écart entre {a} et {b} s’est déplacé vers {toward} dans ce sondage depuis celui {prevDates}',
    fragile: `L’écart entre {a} et {b} penche davantage vers {toward} que dans le sondage {prevDates}, ${UNSETTLED_POLLS}`,
    level: 'L’écart entre {a} et {b} a le même chiffre que dans le sondage {prevDates}',
    'not-shown':
      'L’écart entre {a} et {b}, comparé à celui du sondage {prevDates} : le hasard seul pourrait expliquer la différence',
    family:
      'L’écart entre {a} et {b}, comparé à celui du sondage {prevDates} : le hasard pourrait expliquer la différence parmi plusieurs comparaisons',
    untested:
      '{reason, select, notDisclosed {L’écart entre {a} et {b} : chiffres non communiqués} notComparable {L’écart entre {a} et {b} : non comparable au sondage {prevDates}} noSamplingBasis {L’écart entre {a} et {b}, sans marge d’erreur reconnue} other {L’écart entre {a} et {b} : l’évolution depuis le sondage {prevDates} ne peut pas être testée}}',
  },
  threshold: {
    'holds-twice': aboveOrBelow((place) => `{option} : ${place} de la {line}, avec {share}${ASKED}`),
    holds: aboveOrBelow((place) => `{option} : ${place} de la {line} dans ce sondage, avec {share}${ASKED}`),
    fragile: aboveOrBelow(
      (place) => `{option} : ${place} de la {line} dans ce sondage, avec {share}${ASKED}, ${UNSETTLED}`,
    ),
    level: '{option} : exactement sur la {line} dans ce sondage',
    'not-shown': `{option} : {share}${ASKED}, trop près de la {line} pour dire de quel côté`,
    family: `{option} : {share}${ASKED}, trop près de la {line} pour dire de quel côté`,
    untested:
      '{reason, select, notDisclosed {{option} : chiffre non communiqué} noSamplingBasis {{option} : {share}, sans marge d’erreur reconnue} other {{option} : {share}, qui ne peut pas être testé par rapport à la {line}}}',
  },
  'net-score': FR_NET_SCORE.chartTitle,
  'net-score-change': FR_NET_SCORE_CHANGE.chartTitle,
  gap: FR_GAP.chartTitle,
};
