import type { LanguagePack } from '../language-pack';
import { ofPoints, points, QUANTITY, WEIGHTING } from './de-parts';

const DRAWN =
  '{drawn, select, unknown {Wie die Stichprobe gezogen wurde, ist nicht angegeben.} other {Die Stichprobe wurde nicht zufällig gezogen ({sample}).}}';
const STATED =
  '{statedPp, select, einem {ein} other {{statedPp}}} {statedCount, plural, one {Prozentpunkt} other {Prozentpunkte}}';

/** The caveat in German; the sources of its contents stand beside the English one. */
export const DE_CAVEAT: LanguagePack['caveat'] = {
  fieldwork:
    '{pollsterStart} befragte {dateSpan, select, day {am {end}} other {{dates}}}{sponsored, select, given { im Auftrag von {sponsor}} own { auf eigene Rechnung} other {}} {sized, select, yes {{n} {population}} other {{population}}}{modeKnown, select, yes { {mode}} other {}}.',
  earlier:
    'Die frühere Umfrage{samePollster, select, yes {} other {, von {prevPollster},}} erfasste {prevDateSpan, select, day {am {prevEnd}} other {{prevDates}}} {prevSized, select, yes {{prevN} {prevPopulation}} other {{prevPopulation}}}.',
  'not-disclosed': 'Nicht veröffentlicht: {items}.',
  'not-recorded': 'Von {newsroom} nicht erfasst: {items}.',
  'sample-random':
    '{design, select, weighted {Die Stichprobe wurde zufällig gezogen, die Ergebnisse sind gewichtet.} clustered {Die Stichprobe wurde zufällig gezogen, in Klumpen.} unweighted {Die Stichprobe wurde zufällig gezogen, die Ergebnisse sind nicht gewichtet.} other {Die Stichprobe wurde zufällig gezogen; ob die Ergebnisse gewichtet sind, ist nicht bekannt.}}',
  'sample-not-random':
    '{drawn, select, unknown {Wie die Stichprobe gezogen wurde, ist nicht angegeben; deshalb wird keine Fehlerspanne für den Stichprobenfehler genannt.} other {Die Stichprobe wurde nicht zufällig gezogen ({sample}); deshalb wird keine Fehlerspanne für den Stichprobenfehler genannt.}}',
  'sample-modelled': `${DRAWN} {pollsterStart} gibt ein Modellintervall von ±${ofPoints('modelled')} für einen Anteil an; es beruht auf einem Modell und ist keine Fehlerspanne für den Stichprobenfehler.`,
  'sample-comparison': `${DRAWN} Die hier genannte Fehlerspanne ist nur zum Vergleich so berechnet, als wäre sie es, nach {comparisonRule}; sie ist keine Fehlerspanne für den Stichprobenfehler.`,
  margin: `{stated, select, given {{pollsterStart} gibt ±${STATED} für einen Anteil an{sameLevel, select, yes {} other { (bei {statedLevel} Sicherheit)}}; {newsroom} schätzt} none {{pollsterStart} gibt keine Fehlerspanne an; {newsroom} schätzt} other {{newsroomStart} schätzt}} für ${QUANTITY} ±${points('margin')}{wider, select, yes { oder ±{widerMargin}{basis, select, modelled { im Rahmen der Rundung dieses Intervalls} other {, falls ${WEIGHTING} mehr Genauigkeit kostet}}} other {}} (bei {level} Sicherheit).`,
  'margin-stated-only': `{pollsterStart} gibt ±${STATED} für einen Anteil an (bei {statedLevel} Sicherheit); hier wird keine Fehlerspanne für ${QUANTITY} genannt.`,
  'twice-margin':
    'Nach der Faustregel des Doppelten der Fehlerspanne (hier ±{shareMargin} {shareMarginCount, plural, one {Prozentpunkt} other {Prozentpunkte}} für einen Anteil) {zone, select, above {ist der Unterschied groß genug} between {liegt der Unterschied zwischen dem Einfachen und dem Doppelten dieser Spanne} other {ist der Unterschied kleiner als diese Spanne}}; {thumb, select, agrees {{newsroom} richtet sich nach dem eigenen Test des Unterschieds.} stricter {der eigene Test von {newsroom} ist strenger, weil er auch Gewichtung, Rundung und die Zahl der Vergleiche berücksichtigt.} other {der eigene Test von {newsroom} verlangt weniger, weil andere Antworten oder Unentschlossene einen Anteil haben.}}',
  'small-shares':
    'Die angegebene Fehlerspanne gilt für einen Anteil nahe der Hälfte; kleine Anteile haben kleinere Fehlerspannen.',
  'margin-none': `Hier wird keine Fehlerspanne für ${QUANTITY} genannt.`,
  'errors-before-a-vote':
    'Fehlerspannen erfassen nur den Stichprobenfehler; Studien zu Umfragen vor Wahlen fanden einen Gesamtfehler von etwa dem Doppelten der angegebenen Spannen.',
  errors:
    'Fehlerspannen erfassen nur den Stichprobenfehler; auch der Wortlaut der Fragen und die Menschen, die die Umfrage nicht erreicht hat, können die Werte verschieben.',
  'errors-without-margin':
    'Der Wortlaut der Fragen und die Menschen, die die Umfrage nicht erreicht hat, können die Werte verschieben.',
};
