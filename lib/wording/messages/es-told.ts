import type { ClaimMessages } from '../language-pack';
import { ES_GAP } from './es-gap';
import { ES_NET_SCORE, ES_NET_SCORE_CHANGE } from './es-net-score';
import { ASKED, higherOrLower, UNSETTLED, UNSETTLED_BY_TWO, upOrDown } from './es-parts';

const BOTH = 'El sondeo da a {a} el {aShare} y a {b} el {bShare}';
const BOTH_NOW = 'El sondeo da a {a} el {aNow} y a {b} el {bNow}';
const GAP_NOW = `${BOTH_NOW}, frente al {aThen} y al {bThen} en {prevPoll}`;
const AHEAD = (opening: string, respuesta: string) =>
  `{setting, select, contest {${opening} da ventaja a {a} sobre {b}, {aShare} frente a {bShare}, por más de lo que suele producir el azar.} other {${respuesta} {a} es más frecuente que la respuesta {b}, {aShare} frente a {bShare}, una diferencia mayor de la que suele producir el azar.}}`;
const MOVED = `se ha movido en favor de {toward} desde {prevPoll}: {aNow} a {bNow}, frente a {aThen} a {bThen}.`;
const side = (write: (place: 'por encima' | 'por debajo') => string) =>
  `{side, select, above {${write('por encima')}} other {${write('por debajo')}}}`;
const SHARED = 'este sondeo comparte entrevistas con {prevPoll}, así que el cambio no se puede contrastar';
const TWICE = 'se preguntó las dos veces a las mismas personas, así que el cambio no se puede contrastar';

/** One sentence per finding that can stand in any line, in Spanish. */
export const ES_TOLD: ClaimMessages = {
  lead: {
    'holds-twice': AHEAD('El sondeo', 'La respuesta'),
    holds: AHEAD('Este sondeo', 'En este sondeo, la respuesta'),
    fragile: `En este sondeo, la cifra de {a} es más alta que la de {b}, {aShare} frente a {bShare}, ${UNSETTLED}.`,
    level: 'En este sondeo, {both} tienen la misma cifra: {aShare}.',
    'not-shown': `${BOTH}, una diferencia que el azar por sí solo podría producir.`,
    family: `${BOTH}, una diferencia que el azar podría producir entre varias comparaciones.`,
    untested: `{reason, select, notDisclosed {El sondeo no difunde las cifras necesarias para la comparación entre {both}.} noSamplingBasis {Un sondeo sin margen de error reconocido da a {a} el {aShare} y a {b} el {bShare}.} noSampleSize {Un sondeo que no dice a cuántas personas preguntó da a {a} el {aShare} y a {b} el {bShare}.} tooSmall {Un sondeo con muy pocas entrevistas para comparar da a {a} el {aShare} y a {b} el {bShare}.} other {${BOTH}, una diferencia que este sondeo no permite contrastar.}}`,
  },
  change: {
    'holds-twice': upOrDown((verb) => `La cifra de {option} ${verb} desde {prevPoll}, del {then} al {now}.`),
    holds: upOrDown(
      (verb) => `En este sondeo, la cifra de {option} ${verb} desde {prevPoll}, del {then} al {now}.`,
    ),
    fragile: higherOrLower(
      (_, word) =>
        `La cifra de {option} es más ${word} que en {prevPoll}, {now} frente a {then}, ${UNSETTLED_BY_TWO}.`,
    ),
    level: 'La cifra de {option} es del {now}, la misma que en {prevPoll}.',
    'not-shown':
      'La cifra de {option} es del {now}, frente al {then} en {prevPoll}, una diferencia que el azar por sí solo podría producir.',
    family:
      'La cifra de {option} es del {now}, frente al {then} en {prevPoll}, una diferencia que el azar podría producir entre varias comparaciones.',
    'little-changed': 'La cifra de {option} apenas varía desde {prevPoll}: {now} frente a {then}.',
    untested: `{reason, select, notDisclosed {No se difunden las cifras necesarias para comparar {option} con {prevPoll}.} notComparable {La cifra de {option} es del {now}, que no se puede comparar con {prevPoll}.} sharedWaves {La cifra de {option} es del {now}; ${SHARED}.} samePeople {La cifra de {option} es del {now}, frente al {then} en {prevPoll}; ${TWICE}.} noSamplingBasis {La cifra de {option} es del {now}, frente al {then} en {prevPoll}, sin margen de error reconocido.} other {La cifra de {option} es del {now}; el cambio desde {prevPoll} no se puede contrastar.}}`,
  },
  'lead-change': {
    'holds-twice': `La diferencia entre {both} ${MOVED}`,
    holds: `En este sondeo, la diferencia entre {both} ${MOVED}`,
    fragile: `La diferencia entre {both} es más favorable a {toward} que en {prevPoll}, {aNow} a {bNow} frente a {aThen} a {bThen}, ${UNSETTLED_BY_TWO}.`,
    level:
      'La diferencia entre {both}, {aNow} a {bNow}, tiene la misma cifra que en {prevPoll}, {aThen} a {bThen}.',
    'not-shown': `${GAP_NOW}; el azar por sí solo podría explicar lo que varía la diferencia.`,
    family: `${GAP_NOW}; entre varias comparaciones, el azar podría explicar lo que varía la diferencia.`,
    untested: `{reason, select, notDisclosed {No se difunden las cifras necesarias para comparar la diferencia entre {both} con {prevPoll}.} notComparable {${BOTH_NOW}, una diferencia que no se puede comparar con {prevPoll}.} sharedWaves {${BOTH_NOW}; ${SHARED}.} samePeople {${GAP_NOW}; ${TWICE}.} noSamplingBasis {${GAP_NOW}, sin margen de error reconocido.} other {${BOTH_NOW}; el cambio de la diferencia desde {prevPoll} no se puede contrastar.}}`,
  },
  threshold: {
    'holds-twice': side(
      (place) =>
        `La cifra de {option} está ${place} de la {line}, con el {share}${ASKED}, a más distancia de la que suele producir el azar.`,
    ),
    holds: side(
      (place) =>
        `En este sondeo, la cifra de {option} está ${place} de la {line}, con el {share}${ASKED}, a más distancia de la que suele producir el azar.`,
    ),
    fragile: side(
      (place) =>
        `En este sondeo, la cifra de {option} está ${place} de la {line}, con el {share}${ASKED}, ${UNSETTLED}.`,
    ),
    level: 'La cifra de {option} coincide exactamente con la {line} en este sondeo.',
    'not-shown': `La cifra de {option} es del {share}${ASKED}, demasiado cerca de la {line} para que el sondeo permita saber de qué lado está.`,
    family: `La cifra de {option} es del {share}${ASKED}; entre varias pruebas, está demasiado cerca de la {line} para saber de qué lado.`,
    untested: `{reason, select, notDisclosed {El sondeo no difunde la cifra de {option}.} noSamplingBasis {La cifra de {option} es del {share}${ASKED} en un sondeo sin margen de error reconocido.} noSampleSize {La cifra de {option} es del {share}${ASKED} en un sondeo que no dice a cuántas personas preguntó.} other {La cifra de {option} es del {share}${ASKED}, que este sondeo no permite contrastar con la {line}.}}`,
  },
  'net-score': ES_NET_SCORE.told,
  'net-score-change': ES_NET_SCORE_CHANGE.told,
  gap: ES_GAP.told,
};
