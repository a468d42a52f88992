import type { ClaimMessages } from '../language-pack';
import {
  AMONG,
  chanceAlone,
  higherOrLower,
  IN_EARLIER,
  LARGER,
  LARGER_OF_ONE,
  LARGER_OF_TWO,
  ofPercentagePoints,
  POLL,
  UNSETTLED_BY_TWO,
  UNSETTLED_POLLS,
  upOrDown,
} from './fr-parts';

type Messages<K extends keyof ClaimMessages> = Record<
  'headline' | 'body' | 'chartTitle' | 'told',
  ClaimMessages[K]
>;

const BOTH = '{a} {aShare}, {b} {bShare}';
const MORE = 'a réponse {a} est plus fréquente que la réponse {b}, {aShare} contre {bShare}';
const MORE_BRIEF = 'La réponse {a} plus fréquente que la réponse {b}, {aShare} contre {bShare}';
const HIGHER = 'hiffre plus élevé pour {a} que pour {b}, {aShare} contre {bShare}';
const UNSETTLED = 'mais il ne permet pas de trancher';
const CHANCE = 'que le hasard seul pourrait produire';
const CHANCE_AMONG = 'que le hasard pourrait produire parmi plusieurs comparaisons';
const CREDITS = `Ce ${POLL} donne {a} à {aShare} et {b} à {bShare}`;
const PUTS = 'Le sondage donne {a} à {aShare} et {b} à {bShare}';
const NO_FIGURES = 'les chiffres nécessaires au calcul du solde net';

/** A net score in French: which of the two answers is given more often, with the balance beside it. */
export const FR_NET_SCORE: Messages<'net-score'> = {
  headline: {
    'holds-twice': `${MORE_BRIEF}, soit un solde net de {net}, suggère un sondage {pollster}`,
    holds: `${MORE_BRIEF} dans le sondage {pollster}, soit un solde net de {net}`,
    fragile: `Le sondage {pollster} donne un c${HIGHER}, ${UNSETTLED}`,
    level: 'Même chiffre pour {a} et {b} dans le sondage {pollster} : {aShare}',
    'not-shown': `${BOTH} dans le sondage {pollster} : un solde net ${CHANCE}`,
    family: `${BOTH} dans le sondage {pollster} : un solde net ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {Le sondage {pollster} omet des chiffres nécessaires au calcul du solde net} noSamplingBasis {${BOTH} dans un sondage {pollster} sans marge d’erreur reconnue} noSampleSize {${BOTH} dans un sondage {pollster} qui ne dit pas combien de personnes ont répondu} tooSmall {${BOTH} dans un sondage {pollster} aux entretiens trop peu nombreux pour comparer} other {${BOTH} dans le sondage {pollster} : le solde net ne peut pas être testé}}`,
  },
  body: {
    'holds-twice': `L${MORE}, soit un solde net de {net}, suggère un ${POLL}. L’écart ${LARGER_OF_ONE}.`,
    holds: `Dans ce ${POLL}, l${MORE}, soit un solde net de {net}. L’écart ${LARGER}.`,
    fragile: `Ce ${POLL} donne un c${HIGHER}, soit un solde net de {net}, ${UNSETTLED}.`,
    level: `Ce ${POLL} donne le même chiffre pour {a} et {b}, {aShare} : le solde net est nul. Des chiffres égaux ne signifient pas que l’opinion se partage en deux moitiés.`,
    'not-shown': `${CREDITS}, soit un solde net de {net}. ${chanceAlone('produire un écart de cette taille', 'avec un échantillon aléatoire')}.`,
    family: `${CREDITS}, soit un solde net de {net}. C’est l’une des comparaisons faites avec le même sondage et, parmi elles, le hasard pourrait à lui seul produire un écart de cette taille.`,
    untested: `{known, select, yes {${CREDITS}, soit un solde net de {net}.} other {Ce ${POLL} ne communique pas ${NO_FIGURES}.}}`,
  },
  chartTitle: {
    'holds-twice': `${MORE_BRIEF}, soit un solde net de {net}`,
    holds: `${MORE_BRIEF} dans ce sondage, soit un solde net de {net}`,
    fragile: `C${HIGHER} dans ce sondage, ${UNSETTLED}`,
    level: 'Même chiffre pour {a} et {b} dans ce sondage : {aShare}',
    'not-shown': `${BOTH} : un solde net ${CHANCE}`,
    family: `${BOTH} : un solde net ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {Solde net : chiffres non communiqués} noSamplingBasis {${BOTH}, sans marge d’erreur reconnue} other {${BOTH} : le solde net ne peut pas être testé}}`,
  },
  told: {
    'holds-twice': `L${MORE}, soit un solde net de {net}, plus que ce que le hasard produit d’ordinaire.`,
    holds: `Dans ce sondage, l${MORE}, soit un solde net de {net}, plus que ce que le hasard produit d’ordinaire.`,
    fragile: `Ce sondage donne un c${HIGHER}, ${UNSETTLED}.`,
    level: 'Ce sondage donne le même chiffre pour {a} et {b} : {aShare}.',
    'not-shown': `${PUTS}, soit un solde net de {net} ${CHANCE}.`,
    family: `${PUTS}, soit un solde net de {net} ${CHANCE_AMONG}.`,
    untested: `{reason, select, notDisclosed {Le sondage ne communique pas ${NO_FIGURES}.} noSamplingBasis {Un sondage sans marge d’erreur reconnue donne {a} à {aShare} et {b} à {bShare}.} noSampleSize {Un sondage qui ne dit pas combien de personnes ont répondu donne {a} à {aShare} et {b} à {bShare}.} other {${PUTS}, soit un solde net que ce sondage ne permet pas de tester.}}`,
  },
};

