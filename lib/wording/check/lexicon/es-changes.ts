import type { Cue } from '../phrases';
import { ES_COUNTS } from './es-counts';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'up'
  | 'down'
  | 'dramatic'
  | 'momentum'
  | 'leadUp'
  | 'leadDown'
  | 'gap'
  | 'steady'
  | 'littleChanged'
  | 'raceWords'
  | 'recordWords'
  | 'recordHigh'
  | 'recordLow';

const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));
const THE_LEAD = listed(`su ventaja | la ventaja | la diferencia | la distancia | distancias | distancia`);
const SUPPORT = listed(
  `el apoyo | el respaldo | los apoyos | la intención de voto | la aprobación | la desaprobación | la cifra`,
);
const A_SIZE = [...ES_COUNTS, 'un', 'hasta'];

/** Spanish: moving, standing still, and how high or low ever. */
export const ES_CHANGES: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  up: [
    {
      say: listed(`sube | suben | subió | subieron | subido | subiendo | escala | escalan | trepa | trepan`),
      notBefore: listed(`a | los | las | el | la | su | sus`),
    },
    {
      say: each(
        listed(`sube | subió | ha subido | crece | ha crecido | aumenta | ha aumentado | mejora | repunta`),
        SUPPORT,
      ),
    },
    { say: ['sube a', 'subió a', 'subido a'], before: A_SIZE },
    {
      say: listed(`
      crece | crecen | creció | crecieron | crecido | creciendo | asciende | ascendió | repunta |
      repuntan | repuntó | remonta | remontan | remontó | remontado | avanza | avanzan | avanzó |
      avanzado | avanzando | progresa | progresó`),
      notBefore: ['hacia', 'que', 'el', 'la', 'los'],
    },
    {
      say: listed(`
      aumenta | aumentan | aumentó | aumentaron | aumentado | aumentando | incrementa | incrementan |
      mejora | mejoran | mejoró | mejorado | mejorando | recupera | recuperan | recuperó |
      recuperado`),
      notBefore: listed(`la | el | los | las | de | que`),
    },
    {
      say: each(
        ['gana', 'ganan', 'ganó', 'ganado', 'ganando', 'suma', 'sumado'],
        ['apoyo', 'apoyos', 'fuerza', 'peso', 'terreno', 'votantes'],
      ),
    },
    { say: ['gana', 'ganan', 'ganó', 'ganado', 'ganando'], before: ES_COUNTS },
    { say: ['gana un', 'ganó un', 'ganado un', 'gana hasta'], before: ES_COUNTS },
    {
      say: listed(`
      subida | ascenso | repunte | remontada | alza | al alza | en alza | en ascenso | crecimiento |
      avance | recuperación | mejoría | incremento | aumento`),
      notBefore: ['de precios', 'salarial', 'económico'],
    },
    { say: ['más popular', 'más populares'], notBefore: ['que'] },
  ],
  down: [
    {
      say: listed(`baja | bajan | bajaron | bajado | bajando`),
      notAfter: listed(`más | menos | muy | tan | la | una | planta | clase | de`),
      notBefore: listed(`el | la | los | las | su | sus | participación`),
    },
    { say: ['bajó'], before: [...ES_COUNTS, 'al', 'hasta', 'desde', 'tras', 'con', 'respecto'] },
    { say: ['bajó del', 'bajó un'], before: ES_COUNTS },
    { say: each(listed(`baja | bajó | ha bajado | cae | cayó | ha caído | disminuye | desciende`), SUPPORT) },
    { say: ['bajada', 'a la baja', 'en declive', 'en descenso', 'en retroceso'] },
    {
      say: listed(`
      cae | caen | cayó | cayeron | caído | cayendo | caída | desciende | descienden | descendió |
      descendido | descenso | retrocede | retroceden | retrocedió | retroceso | disminuye |
      disminuyen | disminuyó | decae | decaen | mengua | menguan | flojea | flojean | resbala |
      se desinfla | se desgasta | declive`),
      notBefore: ['por debajo', 'en manos', 'bajo'],
    },
    {
      say: listed(
        `pierde | pierden | perdió | perdieron | perdido | perdiendo | cede | ceden | cedió | cedido`,
      ),
      notBefore: listed(`
      el | la | las | los | su | sus | ante | frente | por | contra | una | tiempo | a | el paso`),
      notAfter: ['va', 'van'],
    },
    {
      say: listed(`
      pierde apoyo | pierde apoyos | pierde terreno | pierde fuelle | pierde fuerza | pierde votos |
      cede terreno | perdido apoyo | perdido terreno | pierden apoyo | pierden terreno`),
    },
    { say: ['menos popular'], notBefore: ['que'] },
  ],
  dramatic: [
    {
      say: listed(`
      se dispara | se disparan | se disparó | se ha disparado | se catapulta | catapultado |
      meteórico | meteórica | fulgurante | vertiginoso | vertiginosa | subidón | arrasa | arrasan |
      imparable`),
    },
    {
      say: listed(`
      se desploma | se desploman | se desplomó | se ha desplomado | desplome | se hunde | se hunden |
      se hundió | se ha hundido | hundimiento | se derrumba | se derrumban | derrumbe | en picado |
      caída libre | batacazo | debacle | se estrella | colapso | se despeña`),
      notBefore: ['del puente', 'económico'],
    },
  ],
  momentum: [
    {
      say: listed(`
      impulso | viento a favor | viento de cola | viento en popa | vuelco | inercia | racha | momento
      dulce | en volandas | cambio de tendencia`),
    },
  ],
  leadUp: [
    {
      say: each(
        listed(
          `amplía | amplían | amplió | ampliado | ampliando | aumenta | aumentado | ensancha | agranda | estira | duplica | dobla | triplica | incrementa`,
        ),
        THE_LEAD,
      ),
    },
    {
      say: listed(
        `se distancia | se distancian | se despega | se escapa | pone tierra de por medio | se agranda | se ensancha | se amplía`,
      ),
    },
  ],
  leadDown: [
    {
      say: each(
        listed(
          `recorta | recortan | recortó | recortado | recortando | reduce | reducen | redujo | reducido | estrecha | estrechan | acorta | acortan | acortó | acortado | disminuye`,
        ),
        THE_LEAD,
      ),
    },
    {
      say: listed(
        `se acerca a | se acercan a | se aproxima a | pisa los talones | se estrecha | se acorta | se reduce | recorta terreno | se esfuma | se evapora`,
      ),
    },
  ],
  gap: [{ say: listed(`diferencia | ventaja | distancia | brecha | carrera | contienda`) }],
  steady: [
    {
      say: listed(`
      estable | estables | se mantiene estable | se mantienen estables | se mantiene sin cambios | estancado | estancada | estancados | se estanca | se estancan | sin cambios
      | no cambia | no cambian | no ha cambiado | no han cambiado | no varía | no varían | no ha
      variado | no han variado | no se mueve | no se mueven | no se ha movido | no hay cambios | no ha
      habido cambios | inmóvil | invariable | inalterado | inalterada | permanece igual | sigue igual |
      siguen igual | clavado | clavada | se queda igual | sigue donde estaba`),
      notBefore: ['en los detalles', 'empleo'],
    },
    {
      say: ['se mantiene', 'se mantienen', 'se ha mantenido', 'se mantuvo'],
      notBefore: listed(`por | como | al | a | en contacto | arriba | líder`),
    },
  ],
  littleChanged: [
    {
      say: listed(`
      apenas varía | apenas varían | apenas ha variado | apenas cambia | apenas cambian | apenas ha
      cambiado | apenas se mueve | apenas se ha movido | sin apenas cambios | apenas cambios | casi sin
      cambios | prácticamente sin cambios | poca variación | pocos cambios | poco cambio | cambia poco |
      varía poco | casi no varía | casi no cambia | prácticamente igual | prácticamente estable`),
    },
  ],
  raceWords: [{ say: listed(`carrera | contienda | diferencia | panorama | ventaja | situación`) }],
  recordWords: [
    {
      say: listed(`
      récord | récords | máximo histórico | máximos históricos | mínimo histórico | mínimos históricos |
      por primera vez | primera vez | sin precedentes | ventaja histórica | subida histórica | caída
      histórica | mejor dato de la serie | peor dato de la serie | mejor resultado de la serie | peor
      resultado de la serie | techo histórico | suelo histórico`),
      notBefore: ['de asistencia', 'que vota'],
    },
  ],
  recordHigh: [
    { say: listed(`más alto | más alta | mejor | mayor | máximo | máxima`) },
    { say: listed(`máximo histórico | máximos históricos | récord | techo histórico`) },
  ],
  recordLow: [
    { say: listed(`más bajo | más baja | peor | mínimo | mínima`) },
    { say: listed(`mínimo histórico | mínimos históricos | suelo histórico`) },
  ],
};
