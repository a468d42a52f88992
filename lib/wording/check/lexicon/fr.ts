import { FR_CHANGES } from './fr-changes';
import { FR_NUMBERS } from './fr-counts';
import { FR_FIGURES } from './fr-figures';
import { FR_LEADS } from './fr-leads';
import { FR_POLLS } from './fr-polls';
import { FR_SMALL_WORDS } from './fr-small-words';
import { FR_WORDS } from './fr-words';
import { listed } from './listed';
import type { Lexicon } from './types';

const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));
const BACKING = listed(`soutient | soutiennent | approuve | approuvent | défend | défendent`);
const REFUSING = listed(`rejette | rejettent | refuse | refusent`);
const THINGS = listed(`le | la | les | l' | un | une`);
const VOTING = listed(`vote | votent | voterait | voteraient | soutient le | soutiennent le | dit | disent`);

/** How people say the answers of a referendum; an answer said outright goes before what is backed. */
const YES = [
  ...each(listed(`le | du | au`), ['oui']),
  ...each(VOTING, ['oui']),
  ...each(BACKING, THINGS),
  ...listed(`pour le oui | favorables au péage | favorable à`),
];
const NO = [
  ...each(listed(`le | du | au`), ['non']),
  ...each(VOTING, ['non']),
  ...each(REFUSING, THINGS),
  ...listed(`s'oppose au | s'opposent au | opposés au | opposé au`),
];

/** French, as written in several countries. */
export const FR_LEXICON: Lexicon = {
  decimalMark: ',',
  locale: 'fr-FR',
  groupsBySpace: true,
  elisions: listed(`l | d | qu | n | s | j | m | t | c | jusqu | lorsqu | puisqu | quoiqu`),
  abbreviations: listed(`m | mm | mme | mlle | dr | me | art | env | n | p | st | ste | av`),
  numbers: FR_NUMBERS,
  oneArticles: ['un', 'une'],
  fractions: {
    'deux tiers': 200 / 3,
    'les deux tiers': 200 / 3,
    'trois quarts': 75,
    'les trois quarts': 75,
    'un tiers': 100 / 3,
    'le tiers': 100 / 3,
    'un quart': 25,
    'le quart': 25,
    'un cinquieme': 20,
    'deux cinquiemes': 40,
    'trois cinquiemes': 60,
    'quatre cinquiemes': 80,
    'un dixieme': 10,
    'la moitie': 50,
    'une moitie': 50,
  },
  inEvery: ['sur'],
  to: ['à', 'au', 'contre', 'face à', 'et', '–', '-'],
  datesAreNames: false,
  capitalsAreNames: true,
  months: [
    ['janvier'],
    ['fevrier'],
    ['mars'],
    ['avril'],
    ['mai'],
    ['juin'],
    ['juillet'],
    ['aout'],
    ['septembre'],
    ['octobre'],
    ['novembre'],
    ['decembre'],
  ],
  weekdays: [['dimanche'], ['lundi'], ['mardi'], ['mercredi'], ['jeudi'], ['vendredi'], ['samedi']],
  nameNouns: {
    approve: listed(
      `cote du gouverneur | approbation du gouverneur | approbation | approuve | approuvent | cote de popularité`,
    ),
    disapprove: listed(`désapprobation du gouverneur | désapprobation | désapprouve | désapprouvent`),
    approuve: listed(`approbation | approuvent`),
    desapprouve: listed(`désapprobation | désapprouvent`),
    yes: YES,
    oui: YES,
    no: NO,
    non: NO,
    "don't know": listed(`indécis | les indécis | ne sait pas | ne savent pas`),
  },
  commonNames: listed(
    ` | no | oui | non | autre | autres | aucun | aucune | indécis | mieux | pire | pour | contre        `,
  ),
  afterCommonName: listed(`
    devance | gagne | dépasse | mène | obtient | recueille | recule | progresse | monte | baisse | perd | à |
    avec | , | . | : | ; | ) | ! | " | ( | va | est | reste | arrive | sur | contre | et | dans | en | que | qu' |
    plus | a | depuis | face | au | pour | de`),
  genericNameWords: listed(
    `parti | le | la | liste | alliance | union | ligue | mouvement | coalition | party | the | list | league`,
  ),
  notNames: listed(`
    le | la | les | l' | d' | un | une | des | du | de | en | a | au | aux | pour | par | avec | sans | sur |
    sous | dans | chez | entre | et | ou | mais | si | ne | n' | qu' | que | qui | quoi | dont | ce | cette |
    ces | c' | s' | j' | son | sa | ses | leur | leurs | il | elle | ils | elles | on | nous | comme | quand |
    selon | apres | avant | depuis | aujourd | hier | ici | plus | moins | tres | tout | tous | aucun | aucune |
    ni | deux | trois | quatre | cinq | sondage | sondages | enquete | chiffres | avance | ecart | course |
    majorite | egalite | est | sont | reste | va | toujours | encore | nette | net | forte | fort | legere |
    large | nouveau | nouvelle | grosse | petite | egalement | tandis | alors | car | donc | chaque | rien |
    personne | soutien | bien | ainsi`),
  cues: { ...FR_LEADS, ...FR_CHANGES, ...FR_FIGURES, ...FR_POLLS, ...FR_WORDS, ...FR_SMALL_WORDS },
  populations: {
    adults: 'personnes adultes',
    'registered-voters': 'personnes inscrites sur les listes électorales',
    'likely-voters': 'personnes susceptibles de voter',
  },
  replacements: {
    isAheadUnsettled:
      'a un chiffre plus élevé que {b} dans ce sondage, mais celui-ci ne permet pas de trancher',
    aheadNow: 'devant',
    isAhead: 'est devant {b}',
    leads: 'devance',
    trails: 'a un chiffre plus bas',
    chanceGap: 'a le chiffre le plus élevé, mais le hasard seul pourrait produire cet écart',
    untestedGap: 'a le chiffre le plus élevé, dans un sondage sans marge d’erreur reconnue',
    level: 'au même chiffre dans ce sondage',
    higherFigure: 'a le chiffre le plus élevé',
    higherUnsettled:
      'a un chiffre plus élevé, {now} contre {then}, mais les sondages ne permettent pas de trancher',
    lowerUnsettled:
      'a un chiffre plus bas, {now} contre {then}, mais les sondages ne permettent pas de trancher',
    chanceChange: 'est à {now}, contre {then}\u00a0: le hasard seul pourrait produire cette différence',
    untestedChange: 'est à {now}, contre {then}\u202f; l’évolution ne peut pas être testée',
    sameFigure: 'a le même chiffre qu’avant',
    isUp: 'est en hausse',
    isDown: 'est en baisse',
    points: '{n} points de pourcentage',
    suggests: 'suggère',
    largerThanChance: 'plus grand que ce que le hasard seul produit d’ordinaire',
    couldBeChance: 'd’une taille que le hasard seul pourrait produire',
    atShare: '{share}',
  },
};
