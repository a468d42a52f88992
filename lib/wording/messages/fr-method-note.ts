import type { LanguagePack } from '../language-pack';
import { ofPoints, points } from './fr-parts';

const DEFF =
  '{poll, select, earlier {Effet de plan du sondage précédent} group {Effet de plan parmi {group}} other {Effet de plan}} : {deff}';

/** How the finding was worked out, in French. */
export const FR_METHOD_NOTE: LanguagePack['methodNote'] = {
  question: 'Question posée : « {question} »{ended, select, yes {} other {.}}',
  'no-choice': 'Sans choix exprimé : {shares}.',
  'compared-with':
    'Comparaison avec le sondage {prevPollster}{prevPopulated, select, yes { {prevOfWhom}} other {}}, {prevDatesLong}{prevSized, select, yes { (échantillon : {prevN})} other { (taille de l’échantillon non communiquée)}}.',
  'shared-waves':
    'Les deux sondages sont des moyennes de {window} vagues chacun, dont {shared} en commun ; seules les vagues qui ne sont pas communes font la différence.{equal, select, yes { Toutes les vagues sont supposées compter autant d’entretiens.} other {}}{pooled, select, yes { Les pourcentages de chaque vague ne sont pas communiqués ; un seul pourcentage d’ensemble les remplace.} other {}}',
  rebased: 'Les pourcentages portent sur les {rebasedN} personnes ayant exprimé un choix.',
  bloc: '{source, select, printed {Le chiffre pour {bloc} est celui des tableaux de l’institut pour {members}.} other {Le chiffre pour {bloc} est la somme des pourcentages publiés pour {members}.}}',
  'net-score':
    'Un solde net a la marge d’un écart, non celle d’un pourcentage ; il bouge de deux points quand un point d’opinion passe d’un côté à l’autre.',
  design: `${DEFF}, calculé d’après le plan de sondage.`,
  kish: `${DEFF} d’après les poids seuls, pris entre {deffLow} et {deffHigh}.`,
  stated: `${DEFF}, tel que l’annonce {pollster}.`,
  implied: `${DEFF}, déduit de {stated, select, modelled {l’intervalle modélisé} other {la marge}} qu’annonce {pollster} (entre {deffLow} et {deffHigh} compte tenu de l’arrondi).`,
  assumed: `${DEFF}, supposé par {newsroom}{ranged, select, yes {, pris entre {deffLow} et {deffHigh}} other {}}.`,
  'stated-margin-like-unweighted':
    'La marge qu’annonce {pollster}{poll, select, earlier { pour le sondage précédent} other {}} ne se distingue pas d’une marge qui ignore la pondération et n’a pas été utilisée.',
  'one-deff':
    'Un seul effet de plan global pour tous les pourcentages et toutes les différences est une approximation.',
  test: 'Test bilatéral au niveau de confiance de {level} : {z, select, none {{p}} other {z = {z}, {p}}}.',
  family:
    'C’est l’un des {count} tests faits ensemble, aux niveaux fixés par la méthode de Holm ; après cet ajustement, {pAdjusted}.',
  'second-test':
    'Second test ({name}) : {measure, select, p {{p}} other {de {low} à {high} points}}, {passes, select, yes {concluant} other {non concluant}}.',
  rounding: `Arrondi des chiffres publiés : ±${points('rounding')} pris en compte.`,
  'breaking-deff':
    '{settled, select, yes {Avec les chiffres publiés, le résultat ne passerait plus le test à partir d’un effet de plan de {breaking}.} other {Avec les chiffres publiés, le résultat ne passerait le test qu’avec un effet de plan inférieur à {breaking}.}}',
  'breaking-factor':
    '{settled, select, yes {Avec les chiffres publiés, le résultat ne passerait plus le test si les deux effets de plan étaient multipliés par {breaking} ou plus.} other {Avec les chiffres publiés, le résultat ne passerait le test que si les deux effets de plan étaient multipliés par moins de {breaking}.}}',
  'lower-deff': 'Au bas de la fourchette de l’effet de plan, il passerait le test.',
  detectable: `{claim, select, lead {Un écart réel} change {Un changement réel} leadChange {Un changement réel de l’écart} netScore {Un solde net réel} netScoreChange {Un changement réel du solde net} gap {Un écart réel} other {Un éloignement réel de la barre}} ${ofPoints('detectable')} aurait été décelé quatre fois sur cinq.`,
  'little-changed': `Peu de changement : les deux tests unilatéraux par rapport à un changement ${ofPoints('indifference')}, fixé au préalable, sont concluants.`,
  exaggerated: 'Les changements qui passent un tel test sont en moyenne un peu exagérés.',
  untested: 'Aucun test n’a été fait.',
  source: 'Source : {url}',
  engine: 'Calculé avec le moteur de calcul {engine} et les textes {templateVersion}.',
  'before-a-vote':
    'Les sondages mesurent l’opinion à un moment donné. La loi locale peut limiter ce qui se publie et quand : consulter les juristes de la rédaction et l’autorité électorale. Les résultats officiels sont ceux que certifie l’autorité électorale.',
  opinion: 'Les sondages mesurent l’opinion à un moment donné.',
};
