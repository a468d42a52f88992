import type { LanguagePack } from '../language-pack';
import { points, WEIGHTING } from './es-parts';

type End = (name: 'low' | 'high' | 'span') => string;
const near: End = (name) => name;
const wide: End = (name) => `wider${name.charAt(0).toUpperCase()}${name.slice(1)}`;

function ends(of: End): string {
  const [low, high, span] = [of('low'), of('high'), of('span')];
  const lead = `de {${span}, select, across {${points(low)} más para {b} a ${points(high)} más para {a}.} other {{${low}} a ${points(high)} más para {a}.}}`;
  const gap = `de {${span}, select, across {${points(low)} más entre {h} a ${points(high)} más entre {g}.} other {{${low}} a ${points(high)} más entre {g}.}}`;
  const move = `de {${span}, select, across {${points(low)} en favor de {away} a ${points(high)} en favor de {toward}.} other {{${low}} a ${points(high)} en favor de {toward}.}}`;
  const change = `de {${span}, select, across {menos {${low}} a más ${points(high)}.} above {más {${low}} a más ${points(high)}.} other {menos {${high}} a menos ${points(low)}.}}`;
  return `{claim, select, lead {${lead}} netScore {${lead}} leadChange {${move}} change {${change}} netScoreChange {${change}} gap {${gap}} other {del {${low}} al {${high}}.}}`;
}

/** What the chart shows, in Spanish, for those who hear the page. */
export const ES_ALT_TEXT: LanguagePack['altText'] = {
  intro:
    '{claim, select, lead {Gráfico de incertidumbre de la diferencia entre {both}, {race}.} change {Gráfico de incertidumbre del cambio de {option}, {race}.} leadChange {Gráfico de incertidumbre del cambio de la diferencia entre {both}, {race}.} netScore {Gráfico de incertidumbre de la diferencia entre {both}, {race}.} netScoreChange {Gráfico de incertidumbre del cambio del saldo neto de {name}, {race}.} gap {Gráfico de incertidumbre de la diferencia entre {g} y {h} para {option}, {race}.} other {Gráfico de incertidumbre de {option} frente a la {line}, {race}.}}',
  title: '{title}.',
  range: `El intervalo del {level} va ${ends(near)}`,
  wider: `{basis, select, modelled {Dentro del redondeo del intervalo declarado, podría ir} other {Si ${WEIGHTING} costara más precisión, iría}} ${ends(wide)}`,
  fieldwork:
    '{pollsterStart} encuestó a {sized, select, yes {{n} {population}} other {{population}}}{modeKnown, select, yes { {mode}} other {}} {longSpan, select, day {el {startLong}} other {del {startShort} al {endLong}}}.',
};
