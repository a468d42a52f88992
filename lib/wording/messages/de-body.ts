import type { ClaimMessages } from '../language-pack';
import { DE_GAP } from './de-gap';
import { DE_NET_SCORE, DE_NET_SCORE_CHANGE } from './de-net-score';
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
  ofPoints,
  POLL,
  UNSETTLED_BY_TWO,
  upOrDown,
} from './de-parts';

const GAP = ofPoints('gap');
const MOVE = ofPoints('move');
const UNSETTLED = 'doch sie kann das nicht entscheiden';
const NO_FIGURES = `Diese ${POLL} veröffentlicht nicht alle Werte für einen Vergleich von {a} und {b}.`;
const NO_FIGURE = `Diese ${POLL} veröffentlicht keinen Wert für {option}.`;
const PUTS = `Diese ${POLL} sieht {a} bei {aShare} und {b} bei {bShare}`;
const PUTS_NOW = `Diese ${POLL} sieht {a} bei {aNow} und {b} bei {bNow}`;
const PUTS_BOTH = `${PUTS_NOW}, nach {aThen} und {bThen} ${IN_EARLIER}`;
const AT = `Diese ${POLL} sieht {option} bei {now}`;
const AT_BOTH = `${AT}, nach {then} ${IN_EARLIER}`;
const SHARE = `Diese ${POLL} sieht {option} bei {share}${ASKED}`;
const STOOD_STILL = 'Gleiche Werte bedeuten nicht, dass die Meinung sich nicht bewegt hat.';
const NO_SIDE = 'die Umfrage kann deshalb nicht sagen, auf welcher Seite die Meinung liegt';
const ONE_OF_TWO_POLLS =
  'Es ist einer von mehreren Vergleichen zwischen den beiden Umfragen, und unter so vielen könnte der Zufall allein';

