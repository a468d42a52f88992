import { fold } from '../fold';
import { DE_MONTHS, DE_WEEKDAYS } from './de-calendar';
import { DE_CHANGES } from './de-changes';
import { DE_FIGURES } from './de-figures';
import { DE_LEADS } from './de-leads';
import { DE_POLLS } from './de-polls';
import { DE_SMALL_WORDS } from './de-small-words';
import { DE_WORDS } from './de-words';
import { listed } from './listed';
import type { Lexicon } from './types';

const ONES = listed(`null | eins | zwei | drei | vier | fünf | sechs | sieben | acht | neun`);
const TEENS = listed(`
  zehn | elf | zwölf | dreizehn | vierzehn | fünfzehn | sechzehn | siebzehn | achtzehn | neunzehn`);
const TENS = listed(`zwanzig | dreißig | vierzig | fünfzig | sechzig | siebzig | achtzig | neunzig`);

/** Entries that are compared as they stand, in folded words. */
const plain = (text: string) => listed(text).map((entry) => fold(entry).text);

/** German says the ones first, in one word: "zweiundfünfzig". */
const numbers: Record<string, number> = {};
const put = (word: string, value: number) => (numbers[fold(word).text] = value);
[...ONES, ...TEENS].forEach(put);
TENS.forEach((ten, index) => {
  const value = 10 * (index + 2);
  put(ten, value);
  ONES.slice(1).forEach((one, place) => put(`${one === 'eins' ? 'ein' : one}und${ten}`, value + place + 1));
});
put('hundert', 100);

const FRACTIONS: Record<string, number> = {
  'die hälfte': 50,
  hälfte: 50,
  'einen halben': 50,
  'einem halben': 50,
  'ein halber': 50,
  'ein drittel': 100 / 3,
  'einem drittel': 100 / 3,
  'zwei drittel': 200 / 3,
  'ein viertel': 25,
  'einem viertel': 25,
  'drei viertel': 75,
  dreiviertel: 75,
  'ein fünftel': 20,
  'zwei fünftel': 40,
  'drei fünftel': 60,
  'vier fünftel': 80,
  'ein zehntel': 10,
};
const EVERY = listed(`jeder | jede | jeden | jedem`);
const NTHS: [string, number][] = [
  ['zweite', 50],
  ['dritte', 100 / 3],
  ['vierte', 25],
  ['fünfte', 20],
  ['zehnte', 10],
];
const nths = NTHS.flatMap(([nth, value]) =>
  EVERY.flatMap((every) =>
    [nth, `${nth}n`, `${nth}r`].map((form): [string, number] => [`${every} ${form}`, value]),
  ),
);

/** German, as papers of several countries write it; not read by a native editor yet. */
export const DE_LEXICON: Lexicon = {
  decimalMark: ',',
  locale: 'de',
  groupsBySpace: false,
  elisions: [],
  abbreviations: listed(
    `z | b | ca | bzw | rd | usw | nr | mio | mrd | dr | prof | st | vgl | bspw | inkl | sept | okt`,
  ),
  numbers,
  oneArticles: listed(`ein | einen | einem | eine | einer`),
  fractions: Object.fromEntries(
    [...Object.entries(FRACTIONS), ...nths].map(([phrase, value]) => [fold(phrase).text, value]),
  ),
  inEvery: ['von', 'von je', 'aus'],
  to: ['zu', 'auf', 'bis', '–', '-'],
  datesAreNames: true,
  months: DE_MONTHS,
  weekdays: DE_WEEKDAYS,
  ordinalDots: true,
  nounsHaveCapitals: true,
  verbsComeLast: true,
  nameEndings: ['s'],
  negatorsAfter: listed(`nicht | kein | keine | keinen | keiner | keineswegs | keinesfalls`),
  nameNouns: {
    approve: ['zustimmung'],
    disapprove: ['ablehnung'],
    yes: ['ja', 'ja lager', 'ja stimmen', 'ja seite'],
    no: ['nein', 'nein lager', 'nein stimmen', 'nein seite'],
    ja: ['ja lager', 'ja stimmen', 'ja seite'],
    nein: ['nein lager', 'nein stimmen', 'nein seite'],
  },
  commonNames: listed(`
      ja | nein | andere | sonstige | keine | unentschlossen | weiß nicht | bleiben | gehen | beide | weder noch`),
  afterCommonName: plain(`
      unter | über | an | als | aus | im | am | zur | zum | nach | gegen | häufiger | erreicht | überspringt |
      liegt | liegen | führt | führen | hat | ist | kommt | kommen | bei | auf | mit | zu | vor | hinter | stimmen | wählen |
      und | legt | verliert | gewinnt | gleichauf | in | , | . | : | ; | ) | ! | " | wäre | würde | wird | steigt | fällt |
      seite | lager | vorn | knapp | klar | deutlich`),
  genericNameWords: listed(`
      partei | die | der | das | liste | bündnis | union | allianz | bewegung | party | the | list | alliance | league |
      movement | coalition`),
  notNames: [],
  cues: { ...DE_LEADS, ...DE_CHANGES, ...DE_FIGURES, ...DE_POLLS, ...DE_WORDS, ...DE_SMALL_WORDS },
  populations: {
    adults: 'Erwachsene',
    'registered-voters': 'ins Wählerverzeichnis Eingetragene',
    'likely-voters': 'voraussichtlich Wählende',
  },
  replacements: {
    isAheadUnsettled: 'hat in dieser Umfrage einen höheren Wert als {b}, doch sie kann das nicht entscheiden',
    aheadNow: 'vorn',
    isAhead: 'liegt vor {b}',
    leads: 'führt',
    trails: 'liegt hinten',
    chanceGap: 'hat den höheren Wert, doch diesen Abstand könnte auch der Zufall allein erzeugen',
    untestedGap: 'hat den höheren Wert, in einer Umfrage ohne anerkannte Fehlerspanne',
    level: 'mit gleichem Wert in dieser Umfrage',
    higherFigure: 'hat den höheren Wert',
    higherUnsettled:
      'hat einen höheren Wert, {now} nach {then}, doch die Umfragen können das nicht entscheiden',
    lowerUnsettled:
      'hat einen niedrigeren Wert, {now} nach {then}, doch die Umfragen können das nicht entscheiden',
    chanceChange: 'liegt bei {now}, nach {then}: ein Unterschied, den auch der Zufall allein erzeugen könnte',
    untestedChange: 'liegt bei {now}, nach {then}; die Veränderung lässt sich nicht prüfen',
    sameFigure: 'hat denselben Wert wie zuvor',
    isUp: 'legt zu',
    isDown: 'fällt',
    points: '{n} Prozentpunkte',
    suggests: 'legt nahe',
    largerThanChance: 'größer, als der Zufall allein üblicherweise erzeugt',
    couldBeChance: 'von einer Größe, die auch der Zufall allein erzeugen könnte',
    atShare: '{share}',
  },
};
