import type { LanguagePack } from '../language-pack';
import { points } from './es-parts';

const DEFF =
  '{poll, select, earlier {Efecto de diseño del sondeo anterior} group {Efecto de diseño entre {group}} other {Efecto de diseño}}: {deff}';

/** How the finding was worked out, in Spanish. */
export const ES_METHOD_NOTE: LanguagePack['methodNote'] = {
  question: 'Pregunta formulada: «{question}»{ended, select, yes {} other {.}}',
  'no-choice': 'Sin elección: {shares}.',
  'compared-with':
    'Se compara con el sondeo de {prevPollster}{prevPopulated, select, yes { {prevOfWhom}} other {}}, {prevDatesLong}{prevSized, select, yes { (tamaño de la muestra: {prevN})} other { (tamaño de la muestra no difundido)}}.',
  'shared-waves':
    'Los dos sondeos son promedios de {window} oleadas cada uno, de las que comparten {shared}; solo las que no comparten forman la diferencia.{equal, select, yes { Se supone que todas las oleadas tienen el mismo número de entrevistas.} other {}}{pooled, select, yes { No se han difundido los porcentajes de cada oleada; los sustituye un único porcentaje conjunto.} other {}}',
  rebased: 'Los porcentajes se calculan sobre {rebasedN} personas que eligieron una opción.',
  bloc: '{source, select, printed {La cifra de {bloc} es la que dan las tablas del instituto para {members}.} other {La cifra de {bloc} es la suma de los porcentajes publicados de {members}.}}',
  'net-score':
    'Un saldo neto tiene el margen de una diferencia, no el de un porcentaje; se mueve dos puntos cuando un punto de opinión pasa de un lado al otro.',
  design: `${DEFF}, calculado a partir del diseño de la muestra.`,
  kish: `${DEFF} según los pesos por sí solos, tomado entre {deffLow} y {deffHigh}.`,
  stated: `${DEFF}, según declara {pollster}.`,
  implied: `${DEFF}, implícito en {stated, select, modelled {el intervalo modelizado} other {el margen}} que declara {pollster} (entre {deffLow} y {deffHigh} dentro de su redondeo).`,
  assumed: `${DEFF}, supuesto por {newsroom}{ranged, select, yes {, tomado entre {deffLow} y {deffHigh}} other {}}.`,
  'stated-margin-like-unweighted':
    'El margen que declara {pollster}{poll, select, earlier { para el sondeo anterior} other {}} no se distingue de uno que pasa por alto la ponderación y no se ha utilizado.',
  'one-deff':
    'Un único efecto de diseño global para todos los porcentajes y diferencias es una aproximación.',
  test: 'Prueba bilateral con una confianza del {level}: {z, select, none {{p}} other {z = {z}, {p}}}.',
  family:
    'Es una de {count} pruebas hechas en conjunto, con niveles según el método de Holm; con ese ajuste, {pAdjusted}.',
  'second-test':
    'Segunda prueba ({name}): {measure, select, p {{p}} other {de {low} a {high} puntos}}, {passes, select, yes {superada} other {no superada}}.',
  rounding: `Redondeo de las cifras publicadas: se admite ±${points('rounding')}.`,
  'breaking-deff':
    '{settled, select, yes {Con las cifras publicadas, el resultado dejaría de superar la prueba con un efecto de diseño de {breaking} o más.} other {Con las cifras publicadas, el resultado solo superaría la prueba con un efecto de diseño inferior a {breaking}.}}',
  'breaking-factor':
    '{settled, select, yes {Con las cifras publicadas, el resultado dejaría de superar la prueba si los dos efectos de diseño se multiplicaran por {breaking} o más.} other {Con las cifras publicadas, el resultado solo superaría la prueba si los dos efectos de diseño se multiplicaran por menos de {breaking}.}}',
  'lower-deff': 'En el extremo bajo del intervalo del efecto de diseño superaría la prueba.',
  detectable: `{claim, select, lead {Una diferencia real} change {Un cambio real} leadChange {Un cambio real de la diferencia} netScore {Un saldo neto real} netScoreChange {Un cambio real del saldo neto} gap {Una diferencia real} other {Una distancia real a la barrera}} de ${points('detectable')} se habría detectado cuatro de cada cinco veces.`,
  'little-changed': `Poca variación: se superan las dos pruebas unilaterales frente a un cambio de ${points('indifference')}, fijado de antemano.`,
  exaggerated: 'Los cambios que superan una prueba así están, en promedio, algo exagerados.',
  untested: 'No se ha hecho ninguna prueba.',
  source: 'Fuente: {url}',
  engine: 'Calculado con el motor de cálculo {engine} y los textos {templateVersion}.',
  'before-a-vote':
    'Los sondeos miden la opinión del momento. La ley local puede limitar qué se publica y cuándo: consúltese con la asesoría jurídica del medio y con la autoridad electoral. Los resultados oficiales son los que certifica la autoridad electoral.',
  opinion: 'Los sondeos miden la opinión del momento.',
};
