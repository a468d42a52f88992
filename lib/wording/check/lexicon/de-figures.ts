import type { Cue } from '../phrases';
import { DE_AFTER_CLAUSE } from './de-leads';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'majority'
  | 'most'
  | 'overHalf'
  | 'underHalf'
  | 'minority'
  | 'aboveThreshold'
  | 'belowThreshold'
  | 'thresholdNoun'
  | 'intoAssembly'
  | 'outOfAssembly'
  | 'marginNoun'
  | 'plusMinus'
  | 'withinMargin'
  | 'outsideMargin'
  | 'noMargin'
  | 'statSignificant'
  | 'significant'
  | 'clear'
  | 'sampleMarkers'
  | 'interviewed'
  | 'approximately'
  | 'almost'
  | 'decided'
  | 'percentWords'
  | 'pointWords'
  | 'sizeMarkers'
  | 'notShare';

const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));
const FIFTY = listed(`50 prozent | 50 % | fünfzig prozent | der 50 prozent marke | der marke von 50 prozent`);
const INTO = listed(`ins parlament | in den landtag | in die versammlung | in die kammer | in den rat`);
const IN = listed(`im parlament | im landtag | in der versammlung | in der kammer | im rat`);
const SIGNIFICANT = listed(
  `signifikant | signifikante | signifikanter | signifikanten | signifikantes | signifikantem`,
);

