import type { Barred, Ladder } from '../ladder';

/** Per verdict, what Spanish headlines and chart titles stand on, strongest first. */
export const ES_LADDER: Ladder = {
  holds: [
    ...['ventaja', 'más frecuente', 'más apoyo', 'más respuestas', 'sube', 'baja', 'se ha movido'],
    ...['por encima', 'por debajo'],
  ],
  fragile: ['más alta', 'más baja', 'más alto', 'más bajo', 'más favorable', 'por encima', 'por debajo'],
  'does-not-hold': ['misma cifra', 'podría', 'demasiado cerca', 'poca variación', 'coincide exactamente'],
  'cannot-be-tested': [
    ...['sin margen de error reconocido', 'no se puede', 'no comparable', 'no difundida', 'omite'],
    ...['muy pocas', 'no dice'],
  ],
};

/** What Spanish may not say below a verdict. Common practice, no source; ties: as in English. */
export const ES_BARRED: Barred = {
  never: [
    ...['empates?(?: técnicos?)?', 'empatad[oa]s?', 'igualdad técnica', 'codo con codo', 'cara a cara'],
    ...['demasiado (?:reñid|igualad|ajustad)[oa]s?', 'se (?:dispara|desploma|hunde|derrumba)n?', 'arrasan?'],
    ...['impulso', 'vuelco', 'sin cambios', 'no cambian?', 'se mantienen?', 'estables?'],
    '(?:sondeos?|encuestas?|datos|cifras) (?:muestran?|demuestran?|prueban?|confirman?)',
    '(?:por ciento|%) de (?:ventaja|diferencia)',
  ],
  needsHolds: [
    ...[
      'aventajan?',
      'ventaja',
      'lideran?',
      'liderato',
      'encabezan?',
      'en cabeza',
      'favorit[oa]s?',
      'mayoría',
    ],
    ...['más frecuentes?', 'más apoyo', 'más respuestas', 'suben?', '(?<!más )baja', 'bajan', 'al alza'],
    ...['a la baja', 'crecen?', 'caen?', 'aumentan?', 'descienden?', 'ganan?', 'pierden?'],
    ...['la (?:subida|bajada)', 'el (?:alza|aumento|descenso|movimiento)', 'se han? movido'],
    'han? (?:subido|bajado|crecido|caído|aumentado|ganado|perdido)',
  ],
  needsFragile: [
    ...['por encima', 'por debajo', 'por delante', 'por detrás', 'más alt[oa]s?', 'más baj[oa]s?'],
    ...['más favorables?', 'más de la mitad', 'menos de la mitad'],
  ],
  needsTestPassed: ['significativ[oa]s?', 'significativamente'],
};
