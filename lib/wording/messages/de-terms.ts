import type { Terms } from '../language-pack';
import { DE_SPOKEN_WORDS } from './de-spoken-words';

/** Words for closed lists in German, chosen so that none has a gender to agree with a person. */
export const DE_TERMS: Terms = {
  percent: '{n} Prozent',
  perCent: '{n} Prozent',
  quoted: '„{name}“',
  everyoneElse: 'den übrigen Befragten',
  figure: '{name} mit {share}',
  earlierPoll:
    '{spoken, select, yes {der am {prevEnd} beendeten Umfrage{samePollster, select, yes {} other { von {prevPollster}}}} other {der Umfrage{samePollster, select, yes {} other { von {prevPollster}}} {prevDates}}}',
  notDisclosed: 'nicht veröffentlicht',
  half: '{spoken, select, yes {Marke von {pct}} other {{number}-Prozent-Marke}}',
  threshold: '{spoken, select, yes {Hürde von {pct}} other {{number}-Prozent-Hürde}}',
  newsroom: 'unsere Redaktion',
  comparisonRule: 'einer Regel dieser Redaktion',
  // Whole points in words stand after "von" only: the dative.
  numbers: ['null', 'einem', 'zwei', 'drei', 'vier', 'fünf', 'sechs', 'sieben', 'acht', 'neun'],
  days: { one: 'vom {end}', several: 'vom {start} bis {end}' },
  population: {
    adults: 'Erwachsene',
    'registered-voters': 'ins Wählerverzeichnis Eingetragene',
    'likely-voters': 'voraussichtlich Wählende',
    unknown: 'Personen',
  },
  ofWhom: {
    adults: 'unter Erwachsenen',
    'registered-voters': 'unter ins Wählerverzeichnis Eingetragenen',
    'likely-voters': 'unter voraussichtlich Wählenden',
    unknown: '',
  },
  mode: {
    'live-telephone': 'in Telefoninterviews',
    'recorded-telephone': 'mit automatischen Telefonanrufen',
    'face-to-face': 'in persönlichen Interviews',
    online: 'online',
    post: 'auf dem Postweg',
    mixed: 'auf mehreren Wegen',
  },
  sample: {
    probability: 'Zufallsstichprobe',
    quota: 'Quotenstichprobe',
    'opt-in': 'Panel aus Freiwilligen',
    blended: 'teils zufällig, teils freiwillig',
    unknown: 'nicht angegeben',
  },
  secondTest: {
    score: 'Score-Test',
    'exact-sign': 'exakter Vorzeichentest',
    pooled: 'Test mit gemeinsamer Varianz',
    newcombe: 'hybrides Score-Intervall',
    fisher: 'exakter Test nach Fisher',
    'exact-binomial': 'exakter Binomialtest',
  },
  comparable: {
    pollster: 'das Institut',
    race: 'die Wahl',
    'question-wording': 'der Wortlaut der Frage',
    'answer-options': 'die angebotenen Antworten',
    population: 'die befragte Gruppe',
    'likely-voter-method': 'die Bestimmung der voraussichtlich Wählenden',
    mode: 'die Art der Befragung',
    'sample-source': 'die Ziehung der Stichprobe',
    'sample-supplier': 'die Herkunft der Stichprobe',
    'weighting-scheme': 'die Gewichtung',
    'sponsor-kind': 'die Art des Auftraggebers',
    're-basing': 'ob Personen ohne Festlegung ausgelassen sind',
    'question-order': 'die Reihenfolge der Fragen',
    'field-dates': 'der Zeitraum der Befragung',
  },
  particular: {
    sponsor: 'der Auftrag',
    population: 'die befragte Gruppe',
    n: 'die Zahl der Befragten',
    mode: 'die Art der Befragung',
  },
  spoken: DE_SPOKEN_WORDS,
};
