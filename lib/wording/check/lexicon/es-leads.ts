import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';
import { ES_COUNTS } from './es-counts';

type Groups =
  | 'leadStrong'
  | 'leadWeak'
  | 'leadStyle'
  | 'leadNoun'
  | 'trailStrong'
  | 'trailWeak'
  | 'second'
  | 'notional'
  | 'tied'
  | 'level'
  | 'plurality';

const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));

/** Spanish: being ahead, behind or level. */
export const ES_LEADS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  leadStrong: [
    {
      say: listed(`
      lidera | lideran | lideró | lideraba | liderando | liderar | encabeza | encabezan | encabezó |
      encabezaba | encabezando`),
      notBefore: listed(`el | la | los | las | un | una | su | al | otra | otro`),
    },
    {
      say: each(
        listed(`lidera | lideran | lideró | liderar | liderando | encabeza | encabezan | encabezó`),
        listed(`
        la carrera | la encuesta | las encuestas | el sondeo | los sondeos | la contienda | la intención | la
        votación | las preferencias | la elección | las elecciones | el referéndum | los apoyos | el voto | la
        clasificación | las intenciones`),
      ),
    },
    {
      say: listed(`
      en cabeza | a la cabeza | cabeza de las encuestas | primer lugar | primera posición | primer
      puesto | va primero | va primera | primera fuerza | fuerza más votada | va ganando | van
      ganando | va en primer lugar | al frente de la encuesta | al frente de las encuestas | al
      frente del sondeo | al frente de los sondeos | gana la encuesta | gana el sondeo | gana las
      encuestas | líder en | líder de la encuesta | líder de las encuestas | líder del sondeo | líder
      de los sondeos | es líder | puntero | puntera | lleva la delantera | toma la delantera | toma
      ventaja | claramente por delante | muy por delante | con claridad por delante`),
    },
    {
      say: listed(`
      aventaja | aventajan | aventajó | aventajaba | aventajando | se impone | se imponen | se
      impuso | se impondría | derrota a | vence a | bate a | gana a | gana al | ganan a | gana por |
      sobrepasa a | rebasa a | se adelanta a`),
    },
    {
      say: listed(`supera | superan | superó | superaba | superando`),
      notBefore: listed(`el | la | los | las | con | ampliamente | holgadamente | sus | su`),
    },
    {
      say: listed(`adelanta | adelantan | adelantó | adelantado`),
      notBefore: listed(`el | la | los | las | elecciones | que | su | sus`),
    },
    { say: listed(`saca | sacan | sacaba | le saca | le sacan`), before: ES_COUNTS },
  ],
  leadWeak: [
    {
      say: ['por delante'],
      notBefore: listed(`un | una | el | la | los | las | meses | semanas | días | mucho`),
      notAfter: listed(`tiene | tienen | queda | quedan | hay | pasar | pasa`),
    },
    { say: ['arriba'], after: listed(`punto | puntos | va | está | van | están | ligeramente | muy`) },
  ],
  leadStyle: [
    {
      say: listed(`
      por la mínima | por los pelos | con holgura | holgadamente | cómodamente | con comodidad |
      ampliamente | arrolladoramente | de calle | a duras penas`),
    },
    {
      say: listed(`
      amplia ventaja | cómoda ventaja | ventaja cómoda | enorme ventaja | estrecha ventaja | leve
      ventaja | ligera ventaja | ventaja mínima | ventaja holgada | holgada ventaja | corta
      ventaja`),
    },
  ],
  leadNoun: [
    { say: ['ventaja', 'ventajas'], notBefore: ['fiscal', 'fiscales', 'competitiva', 'de jugar'] },
    { say: ['delantera'], notAfter: ['parte', 'rueda'] },
  ],
  trailStrong: [
    {
      say: listed(`
      a la zaga | a remolque | va perdiendo | van perdiendo | pierde ante | pierde frente a | pierde
      contra | superado por | superada por | adelantado por | adelantada por | derrotado por |
      derrotada por | rezagado | rezagada | en desventaja | muy por detrás`),
    },
    { say: ['desventaja'] },
  ],
  trailWeak: [
    { say: ['por detrás', 'detrás de'], notBefore: listed(`la | las | los | esta | este`) },
    { say: ['abajo'], after: ['punto', 'puntos', 'va', 'está'] },
  ],
  second: [
    {
      say: listed(`
      segundo lugar | segunda posición | segundo puesto | segunda fuerza | va segundo | va
      segunda`),
    },
  ],
  notional: [
    {
      say: listed(`
      empate técnico | empates técnicos | técnicamente empatados | técnicamente empatadas | empate
      estadístico | estadísticamente empatados | estadísticamente empatadas | empate virtual |
      virtualmente empatados | prácticamente empatados | codo con codo | codo a codo | cabeza con
      cabeza | igualdad técnica | cara o cruz | moneda al aire | en un pañuelo | final de infarto |
      de infarto | al filo de la navaja | demasiado reñida | demasiado reñido | demasiado igualada |
      demasiado ajustada | foto finis`),
    },
  ],
  tied: [
    {
      say: listed(`empatados | empatadas | empatado | empatada | empatan | empataron | ex aequo | en tablas`),
    },
    { say: ['empate'], notBefore: listed(`de | del | en | sin | ante | frente`) },
  ],
  level: [
    {
      say: listed(`
      igualados | igualadas | igualdad entre | igualdad absoluta | en igualdad | a la par | parejos |
      mismo nivel`),
      notAfter: ['muy', 'tan', 'más'],
    },
  ],
  plurality: [
    {
      say: listed(`
      mayoría relativa | mayoría simple | más votado | más votada | más votados | opción preferida |
      candidato preferido | candidata preferida | favorito | favorita | favoritos | más apoyado |
      más apoyada | respuesta más frecuente | partido más grande | mayor partido`),
    },
  ],
};
