import type { LanguagePack } from '../language-pack';
import { points, QUANTITY, SHORT_QUANTITY, WEIGHTING } from './de-parts';

const STATED =
  '{statedPp, select, einem {ein} other {{statedPp}}} {statedCount, plural, one {Prozentpunkt} other {Prozentpunkte}}';
const MARGIN = `±${points('margin')}{wider, select, yes { (bis zu ±{widerMargin})} other {}}`;
const MARGIN_ALOUD = `${points('margin')}{wider, select, yes { oder {widerMargin}, {basis, select, modelled {wenn man die Rundung einrechnet} other {falls ${WEIGHTING} mehr Genauigkeit kostet}}} other {}}`;
const STATES = `{pollsterStart} gibt ±${STATED} für einen Anteil an`;
const NOT_DRAWN =
  '{drawn, select, unknown {Wie die Stichprobe gezogen wurde, ist nicht angegeben} other {Die Stichprobe wurde nicht zufällig gezogen ({sample})}}';
const NOT_DRAWN_ASIDE =
  '{drawn, select, unknown {wie die Stichprobe gezogen wurde, ist nicht angegeben} other {die Stichprobe wurde nicht zufällig gezogen}}';
const ASKED_EARLIER =
  '{twoPolls, select, yes { und zuvor{samePollster, select, yes {} other { {prevPollster}}} {prevDateSpan, select, day {am {prevEnd}} other {{prevDates}}} {prevSized, select, yes {{prevN}} other {eine nicht veröffentlichte Zahl}}} other {}}';
const ASKED = `{pollsterStart} befragte {dateSpan, select, day {am {end}} other {{dates}}} {sized, select, yes {{n} {population}} other {{population} (Zahl nicht veröffentlicht)}}${ASKED_EARLIER}`;

/** The last sentence of the short caveat, in German. */
export const DE_CAVEAT_SHORT: LanguagePack['caveatShort'] = {
  margin: `{stated, select, given {${STATES}{sameLevel, select, yes {} other { (bei {statedLevel} Sicherheit)}}; {newsroom} schätzt} none {{pollsterStart} gibt keine Fehlerspanne an; {newsroom} schätzt} other {{newsroomStart} schätzt}} für ${QUANTITY} ${MARGIN} (bei {level} Sicherheit), nur für den Stichprobenfehler.`,
  'stated-only': `${STATES} (bei {statedLevel} Sicherheit); hier wird keine Fehlerspanne für ${QUANTITY} genannt.`,
  none: `Hier wird keine Fehlerspanne für ${QUANTITY} genannt.`,
  'not-random': `${NOT_DRAWN}; deshalb wird keine Fehlerspanne für den Stichprobenfehler genannt.`,
  modelled: `${NOT_DRAWN}; nach dem Modell des Instituts selbst schätzt {newsroom} für ${QUANTITY} ${MARGIN} (bei {level} Sicherheit).`,
  comparison: `${NOT_DRAWN}; so berechnet, als wäre sie es, nach {comparisonRule}, beträgt die Fehlerspanne für ${QUANTITY} ${MARGIN} (bei {level} Sicherheit).`,
};

/** One sentence for a caption or an aside, in German. */
export const DE_ONE_BREATH: LanguagePack['oneBreath'] = {
  margin: `${ASKED}; {newsroom} schätzt für ${SHORT_QUANTITY} ${MARGIN}.`,
  'stated-only': `${ASKED}; angegeben sind ±${STATED} für einen Anteil, keine Fehlerspanne für ${SHORT_QUANTITY}.`,
  none: `${ASKED}; eine Fehlerspanne für ${SHORT_QUANTITY} wird nicht genannt.`,
  'not-random': `${ASKED}; ${NOT_DRAWN_ASIDE}, deshalb wird keine Fehlerspanne genannt.`,
  modelled: `${ASKED}; {newsroom} schätzt für ${SHORT_QUANTITY} ${MARGIN}, nach dem Modell des Instituts selbst.`,
  comparison: `${ASKED}; für ${SHORT_QUANTITY} gilt ${MARGIN}, als wäre die Stichprobe zufällig gezogen, nach {comparisonRule}.`,
};