const NET = 'solde net pour la réponse {name}';
const NET_NOW = `Dans ce ${POLL}, le ${NET} est de {netNow}`;
const TOLD_NOW = `Le ${NET} est de {netNow}`;
const OF_MOVE = ofPercentagePoints('move');
const capital = (noun: string) => noun.charAt(0).toUpperCase() + noun.slice(1);
const SHARED =
  'ce sondage partage des entretiens avec {prevPoll}, si bien que l’évolution ne peut pas être testée';
const TWICE =
  'les mêmes personnes ont été interrogées les deux fois, si bien que l’évolution ne peut pas être testée';

/** The change of a net score in French. */
export const FR_NET_SCORE_CHANGE: Messages<'net-score-change'> = {
  headline: {
    'holds-twice': upOrDown(
      (noun) =>
        `${capital(noun)} du ${NET} depuis le sondage {prevDates}, suggèrent les sondages {pollsters}`,
    ),
    holds: upOrDown(
      (noun) => `${capital(noun)} du ${NET} dans les sondages {pollsters} depuis celui {prevDates}`,
    ),
    fragile: higherOrLower(
      (word) =>
        `S${NET.slice(1)} plus ${word} que dans le sondage {prevDates}, {netNow} contre {netThen}, ${UNSETTLED_POLLS}`,
    ),
    level: `S${NET.slice(1)} : {netNow} dans le sondage {pollster}, le même chiffre que dans celui {prevDates}`,
    'not-shown': `S${NET.slice(1)} : {netNow} dans le sondage {pollster}, {netThen} dans celui {prevDates} ; le hasard seul pourrait l’expliquer`,
    family: `S${NET.slice(1)} : {netNow} dans le sondage {pollster}, {netThen} dans celui {prevDates} ; parmi plusieurs comparaisons, le hasard pourrait l’expliquer`,
    untested: `{reason, select, notDisclosed {Les sondages {pollsters} omettent des chiffres nécessaires pour comparer le ${NET}} notComparable {S${NET.slice(1)} : {netNow} dans le sondage {pollster}, qui ne peut pas être comparé à celui {prevDates}} noSamplingBasis {S${NET.slice(1)} : {netNow} dans un sondage {pollster} sans marge d’erreur reconnue} other {S${NET.slice(1)} : {netNow} dans le sondage {pollster} ; l’évolution depuis celui {prevDates} ne peut pas être testée}}`,
  },
  body: {
    'holds-twice': upOrDown(
      (noun) =>
        `Deux sondages {pollsters}${AMONG} suggèrent une ${noun} du ${NET} depuis le sondage {prevDates}, de {netThen} à {netNow}. Cette ${noun} ${LARGER_OF_TWO}.`,
    ),
    holds: upOrDown(
      (noun) =>
        `Ce ${POLL} fait état d’une ${noun} du ${NET}, de {netThen} ${IN_EARLIER} à {netNow}. Cette ${noun} ${LARGER}.`,
    ),
    fragile: higherOrLower(
      (word) =>
        `Dans ce ${POLL}, le ${NET} est plus ${word}, {netNow} contre {netThen} ${IN_EARLIER}, ${UNSETTLED_BY_TWO}.`,
    ),
    level: `${NET_NOW}, le même chiffre que ${IN_EARLIER}. Des chiffres égaux ne signifient pas que l’opinion n’a pas bougé.`,
    'not-shown': `${NET_NOW}, contre {netThen} ${IN_EARLIER}. ${chanceAlone(`produire une différence ${OF_MOVE}`, 'entre deux échantillons aléatoires')}.`,
    family: `${NET_NOW}, contre {netThen} ${IN_EARLIER}. C’est l’une des comparaisons faites entre les deux sondages et, parmi elles, le hasard pourrait à lui seul produire une différence ${OF_MOVE}.`,
    untested: `{known, select, both {${NET_NOW}, contre {netThen} ${IN_EARLIER}.} now {${NET_NOW}.} other {Ce ${POLL} ne communique pas ${NO_FIGURES}.}}`,
  },
  chartTitle: {
    'holds-twice': upOrDown((noun) => `${capital(noun)} du ${NET} depuis le sondage {prevDates}`),
    holds: upOrDown((noun) => `${capital(noun)} du ${NET} dans ce sondage depuis celui {prevDates}`),
    fragile: higherOrLower(
      (word) =>
        `S${NET.slice(1)} plus ${word} que dans le sondage {prevDates}, mais les sondages ne permettent pas de trancher`,
    ),
    level: `S${NET.slice(1)} : le même chiffre que dans le sondage {prevDates}`,
    'not-shown': `S${NET.slice(1)} : {netNow}, contre {netThen} dans le sondage {prevDates}, une différence ${CHANCE}`,
    family: `S${NET.slice(1)} : {netNow}, contre {netThen} dans le sondage {prevDates}, une différence ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {S${NET.slice(1)} : chiffres non communiqués} notComparable {S${NET.slice(1)} : {netNow} ; non comparable au sondage {prevDates}} noSamplingBasis {S${NET.slice(1)} : {netNow}, sans marge d’erreur reconnue} other {S${NET.slice(1)} : {netNow} ; l’évolution depuis le sondage {prevDates} ne peut pas être testée}}`,
  },
  told: {
    'holds-twice': upOrDown((noun) => `Le ${NET} est en ${noun} depuis {prevPoll}, de {netThen} à {netNow}.`),
    holds: upOrDown(
      (noun) => `Dans ce sondage, le ${NET} est en ${noun} depuis {prevPoll}, de {netThen} à {netNow}.`,
    ),
    fragile: higherOrLower(
      (word) =>
        `Le ${NET} est plus ${word} que dans {prevPoll}, {netNow} contre {netThen}, ${UNSETTLED_BY_TWO}.`,
    ),
    level: `${TOLD_NOW}, le même chiffre que dans {prevPoll}.`,
    'not-shown': `${TOLD_NOW}, contre {netThen} dans {prevPoll}, une différence ${CHANCE}.`,
    family: `${TOLD_NOW}, contre {netThen} dans {prevPoll}, une différence ${CHANCE_AMONG}.`,
    untested: `{reason, select, notDisclosed {Les chiffres nécessaires pour comparer le ${NET} avec {prevPoll} ne sont pas communiqués.} notComparable {${TOLD_NOW}, sans comparaison possible avec {prevPoll}.} sharedWaves {${TOLD_NOW} ; ${SHARED}.} samePeople {${TOLD_NOW}, contre {netThen} dans {prevPoll} ; ${TWICE}.} noSamplingBasis {${TOLD_NOW}, contre {netThen} dans {prevPoll}, sans marge d’erreur reconnue.} other {${TOLD_NOW} ; l’évolution depuis {prevPoll} ne peut pas être testée.}}`,
  },
};
