/**
 * Pieces that German messages share; every message that is built with them is a whole sentence. Names carry no case
 * and no article: they stand after a preposition or in apposition.
 */

/** Whom the poll asked, where that is known: " unter Erwachsenen". */
export const AMONG = '{populated, select, yes { {ofWhom}} other {}}';

export const POLL = `Umfrage von {pollster}${AMONG}`;

/** The earlier poll; its dates carry their own "vom … bis …". */
export const IN_EARLIER =
  '{samePollster, select, yes {in der Umfrage desselben Instituts {prevDates}} other {in der Umfrage von {prevPollster} {prevDates}}}';

export const ASKED = '{asked, select, everyone { aller Befragten} other {}}';

/** After "von": the dative. */
export const ofPoints = (slot: string) =>
  `{${slot}} {${slot}Count, plural, one {Prozentpunkt} other {Prozentpunkten}}`;
/** After "±" and beside "mehr": the nominative or accusative. One in words comes in the dative. */
export const points = (slot: string) =>
  `{${slot}, select, einem {ein} other {{${slot}}}} {${slot}Count, plural, one {Prozentpunkt} other {Prozentpunkte}}`;

export const WEIGHTING = '{design, select, clustered {die Klumpung} other {die Gewichtung}}';

const ALLOWED_FOR =
  '{design, select, unweighted {Rundung} clustered {Rundung und Klumpung} other {Rundung und Gewichtung}}';

/** After a noun of any gender in the singular. */
export const LARGER = `ist größer, als der Stichprobenfehler allein ihn üblicherweise erzeugt, auch wenn man ${ALLOWED_FOR} berücksichtigt`;
export const LARGER_OF_ONE =
  'wäre selbst dann größer, als ihn der Zufall üblicherweise erzeugt, wenn der Gesamtfehler der Umfrage das Doppelte ihres Stichprobenfehlers betrüge';
export const LARGER_OF_TWO =
  'wäre selbst dann größer, als ihn der Zufall üblicherweise erzeugt, wenn der Gesamtfehler der Umfragen das Doppelte ihres Stichprobenfehlers betrüge';

export const UNSETTLED = 'doch sie kann das nicht entscheiden';
export const UNSETTLED_BY_TWO = 'doch die beiden Umfragen können das nicht entscheiden';
export const UNSETTLED_POLLS = 'doch die Umfragen von {pollsters} können das nicht entscheiden';

/** What a claim is of, after "für". */
export const QUANTITY =
  '{claim, select, lead {den Abstand zwischen {a} und {b}} change {die Veränderung} leadChange {die Veränderung des Abstands} netScore {den Saldo} netScoreChange {die Veränderung des Saldos} gap {den Abstand zwischen den beiden Gruppen} other {den Abstand zur {line}}}';
/** The same where the line is short. */
export const SHORT_QUANTITY =
  '{claim, select, lead {den Abstand} change {die Veränderung} leadChange {die Veränderung des Abstands} netScore {den Saldo} netScoreChange {die Veränderung des Saldos} gap {den Abstand zwischen den Gruppen} other {den Abstand zur {line}}}';

export const RANGE_RUNS =
  '{basis, select, sampling {Unter Berücksichtigung des Stichprobenfehlers reicht die Spanne} modelled {Nach dem Modell des Instituts selbst reicht die Spanne} other {Wäre die Stichprobe zufällig gezogen, reichte die Spanne}}';
export const RANGE_OF_TWO_RUNS = `{basis, select, sampling {Unter Berücksichtigung des Stichprobenfehlers reicht die Spanne} modelled {Nach dem Modell des Instituts selbst reicht die Spanne} other {Wären die Stichproben zufällig gezogen, reichte die Spanne}}`;

/** Who or what could have produced a difference, as the basis allows it to be said. */
export const chanceAlone = (could: string, inSample: string) =>
  `{basis, select, sampling {Der Stichprobenfehler allein könnte ${could}} modelled {Nach dem Modell des Instituts selbst könnte der Zufall allein ${could}} other {Der Zufall allein könnte ${inSample} ${could}}}`;

export const upOrDown = (write: (noun: 'Zuwachs' | 'Rückgang') => string) =>
  `{direction, select, more {${write('Zuwachs')}} other {${write('Rückgang')}}}`;
export const higherOrLower = (write: (stem: 'höher' | 'niedriger') => string) =>
  `{direction, select, more {${write('höher')}} other {${write('niedriger')}}}`;
export const aboveOrBelow = (write: (place: 'über' | 'unter') => string) =>
  `{side, select, above {${write('über')}} other {${write('unter')}}}`;
