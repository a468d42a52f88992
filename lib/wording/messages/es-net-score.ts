import type { ClaimMessages } from '../language-pack';
import {
  AMONG,
  chanceAlone,
  higherOrLower,
  IN_EARLIER,
  LARGER,
  LARGER_OF_ONE,
  LARGER_OF_TWO,
  percentagePoints,
  THIS_POLL,
  THIS_POLL_START,
  UNSETTLED,
  UNSETTLED_BY_TWO,
  upOrDown,
} from './es-parts';

type Messages<K extends keyof ClaimMessages> = Record<
  'headline' | 'body' | 'chartTitle' | 'told',
  ClaimMessages[K]
>;

const BOTH = '{a} {aShare}, {b} {bShare}';
const MORE = 'a respuesta {a} es más frecuente que la respuesta {b}, {aShare} frente a {bShare}';
const HIGHER = 'cifra de {a} es más alta que la de {b}, {aShare} frente a {bShare}';
const CHANCE = 'que el azar por sí solo podría producir';
const CHANCE_AMONG = 'que el azar podría producir entre varias comparaciones';
const NO_FIGURES = 'cifras necesarias para calcular el saldo neto';

/** A net score in Spanish: which of the two answers is given more often, with the balance beside it. */
export const ES_NET_SCORE: Messages<'net-score'> = {
  headline: {
    'holds-twice': `L${MORE}, con un saldo neto de {net}, apunta un sondeo de {pollster}`,
    holds: `L${MORE}, en el sondeo de {pollster}, con un saldo neto de {net}`,
    fragile: `La ${HIGHER}, en el sondeo de {pollster}, ${UNSETTLED}`,
    level: 'Misma cifra para {both} en el sondeo de {pollster}: {aShare}',
    'not-shown': `${BOTH} en el sondeo de {pollster}: un saldo neto ${CHANCE}`,
    family: `${BOTH} en el sondeo de {pollster}: un saldo neto ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {El sondeo de {pollster} omite ${NO_FIGURES}} noSamplingBasis {${BOTH} en un sondeo de {pollster} sin margen de error reconocido} noSampleSize {${BOTH} en un sondeo de {pollster} que no dice a cuántas personas preguntó} tooSmall {${BOTH} en un sondeo de {pollster} con muy pocas entrevistas para comparar} other {${BOTH} en el sondeo de {pollster}: el saldo neto no se puede contrastar}}`,
  },
  body: {
    'holds-twice': `L${MORE}, con un saldo neto de {net}, apunta un sondeo de {pollster}${AMONG}. La diferencia seguiría siendo ${LARGER_OF_ONE}.`,
    holds: `En ${THIS_POLL}, l${MORE}, con un saldo neto de {net}. La diferencia es ${LARGER}.`,
    fragile: `En ${THIS_POLL}, la ${HIGHER}, con un saldo neto de {net}, ${UNSETTLED}.`,
    level: `En ${THIS_POLL}, {both} tienen la misma cifra, {aShare}: el saldo neto es cero. Que las cifras sean iguales no significa que la opinión esté dividida por igual.`,
    'not-shown': `${THIS_POLL_START} da a {a} el {aShare} y a {b} el {bShare}, un saldo neto de {net}. ${chanceAlone('podría producir una diferencia de ese tamaño', 'con una muestra aleatoria')}.`,
    family: `${THIS_POLL_START} da a {a} el {aShare} y a {b} el {bShare}, un saldo neto de {net}. Es una de las varias comparaciones hechas con el mismo sondeo y, entre tantas, el azar por sí solo podría producir una diferencia de ese tamaño.`,
    untested: `{known, select, yes {${THIS_POLL_START} da a {a} el {aShare} y a {b} el {bShare}, un saldo neto de {net}.} other {${THIS_POLL_START} no difunde las ${NO_FIGURES}.}}`,
  },
  chartTitle: {
    'holds-twice': `L${MORE}, con un saldo neto de {net}`,
    holds: `L${MORE}, en este sondeo, con un saldo neto de {net}`,
    fragile: `La ${HIGHER}, en este sondeo, ${UNSETTLED}`,
    level: 'Misma cifra para {both} en este sondeo: {aShare}',
    'not-shown': `${BOTH}: un saldo neto ${CHANCE}`,
    family: `${BOTH}: un saldo neto ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {Saldo neto: cifras no difundidas} noSamplingBasis {${BOTH}, sin margen de error reconocido} other {${BOTH}: el saldo neto no se puede contrastar}}`,
  },
  told: {
    'holds-twice': `L${MORE}, con un saldo neto de {net}, más de lo que suele producir el azar.`,
    holds: `En este sondeo, l${MORE}, con un saldo neto de {net}, más de lo que suele producir el azar.`,
    fragile: `En este sondeo, la ${HIGHER}, ${UNSETTLED}.`,
    level: 'En este sondeo, {both} tienen la misma cifra: {aShare}.',
    'not-shown': `El sondeo da a {a} el {aShare} y a {b} el {bShare}, un saldo neto de {net} ${CHANCE}.`,
    family: `El sondeo da a {a} el {aShare} y a {b} el {bShare}, un saldo neto de {net} ${CHANCE_AMONG}.`,
    untested: `{reason, select, notDisclosed {El sondeo no difunde las ${NO_FIGURES}.} noSamplingBasis {Un sondeo sin margen de error reconocido da a {a} el {aShare} y a {b} el {bShare}.} noSampleSize {Un sondeo que no dice a cuántas personas preguntó da a {a} el {aShare} y a {b} el {bShare}.} other {El sondeo da a {a} el {aShare} y a {b} el {bShare}, un saldo neto que este sondeo no permite contrastar.}}`,
  },
};

