import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'poll'
  | 'compare'
  | 'fieldworkWords'
  | 'publishedWords'
  | 'eventWords'
  | 'relativeDates'
  | 'earlierWords'
  | 'periodWords'
  | 'openers'
  | 'relatives'
  | 'withinWords'
  | 'outsideWords'
  | 'comparatives'
  | 'conditionals'
  | 'negators'
  | 'clauseBreaks'
  | 'pronouns'
  | 'objectMarkers'
  | 'backs';

const MARGIN_STARTS = listed(
  `el | la | su | un | del | ± | margen | error | márgenes | # | los | ese | este`,
);
const ARTICLES = listed(`el | la | los | las`);
const withArticles = (words: readonly string[]) =>
  words.flatMap((word) => [word, ...ARTICLES.map((article) => `${word} ${article}`)]);

/** Spanish: words of the trade, of time, and those that open, deny or part a claim. */
export const ES_WORDS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  poll: [
    {
      say: listed(`
      encuesta | encuestas | sondeo | sondeos | barómetro | encuestados | encuestadora | instituto |
      intención de voto | apoyo | apoyos | respaldo | respaldos | aprobación | desaprobación | cifras |
      datos | votantes | electores | voto | votos | carrera | elección | elecciones | referéndum |
      candidato | candidata | candidatos | rival | rivales | contienda | electoral`),
    },
  ],
  compare: [
    {
      say: listed(`
      comparado con | comparada con | en comparación con | difiere | difieren | diferencia entre |
      discrepan | contraste | más que | menos que`),
    },
  ],
  fieldworkWords: [
    {
      say: listed(`
      entrevistas | entrevistó | entrevistado | entrevistados | entrevistadas | encuestó | encuestados |
      encuestadas | preguntó | preguntado | consultó | consultados | realizada | realizado | realizó |
      realizaron | realizadas | hizo | hecha | hecho | hicieron | trabajo de campo | efectuada | efectuado |
      elaborada | elaborado | llevó a cabo | terminó | terminado`),
    },
  ],
  publishedWords: [
    {
      say: listed(`
      publicó | publicada | publicado | publica | publicaron | publicación | difundida | difundido |
      difundió | apareció | salió | sondeo de | encuesta de`),
    },
  ],
  eventWords: [
    {
      say: listed(`
      elecciones | elección | elegido | elegida | votación | referéndum | debate | comicios | urnas | campaña | jornada
      electoral | dimisión | dimitió | huelga | temporal | discurso | escándalo | presupuesto | juicio |
      votarán | se vota | congreso | plazo`),
    },
  ],
  relativeDates: [
    {
      say: listed(`
      esta semana | la semana pasada | este mes | el mes pasado | ayer | anteayer | anoche | hoy | este fin
      de semana | el fin de semana | este año | el año pasado | recientemente | hace unos días | hace días |
      hace una semana | hace dos semanas | hace un mes | en los últimos días | en las últimas semanas`),
    },
  ],
  earlierWords: [
    {
      say: listed(`
      era | eran | tenía | tenían | había | habían | obtenía | obtuvo | estaba | fue | anterior | anteriores
      | previo | previa | antes | desde | frente | contra | respecto | comparado | comparada | pasado |
      pasada | hace | entonces | del | comparación | repite | repiten | en enero | en febrero | en marzo | en abril | en
      mayo | en junio | en julio | en agosto | en septiembre | en octubre | en noviembre | en diciembre | de
      agosto | de julio | de junio`),
    },
  ],
  periodWords: [
    {
      say: listed(`
      el año pasado | hace un año | el mes pasado | hace un mes | hace dos meses | hace seis meses | desde
      la primavera | desde el verano | desde el invierno | desde las elecciones | desde las últimas
      elecciones | en las últimas elecciones | desde el debate | en una semana | en dos semanas | en quince
      días | este año | en los últimos meses | en las últimas semanas | en el último año | durante meses |
      interanual | la semana pasada | hace una semana | hace dos semanas`),
    },
  ],
  openers: [
    {
      say: listed(`
      muy pocas | muy pocos | demasiado pocas | demasiado pocos | para calcular | no permite | no permiten | no permitir | no se puede | no puede | no pueden | no basta | no bastan |
      no aclara | no aclaran | no dice | no dicen | no está claro | no es seguro | no se sabe | nadie sabe |
      nadie puede | no hay manera | imposible | quién | quiénes | cuál | qué candidato | qué candidata | qué
      partido | de qué lado | sin saber | saber si | decir si | aclara si | aclarar si | ver si | si el | si
      la | pronto para | dudoso | habría que | haría falta | hace falta | hacen falta | tendría que |
      tendrían que | necesita | necesitan | necesitaría | debe | debería | podría | podrían | puede | pueden
      | a menos que | salvo que | en lugar de | en vez de | no demuestra | no demuestran | no prueba | no
      prueban | no significa | no indica | no confirma | no garantiza | desmiente | niega | negó | ni
      siquiera | ningún indicio | ninguna prueba | no hay pruebas | no hay indicios | falta saber | por
      saber | incógnita | posible | posiblemente | quizá | quizás | tal vez | cuestión de si | no supone |
      el azar por sí solo | error equivocado | sería un error | para afirmar que | para decir que`),
    },
    { say: ['cuánto', 'cuántos'] },
  ],
  relatives: [{ say: ['quien', 'quienes'] }],
  withinWords: [
    {
      say: listed(`dentro de | inferior a | inferiores a | menor que | menor al | por debajo de`),
      before: MARGIN_STARTS,
    },
    { say: ['dentro del', 'inferior al', 'por debajo del'], before: MARGIN_STARTS },
  ],
  outsideWords: [
    {
      say: listed(
        `fuera de | superior a | superiores a | mayor que | supera | superan | rebasa | excede | por encima de`,
      ),
      before: MARGIN_STARTS,
    },
    { say: ['fuera del', 'superior al', 'por encima del', 'superiores al'], before: MARGIN_STARTS },
  ],
  comparatives: [
    {
      say: listed(`
      más alto | más alta | más altos | más bajo | más baja | mejor | peor | mayor | menor | superior |
      inferior | puntos más | puntos menos | punto más | punto menos | más favorable | menos favorable |
      por encima | por debajo | más apoyo | menos apoyo | más apoyos | menos apoyos | más fuerte`),
    },
  ],
  conditionals: [
    {
      say: listed(`si | aunque | incluso si | de celebrarse | en caso de | siempre que | con tal de que`),
      notAfter: listed(`el | del | al | un | de por`),
    },
  ],
  negators: [
    {
      say: listed(`
      no | nunca | jamás | ni | sin | tampoco | ningún | ninguno | ninguna | nadie | nada | lejos de | deja
      de | dejó de | ya no`),
    },
  ],
  clauseBreaks: [
    {
      say: listed(`
      ; | : | – | pero | mientras | mientras que | aunque | sin embargo | no obstante | porque | pues | ya
      que | sino`),
    },
  ],
  pronouns: [
    {
      say: listed(`
      su | sus | le | les | ella | ellos | el candidato | la candidata | el partido | la lista | el
      aspirante | la aspirante | el gobernador | la gobernadora | el líder | ambos`),
    },
  ],
  objectMarkers: [
    {
      say: [
        ...withArticles(
          listed(`
          a | para | sobre | contra | ante | con | por | frente a | desde | entre | e | y | o | ni | supera |
          superan | derrota | aventaja | encima de | debajo de | delante de | detrás de`),
        ),
        ...listed(`al | frente al | sobre el | delante del | detrás del | encima del`),
      ],
    },
    { say: withArticles(['de', 'que']), notAfter: ['seguida', 'seguido', 'seguidos'] },
    { say: ['del'], notAfter: ['seguida', 'seguido', 'seguidos'] },
  ],
  backs: [
    { say: ['a', 'a la', 'al'], after: ['%', 'ciento', ','] },
    {
      say: ['por', 'por la', 'por el'],
      after: listed(
        `% | ciento | , | inclina | inclinan | opta | optan | vota | votan | votaría | votarían | votar | decanta | decantan | decide | deciden`,
      ),
    },
    { say: ['para', 'para la', 'para el'], after: ['%', 'ciento', ','] },
    {
      say: listed(`
      apoya | apoyan | apoyaría | apoyarían | apoyar | respalda | respaldan | respaldaría | prefiere |
      prefieren | preferiría | elige | eligen | elegiría | elegirían | vota | votan | votaría | votarían |
      opta | optan | se inclina | se inclinan | quiere | quieren | aprueba | aprueban | desaprueba |
      desaprueban | rechaza | rechazan | dice | dicen | dijo | dijeron | a favor de | en favor de | escoge |
      escogen | se decanta | se decantan`),
    },
  ],
};
