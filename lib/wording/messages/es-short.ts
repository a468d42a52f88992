import type { LanguagePack } from '../language-pack';
import { points, QUANTITY, SHORT_QUANTITY, WEIGHTING } from './es-parts';

const STATED = points('stated').replace('{stated} ', '{statedPp} ');
const MARGIN = `±${points('margin')}{wider, select, yes { (hasta ±{widerMargin})} other {}}`;
const MARGIN_ALOUD = `${points('margin')}{wider, select, yes {, o bien {widerMargin} si {basis, select, modelled {se cuenta el redondeo} other {${WEIGHTING} cuesta más precisión}}} other {}}`;
const STATES = `{pollsterStart} declara ±${STATED} para un porcentaje`;
const NOT_DRAWN =
  '{drawn, select, unknown {No se indica cómo se eligió la muestra} other {La muestra no se eligió al azar ({sample})}}';
const NOT_DRAWN_ASIDE =
  '{drawn, select, unknown {no se indica cómo se eligió la muestra} other {la muestra no se eligió al azar}}';
const ASKED_EARLIER =
  '{twoPolls, select, yes { y, antes,{samePollster, select, yes {} other { {prevPollster}}} a {prevSized, select, yes {{prevN}} other {un número no difundido}} {prevDateSpan, select, day {el {prevEnd}} other {{prevDates}}}} other {}}';
const ASKED = `{pollsterStart} preguntó a {sized, select, yes {{n} {population}} other {{population} (número no difundido)}} {dateSpan, select, day {el {end}} other {{dates}}}${ASKED_EARLIER}`;

/** The last sentence of the short caveat, in Spanish. */
export const ES_CAVEAT_SHORT: LanguagePack['caveatShort'] = {
  margin: `{stated, select, given {${STATES}{sameLevel, select, yes {} other { con una confianza del {statedLevel}}}; {newsroom} estima} none {{pollsterStart} no declara ningún margen; {newsroom} estima} other {{newsroomStart} estima}} para ${QUANTITY} un margen de ${MARGIN} (confianza del {level}), solo por error de muestreo.`,
  'stated-only': `${STATES} con una confianza del {statedLevel}; aquí no se da ninguno para ${QUANTITY}.`,
  none: `Aquí no se da ningún margen para ${QUANTITY}.`,
  'not-random': `${NOT_DRAWN}, así que no se le atribuye ningún margen de error de muestreo.`,
  modelled: `${NOT_DRAWN}; según el modelo del propio instituto, {newsroom} estima para ${QUANTITY} un margen de ${MARGIN} (confianza del {level}).`,
  comparison: `${NOT_DRAWN}; calculado como si así hubiera sido, conforme a {comparisonRule}, el margen para ${QUANTITY} es de ${MARGIN} (confianza del {level}).`,
};

/** One sentence for a caption or an aside, in Spanish. */
export const ES_ONE_BREATH: LanguagePack['oneBreath'] = {
  margin: `${ASKED}; {newsroom} estima para ${SHORT_QUANTITY} un margen de ${MARGIN}.`,
  'stated-only': `${ASKED}; declara ±${STATED} para un porcentaje, y no hay margen para ${SHORT_QUANTITY}.`,
  none: `${ASKED}; no se da margen para ${SHORT_QUANTITY}.`,
  'not-random': `${ASKED}; ${NOT_DRAWN_ASIDE}, así que no se da ningún margen.`,
  modelled: `${ASKED}; {newsroom} estima para ${SHORT_QUANTITY} un margen de ${MARGIN}, según el modelo del propio instituto.`,
  comparison: `${ASKED}; para ${SHORT_QUANTITY} el margen es de ${MARGIN} como si la muestra fuera aleatoria, conforme a {comparisonRule}.`,
};

const SPOKEN_NOT_DRAWN =
  '{drawn, select, unknown {No se indica cómo se eligió la muestra} other {La muestra no se eligió al azar}}';

/** Said aloud, in Spanish. */
export const ES_SPOKEN: LanguagePack['spoken'] = {
  fieldwork:
    '{pollsterStart} preguntó a {sized, select, yes {{n} {population}} other {{population}, sin decir a cuántas,}} {dates}.',
  margin: `{newsroomStart} estima para ${SHORT_QUANTITY} un margen de más o menos ${MARGIN_ALOUD}.`,
  'stated-only': `{pollsterStart} declara más o menos ${STATED} para un porcentaje, y aquí no hay margen para ${SHORT_QUANTITY}.`,
  none: `No se da ningún margen para ${SHORT_QUANTITY}.`,
  'not-random': `${SPOKEN_NOT_DRAWN}, así que no se le atribuye ningún margen de error de muestreo.`,
  modelled: `${SPOKEN_NOT_DRAWN}; según el modelo del propio instituto, el margen para ${SHORT_QUANTITY} es de más o menos ${MARGIN_ALOUD}.`,
  comparison: `${SPOKEN_NOT_DRAWN}; calculado como si así hubiera sido, conforme a {comparisonRule}, el margen para ${SHORT_QUANTITY} es de más o menos ${MARGIN_ALOUD}.`,
};

/** Short reasons of a fragile finding, in Spanish. */
export const ES_FRAGILE_SHORT: LanguagePack['fragileShort'] = {
  rounding: 'Depende de cómo se redondearon las cifras publicadas.',
  'design-effect': `Depende de cuánta precisión cueste ${WEIGHTING}.`,
  'second-test': 'Una segunda prueba aceptada no lo confirma.',
  together: `Depende del redondeo y de ${WEIGHTING} a la vez.`,
  modelled: 'Descansa en el modelo con que el propio instituto estima su error.',
  comparison: 'Está calculado como si la muestra se hubiera elegido al azar.',
};

export const ES_NEWSLETTER: LanguagePack['newsletter'] = { line: '{race}. {line}' };

/** Corrections, in Spanish. */
export const ES_CORRECTION: LanguagePack['correction'] = {
  intro:
    'Corrección, {on}: {count, plural, =0 {se han retirado palabras de una versión anterior de esta información sobre el sondeo de {pollster}} one {una versión anterior de esta información daba un dato erróneo del sondeo de {pollster}} other {una versión anterior de esta información daba datos erróneos del sondeo de {pollster}}}.',
  share: 'Atribuía a {option} el {was}; la cifra correcta es {is}.',
  'earlier-share': 'Atribuía a {option} el {was} en {prevPoll}; la cifra correcta es {is}.',
  'group-share': 'Atribuía a {option} el {was} entre {group}; la cifra correcta es {is}.',
  'sample-size':
    '{wasSized, select, yes {Decía que se preguntó a {was} personas} other {No decía a cuántas personas se preguntó}}; {isSized, select, yes {el número correcto es {is}} other {el número correcto no se ha difundido}}.',
  dates: 'Situaba las entrevistas {was}; las fechas correctas son: {is}.',
  now: 'Esto es lo que permiten afirmar las cifras{count, plural, =0 {} other { correctas}}. {line}',
  weaker: 'No respaldan la afirmación que se hizo.',
};
