import { ES_CHANGES } from './es-changes';
import { ES_NUMBERS } from './es-counts';
import { ES_FIGURES } from './es-figures';
import { ES_LEADS } from './es-leads';
import { ES_POLLS } from './es-polls';
import { ES_SMALL_WORDS } from './es-small-words';
import { ES_WORDS } from './es-words';
import { listed } from './listed';
import type { Lexicon } from './types';

const SIDES = listed(`el | al | del | un`);
const BACKING = listed(`apoya | apoyan | respalda | respaldan | defiende | defienden | aprueba | aprueban`);
const REFUSING = listed(`rechaza | rechazan | se opone | se oponen`);
const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));

/** How people say the answers of a referendum; an answer said outright goes before what is backed. */
const YES = [
  ...each(SIDES, ['sí', 'voto afirmativo']),
  ...each([...BACKING, 'votaría', 'votarían', 'vota', 'votan'], ['el sí', 'sí']),
  ...each(BACKING, listed(`el | la | los | las | que | cobrar`)),
  ...listed(`a favor | partidarios del sí | dice sí | dicen sí | dice que sí | dicen que sí`),
];
const NO = [
  ...each(SIDES, ['no', 'voto negativo']),
  ...each([...BACKING, 'votaría', 'votarían', 'vota', 'votan'], ['el no', 'no']),
  ...each(REFUSING, listed(`el | la | los | las | que | al | a`)),
  ...listed(`en contra | partidarios del no | dice no al | dicen no al | dice que no | dicen que no`),
];

/** Spanish, as written on both sides of the ocean; decimal points are read too. */
export const ES_LEXICON: Lexicon = {
  decimalMark: ',',
  locale: 'es-ES',
  groupsBySpace: true,
  elisions: [],
  abbreviations: listed(
    `sr | sra | dr | dra | ee | uu | pag | art | num | aprox | d | dña | gob | ud | uds | vs`,
  ),
  numbers: ES_NUMBERS,
  oneArticles: ['un', 'una'],
  fractions: {
    'dos tercios': 200 / 3,
    'dos terceras partes': 200 / 3,
    'tres cuartos': 75,
    'tres cuartas partes': 75,
    'un tercio': 100 / 3,
    'una tercera parte': 100 / 3,
    'la tercera parte': 100 / 3,
    'un cuarto': 25,
    'una cuarta parte': 25,
    'la cuarta parte': 25,
    'un quinto': 20,
    'una quinta parte': 20,
    'la quinta parte': 20,
    'dos quintos': 40,
    'tres quintos': 60,
    'cuatro quintos': 80,
    'una decima parte': 10,
    'la mitad': 50,
  },
  inEvery: ['de cada', 'de entre'],
  to: ['a', 'al', 'frente a', 'frente al', 'por', 'y', '–', '-', 'contra'],
  datesAreNames: false,
  capitalsAreNames: true,
  months: [
    ['enero'],
    ['febrero'],
    ['marzo'],
    ['abril'],
    ['mayo'],
    ['junio'],
    ['julio'],
    ['agosto'],
    ['septiembre', 'setiembre'],
    ['octubre'],
    ['noviembre'],
    ['diciembre'],
  ],
  weekdays: [['domingo'], ['lunes'], ['martes'], ['miercoles'], ['jueves'], ['viernes'], ['sabado']],
  nameNouns: {
    approve: listed(
      `aprobación del gobernador | aprobación de la gobernadora | aprobación | aprueba | aprueban`,
    ),
    disapprove: listed(`desaprobación del gobernador | desaprobación | desaprueba | desaprueban`),
    aprueba: listed(`aprobación | aprueban`),
    desaprueba: listed(`desaprobación | desaprueban`),
    yes: YES,
    si: YES,
    no: NO,
    "don't know": listed(`indecisos | los indecisos | no sabe | no saben`),
  },
  commonNames:
    listed(` | no | sí | otro | otros | otra | ninguno | ninguna | indecisos | mejor | peor | a favor | en contra
           `),
  afterCommonName: listed(`
    aventaja | gana | supera | lidera | obtiene | tiene | cae | sube | baja | pierde | recibe | suma | al |
    con | , | . | : | ; | ) | ! | " | ( | va | se | sigue | por | encabeza | sobre | frente | y | en | que |
    fue | o | es | más | desde | entre | a | para | de`),
  genericNameWords: listed(
    `partido | el | la | lista | alianza | unión | liga | movimiento | coalición | party | the | list | alliance | union | league`,
  ),
  notNames: listed(`
    el | la | los | las | un | una | unos | unas | en | de | del | al | a | por | para | con | sin | sobre |
    entre | y | o | pero | si | no | que | se | su | sus | lo | le | les | como | cuando | donde | quien | cual
    | esta | este | estos | estas | esa | ese | segun | tras | ante | desde | hasta | hoy | ayer | ahora | ya |
    solo | mas | menos | muy | tan | asi | aun | ni | nadie | ninguno | ambos | dos | tres | cuatro | cinco |
    encuesta | encuestas | sondeo | sondeos | datos | cifras | ventaja | diferencia | carrera | mayoria |
    sigue | siguen | continua | va | van | queda | quedan | aparece | vuelve | tiene | tienen | obtiene | logra
    | saca | mantiene | nueva | nuevo | fuerte | clara | claro | gran | leve | ligera | ligero | tambien |
    mientras | aunque | porque | durante | cada | ha | han | es | son | apoyo | respaldo`),
  cues: { ...ES_LEADS, ...ES_CHANGES, ...ES_FIGURES, ...ES_POLLS, ...ES_WORDS, ...ES_SMALL_WORDS },
  populations: {
    adults: 'personas adultas',
    'registered-voters': 'personas inscritas para votar',
    'likely-voters': 'votantes probables',
  },
  replacements: {
    isAheadUnsettled: 'tiene una cifra más alta que {b} en este sondeo, que no permite darlo por seguro',
    aheadNow: 'con ventaja',
    isAhead: 'aventaja a {b}',
    leads: 'aventaja',
    trails: 'tiene una cifra más baja',
    chanceGap: 'tiene la cifra más alta, pero el azar por sí solo podría producir esa diferencia',
    untestedGap: 'tiene la cifra más alta, en un sondeo sin margen de error reconocido',
    level: 'con la misma cifra en este sondeo',
    higherFigure: 'tiene la cifra más alta',
    higherUnsettled:
      'tiene una cifra más alta, {now} frente a {then}, pero los sondeos no permiten darlo por seguro',
    lowerUnsettled:
      'tiene una cifra más baja, {now} frente a {then}, pero los sondeos no permiten darlo por seguro',
    chanceChange: 'tiene ahora {now}, frente a {then}: el azar por sí solo podría producir esa diferencia',
    untestedChange: 'tiene ahora {now}, frente a {then}; el cambio no se puede contrastar',
    sameFigure: 'tiene la misma cifra que antes',
    isUp: 'sube',
    isDown: 'baja',
    points: '{n} puntos porcentuales',
    suggests: 'apunta',
    largerThanChance: 'mayor de lo que suele producir por sí solo el azar',
    couldBeChance: 'de un tamaño que el azar por sí solo podría producir',
    atShare: '{share}',
  },
};
