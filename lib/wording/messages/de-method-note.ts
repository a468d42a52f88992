import type { LanguagePack } from '../language-pack';
import { ofPoints, points } from './de-parts';

const DEFF =
  '{poll, select, earlier {Designeffekt der früheren Umfrage} group {Designeffekt unter {group}} other {Designeffekt}}: {deff}';

/** How the finding was worked out, in German. */
export const DE_METHOD_NOTE: LanguagePack['methodNote'] = {
  question: 'Gestellte Frage: „{question}“{ended, select, yes {} other {.}}',
  'no-choice': 'Ohne Festlegung: {shares}.',
  'compared-with':
    'Verglichen mit der Umfrage von {prevPollster}{prevPopulated, select, yes { {prevOfWhom}} other {}} {prevDatesLong}{prevSized, select, yes { ({prevN} Befragte)} other { (Zahl der Befragten nicht veröffentlicht)}}.',
  'shared-waves':
    'Die beiden Umfragen sind Durchschnitte von je {window} Wellen, von denen sie {shared} gemeinsam haben; nur die nicht gemeinsamen Wellen machen den Unterschied aus.{equal, select, yes { Angenommen wird, dass alle Wellen gleich viele Interviews haben.} other {}}{pooled, select, yes { Anteile einzelner Wellen sind nicht veröffentlicht; an ihre Stelle tritt ein gemeinsamer Anteil.} other {}}',
  rebased: 'Die Anteile beziehen sich auf {rebasedN} Personen mit einer Festlegung.',
  bloc: '{source, select, printed {Der Wert für {bloc} ist der aus den Tabellen des Instituts für {members}.} other {Der Wert für {bloc} ist die Summe der veröffentlichten Anteile von {members}.}}',
  'net-score':
    'Ein Saldo hat die Fehlerspanne eines Abstands, nicht die eines Anteils; er bewegt sich um zwei Punkte, wenn ein Punkt der Meinung die Seite wechselt.',
  design: `${DEFF}, berechnet aus dem Plan der Stichprobe.`,
  kish: `${DEFF} nach den Gewichten allein, angesetzt mit {deffLow} bis {deffHigh}.`,
  stated: `${DEFF}, wie von {pollster} angegeben.`,
  implied: `${DEFF}, abgeleitet aus {stated, select, modelled {dem Modellintervall} other {der Fehlerspanne}}, {stated, select, modelled {das} other {die}} {pollster} angibt ({deffLow} bis {deffHigh} im Rahmen der Rundung).`,
  assumed: `${DEFF}, angenommen von {newsroom}{ranged, select, yes {, angesetzt mit {deffLow} bis {deffHigh}} other {}}.`,
  'stated-margin-like-unweighted':
    'Die Fehlerspanne, die {pollster}{poll, select, earlier { für die frühere Umfrage} other {}} angibt, lässt sich nicht von einer unterscheiden, die die Gewichtung außer Acht lässt, und wurde nicht verwendet.',
  'one-deff': 'Ein einziger Designeffekt für alle Anteile und Unterschiede ist eine Näherung.',
  test: 'Zweiseitiger Test bei {level} Sicherheit: {z, select, none {{p}} other {z = {z}, {p}}}.',
  family:
    'Er ist einer von {count} gemeinsam durchgeführten Tests, mit Niveaus nach dem Verfahren von Holm; danach angepasst {pAdjusted}.',
  'second-test':
    'Zweiter Test ({name}): {measure, select, p {{p}} other {{low} bis {high} Prozentpunkte}}, {passes, select, yes {bestanden} other {nicht bestanden}}.',
  rounding: `Rundung der veröffentlichten Werte: ±${points('rounding')} berücksichtigt.`,
  'breaking-deff':
    '{settled, select, yes {Mit den veröffentlichten Werten würde das Ergebnis den Test ab einem Designeffekt von {breaking} nicht mehr bestehen.} other {Mit den veröffentlichten Werten würde das Ergebnis den Test nur bei einem Designeffekt unter {breaking} bestehen.}}',
  'breaking-factor':
    '{settled, select, yes {Mit den veröffentlichten Werten würde das Ergebnis den Test nicht mehr bestehen, wenn beide Designeffekte mindestens {breaking}-mal so groß wären.} other {Mit den veröffentlichten Werten würde das Ergebnis den Test nur bestehen, wenn beide Designeffekte weniger als {breaking}-mal so groß wären.}}',
  'lower-deff': 'Am unteren Ende der Spanne des Designeffekts würde es den Test bestehen.',
  detectable: `{claim, select, lead {Ein tatsächlicher Abstand} change {Eine tatsächliche Veränderung} leadChange {Eine tatsächliche Veränderung des Abstands} netScore {Ein tatsächlicher Saldo} netScoreChange {Eine tatsächliche Veränderung des Saldos} gap {Ein tatsächlicher Abstand} other {Ein tatsächlicher Abstand zur Hürde}} von ${ofPoints('detectable')} wäre in vier von fünf Fällen gefunden worden.`,
  'little-changed': `Wenig Veränderung: Beide einseitigen Tests gegen eine Veränderung von ${ofPoints('indifference')}, vorab festgelegt, sind bestanden.`,
  exaggerated: 'Veränderungen, die einen solchen Test bestehen, sind im Mittel etwas übertrieben.',
  untested: 'Es wurde kein Test durchgeführt.',
  source: 'Quelle: {url}',
  engine: 'Berechnet mit dem Rechenkern {engine} und den Textvorlagen {templateVersion}.',
  'before-a-vote':
    'Umfragen messen die Meinung zur Zeit der Befragung. Örtliches Recht kann einschränken, was wann veröffentlicht wird: Das klären die Rechtsabteilung des Hauses und die Wahlbehörde. Amtliche Ergebnisse sind die, die die Wahlbehörde feststellt.',
  opinion: 'Umfragen messen die Meinung zur Zeit der Befragung.',
};
