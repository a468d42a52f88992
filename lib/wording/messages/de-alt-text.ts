import type { LanguagePack } from '../language-pack';
import { ofPoints, points, WEIGHTING } from './de-parts';

type End = (name: 'low' | 'high' | 'span') => string;
const near: End = (name) => name;
const wide: End = (name) => `wider${name.charAt(0).toUpperCase()}${name.slice(1)}`;

function ends(of: End): string {
  const [low, high, span] = [of('low'), of('high'), of('span')];
  const lead = `{${span}, select, across {${ofPoints(low)} mehr für {b} bis zu ${ofPoints(high)} mehr für {a}.} other {{${low}} bis zu ${ofPoints(high)} mehr für {a}.}}`;
  const gap = `{${span}, select, across {${ofPoints(low)} mehr unter {h} bis zu ${ofPoints(high)} mehr unter {g}.} other {{${low}} bis zu ${ofPoints(high)} mehr unter {g}.}}`;
  const move = `{${span}, select, across {${ofPoints(low)} zugunsten von {away} bis zu ${ofPoints(high)} zugunsten von {toward}.} other {{${low}} bis zu ${ofPoints(high)} zugunsten von {toward}.}}`;
  const change = `{${span}, select, across {minus {${low}} bis plus ${points(high)}.} above {plus {${low}} bis plus ${points(high)}.} other {minus {${high}} bis minus ${points(low)}.}}`;
  return `{claim, select, lead {${lead}} netScore {${lead}} leadChange {${move}} change {${change}} netScoreChange {${change}} gap {${gap}} other {{${low}} bis {${high}}.}}`;
}

/** What the chart shows, in German, for those who hear the page. */
export const DE_ALT_TEXT: LanguagePack['altText'] = {
  intro:
    '{claim, select, lead {Unsicherheitsdiagramm zum Abstand zwischen {a} und {b}, {race}.} change {Unsicherheitsdiagramm zur Veränderung für {option}, {race}.} leadChange {Unsicherheitsdiagramm zur Veränderung des Abstands zwischen {a} und {b}, {race}.} netScore {Unsicherheitsdiagramm zum Abstand zwischen {a} und {b}, {race}.} netScoreChange {Unsicherheitsdiagramm zur Veränderung des Saldos für die Antwort {name}, {race}.} gap {Unsicherheitsdiagramm zum Abstand zwischen {g} und {h} für {option}, {race}.} other {Unsicherheitsdiagramm für {option} an der {line}, {race}.}}',
  title: '{title}.',
  range: `Die Spanne mit {level} Sicherheit reicht von ${ends(near)}`,
  wider: `{basis, select, modelled {Im Rahmen der Rundung des angegebenen Intervalls könnte sie reichen von} other {Kostet ${WEIGHTING} mehr Genauigkeit, reicht sie von}} ${ends(wide)}`,
  fieldwork:
    '{pollsterStart} befragte {longSpan, select, day {am {startLong}} other {vom {startShort} bis zum {endLong}}} {sized, select, yes {{n} {population}} other {{population}}}{modeKnown, select, yes { {mode}} other {}}.',
};
