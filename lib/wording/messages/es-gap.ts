import type { ClaimMessages } from '../language-pack';
import {
  chanceAlone,
  LARGER,
  LARGER_OF_ONE,
  percentagePoints,
  THIS_POLL,
  THIS_POLL_START,
  AMONG,
} from './es-parts';

const BOTH = '{option}: {gShare} entre {g} y {hShare} entre {h}';
const MORE =
  '{setting, select, contest {ás apoyo a {option} entre {g} que entre {h}} other {ás respuestas {option} entre {g} que entre {h}}}';
const SUPPRESSED = 'belowPresentationStandard';
const TOO_FEW = 'tiene muy pocas entrevistas para comparar {g} con {h}';
const LEFT_OUT = 'omite cifras necesarias para comparar {g} con {h}';
const CHANCE = 'una diferencia que el azar por sí solo podría producir';
const CHANCE_AMONG = 'una diferencia que el azar podría producir entre varias comparaciones';
const UNUSUAL = 'una diferencia mayor de la que suele producir el azar';

/** A gap between two groups of one sample, in Spanish. */
export const ES_GAP: Record<'headline' | 'body' | 'chartTitle' | 'told', ClaimMessages['gap']> = {
  headline: {
    'holds-twice': `M${MORE}, {gShare} frente a {hShare}, apunta un sondeo de {pollster}`,
    holds: `M${MORE} en el sondeo de {pollster}: {gShare} frente a {hShare}`,
    fragile:
      'Cifra de {option} más alta entre {g} que entre {h}, {gShare} frente a {hShare}, pero el sondeo de {pollster} no permite darlo por seguro',
    level: 'Misma cifra de {option} entre {g} que entre {h} en el sondeo de {pollster}: {gShare}',
    'not-shown': `${BOTH} en el sondeo de {pollster}, ${CHANCE}`,
    family: `${BOTH} en el sondeo de {pollster}, ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {El sondeo de {pollster} ${LEFT_OUT}} ${SUPPRESSED} {El sondeo de {pollster} ${TOO_FEW}} noSamplingBasis {${BOTH} en un sondeo de {pollster} sin margen de error reconocido} noSampleSize {${BOTH} en un sondeo de {pollster} que no dice a cuántas personas preguntó} tooSmall {El sondeo de {pollster} ${TOO_FEW}} other {${BOTH} en el sondeo de {pollster}: la diferencia no se puede contrastar}}`,
  },
  body: {
    'holds-twice': `Un sondeo de {pollster}${AMONG} apunta a que hay m${MORE}: {gShare} frente a {hShare}. La diferencia seguiría siendo ${LARGER_OF_ONE}.`,
    holds: `En ${THIS_POLL}, hay m${MORE}: {gShare} frente a {hShare}. La diferencia es ${LARGER}.`,
    fragile: `En ${THIS_POLL}, la cifra de {option} es más alta entre {g} que entre {h}, {gShare} frente a {hShare}, pero el sondeo no permite darlo por seguro.`,
    level: `En ${THIS_POLL}, la cifra de {option} es la misma entre {g} que entre {h}: {gShare}. Que las cifras sean iguales no significa que los grupos opinen lo mismo.`,
    'not-shown': `${THIS_POLL_START} da a {option} el {gShare} entre {g} y el {hShare} entre {h}, una diferencia de ${percentagePoints('gap')}. ${chanceAlone('podría producir una diferencia de ese tamaño', 'con muestras aleatorias')}.`,
    family: `${THIS_POLL_START} da a {option} el {gShare} entre {g} y el {hShare} entre {h}, una diferencia de ${percentagePoints('gap')}. Es una de las varias comparaciones hechas entre grupos del mismo sondeo y, entre tantas, el azar por sí solo podría producir una diferencia de ese tamaño.`,
    untested: `{known, select, yes {${THIS_POLL_START} da a {option} el {gShare} entre {g} y el {hShare} entre {h}.} hidden {${THIS_POLL_START} preguntó a muy pocas personas de estos grupos para comparar {g} con {h}.} other {${THIS_POLL_START} no difunde las cifras necesarias para comparar {g} con {h}.}}`,
  },
  chartTitle: {
    'holds-twice': `M${MORE}: {gShare} frente a {hShare}`,
    holds: `M${MORE} en este sondeo: {gShare} frente a {hShare}`,
    fragile:
      'Cifra de {option} más alta entre {g} que entre {h} en este sondeo, {gShare} frente a {hShare}, pero el sondeo no permite darlo por seguro',
    level: 'Misma cifra de {option} entre {g} que entre {h} en este sondeo: {gShare}',
    'not-shown': `${BOTH}, ${CHANCE}`,
    family: `${BOTH}, ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {{g} y {h}: cifras no difundidas} ${SUPPRESSED} {{option} entre {g} y entre {h}: muy pocas entrevistas para mostrarlo} tooSmall {{option} entre {g} y entre {h}: muy pocas entrevistas para comparar} noSamplingBasis {${BOTH}, sin margen de error reconocido} other {${BOTH}; la diferencia no se puede contrastar}}`,
  },
  told: {
    'holds-twice': `Hay m${MORE}, {gShare} frente a {hShare}, ${UNUSUAL}.`,
    holds: `En este sondeo hay m${MORE}, {gShare} frente a {hShare}, ${UNUSUAL}.`,
    fragile:
      'En este sondeo, la cifra de {option} es más alta entre {g} que entre {h}, {gShare} frente a {hShare}, pero el sondeo no permite darlo por seguro.',
    level: 'En este sondeo, la cifra de {option} es la misma entre {g} que entre {h}: {gShare}.',
    'not-shown': `${BOTH}, ${CHANCE}.`,
    family: `${BOTH}, ${CHANCE_AMONG}.`,
    untested: `{reason, select, notDisclosed {El sondeo no difunde las cifras necesarias para comparar {g} con {h}.} ${SUPPRESSED} {El sondeo ${TOO_FEW}.} noSamplingBasis {${BOTH} en un sondeo sin margen de error reconocido.} noSampleSize {${BOTH} en un sondeo que no dice a cuántas personas preguntó.} tooSmall {El sondeo ${TOO_FEW}.} other {${BOTH}, una diferencia que este sondeo no permite contrastar.}}`,
  },
};
