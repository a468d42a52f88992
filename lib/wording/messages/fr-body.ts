import type { ClaimMessages } from '../language-pack';
import { FR_GAP } from './fr-gap';
import { FR_NET_SCORE, FR_NET_SCORE_CHANGE } from './fr-net-score';
import {
  aboveOrBelow,
  AMONG,
  ASKED,
  chanceAlone,
  higherOrLower,
  IN_EARLIER,
  LARGER,
  LARGER_OF_ONE,
  LARGER_OF_TWO,
  ofPercentagePoints,
  percentagePoints,
  POLL,
  UNSETTLED_BY_TWO,
  upOrDown,
} from './fr-parts';

const GAP = percentagePoints('gap');
const OF_GAP = ofPercentagePoints('gap');
const OF_MOVE = ofPercentagePoints('move');
const NO_FIGURES = `Ce ${POLL} ne communique pas les chiffres nécessaires pour comparer {a} et {b}.`;
const NO_FIGURE = `Ce ${POLL} ne communique pas le chiffre pour {option}.`;
const CREDITS = `Ce ${POLL} donne {a} à {aShare} et {b} à {bShare}`;
const CREDITS_NOW = `Ce ${POLL} donne {a} à {aNow} et {b} à {bNow}`;
const CREDITS_BOTH = `${CREDITS_NOW}, contre {aThen} et {bThen} ${IN_EARLIER}`;
const AT = `Ce ${POLL} donne {option} à {now}`;
const AT_BOTH = `${AT}, contre {then} ${IN_EARLIER}`;
const SHARE = `Ce ${POLL} donne {option} à {share}${ASKED}`;
const STOOD_STILL = 'Des chiffres égaux ne signifient pas que l’opinion n’a pas bougé.';
const ONE_OF_TWO_POLLS =
  'C’est l’une des comparaisons faites entre les deux sondages et, parmi elles, le hasard pourrait à lui seul';

