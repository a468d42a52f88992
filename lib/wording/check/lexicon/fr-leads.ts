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

const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));

/** French: being ahead, behind or level. */
export const FR_LEADS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  leadStrong: [
    {
      say: listed(`mène | mènent | menait | menaient | menant`),
      notBefore: listed(`une | un | le | la | les | l' | campagne | des | à | son | sa`),
    },
    {
      say: each(
        listed(`mène | mènent | menait`),
        listed(`
        la course | le sondage | les sondages | les intentions de vote | le référendum | la danse |
        l'élection | le scrutin | le bal`),
      ),
    },
    {
      say: listed(`
      en tête | prend la tête | prennent la tête | a pris la tête | garde la tête | à la première place |
      première place | première position | première force | arrive premier | arrive
      première | fait la course en tête | caracole | pole position | l'emporte | l'emportent | mène au
      score | leader du sondage | largement devant | loin devant | nettement devant`),
      notBefore: ['de liste', 'à tête', "d'affiche"],
    },
    {
      say: listed(`
      devance | devancent | devançait | devançant | dépasse | dépassent | dépassait | domine | dominent | dominait | surpasse | surclasse | bat | coiffe | double`),
      notBefore: listed(`le | la | les | l' | de | du | d' | entre | en | son | pour | ce | ses`),
    },
    {
      say: [
        'devance la',
        'devance le',
        "devance l'",
        'devance les',
        'domine la',
        'domine le',
        'dépasse la',
        'bat la',
      ],
      notBefore: listed(`barre | moitié | seuil | campagne | débat | scène | majorité`),
    },
    {
      say: listed(
        `prend l'avantage | garde l'avantage | a l'avantage | conserve l'avantage | avantage à | prend le dessus`,
      ),
    },
  ],
  leadWeak: [
    {
      say: ['devant'],
      notBefore: listed(`un | une | les | ses | son | sa | des | nous | eux | la | le | plusieurs`),
      notAfter: listed(`parle | débat | discours | prononcé | passe`),
    },
    {
      say: ['devant le', 'devant la'],
      notBefore: listed(`public | presse | parlement | tribunal | foule | mairie | caméra`),
    },
  ],
  leadStyle: [
    {
      say: listed(`
      d'un cheveu | de peu | de justesse | largement | confortablement | haut la main | d'une courte tête |
      à peine | nettement devant | largement devant | loin devant | écrase | caracole`),
    },
    {
      say: listed(`
      large avance | confortable avance | avance confortable | courte avance | légère avance | mince avance |
      énorme avance | forte avance`),
    },
  ],
  leadNoun: [
    {
      say: ['avance', 'avantage'],
      notAfter: listed(`d' | à l' | par | je | on | il | elle | qui | ne`),
      notBefore: listed(`que | rapidement | masquée | fiscal | à | vers`),
    },
    { say: ["d'avance"], after: ['point', 'points', '%', 'cent'] },
  ],
  trailStrong: [
    {
      say: listed(`
      à la traîne | est battu par | battu par | battue par | devancé par | devancée par | dépassé par |
      dépassée par | distancé | distancée | est mené | est menée | relégué | reléguée | loin derrière | se
      fait distancer | s'incline face à`),
    },
  ],
  trailWeak: [
    { say: ['derrière'], notBefore: listed(`les | ses | la | une | un | cette | ces | lui`) },
    { say: ['de retard', 'du retard', 'accuse un retard'] },
  ],
  second: [
    {
      say: listed(
        `deuxième place | seconde place | en deuxième position | deuxième position | arrive deuxième | arrive second | deuxième force`,
      ),
    },
  ],
  notional: [
    {
      say: listed(`
      coude à coude statistique | au coude à coude | coude à coude | égalité statistique | statistiquement à
      égalité | statistiquement égaux | égalité technique | à égalité technique | quasi égalité | à quasi
      égalité | quasiment à égalité | pratiquement à égalité | mouchoir de poche | au photo finish |
      photo finish | à pile ou face | pile ou face | ballottage serré | trop serré | trop serrée | trop
      serrée pour | sur le fil du rasoir`),
    },
  ],
  tied: [
    {
      say: listed(
        `à égalité | égalité parfaite | ex æquo | ex aequo | dos à dos | font match nul | sont à égalité parfaite`,
      ),
    },
    { say: ['match nul'], notBefore: listed(`d' | de | du | contre | à | hier`) },
  ],
  level: [{ say: listed(`au même niveau | font jeu égal | jeu égal | égalité entre`) }],
  plurality: [
    {
      say: listed(`
      majorité relative | majorité simple | premier parti | plus grand parti | parti le plus fort | le plus populaire | la
      plus populaire | candidat préféré | candidate préférée | le favori | la favorite | favori | favorite |
      réponse la plus fréquente | première force politique`),
      notBefore: ['des bookmakers'],
    },
  ],
};
