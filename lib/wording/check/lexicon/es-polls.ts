import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'forecast'
  | 'proof'
  | 'shows'
  | 'subgroup'
  | 'amongst'
  | 'wholeSample'
  | 'everybody'
  | 'people'
  | 'voters'
  | 'likelyVoters'
  | 'registeredVoters'
  | 'adults';

const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));
const GROUPS = listed(`
  jóvenes | mujeres | hombres | jubilados | jubiladas | pensionistas | estudiantes | universitarios |
  mayores de | menores de | desempleados | parados | obreros | autónomos | agricultores | inquilinos |
  propietarios | rurales | urbanos | inmigrantes | votantes jóvenes | votantes rurales | votantes urbanos
  | votantes independientes | votantes mayores`);

/** Spanish: what polls are said to do, and who was asked. */
export const ES_POLLS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  forecast: [
    {
      say: [
        ...each(
          listed(
            `va a | van a | vamos a | iba a | está a punto de | a punto de | llamado a | llamada a | destinado a | destinada a | condenado a | condenada a`,
          ),
          listed(
            `ganar | perder | vencer | arrasar | gobernar | triunfar | imponerse | ser elegido | ser elegida | ser gobernador | ser gobernadora`,
          ),
        ),
        ...listed(`
        ganará | ganarán | ganaremos | ganaré | vencerá | vencerán | venceremos | perderá | perderán |
        arrasará | gobernará | gobernaremos | triunfará | se impondrá | se alzará con | se hará con`),
        ...listed(
          `ganaría | ganarían | vencería | vencerían | perdería | perderían | arrasaría | gobernaría`,
        ),
        ...each(
          listed(`será | serán | seremos | sería | saldrá | saldría`),
          listed(
            `elegido | elegida | reelegido | reelegida | el próximo | la próxima | el nuevo | la nueva | gobernador | gobernadora | el ganador | la ganadora | ganador | vencedor | vencedora | derrotado | derrotada`,
          ),
        ),
        ...each(
          listed(
            `camino de | camino a | rumbo a | se encamina a | se encaminan a | se dirige a | va hacia | apunta a`,
          ),
          listed(
            `la victoria | una victoria | la derrota | una derrota | la reelección | un triunfo | la gobernación`,
          ),
        ),
        ...listed(`
        victoria asegurada | victoria segura | tiene asegurada | tiene ganada | virtual ganador | virtual
        ganadora | virtual gobernador | predice | predicen | pronostica | pronostican | vaticina |
        vaticinan | augura | auguran | presagia | presagian | anticipa la victoria | es un pronóstico`),
      ],
    },
  ],
  proof: [
    {
      say: listed(`
      demuestra | demuestran | demostró | demostrado | prueban | prueba que | probado que | confirma |
      confirman | confirmó | confirmado | constata | constatan | evidencia |
      evidencian | deja claro | dejan claro | no deja dudas | no dejan dudas | sin lugar a dudas | zanja |
      acredita | ratifica`),
    },
    {
      say: ['prueba'],
      notAfter: listed(`una | la | segunda | otra | esta | primera | de | sin | cada | a | ninguna`),
      before: ['que', 'el', 'la', 'cómo'],
    },
  ],
  shows: [
    {
      say: listed(`muestra que | muestra a | muestra un | muestra una`),
      notAfter: listed(`la | una | esta | esa | su | cada | de | otra | misma`),
    },
    { say: listed(`muestran | revela | revelan | reveló | arroja que | pone de manifiesto`) },
  ],
  subgroup: [
    {
      say: [...each(listed(`entre los | entre las | los | las`), GROUPS), ...GROUPS],
      notBefore: ['de edad', 'apoyos', 'cifras', 'que'],
    },
  ],
  amongst: [{ say: ['entre los', 'entre las', 'entre la'] }],
  wholeSample: [
    {
      say: listed(`
      votantes | electores | adultos | adultas | personas | encuestados | encuestadas | entrevistados |
      entrevistadas | inscritos | dos | tres | cuatro | candidatos | candidatas | partidos | sondeos |
      encuestas | que | grupos | más | ciudadanos | cifras | opciones | respuestas | probables | decididos
      | consultados | población | ciudadanía | mismas | mismos | demás | datos | porcentajes | fechas |
      sondeo | encuesta | muestra | primera | última`),
    },
  ],
  everybody: [
    {
      say: listed(`
      la población | los ciudadanos | la ciudadanía | el país | todo el país | el electorado | los
      habitantes | la gente | la provincia entera | toda la provincia`),
      notBefore: ['de referencia', 'que'],
    },
  ],
  people: [
    {
      say: listed(`de las personas | de la gente | de la población | de los vecinos`),
      after: listed(`% | ciento | mitad | parte | mayoría`),
      notBefore: listed(`encuestadas | entrevistadas | consultadas | que | inscritas | adultas`),
    },
  ],
  voters: [
    {
      say: ['votantes', 'electores', 'votante', 'elector'],
      notBefore: listed(`probables | probable | registrados | inscritos | censados | decididos | indecisos`),
      notAfter: ['probables'],
    },
  ],
  likelyVoters: [
    {
      say: listed(`
      votantes probables | votante probable | probables votantes | probable votante | electores probables |
      quienes probablemente voten`),
    },
  ],
  registeredVoters: [
    {
      say: listed(`
      votantes registrados | votantes inscritos | electores inscritos | electores registrados | personas
      inscritas para votar | inscritos para votar | votante registrado | electores censados`),
    },
  ],
  adults: [
    {
      say: listed(`personas adultas | persona adulta | adultos | adultas | adulto | mayores de edad`),
      notBefore: ['jóvenes'],
    },
  ],
};