/** First sentences of a body in German. */
export const DE_BODY: ClaimMessages = {
  lead: {
    'holds-twice': `{setting, select, contest {Eine ${POLL} deutet auf einen Vorsprung von ${GAP} für {a} vor {b} hin: {aShare} zu {bShare}.} other {Die Antwort {a} ist häufiger als die Antwort {b}, {aShare} zu {bShare}: Darauf deutet eine ${POLL} hin.}} Der Abstand ${LARGER_OF_ONE}.`,
    holds: `{setting, select, contest {Diese ${POLL} sieht {a} mit einem Vorsprung von ${GAP} vor {b}: {aShare} zu {bShare}.} other {In dieser ${POLL} ist die Antwort {a} häufiger als die Antwort {b}: {aShare} zu {bShare}.}} Der Abstand ${LARGER}.`,
    fragile: `Diese ${POLL} weist für {a} einen höheren Wert aus als für {b}, {aShare} zu {bShare}, ${UNSETTLED}.`,
    level: `Diese ${POLL} weist für {a} und {b} denselben Wert aus: je {aShare}. Gleiche Werte bedeuten nicht, dass die Meinung gleich geteilt ist.`,
    'not-shown': `${PUTS}, ein Abstand von ${GAP}. ${chanceAlone('einen Abstand dieser Größe erzeugen', 'selbst in einer Zufallsstichprobe')}.`,
    family: `${PUTS}, ein Abstand von ${GAP}. Es ist einer von mehreren Vergleichen mit derselben Umfrage, und unter so vielen könnte der Zufall allein einen Abstand dieser Größe erzeugen.`,
    untested: `{known, select, yes {${PUTS}.} other {${NO_FIGURES}}}`,
  },
  change: {
    'holds-twice': upOrDown(
      (noun) =>
        `Zwei Umfragen von {pollsters}${AMONG} deuten auf einen ${noun} für {option} seit der Umfrage {prevDates} hin, von {then} auf {now}. Der ${noun} ${LARGER_OF_TWO}.`,
    ),
    holds: upOrDown(
      (noun) =>
        `Diese ${POLL} verzeichnet einen ${noun} für {option}, von {then} ${IN_EARLIER} auf {now}. Der ${noun} ${LARGER}.`,
    ),
    fragile: higherOrLower(
      (stem) =>
        `Diese ${POLL} weist für {option} einen ${stem}en Wert aus, {now} nach {then} ${IN_EARLIER}, ${UNSETTLED_BY_TWO}.`,
    ),
    level: `${AT}, demselben Wert wie ${IN_EARLIER}. ${STOOD_STILL}`,
    'not-shown': `${AT_BOTH}. ${chanceAlone(`einen Unterschied von ${MOVE} zwischen zwei solchen Umfragen erzeugen`, 'selbst bei Zufallsstichproben')}.`,
    family: `${AT_BOTH}. ${ONE_OF_TWO_POLLS} einen Unterschied von ${MOVE} erzeugen.`,
    'little-changed': `Der Wert für {option} verändert sich wenig: {now} in dieser ${POLL}, nach {then} ${IN_EARLIER}. Auch mit Stichprobenfehler und Rundung ist der Unterschied kleiner als das vorab festgelegte Mindestmaß von ${ofPoints('indifference')}.`,
    untested: `{known, select, both {${AT_BOTH}.} now {${AT}.} other {${NO_FIGURE}}}`,
  },
  'lead-change': {
    'holds-twice': `Der Abstand zwischen {a} und {b} hat sich seit der Umfrage {prevDates} zugunsten von {toward} verschoben, darauf deuten zwei Umfragen von {pollsters}${AMONG} hin. Damals stand es {aThen} zu {bThen}, jetzt {aNow} zu {bNow}. Der Unterschied ${LARGER_OF_TWO}.`,
    holds: `In dieser ${POLL} hat sich der Abstand zwischen {a} und {b} zugunsten von {toward} verschoben: {aNow} zu {bNow}, nach {aThen} zu {bThen} ${IN_EARLIER}. Der Unterschied ${LARGER}.`,
    fragile: `In dieser ${POLL} ist der Abstand zwischen {a} und {b} günstiger für {toward}, {aNow} zu {bNow} nach {aThen} zu {bThen} ${IN_EARLIER}, ${UNSETTLED_BY_TWO}.`,
    level: `Der Abstand zwischen {a} und {b} hat in dieser ${POLL}, {aNow} zu {bNow}, denselben Wert wie ${IN_EARLIER}, {aThen} zu {bThen}. ${STOOD_STILL}`,
    'not-shown': `${PUTS_BOTH}. ${chanceAlone(`einen Unterschied im Abstand von ${MOVE} zwischen zwei solchen Umfragen erzeugen`, 'selbst bei Zufallsstichproben')}.`,
    family: `${PUTS_BOTH}. ${ONE_OF_TWO_POLLS} einen Unterschied im Abstand von ${MOVE} erzeugen.`,
    untested: `{known, select, both {${PUTS_BOTH}.} now {${PUTS_NOW}.} other {${NO_FIGURES}}}`,
  },
  threshold: {
    'holds-twice': aboveOrBelow(
      (place) =>
        `Eine ${POLL} deutet für {option} auf einen Wert ${place} der {line} hin: {share}${ASKED}. Der Abstand zur {line} ${LARGER_OF_ONE}.`,
    ),
    holds: aboveOrBelow(
      (place) =>
        `Diese ${POLL} sieht {option} ${place} der {line}, bei {share}${ASKED}. Der Abstand zur {line} ${LARGER}.`,
    ),
    fragile: aboveOrBelow(
      (place) => `Diese ${POLL} sieht {option} ${place} der {line}, bei {share}${ASKED}, ${UNSETTLED}.`,
    ),
    level: `Diese ${POLL} sieht {option} genau an der {line}. Auf welcher Seite die Meinung liegt, kann die Umfrage nicht sagen.`,
    'not-shown': `${SHARE}. ${chanceAlone('den Abstand zur {line} erklären', 'selbst in einer Zufallsstichprobe')}; ${NO_SIDE}.`,
    family: `${SHARE}. Es ist einer von mehreren Werten derselben Umfrage, die an einer Hürde geprüft wurden, und unter so vielen könnte der Zufall allein den Abstand zur {line} erklären.`,
    untested: `{known, select, yes {${SHARE}.} other {${NO_FIGURE}}}`,
  },
  'net-score': DE_NET_SCORE.body,
  'net-score-change': DE_NET_SCORE_CHANGE.body,
  gap: DE_GAP.body,
};
