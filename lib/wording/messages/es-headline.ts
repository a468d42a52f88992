import type { ClaimMessages } from '../language-pack';
import { ES_GAP } from './es-gap';
import { ES_NET_SCORE, ES_NET_SCORE_CHANGE } from './es-net-score';
import { ASKED } from './es-parts';

/** Headline claims in Spanish: the name is never the subject, so that no verb has to agree with it. */
export const ES_HEADLINE: ClaimMessages = {
  lead: {
    'holds-twice':
      '{setting, select, contest {Un sondeo de {pollster} apunta a una ventaja de {a} sobre {b}: {aShare} frente a {bShare}} other {La respuesta {a} es más frecuente que la respuesta {b}, {aShare} frente a {bShare}, apunta un sondeo de {pollster}}}',
    holds:
      '{setting, select, contest {El sondeo de {pollster} da ventaja a {a} sobre {b}: {aShare} frente a {bShare}} other {La respuesta {a} es más frecuente que la respuesta {b} en el sondeo de {pollster}: {aShare} frente a {bShare}}}',
    fragile:
      'Cifra más alta para {a} que para {b} en el sondeo de {pollster}, {aShare} frente a {bShare}, pero el sondeo no permite darlo por seguro',
    level: 'Misma cifra para {both} en el sondeo de {pollster}: {aShare}',
    'not-shown':
      '{a} {aShare}, {b} {bShare} en el sondeo de {pollster}: el azar por sí solo podría producir esa diferencia',
    family:
      '{a} {aShare}, {b} {bShare} en el sondeo de {pollster}: entre varias comparaciones, el azar podría producir esa diferencia',
    untested:
      '{reason, select, notDisclosed {El sondeo de {pollster} omite cifras necesarias para la comparación entre {both}} noSamplingBasis {{a} {aShare}, {b} {bShare} en un sondeo de {pollster} sin margen de error reconocido} noSampleSize {{a} {aShare}, {b} {bShare} en un sondeo de {pollster} que no dice a cuántas personas preguntó} tooSmall {{a} {aShare}, {b} {bShare} en un sondeo de {pollster} con muy pocas entrevistas para compararlos} other {{a} {aShare}, {b} {bShare} en el sondeo de {pollster}: la diferencia no se puede contrastar}}',
  },
  change: {
    'holds-twice':
      '{direction, select, more {La cifra de {option} sube desde el sondeo {prevDates}, apuntan los datos de {pollsters}} other {La cifra de {option} baja desde el sondeo {prevDates}, apuntan los datos de {pollsters}}}',
    holds:
      '{direction, select, more {La cifra de {option} sube en los sondeos de {pollsters} desde el realizado {prevDates}} other {La cifra de {option} baja en los sondeos de {pollsters} desde el realizado {prevDates}}}',
    fragile:
      '{direction, select, more {Cifra más alta para {option} que en el sondeo {prevDates}, {now} frente a {then}, pero los sondeos de {pollsters} no permiten darlo por seguro} other {Cifra más baja para {option} que en el sondeo {prevDates}, {now} frente a {then}, pero los sondeos de {pollsters} no permiten darlo por seguro}}',
    level: '{option}: {now} en el sondeo de {pollster}, la misma cifra que en el realizado {prevDates}',
    'not-shown':
      '{option}: {now} en el sondeo de {pollster}, frente a {then} en el realizado {prevDates}; el azar por sí solo podría producir esa diferencia',
    family:
      '{option}: {now} en el sondeo de {pollster}, frente a {then} en el realizado {prevDates}; entre varias comparaciones, el azar podría producir esa diferencia',
    'little-changed': 'Poca variación para {option} desde el sondeo {prevDates}, según {pollsters}',
    untested:
      '{reason, select, notDisclosed {Los sondeos de {pollsters} omiten cifras necesarias para comparar {option} con los datos {prevDates}} notComparable {{option}: {now} en el sondeo de {pollster}, que no se puede comparar con el realizado {prevDates}} noSamplingBasis {{option}: {now} en un sondeo de {pollster} sin margen de error reconocido} other {{option}: {now} en el sondeo de {pollster}; el cambio desde el realizado {prevDates} no se puede contrastar}}',
  },
  'lead-change': {
    'holds-twice':
      'La diferencia entre {both} se ha movido en favor de {toward} desde el sondeo {prevDates}, apuntan los datos de {pollsters}',
    holds:
      'La diferencia entre {both} se ha movido en favor de {toward} en los sondeos de {pollsters} desde el realizado {prevDates}',
    fragile:
      'La diferencia entre {both} es más favorable a {toward} que en el sondeo {prevDates}, pero los sondeos de {pollsters} no permiten darlo por seguro',
    level:
      'La diferencia entre {both} tiene en el sondeo de {pollster} la misma cifra que en el realizado {prevDates}',
    'not-shown':
      '{a} {aNow}, {b} {bNow} en el sondeo de {pollster}: el azar por sí solo podría explicar lo que varía la diferencia desde el realizado {prevDates}',
    family:
      '{a} {aNow}, {b} {bNow} en el sondeo de {pollster}: entre varias comparaciones, el azar podría explicar lo que varía la diferencia desde el realizado {prevDates}',
    untested:
      '{reason, select, notDisclosed {Los sondeos de {pollsters} omiten cifras necesarias para comparar la diferencia entre {both}} notComparable {{a} {aNow}, {b} {bNow} en el sondeo de {pollster}; la diferencia no se puede comparar con el sondeo {prevDates}} noSamplingBasis {{a} {aNow}, {b} {bNow} en un sondeo de {pollster} sin margen de error reconocido} other {{a} {aNow}, {b} {bNow} en el sondeo de {pollster}; el cambio de la diferencia desde el realizado {prevDates} no se puede contrastar}}',
  },
  threshold: {
    'holds-twice': `{side, select, above {Un sondeo de {pollster} apunta a una cifra de {option} por encima de la {line}: {share}${ASKED}} other {Un sondeo de {pollster} apunta a una cifra de {option} por debajo de la {line}: {share}${ASKED}}}`,
    holds: `{side, select, above {El sondeo de {pollster} sitúa a {option} por encima de la {line}, con el {share}${ASKED}} other {El sondeo de {pollster} sitúa a {option} por debajo de la {line}, con el {share}${ASKED}}}`,
    fragile: `{side, select, above {El sondeo de {pollster} sitúa a {option} por encima de la {line}, con el {share}${ASKED}, pero no permite darlo por seguro} other {El sondeo de {pollster} sitúa a {option} por debajo de la {line}, con el {share}${ASKED}, pero no permite darlo por seguro}}`,
    level: 'La cifra de {option} coincide exactamente con la {line} en el sondeo de {pollster}',
    'not-shown': `{option}: {share}${ASKED} en el sondeo de {pollster}, demasiado cerca de la {line} para saber de qué lado está`,
    family: `{option}: {share}${ASKED} en el sondeo de {pollster}, demasiado cerca de la {line} para saber de qué lado está`,
    untested:
      '{reason, select, notDisclosed {El sondeo de {pollster} omite la cifra de {option}} noSamplingBasis {{option}: {share} en un sondeo de {pollster} sin margen de error reconocido} noSampleSize {{option}: {share} en un sondeo de {pollster} que no dice a cuántas personas preguntó} tooSmall {{option}: {share} en un sondeo de {pollster} con muy pocas entrevistas para compararlo con la {line}} other {{option}: {share} en el sondeo de {pollster}, que no se puede contrastar con la {line}}}',
  },
  'net-score': ES_NET_SCORE.headline,
  'net-score-change': ES_NET_SCORE_CHANGE.headline,
  gap: ES_GAP.headline,
};
