import type { LanguagePack } from '../language-pack';
import { points, WEIGHTING } from './fr-parts';

type End = (name: 'low' | 'high' | 'span') => string;
const near: End = (name) => name;
const wide: End = (name) => `wider${name.charAt(0).toUpperCase()}${name.slice(1)}`;

function ends(of: End): string {
  const [low, high, span] = [of('low'), of('high'), of('span')];
  const lead = `de {${span}, select, across {${points(low)} de plus pour {b} à ${points(high)} de plus pour {a}.} other {{${low}} à ${points(high)} de plus pour {a}.}}`;
  const gap = `de {${span}, select, across {${points(low)} de plus parmi {h} à ${points(high)} de plus parmi {g}.} other {{${low}} à ${points(high)} de plus parmi {g}.}}`;
  const move = `de {${span}, select, across {${points(low)} vers {away} à ${points(high)} vers {toward}.} other {{${low}} à ${points(high)} vers {toward}.}}`;
  const change = `de {${span}, select, across {moins {${low}} à plus ${points(high)}.} above {plus {${low}} à plus ${points(high)}.} other {moins {${high}} à moins ${points(low)}.}}`;
  return `{claim, select, lead {${lead}} netScore {${lead}} leadChange {${move}} change {${change}} netScoreChange {${change}} gap {${gap}} other {de {${low}} à {${high}}.}}`;
}

/** What the chart shows, in French, for those who hear the page. */
export const FR_ALT_TEXT: LanguagePack['altText'] = {
  intro:
    '{claim, select, lead {Graphique d’incertitude de l’écart entre {a} et {b}, {race}.} change {Graphique d’incertitude de l’évolution pour {option}, {race}.} leadChange {Graphique d’incertitude de l’évolution de l’écart entre {a} et {b}, {race}.} netScore {Graphique d’incertitude de l’écart entre {a} et {b}, {race}.} netScoreChange {Graphique d’incertitude de l’évolution du solde net pour la réponse {name}, {race}.} gap {Graphique d’incertitude de l’écart entre {g} et {h} pour {option}, {race}.} other {Graphique d’incertitude pour {option} par rapport à la {line}, {race}.}}',
  title: '{title}.',
  range: `La fourchette à {level} va ${ends(near)}`,
  wider: `{basis, select, modelled {Compte tenu de l’arrondi de l’intervalle annoncé, elle pourrait aller} other {Si ${WEIGHTING} coûtait plus en précision, elle irait}} ${ends(wide)}`,
  fieldwork:
    '{pollsterStart} a interrogé {sized, select, yes {{n} {population}} other {des {population}}}{modeKnown, select, yes { {mode}} other {}} {longSpan, select, day {le {startLong}} other {du {startShort} au {endLong}}}.',
};