/** German: halves, thresholds, margins, sizes and significance. */
export const DE_FIGURES: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  majority: [
    {
      say: listed(
        `mehrheit | mehrheiten | mehrheitlich | absolute mehrheit | absoluten mehrheit | klare mehrheit`,
      ),
      notBefore: listed(`des | im`),
      notAfter: ['relative', 'relativen', 'schweigende'],
    },
  ],
  most: [
    {
      say: ['die meisten', 'meisten'],
      before: listed(`
        wähler | wählerinnen | wählern | befragten | menschen | erwachsenen | wahlberechtigten | bürger | bürgerinnen |
        wollen | würden`),
    },
  ],
  overHalf: [
    {
      say: listed(`
      mehr als die hälfte | über die hälfte | gut die hälfte | deutlich mehr als die hälfte | mehr als jeder zweite |
      über der hälfte`),
    },
    { say: each(listed(`über | mehr als | oberhalb von | oberhalb`), FIFTY) },
  ],
  underHalf: [
    { say: listed(`weniger als die hälfte | unter der hälfte | knapp unter der hälfte | keine mehrheit`) },
    { say: each(listed(`unter | weniger als | unterhalb von | unterhalb`), FIFTY) },
  ],
  minority: [{ say: ['minderheit'], notBefore: listed(`regierung | der | des`) }],
  aboveThreshold: [
    {
      say: listed(`
      über | oberhalb | jenseits | überspringt | überspringen | übersprang | übersprungen | schafft | schaffen |
      nimmt | knackt | überwindet | überschreitet | erreicht | passiert | überquert | meistert`),
    },
  ],
  belowThreshold: [
    {
      say: listed(`
      unter | unterhalb | verfehlt | verfehlen | verfehlte | scheitert | scheitern | scheiterte | gescheitert | reißt |
      verpasst | unterschreitet`),
    },
  ],
  thresholdNoun: [
    {
      say: listed(`
      hürde | sperrklausel | fünfprozenthürde | fünfprozentklausel | klausel | schwelle | sperrhürde | prozenthürde`),
    },
  ],
  intoAssembly: [
    { say: listed(`zieht | ziehen | zöge | zögen | zog`), then: ['ein'], thenBefore: DE_AFTER_CLAUSE },
    {
      say: [
        ...each(listed(`einzug | rückkehr | sprung | kommt | kommen | schafft es | einziehen`), INTO),
        ...IN,
      ],
    },
    {
      say: INTO,
      before: listed(`ein | einziehen | eingezogen | einzieht | einzuziehen | kommen | schaffen`),
    },
  ],
  outOfAssembly: [
    { say: each(['nicht', 'nicht mehr', 'nicht länger'], [...INTO, ...IN]) },
    {
      say: [
        ...each(
          ['verpasst den einzug', 'verfehlt den einzug', 'einzug verpasst', 'fliegt aus', 'draußen aus'],
          [...INTO, 'dem parlament', 'dem landtag', 'der versammlung'],
        ),
        'außerparlamentarisch',
      ],
    },
  ],
  marginNoun: [
    {
      say: listed(`
      fehlerspanne | fehlerspannen | fehlertoleranz | fehlertoleranzen | fehlermarge | schwankungsbreite |
      schwankungsbreiten | fehlerbereich | statistische unschärfe | statistischen unschärfe | fehlergrenze`),
    },
  ],
  plusMinus: [{ say: listed(`± | plus/minus | plus minus | plus oder minus | +/- | + / -`) }],
  withinMargin: [
    {
      say: each(
        listed(`innerhalb der | im rahmen der | im bereich der | in der | innerhalb einer | unterhalb der`),
        listed(`fehlerspanne | fehlertoleranz | schwankungsbreite | statistischen unschärfe | fehlermarge`),
      ),
    },
  ],
  outsideMargin: [
    {
      say: each(
        listed(`außerhalb der | jenseits der | größer als die | oberhalb der | über der`),
        listed(`fehlerspanne | fehlertoleranz | schwankungsbreite | statistischen unschärfe | fehlermarge`),
      ),
    },
  ],
  noMargin: [
    {
      say: each(
        listed(`keine | keiner | ohne | ohne anerkannte | keine anerkannte | ohne eine`),
        listed(`fehlerspanne | fehlertoleranz | schwankungsbreite | fehlermarge`),
      ),
    },
  ],
  statSignificant: [
    {
      say: [
        ...each(['statistisch'], SIGNIFICANT),
        'statistisch bedeutsam',
        'statistisch gesichert',
        'statistische signifikanz',
      ],
    },
  ],
  significant: [
    { say: [...SIGNIFICANT, 'bedeutsam', 'kein zufall', 'nicht mit zufall', 'über den zufall hinaus'] },
  ],
  clear: [
    {
      say: listed(`
      klarer vorsprung | klaren vorsprung | klarem vorsprung | eindeutiger vorsprung | eindeutig vorn |
      unbestritten | klarer anstieg | klarer rückgang`),
    },
  ],
  sampleMarkers: [
    { say: listed(`stichprobe von | stichprobengröße | n = | n= | stichprobe umfasst | basis von`) },
  ],
  interviewed: [
    {
      say: listed(`
      befragt | befragte | befragten | befragt wurden | wurden | interviews mit | antworten von | umfrage unter`),
    },
  ],
  approximately: [
    {
      say: listed(`
      etwa | rund | ungefähr | circa | ca | gut | knapp | mehr als | über | fast | nahezu | mindestens | an die |
      weniger als`),
    },
  ],
  almost: [
    {
      say: listed(`
      fast | nahezu | knapp | beinahe | rund | etwa | ungefähr | gut | mehr als | über | weniger als | unter | bald |
      annähernd`),
    },
  ],
  decided: [
    {
      say: listed(`
      ohne unentschlossene | ohne die unentschlossenen | unter den entschlossenen | der gültigen stimmen |
      der abgegebenen stimmen | der entschlossenen | wer sich entschieden hat | ohne nichtwähler`),
    },
  ],
  percentWords: [{ say: listed(`% | prozent`) }],
  pointWords: [
    {
      say: listed(`
      prozentpunkte | prozentpunkten | prozentpunkt | punkte | punkten | punkt | zähler | zählern | pp |
      prozent punkte`),
    },
  ],
  sizeMarkers: [
    {
      say: listed(`
      um | von | um etwa | um rund | um fast | um gut | um knapp | um nur | von etwa | von rund | von nur | von fast |
      von knapp | von gut | beträgt | betrage`),
    },
  ],
  notShare: [
    {
      say: listed(`
      sicherheit | konfidenz | wahrscheinlichkeit | hürde | marke | sperrklausel | klausel | wahlbeteiligung |
      beteiligung | intervall | rücklauf | chance | rabatt | schwelle | ausgezählt`),
    },
  ],
};
