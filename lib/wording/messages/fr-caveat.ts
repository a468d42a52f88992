import type { LanguagePack } from '../language-pack';
import { points, QUANTITY, WEIGHTING } from './fr-parts';

const DRAWN =
  '{drawn, select, unknown {Le mode de tirage de l’échantillon n’est pas indiqué.} other {L’échantillon n’a pas été tiré au sort ({sample}).}}';
const STATED = points('stated').replace('{stated} ', '{statedPp} ');

/** The caveat in French; the sources of its contents stand beside the English one. */
export const FR_CAVEAT: LanguagePack['caveat'] = {
  fieldwork:
    '{pollsterStart} a interrogé {sized, select, yes {{n} {population}} other {des {population}}}{modeKnown, select, yes { {mode}} other {}} {dateSpan, select, day {le {end}} other {{dates}}}{sponsored, select, given { pour {sponsor}} own { pour son propre compte} other {}}.',
  earlier:
    'Le sondage précédent{samePollster, select, yes {} other {, réalisé par {prevPollster},}} portait sur {prevSized, select, yes {{prevN} {prevPopulation}} other {des {prevPopulation}}} {prevDateSpan, select, day {le {prevEnd}} other {{prevDates}}}.',
  'not-disclosed': 'Non communiqué : {items}.',
  'not-recorded': 'Non relevé par {newsroom} : {items}.',
  'sample-random':
    '{design, select, weighted {L’échantillon a été tiré au sort et les résultats sont pondérés.} clustered {L’échantillon a été tiré au sort, en grappes.} unweighted {L’échantillon a été tiré au sort et les résultats ne sont pas pondérés.} other {L’échantillon a été tiré au sort ; on ignore si les résultats sont pondérés.}}',
  'sample-not-random':
    '{drawn, select, unknown {Le mode de tirage de l’échantillon n’est pas indiqué : aucune marge d’erreur d’échantillonnage ne lui est attribuée.} other {L’échantillon n’a pas été tiré au sort ({sample}) : aucune marge d’erreur d’échantillonnage ne lui est attribuée.}}',
  'sample-modelled': `${DRAWN} {pollsterStart} annonce un intervalle modélisé de ±${points('modelled')} pour un pourcentage ; il repose sur un modèle et n’est pas une marge d’erreur d’échantillonnage.`,
  'sample-comparison': `${DRAWN} La marge donnée ici est calculée comme s’il l’avait été, à seule fin de comparaison, selon {comparisonRule} ; ce n’est pas une marge d’erreur d’échantillonnage.`,
  margin: `{stated, select, given {{pollsterStart} annonce ±${STATED} pour un pourcentage{sameLevel, select, yes {} other { au niveau de confiance de {statedLevel}}} ; {newsroom} estime} none {{pollsterStart} n’annonce aucune marge ; {newsroom} estime} other {{newsroomStart} estime}} ${QUANTITY} à ±${points('margin')} près{wider, select, yes {, ou à ±{widerMargin} près {basis, select, modelled {compte tenu de l’arrondi de cet intervalle} other {si ${WEIGHTING} coûtait plus en précision}}} other {}} (niveau de confiance : {level}).`,
  'margin-stated-only': `{pollsterStart} annonce ±${STATED} pour un pourcentage au niveau de confiance de {statedLevel} ; aucune marge n’est donnée ici pour ${QUANTITY}.`,
  'twice-margin':
    'Selon la règle empirique du double de la marge (ici ±{shareMargin} {shareMarginCount, plural, one {point} other {points}} pour un pourcentage), la différence {zone, select, above {suffit} between {se situe entre une et deux fois cette marge} other {est inférieure à cette marge}} ; {thumb, select, agrees {{newsroom} s’en tient à son propre test de la différence.} stricter {le test de {newsroom} est plus strict, car il tient aussi compte de la pondération, de l’arrondi et du nombre de comparaisons.} other {le test de {newsroom} demande moins, car d’autres réponses ou des personnes indécises ont leur part.}}',
  'small-shares':
    'La marge annoncée vaut pour un pourcentage proche de la moitié ; les petits pourcentages ont des marges plus faibles.',
  'margin-none': `Aucune marge n’est donnée ici pour ${QUANTITY}.`,
  'errors-before-a-vote':
    'Les marges ne couvrent que l’erreur d’échantillonnage ; selon les études sur les sondages préélectoraux, l’erreur totale est d’environ deux fois les marges annoncées.',
  errors:
    'Les marges ne couvrent que l’erreur d’échantillonnage ; la formulation des questions et les personnes que le sondage n’a pas touchées peuvent aussi déplacer les chiffres.',
  'errors-without-margin':
    'La formulation des questions et les personnes que le sondage n’a pas touchées peuvent déplacer les chiffres.',
};
