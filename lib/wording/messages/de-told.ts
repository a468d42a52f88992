import type { ClaimMessages } from '../language-pack';
import { DE_GAP } from './de-gap';
import { DE_NET_SCORE, DE_NET_SCORE_CHANGE } from './de-net-score';
import { aboveOrBelow, ASKED, higherOrLower, UNSETTLED_BY_TWO, upOrDown } from './de-parts';

const UNSETTLED = 'doch sie kann das nicht entscheiden';
const CHANCE = 'den auch der Zufall allein erzeugen könnte';
const CHANCE_AMONG = 'den unter mehreren Vergleichen auch der Zufall erzeugen könnte';
const UNUSUAL = 'ein größerer Abstand, als der Zufall üblicherweise erzeugt';
const BOTH = 'Die Umfrage sieht {a} bei {aShare} und {b} bei {bShare}';
const BOTH_NOW = 'Die Umfrage sieht {a} bei {aNow} und {b} bei {bNow}';
const GAP_NOW = `${BOTH_NOW}, nach {aThen} und {bThen} in {prevPoll}`;
const AT = 'Die Umfrage sieht {option} bei {now}';
const AT_BOTH = `${AT}, nach {then} in {prevPoll}`;
const SHARE = `Die Umfrage sieht {option} bei {share}${ASKED}`;
const AHEAD = (poll: string, answer: string) =>
  `{setting, select, contest {${poll} sieht {a} vor {b}, {aShare} zu {bShare}, ${UNUSUAL}.} other {${answer}, {aShare} zu {bShare}, ${UNUSUAL}.}}`;
const MOVED = 'zugunsten von {toward} verschoben: {aNow} zu {bNow}, nach {aThen} zu {bThen}.';
const SHARED =
  'diese Umfrage hat Interviews mit {prevPoll} gemeinsam, deshalb lässt sich die Veränderung nicht prüfen';
const TWICE = 'beide Male wurden dieselben Personen befragt, deshalb lässt sich die Veränderung nicht prüfen';
const NO_MARGIN = 'Eine Umfrage ohne anerkannte Fehlerspanne sieht';
const NO_SIZE = 'Eine Umfrage, die nicht sagt, wie viele befragt wurden, sieht';

