import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'majority'
  | 'most'
  | 'overHalf'
  | 'underHalf'
  | 'minority'
  | 'aboveThreshold'
  | 'belowThreshold'
  | 'thresholdNoun'
  | 'intoAssembly'
  | 'outOfAssembly'
  | 'marginNoun'
  | 'plusMinus'
  | 'withinMargin'
  | 'outsideMargin'
  | 'noMargin'
  | 'statSignificant'
  | 'significant'
  | 'clear'
  | 'sampleMarkers'
  | 'interviewed'
  | 'approximately'
  | 'almost'
  | 'decided'
  | 'percentWords'
  | 'pointWords'
  | 'sizeMarkers'
  | 'notShare';

const ASSEMBLY = listed(`la asamblea | el parlamento | la cámara | el pleno | el hemiciclo`);
const FIFTY = listed(`50 % | 50 por ciento | cincuenta por ciento | umbral de la mitad`);
const MOVING = listed(`
  sube | suben | subió | subido | baja | bajan | bajado | cae | caen | cayó | caído | crece | crecen |
  creció | crecido | gana | ganan | ganó | ganado | pierde | pierden | perdió | perdido | avanza |
  avanzado | aumenta | aumentado | mejora | mejorado | desciende | retrocede | cede | saca | aventaja |
  dispara | desploma | hunde | recupera`);
const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));

