import type { LanguagePack } from '../language-pack';
import { percentagePoints, points, RANGE_OF_TWO_RUNS, RANGE_RUNS, WEIGHTING } from './es-parts';

const LOW = points('low');
const HIGH = points('high');
const LEAD_RANGE = `${RANGE_RUNS} de {span, select, across {${LOW} más para {b} a ${HIGH} más para {a}.} other {{low} a ${HIGH} más para {a}.}}`;
const CHANGE_RANGE = `${RANGE_OF_TWO_RUNS} de {span, select, across {una bajada de ${LOW} a una subida de ${HIGH}.} above {una subida de ${LOW} a otra de {high}.} other {una bajada de ${HIGH} a otra de {low}.}}`;

/** Range, detectable difference, and the reasons why a finding is fragile or was not tested, in Spanish. */
export const ES_LIMITS: Pick<LanguagePack, 'range' | 'detectable' | 'fragile' | 'untested'> = {
  range: {
    lead: LEAD_RANGE,
    change: CHANGE_RANGE,
    'lead-change': `${RANGE_OF_TWO_RUNS} de {span, select, across {${LOW} en favor de {away} a ${HIGH} en favor de {toward}.} other {{low} a ${HIGH} en favor de {toward}.}}`,
    threshold: `${RANGE_RUNS} del {low} al {high}.`,
    'net-score': LEAD_RANGE,
    'net-score-change': CHANGE_RANGE,
    gap: `${RANGE_OF_TWO_RUNS} de {span, select, across {${LOW} más entre {h} a ${HIGH} más entre {g}.} other {{low} a ${HIGH} más entre {g}.}}`,
  },
  detectable: `{claim, select, gap {Una diferencia real} other {Un cambio real}} de ${percentagePoints('detectable')} se habría detectado cuatro de cada cinco veces; los valores menores se escapan a menudo.`,
  fragile: {
    'as-printed':
      'Con las cifras publicadas, {claim, select, lead {la diferencia es mayor} change {el cambio es mayor} leadChange {el cambio de la diferencia es mayor} netScore {la diferencia es mayor} netScoreChange {el cambio del saldo neto es mayor} gap {la diferencia es mayor} other {la distancia a la {line} es mayor}} de lo que {basis, select, sampling {suele producir por sí solo el error de muestreo} modelled {suele producir por sí solo el azar según el modelo del propio instituto} other {suele producir por sí solo el azar en una muestra aleatoria}}.',
    rounding: 'El redondeo de las cifras publicadas podría invalidar ese resultado.',
    'design-effect': `{deffSource, select, assumed {Si ${WEIGHTING} costara más precisión de la que supone {newsroom}, ese resultado podría quedar invalidado.} kish {Si la ponderación costara más precisión de la que indican los pesos por sí solos, ese resultado podría quedar invalidado.} other {Si ${WEIGHTING} costara tanta precisión como admite el extremo alto de lo que implica el margen del instituto, ese resultado podría quedar invalidado.}}`,
    'second-test': 'Una segunda prueba aceptada, con las mismas cifras, no lo confirma.',
    together: `El redondeo y un mayor coste de precisión por ${WEIGHTING} podrían invalidar juntos ese resultado, aunque ninguno bastaría por separado.`,
    modelled:
      'La muestra no se eligió al azar, de modo que el resultado descansa en el modelo con que el propio instituto estima su error.',
    comparison:
      'La muestra no se eligió al azar; el resultado se calcula como si así hubiera sido, solo a efectos de comparación.',
  },
  untested: {
    'no-sample-size':
      '{which, select, both {Ninguno de los dos sondeos dice a cuántas personas se preguntó, así que no se puede calcular un margen de error.} previous {El sondeo anterior no dice a cuántas personas se preguntó, así que no se puede calcular un margen de error.} other {El sondeo no dice a cuántas personas se preguntó, así que no se puede calcular un margen de error.}}',
    'no-sampling-basis':
      '{which, select, both {No consta que las dos muestras se eligieran al azar, y para esas muestras no se reconoce ningún margen de error de muestreo.} previous {No consta que la muestra del sondeo anterior se eligiera al azar, y para una muestra así no se reconoce ningún margen de error de muestreo.} other {{drawn, select, unknown {No se indica cómo se eligió la muestra, así que no se le puede atribuir ningún margen de error de muestreo.} other {La muestra no se eligió al azar, y para una muestra así no se reconoce ningún margen de error de muestreo.}}}}',
    'too-small':
      'Una vez descontada la ponderación, se preguntó a muy pocas personas para que {claim, select, threshold {un contraste con la {line}} other {una comparación}} diga gran cosa.',
    'few-clusters':
      'Las entrevistas proceden de muy pocos lugares para calcular con fiabilidad un margen de error.',
    'not-comparable':
      '{offered, select, no {El sondeo anterior no ofrecía las mismas respuestas, así que no se comparan.} other {Las dos muestras no se eligieron del mismo modo, así que los dos sondeos no se comparan.}}',
    'not-disclosed':
      '{which, select, previous {El sondeo anterior no difunde todas las cifras que exige la comparación.} other {No se difunden todas las cifras que exige la comparación.}}',
    'shared-waves':
      'Los dos sondeos comparten entrevistas que no se pueden separar, así que el cambio entre ambos no se puede calcular.',
    'same-people':
      'Se preguntó las dos veces a las mismas personas, y no se ha difundido cuántas cambiaron de respuesta.',
    'independent-margin': `Dos muestras separadas de este tamaño tendrían aquí un margen de ±${points('independent')}; el de personas a las que se pregunta dos veces no se conoce.`,
    'rebased-size':
      'Los porcentajes excluyen a quienes no eligieron, y no se ha difundido cuántas personas quedaron.',
    'other-base': 'La regla de la {line} cuenta a otras personas que estos porcentajes.',
    'below-presentation-standard':
      'Al menos uno de los grupos es demasiado pequeño para mostrar su porcentaje.',
    'no-sign-of-error':
      'Eso no indica que las cifras sean erróneas; significa que {claim, select, lead {la diferencia entre ellas} change {un cambio} leadChange {un cambio de la diferencia} netScore {la diferencia entre ellas} netScoreChange {un cambio del saldo neto} gap {la diferencia entre los grupos} other {la distancia a la {line}}} no se puede contrastar.',
  },
};
