import type { Cue } from '../phrases';
import { DE_MONTHS } from './de-calendar';
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
  `der | die | das | eine | einer | ihre | ihrer | diese | dieser | ± | fehlerspanne | fehlertoleranz`,
);

/** German: words of the trade, of time, and those that open, deny or part a claim. */
export const DE_WORDS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  poll: [
    {
      say: listed(`
      umfrage | umfragen | umfragewerte | umfragewerten | umfrageinstitut | befragung | befragten | befragte | erhebung |
      institut | instituts | meinungsforscher | demoskopen | sonntagsfrage | zustimmung | werte | wähler | wählern |
      wählerinnen | wahlberechtigten | rennen | wahl | kandidat | kandidatin | kandidaten | rivale | rivalin |
      herausforderer | amtsinhaber | amtsinhaberin | stimmung | wählergunst`),
    },
  ],
  compare: [
    {
      say: listed(`
      als bei | als in | im vergleich zu | im vergleich mit | verglichen mit | gegenüber | unterschied zwischen |
      abweichung | weichen voneinander ab | widersprechen sich | unterscheiden sich`),
    },
  ],
  fieldworkWords: [
    {
      say: listed(`
      befragt | befragte | befragten | befragung | befragungen | interviews | interviewt | erhoben | durchgeführt |
      fand statt | umfrage fand | lief vom | fanden statt | feldzeit | umfrage vom`),
    },
  ],
  publishedWords: [
    { say: listed(`veröffentlicht | erschienen | vorgestellt | umfrage | befragung | publiziert`) },
  ],
  eventWords: [
    {
      say: listed(`
      wahl | wahltag | wahlen | abstimmung | referendum | volksentscheid | debatte | parteitag | wahlkampf | fernsehduell |
      rücktritt | streik | sturm | rede | skandal | haushalt | prozess | gewählt`),
    },
  ],
  relativeDates: [
    {
      say: listed(`
      diese woche | in dieser woche | vergangene woche | vergangenen woche | letzte woche | letzten woche | gestern |
      heute | vorgestern | am wochenende | vergangenen monat | letzten monat | kürzlich | neulich | vor kurzem |
      vor wenigen tagen | in den vergangenen tagen | in den letzten tagen`),
    },
  ],
  earlierWords: [
    {
      say: [
        ...listed(`
        kam | lag | lagen | war | waren | hatte | hatten | zuvor | vorher | früher | frühere | früheren | früherer | damals | letzten |
        vorigen | vergangenen | nach | gegenüber | seit | von | statt | vor | in der umfrage`),
        ...DE_MONTHS.flat().map((month) => `im ${month}`),
      ],
    },
  ],
  periodWords: [
    {
      say: listed(`
      seit dem frühjahr | seit dem frühling | seit dem sommer | seit dem winter | seit dem herbst | seit der letzten wahl |
      seit der wahl | seit der debatte | seit dem skandal | seit wochen | seit monaten | vor einem jahr | vor einem monat |
      vor einer woche | vor zwei wochen | im vergleich zum vorjahr | gegenüber dem vorjahr | seit dem vorjahr |
      binnen einer woche | in einer woche | seit jahresbeginn | im vorjahr`),
    },
  ],
  openers: [
    {
      say: listed(`
      ob | wer | wen | welche | welcher | welches | was | wie weit | kann nicht | können nicht | kann nicht sagen |
      lässt sich nicht | lassen sich nicht | nicht sagen | nicht zeigen | nicht erkennen | nicht möglich | unklar |
      unbekannt | niemand weiß | nichts | kein anzeichen | keine anzeichen | kein beweis | kein beleg | keine prognose |
      bedeutet nicht | bedeuten nicht | heißt nicht | besagt nicht | statt | anstatt | könnte | könnten | möglicherweise |
      müsste | müssten | muss | wäre nötig | zu früh | zu wenige | zu wenigen | dementiert | bestreitet | frage nach | warnte vor |
      warnt vor | zufall allein | reicht | reichte | spanne | tatsächliche veränderung | tatsächlicher abstand`),
      notBefore: ['hat'],
    },
  ],
  relatives: [],
  withinWords: [
    {
      say: listed(`innerhalb | im rahmen | im bereich | kleiner als | geringer als | unterhalb | unter`),
      before: MARGIN_STARTS,
    },
  ],
  outsideWords: [
    {
      say: listed(`außerhalb | jenseits | größer als | höher als | oberhalb | mehr als`),
      before: MARGIN_STARTS,
    },
  ],
  comparatives: [
    {
      say: listed(`
      besser | schlechter | stärker | schwächer | höher | niedriger | höhere | niedrigere | höheren | niedrigeren | größer |
      kleiner | beliebter | punkte mehr | punkte weniger | prozentpunkte mehr | prozentpunkte weniger | mehr zustimmung |
      weniger zustimmung | auseinander`),
    },
  ],
  conditionals: [
    { say: listed(`wenn | falls | sofern | selbst wenn | angenommen`) },
    {
      say: listed(`wäre | wären | hätte | hätten | würde | würden | fände | sollte | sollten`),
      after: ['', '.', ',', ':', '"', '\n'],
    },
  ],
  negators: [
    {
      say: listed(`
      nicht | nie | niemals | niemand | kein | keine | keinen | keinem | keiner | weder | ohne | keineswegs | keinesfalls |
      nichts`),
    },
  ],
  clauseBreaks: [
    {
      say: listed(`
      ; | : | – | aber | doch | sondern | während | obwohl | obgleich | jedoch | weil | denn | wobei | hingegen | dagegen`),
    },
  ],
  pronouns: [
    {
      say: listed(`
      er | sie | es | ihr | ihre | ihren | ihrem | sein | seine | seinen | seinem | die kandidatin | der kandidat |
      die partei | die amtsinhaberin | der amtsinhaber | die gouverneurin | der gouverneur`),
    },
  ],
  objectMarkers: [
    {
      say: listed(`
      für | von | vor | hinter | gegen | über | auf | zu | mit | als | bei | an | gegenüber | überholt | schlägt | unter |
      und`),
    },
  ],
  backs: [
    {
      say: listed(`
      für | wählen | wollen | wollten | würden | stimmen | stimmten | unterstützen | unterstützten | nannten | nennen |
      bevorzugen | sagen | sagten | gaben | entscheiden | mit | ist für | sind für | sprachen`),
    },
  ],
};
