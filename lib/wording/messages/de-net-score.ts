import type { ClaimMessages } from '../language-pack';
import {
  AMONG,
  chanceAlone,
  higherOrLower,
  IN_EARLIER,
  LARGER,
  LARGER_OF_ONE,
  LARGER_OF_TWO,
  ofPoints,
  POLL,
  UNSETTLED_BY_TWO,
  UNSETTLED_POLLS,
  upOrDown,
} from './de-parts';

type Messages<K extends keyof ClaimMessages> = Record<
  'headline' | 'body' | 'chartTitle' | 'told',
  ClaimMessages[K]
>;

const BOTH = '{a} {aShare}, {b} {bShare}';
const MORE = 'Antwort {a} häufiger als Antwort {b}, {aShare} zu {bShare}, Saldo {net}';
const UNSETTLED = 'doch sie kann das nicht entscheiden';
const CHANCE = 'den auch der Zufall allein erzeugen könnte';
const CHANCE_AMONG = 'den unter mehreren Vergleichen auch der Zufall erzeugen könnte';
const PUTS = `Diese ${POLL} sieht {a} bei {aShare} und {b} bei {bShare}, ein Saldo von {net}`;
const TOLD_PUTS = 'Die Umfrage sieht {a} bei {aShare} und {b} bei {bShare}';
const NO_FIGURES = 'fehlen Werte für den Saldo';

/** A net score in German: which of the two answers is given more often, with the balance beside it. */
export const DE_NET_SCORE: Messages<'net-score'> = {
  headline: {
    'holds-twice': `${MORE}: Darauf deutet eine Umfrage von {pollster}`,
    holds:
      'Antwort {a} in Umfrage von {pollster} häufiger als Antwort {b}: {aShare} zu {bShare}, Saldo {net}',
    fragile: `Umfrage von {pollster} mit höherem Wert für {a} als für {b}, {aShare} zu {bShare}, ${UNSETTLED}`,
    level: 'Gleicher Wert für {a} und {b} in Umfrage von {pollster}: je {aShare}',
    'not-shown': `${BOTH} in Umfrage von {pollster}: ein Saldo, ${CHANCE}`,
    family: `${BOTH} in Umfrage von {pollster}: ein Saldo, ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {In Umfrage von {pollster} ${NO_FIGURES}} noSamplingBasis {${BOTH} in einer Umfrage von {pollster} ohne anerkannte Fehlerspanne} noSampleSize {${BOTH} in einer Umfrage von {pollster}, die nicht sagt, wie viele befragt wurden} tooSmall {${BOTH} in Umfrage von {pollster} mit zu wenigen Interviews für einen Vergleich} other {${BOTH} in Umfrage von {pollster}: Der Saldo lässt sich nicht prüfen}}`,
  },
  body: {
    'holds-twice': `Eine ${POLL} deutet darauf hin, dass die Antwort {a} häufiger ist als die Antwort {b}: {aShare} zu {bShare}, ein Saldo von {net}. Der Abstand ${LARGER_OF_ONE}.`,
    holds: `In dieser ${POLL} ist die Antwort {a} häufiger als die Antwort {b}: {aShare} zu {bShare}, ein Saldo von {net}. Der Abstand ${LARGER}.`,
    fragile: `Diese ${POLL} weist für {a} einen höheren Wert aus als für {b}, {aShare} zu {bShare}, ein Saldo von {net}, ${UNSETTLED}.`,
    level: `Diese ${POLL} weist für {a} und {b} denselben Wert aus, je {aShare}: Der Saldo ist null. Gleiche Werte bedeuten nicht, dass die Meinung gleich geteilt ist.`,
    'not-shown': `${PUTS}. ${chanceAlone('einen Abstand dieser Größe erzeugen', 'selbst in einer Zufallsstichprobe')}.`,
    family: `${PUTS}. Es ist einer von mehreren Vergleichen mit derselben Umfrage, und unter so vielen könnte der Zufall allein einen Abstand dieser Größe erzeugen.`,
    untested: `{known, select, yes {${PUTS}.} other {In dieser ${POLL} ${NO_FIGURES}.}}`,
  },
  chartTitle: {
    'holds-twice': MORE,
    holds: 'Antwort {a} in dieser Umfrage häufiger als Antwort {b}, {aShare} zu {bShare}, Saldo {net}',
    fragile: `Höherer Wert für {a} als für {b} in dieser Umfrage, {aShare} zu {bShare}, ${UNSETTLED}`,
    level: 'Gleicher Wert für {a} und {b} in dieser Umfrage: je {aShare}',
    'not-shown': `${BOTH}: ein Saldo, ${CHANCE}`,
    family: `${BOTH}: ein Saldo, ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {Saldo: Werte nicht veröffentlicht} noSamplingBasis {${BOTH}, ohne anerkannte Fehlerspanne} other {${BOTH}: Der Saldo lässt sich nicht prüfen}}`,
  },
  told: {
    'holds-twice':
      'Die Antwort {a} ist häufiger als die Antwort {b}, {aShare} zu {bShare}, ein Saldo von {net} und mehr, als der Zufall üblicherweise erzeugt.',
    holds:
      'In dieser Umfrage ist die Antwort {a} häufiger als die Antwort {b}, {aShare} zu {bShare}, ein Saldo von {net} und mehr, als der Zufall üblicherweise erzeugt.',
    fragile: `Diese Umfrage weist für {a} einen höheren Wert aus als für {b}, {aShare} zu {bShare}, ${UNSETTLED}.`,
    level: 'Diese Umfrage weist für {a} und {b} denselben Wert aus: je {aShare}.',
    'not-shown': `${TOLD_PUTS}, ein Saldo von {net}, ${CHANCE}.`,
    family: `${TOLD_PUTS}, ein Saldo von {net}, ${CHANCE_AMONG}.`,
    untested: `{reason, select, notDisclosed {In der Umfrage ${NO_FIGURES}.} noSamplingBasis {Eine Umfrage ohne anerkannte Fehlerspanne sieht {a} bei {aShare} und {b} bei {bShare}.} noSampleSize {Eine Umfrage, die nicht sagt, wie viele befragt wurden, sieht {a} bei {aShare} und {b} bei {bShare}.} other {${TOLD_PUTS}, ein Saldo, der sich mit dieser Umfrage nicht prüfen lässt.}}`,
  },
};

