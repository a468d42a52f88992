import type { ClaimMessages } from '../language-pack';
import { chanceAlone, LARGER, LARGER_OF_ONE, ofPoints, POLL } from './de-parts';

const BOTH = '{option}: {gShare} unter {g} und {hShare} unter {h}';
const MORE =
  '{setting, select, contest {mehr Zuspruch für {option} unter {g} als unter {h}} other {häufiger die Antwort {option} unter {g} als unter {h}}}';
const CAPITAL_MORE =
  '{setting, select, contest {Mehr Zuspruch für {option} unter {g} als unter {h}} other {Antwort {option} unter {g} häufiger als unter {h}}}';
const SUPPRESSED = 'belowPresentationStandard';
const TOO_FEW = 'hat zu wenige Interviews für einen Vergleich zwischen {g} und {h}';
const LEFT_OUT = 'fehlen Werte für einen Vergleich zwischen {g} und {h}';
const CHANCE = 'ein Abstand, den auch der Zufall allein erzeugen könnte';
const CHANCE_AMONG = 'ein Abstand, den unter mehreren Vergleichen auch der Zufall erzeugen könnte';
const UNUSUAL = 'ein größerer Abstand, als der Zufall üblicherweise erzeugt';
const UNSETTLED = 'doch sie kann das nicht entscheiden';
const PUTS = `Diese ${POLL} sieht {option} bei {gShare} unter {g} und bei {hShare} unter {h}`;

/** A gap between two groups of one sample, in German. */
export const DE_GAP: Record<'headline' | 'body' | 'chartTitle' | 'told', ClaimMessages['gap']> = {
  headline: {
    'holds-twice': `${CAPITAL_MORE}, {gShare} zu {hShare}: Darauf deutet eine Umfrage von {pollster}`,
    holds: `${CAPITAL_MORE} in Umfrage von {pollster}, {gShare} zu {hShare}`,
    fragile: `Umfrage von {pollster} mit höherem Wert für {option} unter {g} als unter {h}, {gShare} zu {hShare}, ${UNSETTLED}`,
    level: 'Gleicher Wert für {option} unter {g} und unter {h} in Umfrage von {pollster}: je {gShare}',
    'not-shown': `${BOTH} in Umfrage von {pollster}, ${CHANCE}`,
    family: `${BOTH} in Umfrage von {pollster}, ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {In Umfrage von {pollster} ${LEFT_OUT}} ${SUPPRESSED} {Umfrage von {pollster} ${TOO_FEW}} noSamplingBasis {${BOTH} in einer Umfrage von {pollster} ohne anerkannte Fehlerspanne} noSampleSize {${BOTH} in einer Umfrage von {pollster}, die nicht sagt, wie viele befragt wurden} tooSmall {Umfrage von {pollster} ${TOO_FEW}} other {${BOTH} in Umfrage von {pollster}: Der Abstand lässt sich nicht prüfen}}`,
  },
  body: {
    'holds-twice': `Eine ${POLL} deutet auf {setting, select, contest {mehr Zuspruch für {option} unter {g} als unter {h}} other {mehr Antworten {option} unter {g} als unter {h}}} hin: {gShare} zu {hShare}. Der Abstand ${LARGER_OF_ONE}.`,
    holds: `Diese ${POLL} verzeichnet ${MORE}: {gShare} zu {hShare}. Der Abstand ${LARGER}.`,
    fragile: `Diese ${POLL} weist für {option} unter {g} einen höheren Wert aus als unter {h}, {gShare} zu {hShare}, ${UNSETTLED}.`,
    level: `Diese ${POLL} weist für {option} unter {g} und unter {h} denselben Wert aus: je {gShare}. Gleiche Werte bedeuten nicht, dass die Gruppen gleich denken.`,
    'not-shown': `${PUTS}, ein Abstand von ${ofPoints('gap')}. ${chanceAlone('einen Abstand dieser Größe erzeugen', 'selbst in Zufallsstichproben')}.`,
    family: `${PUTS}, ein Abstand von ${ofPoints('gap')}. Es ist einer von mehreren Vergleichen zwischen Gruppen derselben Umfrage, und unter so vielen könnte der Zufall allein einen Abstand dieser Größe erzeugen.`,
    untested: `{known, select, yes {${PUTS}.} hidden {Diese ${POLL} ${TOO_FEW}.} other {In dieser ${POLL} ${LEFT_OUT}.}}`,
  },
  chartTitle: {
    'holds-twice': `${CAPITAL_MORE}, {gShare} zu {hShare}`,
    holds: `${CAPITAL_MORE} in dieser Umfrage, {gShare} zu {hShare}`,
    fragile: `Höherer Wert für {option} unter {g} als unter {h} in dieser Umfrage, {gShare} zu {hShare}, ${UNSETTLED}`,
    level: 'Gleicher Wert für {option} unter {g} und unter {h} in dieser Umfrage: je {gShare}',
    'not-shown': `${BOTH}, ${CHANCE}`,
    family: `${BOTH}, ${CHANCE_AMONG}`,
    untested: `{reason, select, notDisclosed {{option} unter {g} und unter {h}: Werte nicht veröffentlicht} ${SUPPRESSED} {{option} unter {g} und unter {h}: zu wenige Interviews für einen Wert} tooSmall {{option} unter {g} und unter {h}: zu wenige Interviews für einen Vergleich} noSamplingBasis {${BOTH}, ohne anerkannte Fehlerspanne} other {${BOTH}: Der Abstand lässt sich nicht prüfen}}`,
  },
  told: {
    'holds-twice': `Die Umfrage verzeichnet ${MORE}, {gShare} zu {hShare}, ${UNUSUAL}.`,
    holds: `Diese Umfrage verzeichnet ${MORE}, {gShare} zu {hShare}, ${UNUSUAL}.`,
    fragile: `Diese Umfrage weist für {option} unter {g} einen höheren Wert aus als unter {h}, {gShare} zu {hShare}, ${UNSETTLED}.`,
    level: 'Diese Umfrage weist für {option} unter {g} und unter {h} denselben Wert aus: je {gShare}.',
    'not-shown': `${BOTH}, ${CHANCE}.`,
    family: `${BOTH}, ${CHANCE_AMONG}.`,
    untested: `{reason, select, notDisclosed {In der Umfrage ${LEFT_OUT}.} ${SUPPRESSED} {Die Umfrage ${TOO_FEW}.} noSamplingBasis {${BOTH} in einer Umfrage ohne anerkannte Fehlerspanne.} noSampleSize {${BOTH} in einer Umfrage, die nicht sagt, wie viele befragt wurden.} tooSmall {Die Umfrage ${TOO_FEW}.} other {${BOTH}, ein Abstand, der sich mit dieser Umfrage nicht prüfen lässt.}}`,
  },
};
