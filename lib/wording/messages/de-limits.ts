import type { LanguagePack } from '../language-pack';
import { ofPoints, RANGE_OF_TWO_RUNS, RANGE_RUNS, WEIGHTING } from './de-parts';

const LOW = ofPoints('low');
const HIGH = ofPoints('high');
const LEAD_RANGE = `${RANGE_RUNS} von {span, select, across {${LOW} mehr für {b} bis zu ${HIGH} mehr für {a}.} other {{low} bis zu ${HIGH} mehr für {a}.}}`;
const CHANGE_RANGE = `${RANGE_OF_TWO_RUNS} von {span, select, across {einem Rückgang von ${LOW} bis zu einem Zuwachs von ${HIGH}.} above {einem Zuwachs von ${LOW} bis zu einem Zuwachs von {high}.} other {einem Rückgang von ${HIGH} bis zu einem Rückgang von {low}.}}`;

/** Range, detectable difference, and the reasons why a finding is fragile or was not tested, in German. */
export const DE_LIMITS: Pick<LanguagePack, 'range' | 'detectable' | 'fragile' | 'untested'> = {
  range: {
    lead: LEAD_RANGE,
    change: CHANGE_RANGE,
    'lead-change': `${RANGE_OF_TWO_RUNS} von {span, select, across {${LOW} zugunsten von {away} bis zu ${HIGH} zugunsten von {toward}.} other {{low} bis zu ${HIGH} zugunsten von {toward}.}}`,
    threshold: `${RANGE_RUNS} von {low} bis {high}.`,
    'net-score': LEAD_RANGE,
    'net-score-change': CHANGE_RANGE,
    gap: `${RANGE_OF_TWO_RUNS} von {span, select, across {${LOW} mehr unter {h} bis zu ${HIGH} mehr unter {g}.} other {{low} bis zu ${HIGH} mehr unter {g}.}}`,
  },
  detectable: `{claim, select, gap {Ein tatsächlicher Abstand} other {Eine tatsächliche Veränderung}} von ${ofPoints('detectable')} wäre in vier von fünf Fällen gefunden worden; kleinere bleiben oft unentdeckt.`,
  fragile: {
    'as-printed':
      'Mit den veröffentlichten Werten geht {claim, select, lead {der Abstand} change {die Veränderung} leadChange {die Veränderung des Abstands} netScore {der Abstand} netScoreChange {die Veränderung des Saldos} gap {der Abstand} other {der Abstand zur {line}}} über das hinaus, was {basis, select, sampling {der Stichprobenfehler allein üblicherweise erzeugt} modelled {nach dem Modell des Instituts selbst der Zufall allein üblicherweise erzeugt} other {in einer Zufallsstichprobe der Zufall allein üblicherweise erzeugt}}.',
    rounding: 'Die Rundung der veröffentlichten Werte könnte das hinfällig machen.',
    'design-effect': `{deffSource, select, assumed {Kostet ${WEIGHTING} mehr Genauigkeit, als {newsroom} annimmt, könnte das hinfällig sein.} kish {Kostet die Gewichtung mehr Genauigkeit, als die Gewichte allein anzeigen, könnte das hinfällig sein.} other {Kostet ${WEIGHTING} so viel Genauigkeit, wie es die Fehlerspanne des Instituts höchstens zulässt, könnte das hinfällig sein.}}`,
    'second-test': 'Ein zweiter anerkannter Test bestätigt das mit denselben Werten nicht.',
    together: `Die Rundung und ein höherer Verlust an Genauigkeit durch ${WEIGHTING} könnten das zusammen hinfällig machen, einzeln aber nicht.`,
    modelled:
      'Die Stichprobe wurde nicht zufällig gezogen; das Ergebnis beruht auf dem Modell, mit dem das Institut selbst seinen Fehler schätzt.',
    comparison:
      'Die Stichprobe wurde nicht zufällig gezogen; das Ergebnis ist nur zum Vergleich so berechnet, als wäre sie es.',
  },
  untested: {
    'no-sample-size':
      '{which, select, both {Keine der beiden Umfragen sagt, wie viele Personen befragt wurden; eine Fehlerspanne lässt sich nicht berechnen.} previous {Die frühere Umfrage sagt nicht, wie viele Personen befragt wurden; eine Fehlerspanne lässt sich nicht berechnen.} other {Die Umfrage sagt nicht, wie viele Personen befragt wurden; eine Fehlerspanne lässt sich nicht berechnen.}}',
    'no-sampling-basis':
      '{which, select, both {Dass die beiden Stichproben zufällig gezogen wurden, ist nicht bekannt, und für solche Stichproben ist keine Fehlerspanne anerkannt.} previous {Dass die Stichprobe der früheren Umfrage zufällig gezogen wurde, ist nicht bekannt, und für eine solche Stichprobe ist keine Fehlerspanne anerkannt.} other {{drawn, select, unknown {Wie die Stichprobe gezogen wurde, ist nicht angegeben; eine Fehlerspanne für den Stichprobenfehler lässt sich nicht angeben.} other {Die Stichprobe wurde nicht zufällig gezogen, und für eine solche Stichprobe ist keine Fehlerspanne anerkannt.}}}}',
    'too-small':
      'Rechnet man die Gewichtung ein, wurden zu wenige Personen befragt, als dass {claim, select, threshold {ein Vergleich mit der {line}} other {ein Vergleich}} viel besagen würde.',
    'few-clusters':
      'Die Interviews stammen aus zu wenigen Orten, um eine Fehlerspanne verlässlich zu berechnen.',
    'not-comparable':
      '{offered, select, no {Die frühere Umfrage bot nicht dieselben Antworten an; die beiden werden nicht verglichen.} other {Die beiden Stichproben wurden nicht auf dieselbe Weise gezogen; die beiden Umfragen werden nicht verglichen.}}',
    'not-disclosed':
      '{which, select, previous {Die frühere Umfrage veröffentlicht nicht alle Werte, die der Vergleich braucht.} other {Nicht alle Werte, die der Vergleich braucht, sind veröffentlicht.}}',
    'shared-waves':
      'Die beiden Umfragen haben Interviews gemeinsam, die sich nicht trennen lassen; die Veränderung zwischen ihnen lässt sich nicht berechnen.',
    'same-people':
      'Beide Male wurden dieselben Personen befragt, und wie viele von ihnen ihre Antwort geändert haben, ist nicht veröffentlicht.',
    'independent-margin': `Zwei getrennte Stichproben dieser Größe hätten hier eine Fehlerspanne von ±${ofPoints('independent')}; die von zweimal Befragten ist nicht bekannt.`,
    'rebased-size':
      'Die Anteile lassen Personen ohne Festlegung außer Acht, und wie viele übrig blieben, ist nicht veröffentlicht.',
    'other-base': 'Die Regel hinter der {line} zählt andere Personen als diese Anteile.',
    'below-presentation-standard': 'Mindestens eine der Gruppen ist zu klein, um ihren Anteil zu zeigen.',
    'no-sign-of-error':
      'Das heißt nicht, dass die Werte falsch sind; es heißt, dass sich {claim, select, lead {der Abstand zwischen ihnen} change {eine Veränderung} leadChange {eine Veränderung des Abstands} netScore {der Abstand zwischen ihnen} netScoreChange {eine Veränderung des Saldos} gap {der Abstand zwischen den Gruppen} other {der Abstand zur {line}}} nicht prüfen lässt.',
  },
};
