/** Pieces that Spanish messages share; every message that is built with them is a whole sentence. */

/** Whom the poll asked, where that is known: " entre votantes probables". */
export const AMONG = '{populated, select, yes { {ofWhom}} other {}}';

export const THIS_POLL = `este sondeo de {pollster}${AMONG}`;
export const THIS_POLL_START = `Este sondeo de {pollster}${AMONG}`;

/** The earlier poll; its dates carry their own "del … al …". */
export const IN_EARLIER =
  '{samePollster, select, yes {en su sondeo {prevDates}} other {en el sondeo de {prevPollster} {prevDates}}}';

export const ASKED = '{asked, select, everyone { de todas las personas encuestadas} other {}}';

/** A difference at its first mention. */
export const percentagePoints = (slot: string) =>
  `{${slot}} {${slot}Count, plural, one {punto porcentual} other {puntos porcentuales}}`;

/** A difference once it is clear of what. */
export const points = (slot: string) => `{${slot}} {${slot}Count, plural, one {punto} other {puntos}}`;

export const WEIGHTING = '{design, select, clustered {el muestreo por conglomerados} other {la ponderación}}';

const ALLOWED_FOR =
  '{design, select, unweighted {el redondeo} clustered {el redondeo y el muestreo por conglomerados} other {el redondeo y la ponderación}}';

export const LARGER = `mayor de lo que suele producir por sí solo el error de muestreo, incluso teniendo en cuenta ${ALLOWED_FOR}`;

export const LARGER_OF_ONE =
  'mayor de lo que suele producir el azar aunque el error total del sondeo fuera el doble de su error de muestreo';

export const LARGER_OF_TWO =
  'mayor de lo que suele producir el azar aunque el error total de los sondeos fuera el doble de su error de muestreo';

export const UNSETTLED = 'pero el sondeo no permite darlo por seguro';
export const UNSETTLED_BY_TWO = 'pero los dos sondeos no permiten darlo por seguro';

/** What a claim is of. */
export const QUANTITY =
  '{claim, select, lead {la diferencia entre {both}} change {el cambio} leadChange {el cambio de la diferencia} netScore {el saldo neto} netScoreChange {el cambio del saldo neto} gap {la diferencia entre los dos grupos} other {la distancia a la {line}}}';

const RUNS = (sample: string) =>
  `{basis, select, sampling {Teniendo en cuenta el error de muestreo, el intervalo va} modelled {Según el modelo del propio instituto, el intervalo va} other {Si ${sample}, el intervalo iría}}`;
export const RANGE_RUNS = RUNS('la muestra hubiera sido aleatoria');
export const RANGE_OF_TWO_RUNS = RUNS('las muestras hubieran sido aleatorias');

/** The same where the line is short. */
export const SHORT_QUANTITY =
  '{claim, select, lead {la diferencia} change {el cambio} leadChange {el cambio de la diferencia} netScore {el saldo neto} netScoreChange {el cambio del saldo neto} gap {la diferencia entre los grupos} other {la distancia a la {line}}}';

/** Who or what could have produced a difference, as the basis allows it to be said. */
export const chanceAlone = (could: string, inSample: string) =>
  `{basis, select, sampling {El error de muestreo por sí solo ${could}} modelled {Según el modelo del propio instituto, el azar por sí solo ${could}} other {El azar por sí solo ${could} incluso ${inSample}}}`;

export const upOrDown = (write: (verb: 'sube' | 'baja', noun: 'subida' | 'bajada') => string) =>
  `{direction, select, more {${write('sube', 'subida')}} other {${write('baja', 'bajada')}}}`;
export const higherOrLower = (write: (word: 'alto' | 'bajo', feminine: 'alta' | 'baja') => string) =>
  `{direction, select, more {${write('alto', 'alta')}} other {${write('bajo', 'baja')}}}`;
