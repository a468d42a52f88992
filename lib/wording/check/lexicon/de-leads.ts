import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';

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

/** Words that may follow the last word of a German clause. */
export const DE_AFTER_CLAUSE = listed(`und | oder | als | wie | aber | doch | sondern | während`);
export const DE_ARTICLES = listed(`der | die | das | den | dem | des`);

/** What somebody may lead besides a race. */
const LED = listed(`
  an | zu | zur | zum | durch | ins | aus | über | von | ein | eine | einen | den | das | dem |
  ihr | ihre | ihren | sein | seine | seinen | gespräche | verhandlungen | wahlkampf | krieg | regie | dazu | heute`);

/** German: being ahead, behind or level. */
export const DE_LEADS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  leadStrong: [
    { say: listed(`führt | führte | führten`), then: ['an'], thenBefore: DE_AFTER_CLAUSE },
    { say: listed(`führt | führte | führten`), notBefore: [...LED, 'die'] },
    { say: ['führen'], notBefore: [...LED, 'die'], notAfter: ['zu', 'können', 'könnte', 'würde'] },
    { say: ['führend'] },
    {
      say: listed(`
      in führung | geht in führung | führung übernommen | auf platz eins | auf platz 1 | auf dem ersten platz |
      an der spitze | an erster stelle | erster platz | hat die nase vorn | haben die nase vorn |
      klar vorn | klar vorne | deutlich vorn | deutlich vorne | weit vorn | weit vorne`),
    },
    { say: listed(`spitzenreiter | spitzenreiterin | favorit | favoritin`) },
    {
      say: listed(`überholt | überholte | überflügelt | schlägt | distanziert`),
      notBefore: ['werden', 'worden'],
    },
    {
      say: listed(`zieht | zog | ziehen`),
      then: ['davon', 'vorbei'],
      thenBefore: DE_AFTER_CLAUSE,
    },
    { say: ['setzt', 'setzte'], then: ['ab'], thenBefore: DE_AFTER_CLAUSE },
  ],
  leadWeak: [
    {
      say: listed(`vorn | vorne | voran | knapp vorn | knapp vorne | hauchdünn vorn | leicht vorn`),
      notAfter: listed(`von | nach | ganz | schon`),
    },
    {
      say: listed(`vor | knapp vor | deutlich vor | klar vor | leicht vor | hauchdünn vor | weit vor`),
      beforeName: DE_ARTICLES,
    },
  ],
  leadStyle: [
    { say: listed(`hauchdünn | haushoch | souverän | komfortabel | komfortablen | komfortabler | mühelos`) },
  ],
  leadNoun: [
    {
      say: listed(`
      vorsprung | vorsprungs | führungsposition | spitzenposition | polster | spitzenplatz | führungsrolle`),
      notBefore: listed(`durch | beim | bei | im`),
    },
  ],
  trailStrong: [
    { say: listed(`unterliegt | unterlegen | abgeschlagen | abgehängt | weit hinten | weit zurück`) },
    { say: listed(`hinkt | hinken`), then: ['hinterher'], thenBefore: DE_AFTER_CLAUSE },
    { say: listed(`rückstand | rückstands`) },
  ],
  trailWeak: [
    { say: listed(`hinten | im hintertreffen`), notAfter: listed(`von | nach | ganz`) },
    {
      say: ['zurück'],
      after: listed(`punkt | punkte | prozentpunkte | prozentpunkt | prozent | % | liegt | liegen | lag`),
    },
    {
      say: listed(`hinter | knapp hinter | deutlich hinter | klar hinter | weit hinter`),
      beforeName: DE_ARTICLES,
    },
  ],
  second: [
    {
      say: listed(`
      auf platz zwei | auf platz 2 | auf rang zwei | auf dem zweiten platz | an zweiter stelle | zweiter platz |
      zweitplatzierter | zweitplatzierte`),
    },
  ],
  notional: [
    {
      say: listed(`
      kopf an kopf | kopf an kopf rennen | statistischer gleichstand | statistischen gleichstand |
      statistischem gleichstand | statistisches patt | technisches patt | technischer gleichstand |
      technisches unentschieden | praktisch gleichauf | statistisch gleichauf | statistisch gesehen gleichauf |
      zu knapp | totes rennen | messers schneide | hauchdünnes rennen | offenes rennen | fotofinish`),
    },
  ],
  tied: [
    { say: listed(`patt | pattsituation | unentschieden | pari | remis`) },
    { say: listed(`gleich stark | gleich viele stimmen`) },
  ],
  level: [{ say: listed(`gleichauf | gleichstand | auf augenhöhe | punktgleich`) }],
  plurality: [
    {
      say: listed(`
      stärkste kraft | stärkste partei | stärkster kraft | stärksten partei | stärksten kraft | größte partei |
      größte fraktion | stärkste fraktion | meiste stimmen | meisten stimmen | relative mehrheit | beliebteste |
      beliebtester | beliebteste partei | am beliebtesten | häufigste antwort | meistgenannte | erste wahl`),
    },
  ],
};