/** First sentences of a body in French. */
export const FR_BODY: ClaimMessages = {
  lead: {
    'holds-twice': `{setting, select, contest {Un ${POLL} suggère une avance ${OF_GAP} pour {a} sur {b} : {aShare} contre {bShare}.} other {La réponse {a} est plus fréquente que la réponse {b}, {aShare} contre {bShare}, suggère un ${POLL}.}} L’écart ${LARGER_OF_ONE}.`,
    holds: `{setting, select, contest {Ce ${POLL} donne {a} devant {b}, avec ${GAP} d’écart : {aShare} contre {bShare}.} other {Dans ce ${POLL}, la réponse {a} est plus fréquente que la réponse {b}, {aShare} contre {bShare}.}} Cet écart ${LARGER}.`,
    fragile: `Ce ${POLL} donne un chiffre plus élevé pour {a} que pour {b}, {aShare} contre {bShare}, mais il ne permet pas de trancher.`,
    level: `Ce ${POLL} donne le même chiffre pour {a} et {b} : {aShare}. Des chiffres égaux ne signifient pas que l’opinion se partage en deux moitiés.`,
    'not-shown': `${CREDITS}, soit un écart ${OF_GAP}. ${chanceAlone('produire un écart de cette taille', 'avec un échantillon aléatoire')}.`,
    family: `${CREDITS}, soit un écart ${OF_GAP}. C’est l’une des comparaisons faites avec le même sondage et, parmi elles, le hasard pourrait à lui seul produire un écart de cette taille.`,
    untested: `{known, select, yes {${CREDITS}.} other {${NO_FIGURES}}}`,
  },
  change: {
    'holds-twice': upOrDown(
      (noun) =>
        `Deux sondages {pollsters}${AMONG} suggèrent une ${noun} pour {option} depuis le sondage {prevDates} : {now} contre {then}. Cette ${noun} ${LARGER_OF_TWO}.`,
    ),
    holds: upOrDown(
      (noun) =>
        `Ce ${POLL} fait état d’une ${noun} pour {option} : {now} contre {then} ${IN_EARLIER}. Cette ${noun} ${LARGER}.`,
    ),
    fragile: higherOrLower(
      (word) =>
        `Ce ${POLL} donne un chiffre plus ${word} pour {option}, {now} contre {then} ${IN_EARLIER}, ${UNSETTLED_BY_TWO}.`,
    ),
    level: `${AT}, le même chiffre que ${IN_EARLIER}. ${STOOD_STILL}`,
    'not-shown': `${AT_BOTH}. ${chanceAlone(`produire une différence ${OF_MOVE} entre deux sondages de ce type`, 'entre deux échantillons aléatoires')}.`,
    family: `${AT_BOTH}. ${ONE_OF_TWO_POLLS} produire une différence ${OF_MOVE}.`,
    'little-changed': `Le chiffre pour {option} change peu : {now} dans ce ${POLL}, contre {then} ${IN_EARLIER}. Même compte tenu de l’erreur d’échantillonnage et de l’arrondi, la différence est inférieure au minimum ${ofPercentagePoints('indifference')} fixé au préalable pour qu’elle compte.`,
    untested: `{known, select, both {${AT_BOTH}.} now {${AT}.} other {${NO_FIGURE}}}`,
  },
  'lead-change': {
    'holds-twice': `L’écart entre {a} et {b} s’est déplacé vers {toward} depuis le sondage {prevDates}, suggèrent deux sondages {pollsters}${AMONG}. Il était de {aThen} contre {bThen} ; il est maintenant de {aNow} contre {bNow}. Ce déplacement ${LARGER_OF_TWO}.`,
    holds: `Dans ce ${POLL}, l’écart entre {a} et {b} s’est déplacé vers {toward} : {aNow} contre {bNow}, après {aThen} contre {bThen} ${IN_EARLIER}. Ce déplacement ${LARGER}.`,
    fragile: `Dans ce ${POLL}, l’écart entre {a} et {b} penche davantage vers {toward}, {aNow} contre {bNow} après {aThen} contre {bThen} ${IN_EARLIER}, ${UNSETTLED_BY_TWO}.`,
    level: `Dans ce ${POLL}, l’écart entre {a} et {b}, {aNow} contre {bNow}, a le même chiffre que ${IN_EARLIER}, {aThen} contre {bThen}. ${STOOD_STILL}`,
    'not-shown': `${CREDITS_BOTH}. ${chanceAlone(`faire varier l’écart ${OF_MOVE} entre deux sondages de ce type`, 'entre deux échantillons aléatoires')}.`,
    family: `${CREDITS_BOTH}. ${ONE_OF_TWO_POLLS} faire varier l’écart ${OF_MOVE}.`,
    untested: `{known, select, both {${CREDITS_BOTH}.} now {${CREDITS_NOW}.} other {${NO_FIGURES}}}`,
  },
  threshold: {
    'holds-twice': aboveOrBelow(
      (place) =>
        `Un ${POLL} suggère un score pour {option} ${place} de la {line} : {share}${ASKED}. La distance à la {line} ${LARGER_OF_ONE}.`,
    ),
    holds: aboveOrBelow(
      (place) =>
        `Ce ${POLL} place {option} ${place} de la {line}, avec {share}${ASKED}. La distance à la {line} ${LARGER}.`,
    ),
    fragile: aboveOrBelow(
      (place) =>
        `Ce ${POLL} place {option} ${place} de la {line}, avec {share}${ASKED}, mais il ne permet pas de trancher.`,
    ),
    level: `Ce ${POLL} place {option} exactement sur la {line}. Le sondage ne permet pas de dire de quel côté se situe l’opinion.`,
    'not-shown': `${SHARE}. ${chanceAlone('expliquer la distance à la {line}', 'avec un échantillon aléatoire')} ; le sondage ne permet donc pas de dire de quel côté se situe l’opinion.`,
    family: `${SHARE}. C’est l’un des chiffres du même sondage comparés à un seuil et, parmi eux, le hasard pourrait à lui seul expliquer la distance à la {line}.`,
    untested: `{known, select, yes {${SHARE}.} other {${NO_FIGURE}}}`,
  },
  'net-score': FR_NET_SCORE.body,
  'net-score-change': FR_NET_SCORE_CHANGE.body,
  gap: FR_GAP.body,
};
