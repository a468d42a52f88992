/**
 * Pieces that French messages share; every message that is built with them is a whole sentence. Names are never put
 * after "de", "que" or "à", which would have to elide or contract with them.
 */

/** Whom the poll asked, where that is known: " auprès de personnes adultes". */
export const AMONG = '{populated, select, yes { {ofWhom}} other {}}';

export const POLL = `sondage {pollster}${AMONG}`;

/** The earlier poll; its dates carry their own "du … au …". */
export const IN_EARLIER =
  '{samePollster, select, yes {dans son sondage {prevDates}} other {dans le sondage {prevPollster} {prevDates}}}';

export const ASKED = '{asked, select, everyone { de l’ensemble des personnes interrogées} other {}}';

const unit = (slot: string) => `{${slot}Count, plural, one {point} other {points}}`;
/** A difference at its first mention. */
export const percentagePoints = (slot: string) => `{${slot}} ${unit(slot)} de pourcentage`;
/** A difference once it is clear of what. */
export const points = (slot: string) => `{${slot}} ${unit(slot)}`;

/** "de", or "d’" before a number in words that begins with a vowel. */
export const of = (slot: string) => `{${slot}, select, un {d’un} other {de {${slot}}}}`;
export const ofPercentagePoints = (slot: string) => `${of(slot)} ${unit(slot)} de pourcentage`;
export const ofPoints = (slot: string) => `${of(slot)} ${unit(slot)}`;

export const WEIGHTING = '{design, select, clustered {le tirage en grappes} other {la pondération}}';

const ALLOWED_FOR =
  '{design, select, unweighted {de l’arrondi} clustered {de l’arrondi et du tirage en grappes} other {de l’arrondi et de la pondération}}';

/** After a masculine or feminine noun alike. */
export const LARGER = `dépasse ce que l’erreur d’échantillonnage produit d’ordinaire à elle seule, même compte tenu ${ALLOWED_FOR}`;
export const LARGER_OF_ONE =
  'dépasserait ce que le hasard produit d’ordinaire, même si l’erreur totale du sondage était le double de son erreur d’échantillonnage';
export const LARGER_OF_TWO =
  'dépasserait ce que le hasard produit d’ordinaire, même si l’erreur totale des sondages était le double de leur erreur d’échantillonnage';

export const UNSETTLED = 'mais le sondage ne permet pas de trancher';
export const UNSETTLED_BY_TWO = 'mais les deux sondages ne permettent pas de trancher';
export const UNSETTLED_POLLS = 'mais les sondages {pollsters} ne permettent pas de trancher';

/** What a claim is of. */
export const QUANTITY =
  '{claim, select, lead {l’écart entre {a} et {b}} change {l’évolution} leadChange {l’évolution de l’écart} netScore {le solde net} netScoreChange {l’évolution du solde net} gap {l’écart entre les deux groupes} other {la distance à la {line}}}';
/** The same where the line is short. */
export const SHORT_QUANTITY =
  '{claim, select, lead {l’écart} change {l’évolution} leadChange {l’évolution de l’écart} netScore {le solde net} netScoreChange {l’évolution du solde net} gap {l’écart entre les groupes} other {la distance à la {line}}}';

const runs = (sample: string) =>
  `{basis, select, sampling {Compte tenu de l’erreur d’échantillonnage, la fourchette va} modelled {Selon le modèle de l’institut lui-même, la fourchette va} other {Si ${sample}, la fourchette irait}}`;
export const RANGE_RUNS = runs('l’échantillon avait été aléatoire');
export const RANGE_OF_TWO_RUNS = runs('les échantillons avaient été aléatoires');

/** Who or what could have produced a difference, as the basis allows it to be said. */
export const chanceAlone = (could: string, inSample: string) =>
  `{basis, select, sampling {L’erreur d’échantillonnage pourrait à elle seule ${could}} modelled {Selon le modèle de l’institut lui-même, le hasard pourrait à lui seul ${could}} other {Le hasard pourrait à lui seul ${could}, même ${inSample}}}`;

export const upOrDown = (write: (noun: 'hausse' | 'baisse') => string) =>
  `{direction, select, more {${write('hausse')}} other {${write('baisse')}}}`;
export const higherOrLower = (write: (word: 'élevé' | 'bas') => string) =>
  `{direction, select, more {${write('élevé')}} other {${write('bas')}}}`;
export const aboveOrBelow = (write: (place: 'au-dessus' | 'au-dessous') => string) =>
  `{side, select, above {${write('au-dessus')}} other {${write('au-dessous')}}}`;
