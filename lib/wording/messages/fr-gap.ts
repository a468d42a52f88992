import type { ClaimMessages } from '../language-pack';
import { chanceAlone, LARGER, LARGER_OF_ONE, ofPercentagePoints, POLL } from './fr-parts';

const BOTH = '{option} : {gShare} parmi {g} et {hShare} parmi {h}';
const MORE =
  '{setting, select, contest {davantage de soutien pour {option} parmi {g} que parmi {h}} other {davantage de réponses {option} parmi {g} que parmi {h}}}';
const CAPITAL_MORE =
  '{setting, select, contest {Davantage de soutien pour {option} parmi {g} que parmi {h}} other {Davantage de réponses {option} parmi {g} que parmi {h}}}';
const HIGHER = 'hiffre plus élevé pour {option} parmi {g} que parmi {h}';
const SUPPRESSED = 'belowPresentationStandard';
const TOO_FEW = 'compte trop peu d’entretiens pour comparer {g} et {h}';
const LEFT_OUT = 'omet des chiffres nécessaires pour comparer {g} et {h}';
const CHANCE = 'un écart que le hasard seul pourrait produire';
const CHANCE_AMONG = 'un écart que le hasard pourrait produire parmi plusieurs comparaisons';
const UNUSUAL = 'un écart qui dépasse ce que le hasard produit d’ordinaire';
const CREDITS = `Ce ${POLL} donne {option} à {gShare} parmi {g} et à {hShare} parmi {h}`;

/** A gap between two groups of one sample, in French. */
export const FR_GAP: Record<'headline' | 'body' | 'chartTitle' | 'told', ClaimMessages['gap']> = {
  headline: {
    'holds-twice': `${CAPITAL_MORE}, {gShare} contre {hShare}, suggère un sondage {pollster}`,
    holds: `${CAPITAL_MORE} dans le sondage {pollster}, {gShare} contre {hShare}`,
    fragile: `C${HIGHER}, {gShare} contre {hShare}, mais le sondage {pollster} ne permet pas de trancher`,
    level: 'Même chiffre pour {option} parmi {g} et parmi {h} dans le sondage {pollster} : {gShare}',
    'not-shown': `${BOTH} dans le sondage {pollster}, ${CHANCE}`,
    family: `${BOTH} dans le sondage {pollster}, ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {Le sondage {pollster} ${LEFT_OUT}} ${SUPPRESSED} {Le sondage {pollster} ${TOO_FEW}} noSamplingBasis {${BOTH} dans un sondage {pollster} sans marge d’erreur reconnue} noSampleSize {${BOTH} dans un sondage {pollster} qui ne dit pas combien de personnes ont répondu} tooSmall {Le sondage {pollster} ${TOO_FEW}} other {${BOTH} dans le sondage {pollster} : l’écart ne peut pas être testé}}`,
  },
  body: {
    'holds-twice': `Un ${POLL} suggère ${MORE} : {gShare} contre {hShare}. Cet écart ${LARGER_OF_ONE}.`,
    holds: `Ce ${POLL} relève ${MORE} : {gShare} contre {hShare}. Cet écart ${LARGER}.`,
    fragile: `Ce ${POLL} donne un c${HIGHER}, {gShare} contre {hShare}, mais il ne permet pas de trancher.`,
    level: `Ce ${POLL} donne le même chiffre pour {option} parmi {g} et parmi {h} : {gShare}. Des chiffres égaux ne signifient pas que les groupes pensent la même chose.`,
    'not-shown': `${CREDITS}, soit un écart ${ofPercentagePoints('gap')}. ${chanceAlone('produire un écart de cette taille', 'avec des échantillons aléatoires')}.`,
    family: `${CREDITS}, soit un écart ${ofPercentagePoints('gap')}. C’est l’une des comparaisons faites entre groupes du même sondage et, parmi elles, le hasard pourrait à lui seul produire un écart de cette taille.`,
    untested: `{known, select, yes {${CREDITS}.} hidden {Ce ${POLL} ${TOO_FEW}.} other {Ce ${POLL} ne communique pas les chiffres nécessaires pour comparer {g} et {h}.}}`,
  },
  chartTitle: {
    'holds-twice': `${CAPITAL_MORE}, {gShare} contre {hShare}`,
    holds: `${CAPITAL_MORE} dans ce sondage, {gShare} contre {hShare}`,
    fragile: `C${HIGHER} dans ce sondage, {gShare} contre {hShare}, mais il ne permet pas de trancher`,
    level: 'Même chiffre pour {option} parmi {g} et parmi {h} dans ce sondage : {gShare}',
    'not-shown': `${BOTH}, ${CHANCE}`,
    family: `${BOTH}, ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {{g} et {h} : chiffres non communiqués} ${SUPPRESSED} {{option} parmi {g} et parmi {h} : trop peu d’entretiens pour montrer un chiffre} tooSmall {{option} parmi {g} et parmi {h} : trop peu d’entretiens pour comparer} noSamplingBasis {${BOTH}, sans marge d’erreur reconnue} other {${BOTH} : l’écart ne peut pas être testé}}`,
  },
  told: {
    'holds-twice': `Il y a ${MORE}, {gShare} contre {hShare}, ${UNUSUAL}.`,
    holds: `Dans ce sondage, il y a ${MORE}, {gShare} contre {hShare}, ${UNUSUAL}.`,
    fragile: `Ce sondage donne un c${HIGHER}, {gShare} contre {hShare}, mais il ne permet pas de trancher.`,
    level: 'Ce sondage donne le même chiffre pour {option} parmi {g} et parmi {h} : {gShare}.',
    'not-shown': `${BOTH}, ${CHANCE}.`,
    family: `${BOTH}, ${CHANCE_AMONG}.`,
    untested: `{reason, select, notDisclosed {Le sondage ne communique pas les chiffres nécessaires pour comparer {g} et {h}.} ${SUPPRESSED} {Le sondage ${TOO_FEW}.} noSamplingBasis {${BOTH} dans un sondage sans marge d’erreur reconnue.} noSampleSize {${BOTH} dans un sondage qui ne dit pas combien de personnes ont répondu.} tooSmall {Le sondage ${TOO_FEW}.} other {${BOTH}, un écart que ce sondage ne permet pas de tester.}}`,
  },
};