const MOVE = percentagePoints('move');
const ASKED_TWICE =
  'se preguntó las dos veces a las mismas personas, así que el cambio no se puede contrastar';

/** The change of a net score in Spanish. */
export const ES_NET_SCORE_CHANGE: Messages<'net-score-change'> = {
  headline: {
    'holds-twice': upOrDown(
      (verb) =>
        `El saldo neto de {name} ${verb} desde el sondeo {prevDates}, apuntan los datos de {pollsters}`,
    ),
    holds: upOrDown(
      (verb) =>
        `El saldo neto de {name} ${verb} en los sondeos de {pollsters} desde el realizado {prevDates}`,
    ),
    fragile: higherOrLower(
      (word) =>
        `Saldo neto de {name} más ${word} que en el sondeo {prevDates}, {netNow} frente a {netThen}, pero los sondeos de {pollsters} no permiten darlo por seguro`,
    ),
    level:
      'Saldo neto de {name}: {netNow} en el sondeo de {pollster}, la misma cifra que en el realizado {prevDates}',
    'not-shown':
      'Saldo neto de {name}: {netNow} en el sondeo de {pollster}, frente a {netThen} en el realizado {prevDates}: el azar por sí solo podría explicarlo',
    family:
      'Saldo neto de {name}: {netNow} en el sondeo de {pollster}, frente a {netThen} en el realizado {prevDates}: entre varias comparaciones, el azar podría explicarlo',
    untested:
      '{reason, select, notDisclosed {Los sondeos de {pollsters} omiten cifras necesarias para comparar el saldo neto de {name}} notComparable {Saldo neto de {name}: {netNow} en el sondeo de {pollster}, que no se puede comparar con el realizado {prevDates}} noSamplingBasis {Saldo neto de {name}: {netNow} en un sondeo de {pollster} sin margen de error reconocido} other {Saldo neto de {name}: {netNow} en el sondeo de {pollster}; el cambio desde el realizado {prevDates} no se puede contrastar}}',
  },
  body: {
    'holds-twice': upOrDown(
      (verb, noun) =>
        `El saldo neto de {name} ${verb} desde el sondeo {prevDates}, de {netThen} a {netNow}, apuntan dos sondeos de {pollsters}${AMONG}. La ${noun} seguiría siendo ${LARGER_OF_TWO}.`,
    ),
    holds: upOrDown(
      (verb, noun) =>
        `En ${THIS_POLL}, el saldo neto de {name} ${verb}: de {netThen} ${IN_EARLIER} a {netNow}. La ${noun} es ${LARGER}.`,
    ),
    fragile: higherOrLower(
      (word) =>
        `El saldo neto de {name} es más ${word} en ${THIS_POLL}, {netNow} frente a {netThen} ${IN_EARLIER}, ${UNSETTLED_BY_TWO}.`,
    ),
    level: `En ${THIS_POLL}, el saldo neto de {name} es de {netNow}, la misma cifra que ${IN_EARLIER}. Que las cifras sean iguales no significa que la opinión no se haya movido.`,
    'not-shown': `En ${THIS_POLL}, el saldo neto de {name} es de {netNow}, frente a {netThen} ${IN_EARLIER}. ${chanceAlone(`podría producir una diferencia de ${MOVE}`, 'entre dos muestras aleatorias')}.`,
    family: `En ${THIS_POLL}, el saldo neto de {name} es de {netNow}, frente a {netThen} ${IN_EARLIER}. Es una de las varias comparaciones hechas entre los dos sondeos y, entre tantas, el azar por sí solo podría producir una diferencia de ${MOVE}.`,
    untested: `{known, select, both {En ${THIS_POLL}, el saldo neto de {name} es de {netNow}, frente a {netThen} ${IN_EARLIER}.} now {En ${THIS_POLL}, el saldo neto de {name} es de {netNow}.} other {${THIS_POLL_START} no difunde las ${NO_FIGURES}.}}`,
  },
  chartTitle: {
    'holds-twice': upOrDown((verb) => `El saldo neto de {name} ${verb} desde el sondeo {prevDates}`),
    holds: upOrDown(
      (verb) => `El saldo neto de {name} ${verb} en este sondeo desde el realizado {prevDates}`,
    ),
    fragile: higherOrLower(
      (word) =>
        `Saldo neto de {name} más ${word} que en el sondeo {prevDates}, pero los sondeos no permiten darlo por seguro`,
    ),
    level: 'Saldo neto de {name} con la misma cifra que en el sondeo {prevDates}',
    'not-shown':
      'Saldo neto de {name}: {netNow}, frente a {netThen} en el sondeo {prevDates}; el azar por sí solo podría producir esta diferencia',
    family:
      'Saldo neto de {name}: {netNow}, frente a {netThen} en el sondeo {prevDates}; entre varias comparaciones, el azar podría producir esta diferencia',
    untested:
      '{reason, select, notDisclosed {Saldo neto de {name}: cifras no difundidas} notComparable {Saldo neto de {name}: {netNow}; no comparable con el sondeo {prevDates}} noSamplingBasis {Saldo neto de {name}: {netNow}, sin margen de error reconocido} other {Saldo neto de {name}: {netNow}; el cambio desde el sondeo {prevDates} no se puede contrastar}}',
  },
  told: {
    'holds-twice': upOrDown(
      (verb) => `El saldo neto de {name} ${verb} desde {prevPoll}, de {netThen} a {netNow}.`,
    ),
    holds: upOrDown(
      (verb) => `En este sondeo, el saldo neto de {name} ${verb} desde {prevPoll}, de {netThen} a {netNow}.`,
    ),
    fragile: higherOrLower(
      (word) =>
        `El saldo neto de {name} es más ${word} que en {prevPoll}, {netNow} frente a {netThen}, ${UNSETTLED_BY_TWO}.`,
    ),
    level: 'El saldo neto de {name} es de {netNow}, la misma cifra que en {prevPoll}.',
    'not-shown': `El saldo neto de {name} es de {netNow}, frente a {netThen} en {prevPoll}, una diferencia ${CHANCE}.`,
    family: `El saldo neto de {name} es de {netNow}, frente a {netThen} en {prevPoll}, una diferencia ${CHANCE_AMONG}.`,
    untested: `{reason, select, notDisclosed {No se difunden las cifras necesarias para comparar el saldo neto de {name} con {prevPoll}.} notComparable {El saldo neto de {name} es de {netNow}, que no se puede comparar con {prevPoll}.} sharedWaves {El saldo neto de {name} es de {netNow}; este sondeo comparte entrevistas con {prevPoll}, así que el cambio no se puede contrastar.} samePeople {El saldo neto de {name} es de {netNow}, frente a {netThen} en {prevPoll}; ${ASKED_TWICE}.} noSamplingBasis {El saldo neto de {name} es de {netNow}, frente a {netThen} en {prevPoll}, sin margen de error reconocido.} other {El saldo neto de {name} es de {netNow}; el cambio desde {prevPoll} no se puede contrastar.}}`,
  },
};
