import type { LanguagePack } from '../language-pack';
import { points, QUANTITY, SHORT_QUANTITY, WEIGHTING } from './fr-parts';

const STATED = points('stated').replace('{stated} ', '{statedPp} ');
const WIDER = '{wider, select, yes { (jusqu’à ±{widerMargin})} other {}}';
const MARGIN = `±${points('margin')}${WIDER}`;
const MARGIN_NEAR = `±${points('margin')} près${WIDER}`;
const WIDER_ALOUD = `{wider, select, yes {, ou {widerMargin} {basis, select, modelled {en comptant l’arrondi} other {si ${WEIGHTING} coûte plus en précision}}} other {}}`;
const STATES = `{pollsterStart} annonce ±${STATED} pour un pourcentage`;
const NOT_DRAWN =
  '{drawn, select, unknown {Le mode de tirage de l’échantillon n’est pas indiqué} other {L’échantillon n’a pas été tiré au sort ({sample})}}';
const NOT_DRAWN_ASIDE =
  '{drawn, select, unknown {le mode de tirage de l’échantillon n’est pas indiqué} other {l’échantillon n’a pas été tiré au sort}}';
const ASKED_EARLIER =
  '{twoPolls, select, yes { et, auparavant,{samePollster, select, yes {} other { {prevPollster}}} {prevSized, select, yes {{prevN}} other {un nombre non communiqué}} {prevDateSpan, select, day {le {prevEnd}} other {{prevDates}}}} other {}}';
const ASKED = `{pollsterStart} a interrogé {sized, select, yes {{n} {population}} other {des {population} (nombre non communiqué)}} {dateSpan, select, day {le {end}} other {{dates}}}${ASKED_EARLIER}`;

/** The last sentence of the short caveat, in French. */
export const FR_CAVEAT_SHORT: LanguagePack['caveatShort'] = {
  margin: `{stated, select, given {${STATES}{sameLevel, select, yes {} other { au niveau de confiance de {statedLevel}}} ; {newsroom} estime} none {{pollsterStart} n’annonce aucune marge ; {newsroom} estime} other {{newsroomStart} estime}} ${QUANTITY} à ${MARGIN_NEAR} (niveau de confiance : {level}), pour la seule erreur d’échantillonnage.`,
  'stated-only': `${STATES} au niveau de confiance de {statedLevel} ; aucune marge n’est donnée ici pour ${QUANTITY}.`,
  none: `Aucune marge n’est donnée ici pour ${QUANTITY}.`,
  'not-random': `${NOT_DRAWN} : aucune marge d’erreur d’échantillonnage ne lui est attribuée.`,
  modelled: `${NOT_DRAWN} ; selon le modèle de l’institut lui-même, {newsroom} estime ${QUANTITY} à ${MARGIN_NEAR} (niveau de confiance : {level}).`,
  comparison: `${NOT_DRAWN} ; calculée comme s’il l’avait été, selon {comparisonRule}, la marge pour ${QUANTITY} est de ${MARGIN} (niveau de confiance : {level}).`,
};

/** One sentence for a caption or an aside, in French. */
export const FR_ONE_BREATH: LanguagePack['oneBreath'] = {
  margin: `${ASKED} ; {newsroom} estime ${SHORT_QUANTITY} à ${MARGIN_NEAR}.`,
  'stated-only': `${ASKED} ; la marge annoncée est de ±${STATED} pour un pourcentage, sans marge pour ${SHORT_QUANTITY}.`,
  none: `${ASKED} ; aucune marge n’est donnée pour ${SHORT_QUANTITY}.`,
  'not-random': `${ASKED} ; ${NOT_DRAWN_ASIDE}, aucune marge n’est donc donnée.`,
  modelled: `${ASKED} ; {newsroom} estime ${SHORT_QUANTITY} à ${MARGIN_NEAR}, selon le modèle de l’institut lui-même.`,
  comparison: `${ASKED} ; pour ${SHORT_QUANTITY}, la marge serait de ${MARGIN} avec un échantillon tiré au sort, selon {comparisonRule}.`,
};

const SPOKEN_NOT_DRAWN =
  '{drawn, select, unknown {Le mode de tirage de l’échantillon n’est pas indiqué} other {L’échantillon n’a pas été tiré au sort}}';

/** Said aloud, in French. */
export const FR_SPOKEN: LanguagePack['spoken'] = {
  fieldwork:
    '{pollsterStart} a interrogé {sized, select, yes {{n} {population}} other {des {population}, sans dire combien,}} {dates}.',
  margin: `{newsroomStart} estime ${SHORT_QUANTITY} à plus ou moins ${points('margin')} près${WIDER_ALOUD}.`,
  'stated-only': `{pollsterStart} annonce plus ou moins ${STATED} pour un pourcentage, et aucune marge n’est donnée ici pour ${SHORT_QUANTITY}.`,
  none: `Aucune marge n’est donnée pour ${SHORT_QUANTITY}.`,
  'not-random': `${SPOKEN_NOT_DRAWN} : aucune marge d’erreur d’échantillonnage ne lui est attribuée.`,
  modelled: `${SPOKEN_NOT_DRAWN} ; selon le modèle de l’institut lui-même, la marge pour ${SHORT_QUANTITY} est de plus ou moins ${points('margin')}${WIDER_ALOUD}.`,
  comparison: `${SPOKEN_NOT_DRAWN} ; calculée comme s’il l’avait été, selon {comparisonRule}, la marge pour ${SHORT_QUANTITY} est de plus ou moins ${points('margin')}${WIDER_ALOUD}.`,
};

/** Short reasons of a fragile finding, in French. */
export const FR_FRAGILE_SHORT: LanguagePack['fragileShort'] = {
  rounding: 'Cela dépend de l’arrondi des chiffres publiés.',
  'design-effect': `Cela dépend de ce que ${WEIGHTING} coûte en précision.`,
  'second-test': 'Un second test reconnu ne le confirme pas.',
  together:
    'Cela dépend à la fois de l’arrondi et {design, select, clustered {du tirage en grappes} other {de la pondération}}.',
  modelled: 'Cela repose sur le modèle par lequel l’institut estime lui-même son erreur.',
  comparison: 'Cela est calculé comme si l’échantillon avait été tiré au sort.',
};

export const FR_NEWSLETTER: LanguagePack['newsletter'] = { line: '{race}. {line}' };

/** Corrections, in French. */
export const FR_CORRECTION: LanguagePack['correction'] = {
  intro:
    'Rectificatif, {on} : {count, plural, =0 {des formulations d’une version antérieure de cet article sur le sondage {pollster} ont été retirées} one {une version antérieure de cet article donnait une indication erronée sur le sondage {pollster}} other {une version antérieure de cet article donnait des indications erronées sur le sondage {pollster}}}.',
  share: 'Elle donnait {option} à {was} ; le chiffre exact est {is}.',
  'earlier-share': 'Elle donnait {option} à {was} dans {prevPoll} ; le chiffre exact est {is}.',
  'group-share': 'Elle donnait {option} à {was} parmi {group} ; le chiffre exact est {is}.',
  'sample-size':
    '{wasSized, select, yes {Elle indiquait {was} personnes interrogées} other {Elle n’indiquait pas le nombre de personnes interrogées}} ; {isSized, select, yes {le nombre exact est {is}} other {le nombre exact n’est pas communiqué}}.',
  dates: 'Elle datait les entretiens {was} ; les dates exactes sont : {is}.',
  now: 'Voici ce que permettent de dire les chiffres{count, plural, =0 {} other { exacts}}. {line}',
  weaker: 'Ils ne permettent pas l’affirmation qui a été faite.',
};
