import type { ClaimMessages } from '../language-pack';
import { ES_GAP } from './es-gap';
import { ES_NET_SCORE, ES_NET_SCORE_CHANGE } from './es-net-score';
import { ASKED, UNSETTLED } from './es-parts';

/** Chart titles in Spanish: pollster and dates stand beneath the chart. */
export const ES_CHART_TITLE: ClaimMessages = {
  lead: {
    'holds-twice':
      '{setting, select, contest {Ventaja de {a} sobre {b}: {aShare} frente a {bShare}} other {La respuesta {a} es más frecuente que la respuesta {b}: {aShare} frente a {bShare}}}',
    holds:
      '{setting, select, contest {Ventaja de {a} sobre {b} en este sondeo: {aShare} frente a {bShare}} other {La respuesta {a} es más frecuente que la respuesta {b} en este sondeo: {aShare} frente a {bShare}}}',
    fragile: `Cifra más alta para {a} que para {b} en este sondeo, {aShare} frente a {bShare}, ${UNSETTLED}`,
    level: 'Misma cifra para {both} en este sondeo: {aShare}',
    'not-shown': '{a} {aShare}, {b} {bShare}: el azar por sí solo podría producir esta diferencia',
    family: '{a} {aShare}, {b} {bShare}: entre varias comparaciones, el azar podría producir esta diferencia',
    untested:
      '{reason, select, notDisclosed {Diferencia entre {both}: cifras no difundidas} noSamplingBasis {{a} {aShare}, {b} {bShare}, sin margen de error reconocido} other {{a} {aShare}, {b} {bShare}: la diferencia no se puede contrastar}}',
  },
  change: {
    'holds-twice':
      '{direction, select, more {La cifra de {option} sube desde el sondeo {prevDates}} other {La cifra de {option} baja desde el sondeo {prevDates}}}',
    holds:
      '{direction, select, more {La cifra de {option} sube en este sondeo desde el realizado {prevDates}} other {La cifra de {option} baja en este sondeo desde el realizado {prevDates}}}',
    fragile:
      '{direction, select, more {Cifra más alta para {option} que en el sondeo {prevDates}, pero los sondeos no permiten darlo por seguro} other {Cifra más baja para {option} que en el sondeo {prevDates}, pero los sondeos no permiten darlo por seguro}}',
    level: 'Misma cifra para {option} que en el sondeo {prevDates}',
    'not-shown':
      '{option}: {now}, frente a {then} en el sondeo {prevDates}; el azar por sí solo podría producir esta diferencia',
    family:
      '{option}: {now}, frente a {then} en el sondeo {prevDates}; entre varias comparaciones, el azar podría producir esta diferencia',
    'little-changed': 'Poca variación para {option} desde el sondeo {prevDates}',
    untested:
      '{reason, select, notDisclosed {{option}: cifras no difundidas} notComparable {{option}: {now}; no comparable con el sondeo {prevDates}} noSamplingBasis {{option}: {now}, sin margen de error reconocido} other {{option}: {now}; el cambio desde el sondeo {prevDates} no se puede contrastar}}',
  },
  'lead-change': {
    'holds-twice': 'La diferencia entre {both} se ha movido en favor de {toward} desde el sondeo {prevDates}',
    holds:
      'La diferencia entre {both} se ha movido en favor de {toward} en este sondeo desde el realizado {prevDates}',
    fragile:
      'La diferencia entre {both} es más favorable a {toward} que en el sondeo {prevDates}, pero los sondeos no permiten darlo por seguro',
    level: 'La diferencia entre {both} tiene la misma cifra que en el sondeo {prevDates}',
    'not-shown':
      'La diferencia entre {both}, comparada con la del sondeo {prevDates}: el azar por sí solo podría explicar lo que varía',
    family:
      'La diferencia entre {both}, comparada con la del sondeo {prevDates}: entre varias comparaciones, el azar podría explicar lo que varía',
    untested:
      '{reason, select, notDisclosed {La diferencia entre {both}: cifras no difundidas} notComparable {La diferencia entre {both}: no comparable con el sondeo {prevDates}} noSamplingBasis {La diferencia entre {both}, sin margen de error reconocido} other {La diferencia entre {both}: el cambio desde el sondeo {prevDates} no se puede contrastar}}',
  },
  threshold: {
    'holds-twice': `{side, select, above {La cifra de {option} está por encima de la {line}: {share}${ASKED}} other {La cifra de {option} está por debajo de la {line}: {share}${ASKED}}}`,
    holds: `{side, select, above {La cifra de {option} está por encima de la {line} en este sondeo: {share}${ASKED}} other {La cifra de {option} está por debajo de la {line} en este sondeo: {share}${ASKED}}}`,
    fragile: `{side, select, above {La cifra de {option} está por encima de la {line} en este sondeo, {share}${ASKED}, ${UNSETTLED}} other {La cifra de {option} está por debajo de la {line} en este sondeo, {share}${ASKED}, ${UNSETTLED}}}`,
    level: 'La cifra de {option} coincide exactamente con la {line} en este sondeo',
    'not-shown': `{option}: {share}${ASKED}, demasiado cerca de la {line} para saber de qué lado está`,
    family: `{option}: {share}${ASKED}, demasiado cerca de la {line} para saber de qué lado está`,
    untested:
      '{reason, select, notDisclosed {{option}: cifra no difundida} noSamplingBasis {{option}: {share}, sin margen de error reconocido} other {{option}: {share}; no se puede contrastar con la {line}}}',
  },
  'net-score': ES_NET_SCORE.chartTitle,
  'net-score-change': ES_NET_SCORE_CHANGE.chartTitle,
  gap: ES_GAP.chartTitle,
};
