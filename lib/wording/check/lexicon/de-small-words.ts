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
  | 'ownedNouns';

/** German: small words around a claim, by what they do there. */
export const DE_SMALL_WORDS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  ofWords: [],
  rivals: [],
  pollAsSubject: [
    {
      say: listed(`
      umfrage | umfragen | befragung | erhebung | zahlen | daten | werte | ergebnis | ergebnisse | studie | institut |
      meinungsforscher | demoskopen | umfragewerte`),
    },
  ],
  everWords: [{ say: listed(`seit | jemals | bisher | je | aller zeiten | der reihe | bislang`) }],
  dateLinks: [{ say: listed(`– | - | bis | und | zum | den | dem | der | vom | am | . | bis zum`) }],
  heldWords: [{ say: ['gewählt', 'abgestimmt', 'stattfände', 'wahl', 'wählen'] }],
  beforeNoShare: [
    {
      say: listed(`
      über | unter | zwischen | als | oberhalb | unterhalb | spanne von | bereich von | bis zu | hürde von | marke von`),
    },
  ],
  rangeWords: [{ say: listed(`spanne | intervall | bereich | reicht | reichte | z | p | reichen`) }],
  shareLeads: [{ say: listed(`bei | auf | jetzt | nun | liegt | noch`) }],
  afterBareShare: [{ say: listed(`in | zu | und | gegen | nach | bei`) }],
  fromWords: [{ say: ['von', 'zwischen'] }],
  withWords: [{ say: ['mit'] }],
  ownsMargin: [{ say: listed(`die | eine | einer | der | ihre | ihrer | mit | seine`) }],
  orWords: [{ say: ['oder'] }],
  leadOrGap: [
    {
      say: listed(`
      vorsprung | vorsprungs | vorsprunges | abstand | abstands | abstandes | unterschied | unterschieds | differenz |
      veränderung | saldo`),
    },
  ],
  shareWords: [{ say: listed(`anteil | anteile | anteils | wert | werte | einzelnen wert | einzelwert`) }],
  roundingWords: [{ say: listed(`rundung | gerundet | gerundete | gerundeten | runden`) }],
  beforeNoFraction: [
    { say: listed(`gegen | nahe der | nahe | an der | zur | um die | auf die | um ein | in`) },
  ],
  afterNoFraction: [
    {
      say: listed(`
      fällen | stunde | stunden | jahr | jahre | jahres | tag | tage | mal | preis | weg | liter | platz | amtszeit |
      umfrage | welle`),
    },
  ],
  changeNouns: [
    { say: listed(`veränderung | verschiebung | anstieg | rückgang | zuwachs | unterschied seit`) },
  ],
  countedPeople: [
    {
      say: listed(
        `menschen | befragte | befragten | interviews | personen | einwohner | teilnehmer | teilnehmern`,
      ),
    },
  ],
  auxiliaries: [],
  ownedNouns: [],
};