const NET = 'Saldo für die Antwort {name}';
const NET_NOW = `In dieser ${POLL} liegt der ${NET} bei {netNow}`;
const TOLD_NOW = `Der ${NET} liegt bei {netNow}`;
const MOVE = ofPoints('move');
const SHARED =
  'diese Umfrage hat Interviews mit {prevPoll} gemeinsam, deshalb lässt sich die Veränderung nicht prüfen';
const TWICE = 'beide Male wurden dieselben Personen befragt, deshalb lässt sich die Veränderung nicht prüfen';

/** The change of a net score in German. */
export const DE_NET_SCORE_CHANGE: Messages<'net-score-change'> = {
  headline: {
    'holds-twice': upOrDown(
      (noun) => `Umfragen von {pollsters} deuten auf ${noun} beim ${NET} seit der Umfrage {prevDates}`,
    ),
    holds: upOrDown((noun) => `${noun} beim ${NET} in Umfragen von {pollsters} seit jener {prevDates}`),
    fragile: higherOrLower(
      (stem) => `${NET} ${stem} als in der Umfrage {prevDates}, {netNow} nach {netThen}, ${UNSETTLED_POLLS}`,
    ),
    level: `${NET} bei {netNow} in Umfrage von {pollster}, derselbe Wert wie in der Umfrage {prevDates}`,
    'not-shown': `${NET} bei {netNow} in Umfrage von {pollster}, nach {netThen} in der Umfrage {prevDates}: Das könnte auch der Zufall allein erklären`,
    family: `${NET} bei {netNow} in Umfrage von {pollster}, nach {netThen} in der Umfrage {prevDates}: Das könnte unter mehreren Vergleichen auch der Zufall erklären`,
    untested: `{reason, select, notDisclosed {In Umfragen von {pollsters} fehlen Werte für einen Vergleich beim ${NET}} notComparable {${NET} bei {netNow} in Umfrage von {pollster}; mit der Umfrage {prevDates} ist das nicht vergleichbar} noSamplingBasis {${NET} bei {netNow} in einer Umfrage von {pollster} ohne anerkannte Fehlerspanne} other {${NET} bei {netNow} in Umfrage von {pollster}; die Veränderung seit der Umfrage {prevDates} lässt sich nicht prüfen}}`,
  },
  body: {
    'holds-twice': upOrDown(
      (noun) =>
        `Zwei Umfragen von {pollsters}${AMONG} deuten auf einen ${noun} beim ${NET} seit der Umfrage {prevDates} hin, von {netThen} auf {netNow}. Der ${noun} ${LARGER_OF_TWO}.`,
    ),
    holds: upOrDown(
      (noun) =>
        `Diese ${POLL} verzeichnet einen ${noun} beim ${NET}, von {netThen} ${IN_EARLIER} auf {netNow}. Der ${noun} ${LARGER}.`,
    ),
    fragile: higherOrLower(
      (stem) =>
        `Der ${NET} ist in dieser ${POLL} ${stem}, {netNow} nach {netThen} ${IN_EARLIER}, ${UNSETTLED_BY_TWO}.`,
    ),
    level: `${NET_NOW}, demselben Wert wie ${IN_EARLIER}. Gleiche Werte bedeuten nicht, dass die Meinung sich nicht bewegt hat.`,
    'not-shown': `${NET_NOW}, nach {netThen} ${IN_EARLIER}. ${chanceAlone(`einen Unterschied von ${MOVE} erzeugen`, 'selbst bei Zufallsstichproben')}.`,
    family: `${NET_NOW}, nach {netThen} ${IN_EARLIER}. Es ist einer von mehreren Vergleichen zwischen den beiden Umfragen, und unter so vielen könnte der Zufall allein einen Unterschied von ${MOVE} erzeugen.`,
    untested: `{known, select, both {${NET_NOW}, nach {netThen} ${IN_EARLIER}.} now {${NET_NOW}.} other {In dieser ${POLL} ${NO_FIGURES}.}}`,
  },
  chartTitle: {
    'holds-twice': upOrDown((noun) => `${noun} beim ${NET} seit der Umfrage {prevDates}`),
    holds: upOrDown((noun) => `${noun} beim ${NET} in dieser Umfrage seit jener {prevDates}`),
    fragile: higherOrLower(
      (stem) =>
        `${NET} ${stem} als in der Umfrage {prevDates}, doch die Umfragen können das nicht entscheiden`,
    ),
    level: `${NET} mit demselben Wert wie in der Umfrage {prevDates}`,
    'not-shown': `${NET} bei {netNow}, nach {netThen} in der Umfrage {prevDates}: ein Unterschied, ${CHANCE}`,
    family: `${NET} bei {netNow}, nach {netThen} in der Umfrage {prevDates}: ein Unterschied, ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {${NET}: Werte nicht veröffentlicht} notComparable {${NET} bei {netNow}; mit der Umfrage {prevDates} nicht vergleichbar} noSamplingBasis {${NET} bei {netNow}, ohne anerkannte Fehlerspanne} other {${NET} bei {netNow}: Die Veränderung seit der Umfrage {prevDates} lässt sich nicht prüfen}}`,
  },
  told: {
    'holds-twice': upOrDown(
      (noun) => `Seit {prevPoll} gibt es einen ${noun} beim ${NET}, von {netThen} auf {netNow}.`,
    ),
    holds: upOrDown(
      (noun) =>
        `In dieser Umfrage gibt es seit {prevPoll} einen ${noun} beim ${NET}, von {netThen} auf {netNow}.`,
    ),
    fragile: higherOrLower(
      (stem) => `Der ${NET} ist ${stem} als in {prevPoll}, {netNow} nach {netThen}, ${UNSETTLED_BY_TWO}.`,
    ),
    level: `${TOLD_NOW}, demselben Wert wie in {prevPoll}.`,
    'not-shown': `${TOLD_NOW}, nach {netThen} in {prevPoll}, ein Unterschied, ${CHANCE}.`,
    family: `${TOLD_NOW}, nach {netThen} in {prevPoll}, ein Unterschied, ${CHANCE_AMONG}.`,
    untested: `{reason, select, notDisclosed {Für einen Vergleich beim ${NET} mit {prevPoll} fehlen Werte.} notComparable {${TOLD_NOW}, ohne Vergleich mit {prevPoll}.} sharedWaves {${TOLD_NOW}; ${SHARED}.} samePeople {${TOLD_NOW}, nach {netThen} in {prevPoll}; ${TWICE}.} noSamplingBasis {${TOLD_NOW}, nach {netThen} in {prevPoll}, ohne anerkannte Fehlerspanne.} other {${TOLD_NOW}; die Veränderung seit {prevPoll} lässt sich nicht prüfen.}}`,
  },
};
