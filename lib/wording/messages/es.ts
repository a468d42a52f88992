import type { LanguagePack } from '../language-pack';
import { ES_ALT_TEXT } from './es-alt-text';
import { ES_BODY } from './es-body';
import { ES_CAVEAT } from './es-caveat';
import { ES_CHART_TITLE } from './es-chart-title';
import { ES_HEADLINE } from './es-headline';
import { ES_LIMITS } from './es-limits';
import { ES_METHOD_NOTE } from './es-method-note';
import {
  ES_CAVEAT_SHORT,
  ES_CORRECTION,
  ES_FRAGILE_SHORT,
  ES_NEWSLETTER,
  ES_ONE_BREATH,
  ES_SPOKEN,
} from './es-short';
import { ES_TERMS } from './es-terms';
import { ES_TOLD } from './es-told';

/** Spanish as the product ships it: not to be printed until a native editor of the desk has signed it. */
export const ES: LanguagePack = {
  headline: ES_HEADLINE,
  body: ES_BODY,
  chartTitle: ES_CHART_TITLE,
  told: ES_TOLD,
  ...ES_LIMITS,
  fragileShort: ES_FRAGILE_SHORT,
  context: {
    others: 'También en este sondeo: {others}.',
    bloc: '{bloc} suma {members}.',
    'shared-waves':
      'Los dos sondeos comparten {shared} de sus {window} oleadas; solo las demás forman la diferencia entre ambos.',
    groups:
      'Las cifras se basan en {gSized, select, yes {{gN} entrevistas} other {un número no difundido de entrevistas}} entre {g} y {hSized, select, yes {{hN}} other {un número no difundido}} entre {h}.',
  },
  caveat: ES_CAVEAT,
  caveatShort: ES_CAVEAT_SHORT,
  oneBreath: ES_ONE_BREATH,
  methodNote: ES_METHOD_NOTE,
  comparison: {
    latest: 'Es el último sondeo de esta serie con fechas anteriores.',
    'latest-comparable':
      '{count, plural, one {Es el último sondeo anterior que se puede comparar; hay otro posterior que difiere en lo siguiente: {items}.} other {Es el último sondeo anterior que se puede comparar; hay otros # posteriores que difieren en lo siguiente: {items}.}}',
    unknown: 'No consta, y no se toma por diferente: {items}.',
    override:
      '{differing, select, yes {Los dos sondeos difieren en lo siguiente: {items}; la redacción los compara pese a ello: {reason}} other {La redacción eligió el sondeo con el que comparar: {reason}}}',
  },
  altText: ES_ALT_TEXT,
  spoken: ES_SPOKEN,
  newsletter: ES_NEWSLETTER,
  correction: ES_CORRECTION,
  terms: ES_TERMS,
};
