import type { ClaimMessages } from '../language-pack';
import { DE_GAP } from './de-gap';
import { DE_NET_SCORE, DE_NET_SCORE_CHANGE } from './de-net-score';
import { aboveOrBelow, ASKED, higherOrLower, upOrDown } from './de-parts';

const BOTH = '{a} {aShare}, {b} {bShare}';
const UNSETTLED_POLLS = 'doch die Umfragen können das nicht entscheiden';

/** Chart titles in German: pollster and dates stand beneath the chart. */
export const DE_CHART_TITLE: ClaimMessages = {
  lead: {
    'holds-twice':
      '{setting, select, contest {Vorsprung für {a} vor {b}: {aShare} zu {bShare}} other {Antwort {a} häufiger als Antwort {b}: {aShare} zu {bShare}}}',
    holds:
      '{setting, select, contest {Vorsprung für {a} vor {b} in dieser Umfrage: {aShare} zu {bShare}} other {Antwort {a} in dieser Umfrage häufiger als Antwort {b}: {aShare} zu {bShare}}}',
    fragile: `Höherer Wert für {a} als für {b} in dieser Umfrage, {aShare} zu {bShare}, doch sie kann das nicht entscheiden`,
    level: 'Gleicher Wert für {a} und {b} in dieser Umfrage: je {aShare}',
    'not-shown': `${BOTH}: Diesen Abstand könnte auch der Zufall allein erzeugen`,
    family: `${BOTH}: Diesen Abstand könnte unter mehreren Vergleichen auch der Zufall erzeugen`,
    untested: `{reason, select, notDisclosed {Abstand zwischen {a} und {b}: Werte nicht veröffentlicht} noSamplingBasis {${BOTH}, ohne anerkannte Fehlerspanne} other {${BOTH}: Der Abstand lässt sich nicht prüfen}}`,
  },
  change: {
    'holds-twice': upOrDown((noun) => `${noun} für {option} seit der Umfrage {prevDates}`),
    holds: upOrDown((noun) => `${noun} für {option} in dieser Umfrage seit jener {prevDates}`),
    fragile: higherOrLower(
      (stem) =>
        `${stem === 'höher' ? 'Höherer' : 'Niedrigerer'} Wert für {option} als in der Umfrage {prevDates}, ${UNSETTLED_POLLS}`,
    ),
    level: 'Derselbe Wert für {option} wie in der Umfrage {prevDates}',
    'not-shown':
      '{option} bei {now}, nach {then} in der Umfrage {prevDates}: Diesen Unterschied könnte auch der Zufall allein erzeugen',
    family:
      '{option} bei {now}, nach {then} in der Umfrage {prevDates}: Diesen Unterschied könnte unter mehreren Vergleichen auch der Zufall erzeugen',
    'little-changed': 'Wenig Veränderung für {option} seit der Umfrage {prevDates}',
    untested:
      '{reason, select, notDisclosed {{option}: Werte nicht veröffentlicht} notComparable {{option} bei {now}; mit der Umfrage {prevDates} nicht vergleichbar} noSamplingBasis {{option} bei {now}, ohne anerkannte Fehlerspanne} other {{option} bei {now}: Die Veränderung seit der Umfrage {prevDates} lässt sich nicht prüfen}}',
  },
  'lead-change': {
    'holds-twice':
      'Abstand zwischen {a} und {b} hat sich seit der Umfrage {prevDates} zugunsten von {toward} verschoben',
    holds:
      'Abstand zwischen {a} und {b} hat sich in dieser Umfrage seit jener {prevDates} zugunsten von {toward} verschoben',
    fragile: `Abstand zwischen {a} und {b} günstiger für {toward} als in der Umfrage {prevDates}, ${UNSETTLED_POLLS}`,
    level: 'Abstand zwischen {a} und {b} mit demselben Wert wie in der Umfrage {prevDates}',
    'not-shown':
      'Abstand zwischen {a} und {b}, verglichen mit der Umfrage {prevDates}: Den Unterschied könnte auch der Zufall allein erzeugen',
    family:
      'Abstand zwischen {a} und {b}, verglichen mit der Umfrage {prevDates}: Den Unterschied könnte unter mehreren Vergleichen auch der Zufall erzeugen',
    untested:
      '{reason, select, notDisclosed {Abstand zwischen {a} und {b}: Werte nicht veröffentlicht} notComparable {Abstand zwischen {a} und {b}: mit der Umfrage {prevDates} nicht vergleichbar} noSamplingBasis {Abstand zwischen {a} und {b}, ohne anerkannte Fehlerspanne} other {Abstand zwischen {a} und {b}: Die Veränderung seit der Umfrage {prevDates} lässt sich nicht prüfen}}',
  },
  threshold: {
    'holds-twice': aboveOrBelow((place) => `{option} ${place} der {line}, bei {share}${ASKED}`),
    holds: aboveOrBelow((place) => `{option} in dieser Umfrage ${place} der {line}, bei {share}${ASKED}`),
    fragile: aboveOrBelow(
      (place) =>
        `{option} in dieser Umfrage ${place} der {line}, bei {share}${ASKED}, doch sie kann das nicht entscheiden`,
    ),
    level: '{option} in dieser Umfrage genau an der {line}',
    'not-shown': `{option} bei {share}${ASKED}: zu nah an der {line}, um die Seite zu bestimmen`,
    family: `{option} bei {share}${ASKED}: zu nah an der {line}, um die Seite zu bestimmen`,
    untested:
      '{reason, select, notDisclosed {{option}: Wert nicht veröffentlicht} noSamplingBasis {{option} bei {share}, ohne anerkannte Fehlerspanne} other {{option} bei {share}: An der {line} lässt sich das nicht prüfen}}',
  },
  'net-score': DE_NET_SCORE.chartTitle,
  'net-score-change': DE_NET_SCORE_CHANGE.chartTitle,
  gap: DE_GAP.chartTitle,
};
