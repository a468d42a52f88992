import type { LanguagePack } from '../language-pack';
import {
  of,
  ofPercentagePoints,
  ofPoints,
  points,
  RANGE_OF_TWO_RUNS,
  RANGE_RUNS,
  WEIGHTING,
} from './fr-parts';

const HIGH = points('high');
const OF_LOW = ofPoints('low');
const OF_HIGH = ofPoints('high');
const LEAD_RANGE = `${RANGE_RUNS} {span, select, across {${OF_LOW} de plus pour {b} à ${HIGH} de plus pour {a}.} other {${of('low')} à ${HIGH} de plus pour {a}.}}`;
const CHANGE_RANGE = `${RANGE_OF_TWO_RUNS} {span, select, across {d’une baisse ${OF_LOW} à une hausse ${OF_HIGH}.} above {d’une hausse ${OF_LOW} à une hausse ${of('high')}.} other {d’une baisse ${OF_HIGH} à une baisse ${of('low')}.}}`;

/** Range, detectable difference, and the reasons why a finding is fragile or was not tested, in French. */
export const FR_LIMITS: Pick<LanguagePack, 'range' | 'detectable' | 'fragile' | 'untested'> = {
  range: {
    lead: LEAD_RANGE,
    change: CHANGE_RANGE,
    'lead-change': `${RANGE_OF_TWO_RUNS} {span, select, across {${OF_LOW} vers {away} à ${HIGH} vers {toward}.} other {${of('low')} à ${HIGH} vers {toward}.}}`,
    threshold: `${RANGE_RUNS} de {low} à {high}.`,
    'net-score': LEAD_RANGE,
    'net-score-change': CHANGE_RANGE,
    gap: `${RANGE_OF_TWO_RUNS} {span, select, across {${OF_LOW} de plus parmi {h} à ${HIGH} de plus parmi {g}.} other {${of('low')} à ${HIGH} de plus parmi {g}.}}`,
  },
  detectable: `{claim, select, gap {Un écart réel} other {Un changement réel}} ${ofPercentagePoints('detectable')} aurait été décelé quatre fois sur cinq ; les plus petits passent souvent inaperçus.`,
  fragile: {
    'as-printed':
      'Avec les chiffres publiés, {claim, select, lead {l’écart} change {l’évolution} leadChange {l’évolution de l’écart} netScore {l’écart} netScoreChange {l’évolution du solde net} gap {l’écart} other {la distance à la {line}}} dépasse ce que {basis, select, sampling {l’erreur d’échantillonnage produit d’ordinaire à elle seule} modelled {le hasard produit d’ordinaire à lui seul selon le modèle de l’institut} other {le hasard produit d’ordinaire à lui seul dans un échantillon aléatoire}}.',
    rounding: 'L’arrondi des chiffres publiés pourrait remettre cela en cause.',
    'design-effect': `{deffSource, select, assumed {Si ${WEIGHTING} coûtait plus en précision que {newsroom} ne le suppose, cela pourrait être remis en cause.} kish {Si la pondération coûtait plus en précision que les poids seuls ne l’indiquent, cela pourrait être remis en cause.} other {Si ${WEIGHTING} coûtait en précision autant que le permet le haut de ce qu’implique la marge de l’institut, cela pourrait être remis en cause.}}`,
    'second-test': 'Un second test reconnu, sur les mêmes chiffres, ne le confirme pas.',
    together: `L’arrondi et un coût plus élevé en précision pour ${WEIGHTING} pourraient ensemble remettre cela en cause ; séparément, aucun n’y suffirait.`,
    modelled:
      'L’échantillon n’a pas été tiré au sort : le résultat repose sur le modèle par lequel l’institut estime lui-même son erreur.',
    comparison:
      'L’échantillon n’a pas été tiré au sort ; le résultat est calculé comme s’il l’avait été, à seule fin de comparaison.',
  },
  untested: {
    'no-sample-size':
      '{which, select, both {Aucun des deux sondages ne dit combien de personnes ont répondu : aucune marge d’erreur ne peut être calculée.} previous {Le sondage précédent ne dit pas combien de personnes ont répondu : aucune marge d’erreur ne peut être calculée.} other {Le sondage ne dit pas combien de personnes ont répondu : aucune marge d’erreur ne peut être calculée.}}',
    'no-sampling-basis':
      '{which, select, both {Rien n’indique que les deux échantillons ont été tirés au sort, et aucune marge d’erreur d’échantillonnage n’est reconnue pour de tels échantillons.} previous {Rien n’indique que l’échantillon du sondage précédent a été tiré au sort, et aucune marge d’erreur d’échantillonnage n’est reconnue pour un tel échantillon.} other {{drawn, select, unknown {Le mode de tirage de l’échantillon n’est pas indiqué : aucune marge d’erreur d’échantillonnage ne peut lui être attribuée.} other {L’échantillon n’a pas été tiré au sort, et aucune marge d’erreur d’échantillonnage n’est reconnue pour un tel échantillon.}}}}',
    'too-small':
      'Une fois la pondération prise en compte, trop peu de personnes ont été interrogées pour {claim, select, threshold {qu’une comparaison avec la {line}} other {qu’une comparaison}} ait un sens.',
    'few-clusters':
      'Les entretiens viennent de trop peu de lieux pour calculer une marge d’erreur de façon fiable.',
    'not-comparable':
      '{offered, select, no {Le sondage précédent ne proposait pas les mêmes réponses : les deux ne sont pas comparés.} other {Les deux échantillons n’ont pas été constitués de la même façon : les deux sondages ne sont pas comparés.}}',
    'not-disclosed':
      '{which, select, previous {Le sondage précédent ne communique pas tous les chiffres nécessaires à la comparaison.} other {Les chiffres nécessaires à la comparaison ne sont pas tous communiqués.}}',
    'shared-waves':
      'Les deux sondages partagent des entretiens impossibles à distinguer : l’évolution entre eux ne peut pas être calculée.',
    'same-people':
      'Les mêmes personnes ont été interrogées les deux fois, et le nombre de celles qui ont changé de réponse n’est pas communiqué.',
    'independent-margin': `Deux échantillons distincts de cette taille auraient ici une marge de ±${points('independent')} ; celle de personnes interrogées deux fois n’est pas connue.`,
    'rebased-size':
      'Les pourcentages excluent les personnes sans choix exprimé, et le nombre de celles qui restent n’est pas communiqué.',
    'other-base': 'La règle de la {line} ne compte pas les mêmes personnes que ces pourcentages.',
    'below-presentation-standard':
      'Au moins un des groupes est trop petit pour que son pourcentage soit montré.',
    'no-sign-of-error':
      'Cela n’indique pas que les chiffres sont faux ; simplement, {claim, select, lead {l’écart entre eux} change {l’évolution} leadChange {l’évolution de l’écart} netScore {l’écart entre eux} netScoreChange {l’évolution du solde net} gap {l’écart entre les groupes} other {la distance à la {line}}} ne se prête pas à un test.',
  },
};
