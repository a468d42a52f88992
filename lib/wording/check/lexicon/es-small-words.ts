import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'ofWords'
  | 'rivals'
  | 'pollAsSubject'
  | 'everWords'
  | 'dateLinks'
  | 'heldWords'
  | 'beforeNoShare'
  | 'rangeWords'
  | 'shareLeads'
  | 'afterBareShare'
  | 'fromWords'
  | 'withWords'
  | 'ownsMargin'
  | 'orWords'
  | 'leadOrGap'
  | 'shareWords'
  | 'roundingWords'
  | 'beforeNoFraction'
  | 'afterNoFraction'
  | 'changeNouns'
  | 'countedPeople'
  | 'auxiliaries'
  | 'ownedNouns'
  | 'otherMatters';

/** Spanish: small words around a claim, by what they do there. */
export const ES_SMALL_WORDS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  ofWords: [{ say: ['de', 'del', 'de la', 'de los', 'de las', 'de el'] }],
  rivals: [
    {
      say: listed(`
      su rival | sus rivales | su adversario | su adversaria | sus adversarios | su oponente | sus oponentes
      | todos | todas | el resto | los demás | ella | ellos`),
    },
  ],
  pollAsSubject: [
    {
      say: listed(`
      encuesta | encuestas | sondeo | sondeos | datos | cifras | resultado | resultados | estudio | barómetro
      | números`),
    },
  ],
  everWords: [
    {
      say: listed(
        `jamás | nunca | de la serie | hasta la fecha | hasta ahora | en la historia | histórico | histórica | registrado | registrada`,
      ),
    },
  ],
  dateLinks: [{ say: listed(`– | al | a | y | de | del | el | 1 º`) }],
  heldWords: [
    {
      say: listed(
        `celebran | celebraran | celebrasen | celebrara | celebrase | fueran | fuesen | votaría | votarían | votar`,
      ),
    },
  ],
  beforeNoShare: [
    {
      say: listed(`
      filo del | umbral del | barrera del | más del | menos del | encima del | debajo del | nivel del |
      intervalo del | llegar al | alcanzar el | superar el | alcanza el | supera el | lejos del | ronda el |
      rondar el | entre el | entre | necesario del | mínimo del | más de | menos de | regla del`),
    },
  ],
  rangeWords: [
    {
      say: listed(
        `intervalo | rango | oscila | oscilan | horquilla | va de | van de | iría de | irían de | iría | iban de | z | p`,
      ),
    },
  ],
  shareLeads: [{ say: ['al', 'hasta', 'hasta el', 'el', 'con', 'con el'] }],
  afterBareShare: [{ say: ['a', 'y', 'frente', 'contra', 'en'] }],
  fromWords: [
    { say: ['desde', 'desde el', 'entre', 'entre el'] },
    { say: ['del', 'de', 'de un'], notAfter: ['era', 'es', 'ahora'] },
  ],
  withWords: [{ say: ['con', 'con el', 'con un', 'con una'] }],
  ownsMargin: [{ say: listed(`un | el | su | con | tiene | es`) }],
  orWords: [{ say: ['o', 'o de', 'o a'] }],
  leadOrGap: [{ say: ['ventaja', 'diferencia', 'distancia'] }],
  shareWords: [{ say: listed(`porcentaje | porcentajes | cifra | cifras | dato | datos | cada porcentaje`) }],
  roundingWords: [{ say: listed(`redondeo | redondeado | redondeada | redondeados | redondear | redondea`) }],
  beforeNoFraction: [{ say: listed(`en | por | hasta | entre | cerca de | contra | a | ante | con la`) }],
  afterNoFraction: [
    {
      say: listed(
        `semana | semanas | día | días | mes | meses | punto | puntos | hora | horas | año | años | siglo | docena | plazo | lugar | puesto`,
      ),
    },
  ],
  changeNouns: [{ say: listed(`cambio | variación | movimiento | diferencia desde | evolución`) }],
  countedPeople: [
    {
      say: listed(
        `personas | encuestados | entrevistas | residentes | entrevistados | vecinos | consultados`,
      ),
    },
  ],
  auxiliaries: [
    {
      say: listed(`
      es | está | están | ha | han | había | era | fue | sigue | siguen | se | le | les | va | van | ya |
      ahora | también | aún | todavía | aparece | aparecen | queda | estaría | iría | solo | casi | claramente`),
    },
  ],
  ownedNouns: [
    {
      say: listed(`
      ventaja | delantera | subida | bajada | caída | ascenso | descenso | remontada | avance | retroceso |
      alza | crecimiento | aumento | repunte | desplome | hundimiento | recuperación | impulso`),
    },
  ],
  otherMatters: [
    {
      say: listed(`
      precio | precios | combustible | inflación | paro | desempleo | impuesto | impuestos | salario |
      salarios | sueldo | alquiler | alquileres | temperatura | bolsa | deuda | presupuesto | acciones |
      participación`),
    },
  ],
};