/** Spanish: halves, thresholds, margins, sizes and significance. */
export const ES_FIGURES: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  majority: [
    {
      say: listed(`
      mayoría | mayorías | mayoría absoluta | clara mayoría | amplia mayoría | mayoritario | mayoritaria |
      mayoritariamente`),
      notBefore: listed(`relativa | simple | silenciosa | parlamentaria | del`),
    },
  ],
  most: [{ say: ['la mayor parte', 'la gran parte'], notBefore: ['del', 'del tiempo'] }],
  overHalf: [
    {
      say: listed(`
      más de la mitad | por encima de la mitad | algo más de la mitad | poco más de la mitad | supera la
      mitad | rebasa la mitad | pasa de la mitad | pase de la mitad | sobrepasa la mitad | superan la
      mitad`),
    },
    {
      say: each(
        listed(`
        más del | por encima del | por encima de la barrera del | supera el | superan el | rebasa el | pasa del`),
        FIFTY,
      ),
    },
  ],
  underHalf: [
    {
      say: listed(`
      menos de la mitad | por debajo de la mitad | no llega a la mitad | no alcanza la mitad | algo menos
      de la mitad`),
    },
    {
      say: each(
        listed(`
        menos del | por debajo del | por debajo de la barrera del | no llega al | no alcanza el | no supera el`),
        FIFTY,
      ),
    },
  ],
  minority: [{ say: ['minoría', 'minoritario'], notBefore: ['étnica', 'lingüística', 'parlamentaria'] }],
  aboveThreshold: [
    {
      say: listed(`
      supera | superan | superaría | superarían | supere | por encima de | por encima del | rebasa |
      rebasaría | franquea | alcanza | alcanzan | alcanzaría | sobrepasa | salva | salvaría | llega al |
      llega a | llegaría al | pasa | pasaría | más del | más de`),
    },
  ],
  belowThreshold: [
    {
      say: listed(`
      por debajo de | por debajo del | bajo | no llega | no llegaría | no alcanza | no alcanzaría | no
      supera | no superaría | no pasa | no rebasa | menos del | menos de | inferior al | lejos de | lejos
      del`),
    },
  ],
  thresholdNoun: [{ say: listed(`umbral | barrera | mínimo | listón | corte`) }],
  intoAssembly: [
    {
      say: each(
        listed(`
        entra en | entran en | entraría en | entrarían en | accede a | accedería a | un sitio en | un
        escaño en | escaños en | vuelve a | sigue en | seguiría en`),
        ASSEMBLY,
      ),
      notBefore: ['elección', 'votación'],
    },
    {
      say: listed(`
      obtiene representación | obtendría representación | logra representación | lograría representación
      | consigue escaños | conseguiría escaños | obtendría escaños | logra escaños | lograría escaños`),
    },
  ],
  outOfAssembly: [
    { say: each(listed(`fuera de | sale de | saldría de`), [...ASSEMBLY]) },
    {
      say: listed(`
      queda fuera | quedaría fuera | se queda fuera | se quedaría fuera | fuera del parlamento | fuera
      del pleno | sin representación | sin escaños | extraparlamentario | extraparlamentaria`),
    },
  ],
  marginNoun: [
    {
      say: listed(`
      margen de error | márgenes de error | error muestral | error de muestreo | margen de error muestral
      | margen de error de muestreo | margen muestral`),
    },
  ],
  plusMinus: [{ say: listed(`± | más menos | más o menos | +/- | + / - | + o -`) }],
  withinMargin: [
    {
      say: listed(`
      dentro del margen | dentro de su margen | dentro de un margen | en el margen de error | inferior al
      margen | menor que el margen | por debajo del margen | dentro del error muestral`),
    },
  ],
  outsideMargin: [
    {
      say: listed(`
      fuera del margen | superior al margen | mayor que el margen | supera el margen | por encima del
      margen | rebasa el margen | excede el margen | más allá del margen`),
    },
  ],
  noMargin: [
    {
      say: listed(`
      sin margen de error | sin margen | no tiene margen de error | no tiene margen | ningún margen de
      error | ningún margen | no hay margen de error | no hay margen | carece de margen de error | carece
      de margen | sin error muestral | no da margen de error | no declara margen de error`),
    },
  ],
  statSignificant: [
    {
      say: listed(`
      estadísticamente significativo | estadísticamente significativa | estadísticamente significativos |
      estadísticamente significativas | significación estadística | significancia estadística |
      estadísticamente fiable | estadísticamente claro | estadísticamente clara`),
    },
  ],
  significant: [
    {
      say: listed(`
      significativo | significativa | significativos | significativas | significativamente | no se debe
      al azar | no es casualidad | no es fruto del azar`),
    },
  ],
  clear: [
    {
      say: listed(`
      clara subida | clara bajada | claro ascenso | claro descenso | clara caída | claro avance | clara
      victoria | clara mayoría | decisivo | decisiva | contundente | inequívoco | inequívoca |
      indiscutible`),
    },
  ],
  sampleMarkers: [
    { say: listed(`muestra de | muestra es de | muestra fue de | n = | n= | basado en | basada en`) },
  ],
  interviewed: [
    {
      say: listed(`
      preguntó a | preguntado a | entrevistó a | entrevistado a | encuestó a | encuestado a | consultó a |
      consultado a | entrevistas a | sondeó a | respuestas de`),
    },
  ],
  approximately: [
    {
      say: listed(`
      unos | unas | casi | cerca de | alrededor de | en torno a | aproximadamente | más de | menos de |
      hasta | al menos`),
    },
  ],
  almost: [
    {
      say: listed(`
      casi | cerca de | alrededor de | en torno a | aproximadamente | más de | menos de | poco más de |
      poco menos de | apenas | algo más de | algo menos de`),
    },
  ],
  decided: [
    {
      say: listed(`
      votantes decididos | excluidos los indecisos | excluyendo a los indecisos | sin contar a los
      indecisos | sin los indecisos | sin indecisos | entre los decididos | voto válido | votos válidos |
      de quienes eligen`),
    },
  ],
  percentWords: [{ say: listed(`% | por ciento | por cien`) }],
  pointWords: [
    {
      say: listed(`puntos porcentuales | punto porcentual | puntos | punto | pp | p . p .`),
      notBefore: ['de vista', 'de partida'],
    },
  ],
  sizeMarkers: [
    {
      say: listed(
        `en | de | del | por | en un | de un | en unos | en casi | de casi | por unos | solo | otro | otros`,
      ),
    },
    { say: ['un', 'hasta un'], after: MOVING },
  ],
  notShare: [
    {
      say: listed(`
      de confianza | confianza | umbral | de participación | participación | intervalo | de probabilidad |
      escrutado | de las actas | de descuento | de respuesta | necesario | necesarios`),
    },
  ],
};