/** One sentence per finding that can stand in any line, in German. */
export const DE_TOLD: ClaimMessages = {
  lead: {
    'holds-twice': AHEAD('Die Umfrage', 'Die Antwort {a} ist häufiger als die Antwort {b}'),
    holds: AHEAD('Diese Umfrage', 'In dieser Umfrage ist die Antwort {a} häufiger als die Antwort {b}'),
    fragile: `Diese Umfrage weist für {a} einen höheren Wert aus als für {b}, {aShare} zu {bShare}, ${UNSETTLED}.`,
    level: 'Diese Umfrage weist für {a} und {b} denselben Wert aus: je {aShare}.',
    'not-shown': `${BOTH}, ein Abstand, ${CHANCE}.`,
    family: `${BOTH}, ein Abstand, ${CHANCE_AMONG}.`,
    untested: `{reason, select, notDisclosed {In der Umfrage fehlen Werte für einen Vergleich von {a} und {b}.} noSamplingBasis {${NO_MARGIN} {a} bei {aShare} und {b} bei {bShare}.} noSampleSize {${NO_SIZE} {a} bei {aShare} und {b} bei {bShare}.} tooSmall {Eine Umfrage mit zu wenigen Interviews für einen Vergleich sieht {a} bei {aShare} und {b} bei {bShare}.} other {${BOTH}, ein Abstand, der sich mit dieser Umfrage nicht prüfen lässt.}}`,
  },
  change: {
    'holds-twice': upOrDown(
      (noun) => `Seit {prevPoll} gibt es einen ${noun} für {option}, von {then} auf {now}.`,
    ),
    holds: upOrDown(
      (noun) => `In dieser Umfrage gibt es seit {prevPoll} einen ${noun} für {option}, von {then} auf {now}.`,
    ),
    fragile: higherOrLower(
      (stem) =>
        `Der Wert für {option} ist ${stem} als in {prevPoll}, {now} nach {then}, ${UNSETTLED_BY_TWO}.`,
    ),
    level: `${AT}, demselben Wert wie in {prevPoll}.`,
    'not-shown': `${AT_BOTH}, ein Unterschied, ${CHANCE}.`,
    family: `${AT_BOTH}, ein Unterschied, ${CHANCE_AMONG}.`,
    'little-changed': 'Der Wert für {option} verändert sich seit {prevPoll} wenig: {now} nach {then}.',
    untested: `{reason, select, notDisclosed {Für einen Vergleich von {option} mit {prevPoll} fehlen Werte.} notComparable {${AT}, ohne Vergleich mit {prevPoll}.} sharedWaves {${AT}; ${SHARED}.} samePeople {${AT_BOTH}; ${TWICE}.} noSamplingBasis {${AT_BOTH}, ohne anerkannte Fehlerspanne.} other {${AT}; die Veränderung seit {prevPoll} lässt sich nicht prüfen.}}`,
  },
  'lead-change': {
    'holds-twice': `Der Abstand zwischen {a} und {b} hat sich seit {prevPoll} ${MOVED}`,
    holds: `In dieser Umfrage hat sich der Abstand zwischen {a} und {b} seit {prevPoll} ${MOVED}`,
    fragile: `Der Abstand zwischen {a} und {b} ist günstiger für {toward} als in {prevPoll}, {aNow} zu {bNow} nach {aThen} zu {bThen}, ${UNSETTLED_BY_TWO}.`,
    level:
      'Der Abstand zwischen {a} und {b}, {aNow} zu {bNow}, hat denselben Wert wie in {prevPoll}, {aThen} zu {bThen}.',
    'not-shown': `${GAP_NOW}; den Unterschied im Abstand könnte auch der Zufall allein erklären.`,
    family: `${GAP_NOW}; den Unterschied im Abstand könnte unter mehreren Vergleichen auch der Zufall erklären.`,
    untested: `{reason, select, notDisclosed {Für einen Vergleich des Abstands zwischen {a} und {b} mit {prevPoll} fehlen Werte.} notComparable {${BOTH_NOW}, ein Abstand ohne Vergleich mit {prevPoll}.} sharedWaves {${BOTH_NOW}; ${SHARED}.} samePeople {${GAP_NOW}; ${TWICE}.} noSamplingBasis {${GAP_NOW}, ohne anerkannte Fehlerspanne.} other {${BOTH_NOW}; die Veränderung des Abstands seit {prevPoll} lässt sich nicht prüfen.}}`,
  },
  threshold: {
    'holds-twice': aboveOrBelow(
      (place) => `Die Umfrage sieht {option} ${place} der {line}, bei {share}${ASKED}, ${UNUSUAL}.`,
    ),
    holds: aboveOrBelow(
      (place) => `Diese Umfrage sieht {option} ${place} der {line}, bei {share}${ASKED}, ${UNUSUAL}.`,
    ),
    fragile: aboveOrBelow(
      (place) => `Diese Umfrage sieht {option} ${place} der {line}, bei {share}${ASKED}, ${UNSETTLED}.`,
    ),
    level: 'Diese Umfrage sieht {option} genau an der {line}.',
    'not-shown': `${SHARE}, zu nah an der {line}, um die Seite zu bestimmen.`,
    family: `${SHARE}; unter mehreren Tests ist das zu nah an der {line}, um die Seite zu bestimmen.`,
    untested: `{reason, select, notDisclosed {Die Umfrage veröffentlicht keinen Wert für {option}.} noSamplingBasis {${NO_MARGIN} {option} bei {share}${ASKED}.} noSampleSize {${NO_SIZE} {option} bei {share}${ASKED}.} other {${SHARE}; an der {line} lässt sich das mit dieser Umfrage nicht prüfen.}}`,
  },
  'net-score': DE_NET_SCORE.told,
  'net-score-change': DE_NET_SCORE_CHANGE.told,
  gap: DE_GAP.told,
};
