import type { ClaimMessages } from '../language-pack';
import { ES_GAP } from './es-gap';
import { ES_NET_SCORE, ES_NET_SCORE_CHANGE } from './es-net-score';
import {
  AMONG,
  ASKED,
  IN_EARLIER,
  LARGER,
  LARGER_OF_ONE,
  LARGER_OF_TWO,
  percentagePoints,
  THIS_POLL,
  THIS_POLL_START,
  UNSETTLED,
  UNSETTLED_BY_TWO,
} from './es-parts';

const GAP = percentagePoints('gap');
const MOVE = percentagePoints('move');
const NOT_GIVEN = `Este sondeo de {pollster}${AMONG} no difunde`;

/** First sentences of a body in Spanish. */
export const ES_BODY: ClaimMessages = {
  lead: {
    'holds-twice': `{setting, select, contest {Un sondeo de {pollster}${AMONG} apunta a una ventaja de {a} sobre {b} de ${GAP}: {aShare} frente a {bShare}.} other {La respuesta {a} es más frecuente que la respuesta {b}, {aShare} frente a {bShare}, apunta un sondeo de {pollster}${AMONG}.}} La diferencia seguiría siendo ${LARGER_OF_ONE}.`,
    holds: `{setting, select, contest {${THIS_POLL_START} da a {a} una ventaja sobre {b} de ${GAP}: {aShare} frente a {bShare}.} other {En ${THIS_POLL}, la respuesta {a} es más frecuente que la respuesta {b}: {aShare} frente a {bShare}.}} La diferencia es ${LARGER}.`,
    fragile: `En ${THIS_POLL}, la cifra de {a} es más alta que la de {b}, {aShare} frente a {bShare}, ${UNSETTLED}.`,
    level: `En ${THIS_POLL}, {both} tienen la misma cifra: {aShare}. Que las cifras sean iguales no significa que la opinión esté dividida por igual.`,
    'not-shown': `${THIS_POLL_START} da a {a} el {aShare} y a {b} el {bShare}, una diferencia de ${GAP}. {basis, select, sampling {El error de muestreo por sí solo podría producir una diferencia de ese tamaño.} modelled {Según el modelo del propio instituto, el azar por sí solo podría producir una diferencia de ese tamaño.} other {El azar por sí solo podría producir una diferencia de ese tamaño incluso con una muestra aleatoria.}}`,
    family: `${THIS_POLL_START} da a {a} el {aShare} y a {b} el {bShare}, una diferencia de ${GAP}. Es una de las varias comparaciones hechas con el mismo sondeo y, entre tantas, el azar por sí solo podría producir una diferencia de ese tamaño.`,
    untested: `{known, select, yes {${THIS_POLL_START} da a {a} el {aShare} y a {b} el {bShare}.} other {${NOT_GIVEN} las cifras necesarias para la comparación entre {both}.}}`,
  },
  change: {
    'holds-twice': `{direction, select, more {La cifra de {option} sube desde el sondeo {prevDates}, del {then} al {now}, apuntan dos sondeos de {pollsters}${AMONG}. La subida seguiría siendo ${LARGER_OF_TWO}.} other {La cifra de {option} baja desde el sondeo {prevDates}, del {then} al {now}, apuntan dos sondeos de {pollsters}${AMONG}. La bajada seguiría siendo ${LARGER_OF_TWO}.}}`,
    holds: `{direction, select, more {En ${THIS_POLL}, la cifra de {option} sube: del {then} ${IN_EARLIER} al {now}. La subida es ${LARGER}.} other {En ${THIS_POLL}, la cifra de {option} baja: del {then} ${IN_EARLIER} al {now}. La bajada es ${LARGER}.}}`,
    fragile: `{direction, select, more {La cifra de {option} es más alta en ${THIS_POLL}, {now} frente a {then} ${IN_EARLIER}, ${UNSETTLED_BY_TWO}.} other {La cifra de {option} es más baja en ${THIS_POLL}, {now} frente a {then} ${IN_EARLIER}, ${UNSETTLED_BY_TWO}.}}`,
    level: `En ${THIS_POLL}, la cifra de {option} es del {now}, la misma que ${IN_EARLIER}. Que las cifras sean iguales no significa que la opinión no se haya movido.`,
    'not-shown': `En ${THIS_POLL}, la cifra de {option} es del {now}, frente al {then} ${IN_EARLIER}. {basis, select, sampling {El error de muestreo por sí solo podría producir una diferencia de ${MOVE} entre dos sondeos como estos.} modelled {Según el modelo del propio instituto, el azar por sí solo podría producir una diferencia de ${MOVE} entre dos sondeos como estos.} other {El azar por sí solo podría producir una diferencia de ${MOVE} incluso entre dos muestras aleatorias.}}`,
    family: `En ${THIS_POLL}, la cifra de {option} es del {now}, frente al {then} ${IN_EARLIER}. Es una de las varias comparaciones hechas entre los dos sondeos y, entre tantas, el azar por sí solo podría producir una diferencia de ${MOVE}.`,
    'little-changed': `La cifra de {option} apenas varía: {now} en ${THIS_POLL}, frente al {then} ${IN_EARLIER}. Incluso teniendo en cuenta el error de muestreo y el redondeo, la diferencia es menor que el mínimo de ${percentagePoints('indifference')} fijado de antemano como relevante.`,
    untested: `{known, select, both {En ${THIS_POLL}, la cifra de {option} es del {now}, frente al {then} ${IN_EARLIER}.} now {En ${THIS_POLL}, la cifra de {option} es del {now}.} other {${NOT_GIVEN} la cifra de {option}.}}`,
  },
  'lead-change': {
    'holds-twice': `La diferencia entre {both} se ha movido en favor de {toward} desde el sondeo {prevDates}, apuntan dos sondeos de {pollsters}${AMONG}. Entonces era de {aThen} a {bThen}; ahora es de {aNow} a {bNow}. El movimiento seguiría siendo ${LARGER_OF_TWO}.`,
    holds: `En ${THIS_POLL}, la diferencia entre {both} se ha movido en favor de {toward}: {aNow} a {bNow}, frente a {aThen} a {bThen} ${IN_EARLIER}. El movimiento es ${LARGER}.`,
    fragile: `En ${THIS_POLL}, la diferencia entre {both} es más favorable a {toward}, {aNow} a {bNow} frente a {aThen} a {bThen} ${IN_EARLIER}, ${UNSETTLED_BY_TWO}.`,
    level: `La diferencia entre {both} en ${THIS_POLL}, {aNow} a {bNow}, tiene la misma cifra que ${IN_EARLIER}, {aThen} a {bThen}. Que las cifras sean iguales no significa que la opinión no se haya movido.`,
    'not-shown': `${THIS_POLL_START} da a {a} el {aNow} y a {b} el {bNow}, frente al {aThen} y al {bThen} ${IN_EARLIER}. {basis, select, sampling {El error de muestreo por sí solo podría hacer que la diferencia entre ambas cifras variara ${MOVE} entre dos sondeos como estos.} modelled {Según el modelo del propio instituto, el azar por sí solo podría hacer que la diferencia entre ambas cifras variara ${MOVE} entre dos sondeos como estos.} other {El azar por sí solo podría hacer que la diferencia entre ambas cifras variara ${MOVE} incluso entre dos muestras aleatorias.}}`,
    family: `${THIS_POLL_START} da a {a} el {aNow} y a {b} el {bNow}, frente al {aThen} y al {bThen} ${IN_EARLIER}. Es una de las varias comparaciones hechas entre los dos sondeos y, entre tantas, el azar por sí solo podría hacer que la diferencia variara ${MOVE}.`,
    untested: `{known, select, both {${THIS_POLL_START} da a {a} el {aNow} y a {b} el {bNow}, frente al {aThen} y al {bThen} ${IN_EARLIER}.} now {${THIS_POLL_START} da a {a} el {aNow} y a {b} el {bNow}.} other {${NOT_GIVEN} las cifras necesarias para la comparación entre {both}.}}`,
  },
  threshold: {
    'holds-twice': `{side, select, above {Un sondeo de {pollster}${AMONG} apunta a una cifra de {option} por encima de la {line}: {share}${ASKED}.} other {Un sondeo de {pollster}${AMONG} apunta a una cifra de {option} por debajo de la {line}: {share}${ASKED}.}} La distancia a la {line} seguiría siendo ${LARGER_OF_ONE}.`,
    holds: `{side, select, above {En ${THIS_POLL}, la cifra de {option} está por encima de la {line}: {share}${ASKED}.} other {En ${THIS_POLL}, la cifra de {option} está por debajo de la {line}: {share}${ASKED}.}} La distancia a la {line} es ${LARGER}.`,
    fragile: `{side, select, above {En ${THIS_POLL}, la cifra de {option} está por encima de la {line}, con el {share}${ASKED}, ${UNSETTLED}.} other {En ${THIS_POLL}, la cifra de {option} está por debajo de la {line}, con el {share}${ASKED}, ${UNSETTLED}.}}`,
    level: `La cifra de {option} coincide exactamente con la {line} en ${THIS_POLL}. El sondeo no permite saber de qué lado está la opinión.`,
    'not-shown': `En ${THIS_POLL}, la cifra de {option} es del {share}${ASKED}. {basis, select, sampling {El error de muestreo por sí solo podría explicar la distancia a la {line}, así que el sondeo no permite saber de qué lado está la opinión.} modelled {Según el modelo del propio instituto, el azar por sí solo podría explicar la distancia a la {line}, así que el sondeo no permite saber de qué lado está la opinión.} other {El azar por sí solo podría explicar la distancia a la {line} incluso con una muestra aleatoria, así que el sondeo no permite saber de qué lado está la opinión.}}`,
    family: `En ${THIS_POLL}, la cifra de {option} es del {share}${ASKED}. Es una de las varias cifras del mismo sondeo que se han contrastado con una barrera y, entre tantas, el azar por sí solo podría explicar la distancia a la {line}.`,
    untested: `{known, select, yes {En ${THIS_POLL}, la cifra de {option} es del {share}${ASKED}.} other {${NOT_GIVEN} la cifra de {option}.}}`,
  },
  'net-score': ES_NET_SCORE.body,
  'net-score-change': ES_NET_SCORE_CHANGE.body,
  gap: ES_GAP.body,
};
