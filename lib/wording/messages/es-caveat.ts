import type { LanguagePack } from '../language-pack';
import { points, QUANTITY, WEIGHTING } from './es-parts';

const DRAWN =
  '{drawn, select, unknown {No se indica cómo se eligió la muestra.} other {La muestra no se eligió al azar ({sample}).}}';
const STATED = points('stated').replace('{stated} ', '{statedPp} ');

/** The caveat in Spanish; the sources of its contents stand beside the English one. */
export const ES_CAVEAT: LanguagePack['caveat'] = {
  fieldwork:
    '{pollsterStart} encuestó a {sized, select, yes {{n} {population}} other {{population}}}{modeKnown, select, yes { {mode}} other {}} {dateSpan, select, day {el {end}} other {{dates}}}{sponsored, select, given { por encargo de {sponsor}} own { por iniciativa propia} other {}}.',
  earlier:
    'En el sondeo anterior{samePollster, select, yes {} other {, de {prevPollster},}} se encuestó a {prevSized, select, yes {{prevN} {prevPopulation}} other {{prevPopulation}}} {prevDateSpan, select, day {el {prevEnd}} other {{prevDates}}}.',
  'not-disclosed': 'Datos no difundidos: {items}.',
  'not-recorded': 'Datos sin registrar por {newsroom}: {items}.',
  'sample-random':
    '{design, select, weighted {La muestra se eligió al azar y los resultados están ponderados.} clustered {La muestra se eligió al azar, por conglomerados.} unweighted {La muestra se eligió al azar y los resultados no están ponderados.} other {La muestra se eligió al azar; no consta si los resultados están ponderados.}}',
  'sample-not-random':
    '{drawn, select, unknown {No se indica cómo se eligió la muestra, así que no se le atribuye ningún margen de error de muestreo.} other {La muestra no se eligió al azar ({sample}), así que no se le atribuye ningún margen de error de muestreo.}}',
  'sample-modelled': `${DRAWN} {pollsterStart} declara un intervalo modelizado de ±${points('modelled')} para un porcentaje; descansa en un modelo y no es un margen de error de muestreo.`,
  'sample-comparison': `${DRAWN} El margen que aquí se da está calculado como si lo hubiera sido, solo a efectos de comparación, conforme a {comparisonRule}; no es un margen de error de muestreo.`,
  margin: `{stated, select, given {{pollsterStart} declara ±${STATED} para un porcentaje{sameLevel, select, yes {} other { con una confianza del {statedLevel}}}; {newsroom} estima} none {{pollsterStart} no declara ningún margen; {newsroom} estima} other {{newsroomStart} estima}} para ${QUANTITY} un margen de ±${points('margin')}{wider, select, yes {, o de ±{widerMargin} {basis, select, modelled {dentro del redondeo de ese intervalo} other {si ${WEIGHTING} costara más precisión}}} other {}} (confianza del {level}).`,
  'margin-stated-only': `{pollsterStart} declara ±${STATED} para un porcentaje con una confianza del {statedLevel}; aquí no se da ninguno para ${QUANTITY}.`,
  'twice-margin':
    'Según la regla práctica del doble del margen (aquí ±{shareMargin} {shareMarginCount, plural, one {punto} other {puntos}} para un porcentaje), la diferencia {zone, select, above {es suficiente} between {queda entre una y dos veces ese margen} other {es menor que ese margen}}; {thumb, select, agrees {{newsroom} se guía por su propia prueba de la diferencia.} stricter {la prueba de {newsroom} es más estricta, porque también tiene en cuenta la ponderación, el redondeo y el número de comparaciones.} other {la prueba de {newsroom} exige menos, porque hay otras opciones o personas indecisas.}}',
  'small-shares':
    'El margen declarado vale para un porcentaje cercano a la mitad; los porcentajes pequeños tienen márgenes menores.',
  'margin-none': `Aquí no se da ningún margen para ${QUANTITY}.`,
  'errors-before-a-vote':
    'Los márgenes solo cubren el error de muestreo; según los estudios sobre sondeos preelectorales, el error total fue de alrededor del doble de los márgenes declarados.',
  errors:
    'Los márgenes solo cubren el error de muestreo; la formulación de las preguntas y las personas a las que el sondeo no llegó también pueden mover las cifras.',
  'errors-without-margin':
    'La formulación de las preguntas y las personas a las que el sondeo no llegó pueden mover las cifras.',
};