const SPOKEN_NOT_DRAWN =
  '{drawn, select, unknown {Wie die Stichprobe gezogen wurde, ist nicht angegeben} other {Die Stichprobe wurde nicht zufällig gezogen}}';

/** Said aloud, in German. */
export const DE_SPOKEN: LanguagePack['spoken'] = {
  fieldwork:
    '{pollsterStart} befragte {dates} {sized, select, yes {{n} {population}} other {{population}, ohne zu sagen, wie viele}}.',
  margin: `{newsroomStart} schätzt für ${SHORT_QUANTITY} plus oder minus ${MARGIN_ALOUD}.`,
  'stated-only': `{pollsterStart} gibt plus oder minus ${STATED} für einen Anteil an, und für ${SHORT_QUANTITY} wird hier keine Fehlerspanne genannt.`,
  none: `Für ${SHORT_QUANTITY} wird keine Fehlerspanne genannt.`,
  'not-random': `${SPOKEN_NOT_DRAWN}; deshalb wird keine Fehlerspanne für den Stichprobenfehler genannt.`,
  modelled: `${SPOKEN_NOT_DRAWN}; nach dem Modell des Instituts selbst beträgt die Fehlerspanne für ${SHORT_QUANTITY} plus oder minus ${MARGIN_ALOUD}.`,
  comparison: `${SPOKEN_NOT_DRAWN}; so berechnet, als wäre sie es, nach {comparisonRule}, beträgt die Fehlerspanne für ${SHORT_QUANTITY} plus oder minus ${MARGIN_ALOUD}.`,
};

/** Short reasons of a fragile finding, in German. */
export const DE_FRAGILE_SHORT: LanguagePack['fragileShort'] = {
  rounding: 'Es hängt davon ab, wie die veröffentlichten Werte gerundet wurden.',
  'design-effect': `Es hängt davon ab, wie viel Genauigkeit ${WEIGHTING} kostet.`,
  'second-test': 'Ein zweiter anerkannter Test bestätigt es nicht.',
  together:
    'Es hängt von der Rundung und {design, select, clustered {der Klumpung} other {der Gewichtung}} zusammen ab.',
  modelled: 'Es beruht auf dem Modell, mit dem das Institut selbst seinen Fehler schätzt.',
  comparison: 'Es ist so berechnet, als wäre die Stichprobe zufällig gezogen.',
};

export const DE_NEWSLETTER: LanguagePack['newsletter'] = { line: '{race}: {line}' };

/** Corrections, in German. */
export const DE_CORRECTION: LanguagePack['correction'] = {
  intro:
    'Korrektur, {on}: {count, plural, =0 {Formulierungen einer früheren Fassung dieses Berichts zur Umfrage von {pollster} wurden zurückgezogen} one {Eine frühere Fassung dieses Berichts enthielt eine falsche Angabe zur Umfrage von {pollster}} other {Eine frühere Fassung dieses Berichts enthielt falsche Angaben zur Umfrage von {pollster}}}.',
  share: 'Sie nannte für {option} {was}; richtig ist {is}.',
  'earlier-share': 'Sie nannte für {option} {was} in {prevPoll}; richtig ist {is}.',
  'group-share': 'Sie nannte für {option} {was} unter {group}; richtig ist {is}.',
  'sample-size':
    '{wasSized, select, yes {Sie nannte {was} Befragte} other {Sie nannte keine Zahl der Befragten}}; {isSized, select, yes {richtig ist {is}} other {die richtige Zahl ist nicht veröffentlicht}}.',
  dates: 'Sie datierte die Interviews {was}; richtig ist: {is}.',
  now: 'Was sich mit den {count, plural, =0 {} other {richtigen }}Werten sagen lässt: {line}',
  weaker: 'Sie stützen die frühere Aussage nicht.',
};
