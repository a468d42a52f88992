import type { ClaimMessages } from '../language-pack';
import { DE_GAP } from './de-gap';
import { DE_NET_SCORE, DE_NET_SCORE_CHANGE } from './de-net-score';
import { aboveOrBelow, ASKED, higherOrLower, UNSETTLED, UNSETTLED_POLLS, upOrDown } from './de-parts';

const BOTH = '{a} {aShare}, {b} {bShare}';
const BOTH_NOW = '{a} {aNow}, {b} {bNow}';
const NO_MARGIN = 'in einer Umfrage von {pollster} ohne anerkannte Fehlerspanne';
const NO_SIZE = 'in einer Umfrage von {pollster}, die nicht sagt, wie viele befragt wurden';

/** Headline claims in German: the name is never the subject, so that no verb has to agree with it. */
export const DE_HEADLINE: ClaimMessages = {
  lead: {
    'holds-twice':
      '{setting, select, contest {Umfrage von {pollster} deutet auf Vorsprung für {a} vor {b}: {aShare} zu {bShare}} other {Antwort {a} häufiger als Antwort {b}, {aShare} zu {bShare}: Darauf deutet eine Umfrage von {pollster}}}',
    holds:
      '{setting, select, contest {Umfrage von {pollster} sieht {a} vor {b}: {aShare} zu {bShare}} other {Antwort {a} in Umfrage von {pollster} häufiger als Antwort {b}: {aShare} zu {bShare}}}',
    fragile: `Umfrage von {pollster} mit höherem Wert für {a} als für {b}, {aShare} zu {bShare}, ${UNSETTLED}`,
    level: 'Gleicher Wert für {a} und {b} in Umfrage von {pollster}: je {aShare}',
    'not-shown': `${BOTH} in Umfrage von {pollster}: ein Abstand, den auch der Zufall allein erzeugen könnte`,
    family: `${BOTH} in Umfrage von {pollster}: ein Abstand, den unter mehreren Vergleichen auch der Zufall erzeugen könnte`,
    untested: `{reason, select, notDisclosed {In Umfrage von {pollster} fehlen Werte für einen Vergleich von {a} und {b}} noSamplingBasis {${BOTH} ${NO_MARGIN}} noSampleSize {${BOTH} ${NO_SIZE}} tooSmall {${BOTH} in Umfrage von {pollster} mit zu wenigen Interviews für einen Vergleich} other {${BOTH} in Umfrage von {pollster}: Der Abstand lässt sich nicht prüfen}}`,
  },
  change: {
    'holds-twice': upOrDown(
      (noun) => `Umfragen von {pollsters} deuten auf ${noun} für {option} seit der Umfrage {prevDates}`,
    ),
    holds: upOrDown((noun) => `${noun} für {option} in Umfragen von {pollsters} seit jener {prevDates}`),
    fragile: higherOrLower(
      (stem) =>
        `${stem === 'höher' ? 'Höherer' : 'Niedrigerer'} Wert für {option} als in der Umfrage {prevDates}, {now} nach {then}, ${UNSETTLED_POLLS}`,
    ),
    level: '{option} bei {now} in Umfrage von {pollster}, derselbe Wert wie in der Umfrage {prevDates}',
    'not-shown':
      '{option} bei {now} in Umfrage von {pollster}, nach {then} in der Umfrage {prevDates}: ein Unterschied, den auch der Zufall allein erzeugen könnte',
    family:
      '{option} bei {now} in Umfrage von {pollster}, nach {then} in der Umfrage {prevDates}: ein Unterschied, den unter mehreren Vergleichen auch der Zufall erzeugen könnte',
    'little-changed': 'Wenig Veränderung für {option} seit der Umfrage {prevDates}, laut {pollsters}',
    untested: `{reason, select, notDisclosed {In Umfragen von {pollsters} fehlen Werte für einen Vergleich von {option} mit der Umfrage {prevDates}} notComparable {{option} bei {now} in Umfrage von {pollster}; mit der Umfrage {prevDates} ist das nicht vergleichbar} noSamplingBasis {{option} bei {now} ${NO_MARGIN}} other {{option} bei {now} in Umfrage von {pollster}; die Veränderung seit der Umfrage {prevDates} lässt sich nicht prüfen}}`,
  },
  'lead-change': {
    'holds-twice':
      'Abstand zwischen {a} und {b} hat sich seit der Umfrage {prevDates} zugunsten von {toward} verschoben, darauf deuten Umfragen von {pollsters}',
    holds:
      'Abstand zwischen {a} und {b} hat sich in Umfragen von {pollsters} seit jener {prevDates} zugunsten von {toward} verschoben',
    fragile: `Abstand zwischen {a} und {b} günstiger für {toward} als in der Umfrage {prevDates}, ${UNSETTLED_POLLS}`,
    level:
      'Abstand zwischen {a} und {b} in Umfrage von {pollster} mit demselben Wert wie in der Umfrage {prevDates}',
    'not-shown': `${BOTH_NOW} in Umfrage von {pollster}: Den Unterschied im Abstand zur Umfrage {prevDates} könnte auch der Zufall allein erklären`,
    family: `${BOTH_NOW} in Umfrage von {pollster}: Den Unterschied im Abstand zur Umfrage {prevDates} könnte unter mehreren Vergleichen auch der Zufall erklären`,
    untested: `{reason, select, notDisclosed {In Umfragen von {pollsters} fehlen Werte für einen Vergleich des Abstands zwischen {a} und {b}} notComparable {${BOTH_NOW} in Umfrage von {pollster}; der Abstand ist mit der Umfrage {prevDates} nicht vergleichbar} noSamplingBasis {${BOTH_NOW} ${NO_MARGIN}} other {${BOTH_NOW} in Umfrage von {pollster}; die Veränderung des Abstands seit der Umfrage {prevDates} lässt sich nicht prüfen}}`,
  },
  threshold: {
    'holds-twice': aboveOrBelow(
      (place) => `Umfrage von {pollster} deutet auf Wert für {option} ${place} der {line}: {share}${ASKED}`,
    ),
    holds: aboveOrBelow(
      (place) => `Umfrage von {pollster} sieht {option} ${place} der {line}, bei {share}${ASKED}`,
    ),
    fragile: aboveOrBelow(
      (place) =>
        `Umfrage von {pollster} sieht {option} ${place} der {line}, bei {share}${ASKED}, ${UNSETTLED}`,
    ),
    level: 'Umfrage von {pollster} sieht {option} genau an der {line}',
    'not-shown': `{option} bei {share}${ASKED} in Umfrage von {pollster}, zu nah an der {line}, um die Seite zu bestimmen`,
    family: `{option} bei {share}${ASKED} in Umfrage von {pollster}, zu nah an der {line}, um die Seite zu bestimmen`,
    untested: `{reason, select, notDisclosed {In Umfrage von {pollster} fehlt der Wert für {option}} noSamplingBasis {{option} bei {share} ${NO_MARGIN}} noSampleSize {{option} bei {share} ${NO_SIZE}} tooSmall {{option} bei {share} in Umfrage von {pollster} mit zu wenigen Interviews für einen Vergleich mit der {line}} other {{option} bei {share} in Umfrage von {pollster}; an der {line} lässt sich das nicht prüfen}}`,
  },
  'net-score': DE_NET_SCORE.headline,
  'net-score-change': DE_NET_SCORE_CHANGE.headline,
  gap: DE_GAP.headline,
};
