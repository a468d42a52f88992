import type { Cue } from '../phrases';
import { DE_AFTER_CLAUSE } from './de-leads';
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

const SIZED = listed(
  `punkt | punkte | punkten | prozentpunkt | prozentpunkte | prozentpunkten | prozent | %`,
);
const MOVED = [
  ...SIZED,
  'ist',
  'sind',
  'zustimmung',
  'leicht',
  'deutlich',
  'stark',
  'weiter',
  'erneut',
  'und',
];
const THINGS = listed(
  `die | das | den | dem | der | ihre | ihren | seine | seinen | sein | ihr | einen | eine | sich | zeit`,
);
/** A verb whose second part ends the clause: "legt um 3 Punkte zu". */
const split = (verbs: string, ends: string): Cue => ({
  say: listed(verbs),
  then: listed(ends),
  thenBefore: DE_AFTER_CLAUSE,
});

/** German: moving, standing still, and how high or low ever. */
export const DE_CHANGES: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  up: [
    { say: listed(`legt zu | legte zu | legen zu | legten zu | zugelegt | zulegt | zulegte | zuzulegen`) },
    split('legt | legte | legen | legten', 'zu'),
    {
      say: listed(`
      steigt | stieg | stiegen | steigen | gestiegen | klettert | kletterte | geklettert | angestiegen | wächst |
      wuchs | gewachsen | zugenommen | hinzugewonnen | dazugewonnen | hinzugewinnt | steigert | steigerte |
      gesteigert | verbessert | verbesserte | erholt | erholte`),
      notBefore: listed(`in | aus | ein`),
    },
    split('nimmt | nahm', 'zu'),
    split('gewinnt | gewann | gewinnen', 'hinzu | dazu'),
    { say: ['gewinnt', 'gewann'], before: listed(`an | stimmen | zustimmung | punkte`) },
    { say: ['gewonnen'], after: SIZED },
    split('holt | holte', 'auf'),
    { say: listed(`holt auf | aufgeholt | im plus | im aufwärtstrend | aufwärts`) },
    {
      say: listed(`zuwachs | zuwächse | anstieg | zugewinn | zugewinne | aufschwung | aufwärtstrend`),
      notAfter: listed(`von | einem`),
    },
    { say: ['plus'], after: listed(`ein | im`) },
    { say: ['beliebter'], notBefore: ['als'] },
  ],
  down: [
    {
      say: listed(`fällt | fiel | fallen`),
      notBefore: listed(`es | in | schwer | leicht | zu | aus | die | mir`),
    },
    { say: ['gefallen'], after: [...MOVED, 'auf'] },
    {
      say: listed(`
      sinkt | sank | sanken | sinken | gesunken | rutscht | rutschte | gerutscht | schrumpft | schrumpfte |
      geschrumpft | schwindet | abgesackt | absackt | abgerutscht | zurückgefallen | abgenommen | eingebüßt |
      nachgelassen | verschlechtert | verschlechterte`),
    },
    split('sackt | sackte | rutscht | rutschte | nimmt | nahm', 'ab'),
    split('büßt | büßte', 'ein'),
    split('lässt | ließ', 'nach'),
    split('fällt | fiel', 'zurück'),
    { say: listed(`verliert | verlor | verloren | verlieren | einbußen`), notBefore: THINGS },
    {
      say: listed(`rückgang | rückgänge | abwärtstrend | verluste | talsohle`),
      notAfter: listed(`von | einem`),
    },
    { say: ['minus'], after: listed(`ein | im`) },
    { say: listed(`im minus | abwärts`) },
  ],
  dramatic: [
    {
      say: listed(`
      höhenflug | höhenflugs | absturz | abgestürzt | abstürzt | einbruch | eingebrochen | einbricht | talfahrt |
      sturzflug | im freien fall | kollabiert | explodiert | raketenhaft | schießt | schoss | katapultiert |
      erdrutsch | erdrutschartig | umfragehoch | umfragetief | senkrechtstart | beispielloser`),
    },
    split('stürzt | stürzte | stürzen', 'ab'),
    split('bricht | brach | brechen', 'ein'),
    { say: listed(`bricht ein | brach ein | brechen ein | stürzt ab | stürzte ab`) },
    { say: listed(`stürzt | stürzte`), before: ['auf'] },
  ],
  momentum: [
    {
      say: listed(`
      aufwind | rückenwind | momentum | auftrieb | schwung | trendwende | stimmungsumschwung | siegeszug | lauf |
      erfolgswelle | gegenwind | dreht sich der wind | wind hat sich gedreht`),
      notBefore: listed(`der | des | von`),
    },
  ],
  leadUp: [
    split('baut | baute | bauen', 'aus'),
    {
      say: listed(`
      ausgebaut | ausbaut | vergrößert | vergrößerte | verdoppelt | verdoppelte | wachsender vorsprung |
      wachsenden vorsprung | wachsendem vorsprung | größerer vorsprung`),
      notAfter: ['werden'],
    },
  ],
  leadDown: [
    {
      say: listed(`
      verkürzt | verkürzte | verringert | verringerte | schmilzt | geschmolzen | zusammengeschmolzen | halbiert |
      halbierte | schrumpfender vorsprung | rückt näher | rücken näher | rückt heran | enger geworden`),
    },
    split('rückt | rückte', 'heran'),
    split('holt | holte', 'ein'),
  ],
  gap: [{ say: listed(`abstand | vorsprung | vorsprungs | rückstand | rennen | differenz | führung`) }],
  steady: [
    {
      say: listed(`
      stabil | bleibt stabil | unverändert | bleibt unverändert | konstant | gleichbleibend | gleich geblieben |
      stagniert | stagnieren | stagnierte | stagnation | stillstand | keine veränderung | nicht verändert |
      nicht vom fleck | auf der stelle | eingependelt | keine bewegung | verharrt | verharren`),
      notBefore: listed(`hohe | arbeitsplätze`),
    },
  ],
  littleChanged: [
    {
      say: listed(`
      kaum verändert | kaum bewegt | wenig verändert | kaum veränderung | kaum veränderungen | wenig veränderung |
      verändert sich wenig | verändert sich kaum | weitgehend stabil | weitgehend unverändert | nahezu unverändert |
      fast unverändert | praktisch unverändert | im wesentlichen unverändert`),
    },
  ],
  raceWords: [
    {
      say: listed(`
      rennen | abstand | vorsprung | kräfteverhältnis | stimmung | werte | umfragewerte | meinung | bild | lage |
      zustimmung | zahlen | verhältnisse`),
    },
  ],
  recordWords: [
    {
      say: listed(`
      rekord | rekordhoch | rekordtief | rekordwert | rekordstand | rekordwerte | höchststand | tiefststand |
      allzeithoch | allzeittief | höchstwert | tiefstwert | bestwert | bester wert | schlechtester wert |
      zum ersten mal | erstmals | noch nie | historisches hoch | historisches tief | so stark wie nie |
      so hoch wie nie | so niedrig wie nie | beispiellos`),
      notBefore: ['wähler'],
    },
  ],
  recordHigh: [
    { say: listed(`höchster | höchste | höchsten | größter | größte | bester | beste | besten | stärkster`) },
    {
      say: listed(`
      rekordhoch | rekordwert | höchststand | allzeithoch | höchstwert | bestwert | historisches hoch |
      so stark wie nie | so hoch wie nie`),
    },
  ],
  recordLow: [
    { say: listed(`niedrigster | niedrigste | niedrigsten | schlechtester | schlechteste | schlechtesten`) },
    {
      say: listed(
        `rekordtief | tiefststand | allzeittief | tiefstwert | historisches tief | so niedrig wie nie`,
      ),
    },
  ],
};
