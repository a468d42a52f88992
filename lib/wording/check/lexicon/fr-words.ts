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

const MARGIN_STARTS = listed(`la | sa | cette | une | les | ses | marge | ± | # | erreur`);
const ARTICLES = listed(`le | la | les | l'`);
const withArticles = (words: readonly string[]) =>
  words.flatMap((word) => [word, ...ARTICLES.map((article) => `${word} ${article}`)]);

/** French: words of the trade, of time, and those that open, deny or part a claim. */
export const FR_WORDS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  poll: [
    {
      say: listed(`
      sondage | sondages | enquête | enquêtes | baromètre | sondés | institut | intentions de vote |
      soutien | soutiens | approbation | désapprobation | chiffres | électeurs | élection | élections |
      référendum | scrutin | voix | candidat | candidate | candidats | rival | rivaux | cote | popularité |
      course | électoral | électorale`),
    },
  ],
  compare: [
    {
      say: listed(
        `comparé à | par rapport à | diffère | diffèrent | écart entre | contraste | plus que | moins que | plus qu' | moins qu'`,
      ),
    },
  ],
  fieldworkWords: [
    {
      say: listed(`
      entretiens | entretien | interrogé | interrogés | interrogées | sondés | réalisée | réalisé | réalisés |
      menée | mené | conduite | effectuée | effectué | terrain | recueilli | recueillies | questionnés |
      achevé | achevée`),
    },
  ],
  publishedWords: [
    {
      say: listed(
        `publié | publiée | publie | publiés | publication | diffusé | diffusée | paru | parue | rendue publique | sondage de | enquête de | enquête d' | sondage d'`,
      ),
    },
  ],
  eventWords: [
    {
      say: listed(`
      élection | élections | élu | élue | scrutin | référendum | vote | débat | urnes | campagne | démission | grève |
      tempête | discours | scandale | budget | procès | voteront | congrès | échéance`),
    },
  ],
  relativeDates: [
    {
      say: listed(`
      cette semaine | la semaine dernière | ce mois-ci | le mois dernier | hier | avant-hier | aujourd'hui |
      ce week-end | le week-end dernier | cette année | l'année dernière | récemment | il y a quelques jours |
      il y a une semaine | il y a deux semaines | il y a un mois | ces derniers jours | ces dernières
      semaines`),
    },
  ],
  earlierWords: [
    {
      say: listed(`
      était | étaient | avait | avaient | recueillait | obtenait | précédent | précédente | précédents |
      auparavant | avant | depuis | contre | par rapport à | comparé | dernier | dernière | il y a | alors |
      celui du | comparaison | en janvier | en février | en mars | en avril | en mai | en juin | en juillet | en août | en
      septembre | en octobre | en novembre | en décembre | d'août | de juillet | de juin | d'avril | retrouve |
      qu'en | celui de | celle de | celle d'`),
    },
  ],
  periodWords: [
    {
      say: listed(`
      l'année dernière | l'an dernier | il y a un an | le mois dernier | il y a un mois | il y a deux mois | il
      y a six mois | depuis le printemps | depuis l'été | depuis l'hiver | depuis l'élection | depuis les
      élections | aux dernières élections | depuis le débat | en une semaine | en deux semaines | en quinze
      jours | cette année | ces derniers mois | ces dernières semaines | en un an | sur un an | depuis des mois
      | la semaine dernière`),
    },
  ],
  openers: [
    {
      say: listed(`
      trop peu | trop peu nombreux | pour calculer | ne permet pas | ne permettent pas | ne peut pas | ne peuvent pas | ne suffit pas | ne suffisent pas | ne
      dit pas | ne disent pas | ne sait pas | on ne sait | on ignore | rien ne dit | nul ne sait | personne ne
      sait | personne ne peut | impossible | qui | lequel | laquelle | quel candidat | quel parti | de quel
      côté | sans savoir | savoir si | dire si | s'il | si l' | si le | si la | trop tôt pour | douteux | il
      faudrait | faudrait | doit | devrait | pourrait | pourraient | peut | peuvent | à moins que | sauf à |
      plutôt que | ne prouve pas | ne prouvent pas | ne signifie pas | n'indique pas | ne confirme pas | ne
      garantit pas | dément | nie | même pas | aucun signe | aucune preuve | pas de preuve | reste à savoir |
      inconnue | possible | peut-être | sans doute | ne veut pas dire | pour dire que | pour dire qu' | pour
      affirmer que | pour affirmer qu' | à savoir si | le hasard seul | à dire qui`),
    },
    { say: ['combien'] },
  ],
  relatives: [{ say: ['qui', 'lequel', 'laquelle'] }],
  withinWords: [
    {
      say: listed(`dans | inférieur à | inférieure à | inférieurs à | sous | en dessous de | plus petit que`),
      before: MARGIN_STARTS,
    },
  ],
  outsideWords: [
    {
      say: listed(
        `hors de | supérieur à | supérieure à | supérieurs à | dépasse | dépassent | excède | au-delà de | au-dessus de | plus grand que`,
      ),
      before: MARGIN_STARTS,
    },
  ],
  comparatives: [
    {
      say: listed(`
      plus haut | plus élevé | plus élevée | plus bas | plus basse | meilleur | pire | supérieur | inférieur |
      points de plus | points de moins | point de plus | point de moins | plus favorable | moins favorable |
      au-dessus | au-dessous | en dessous | plus fort | plus faible | davantage de`),
    },
  ],
  conditionals: [
    {
      say: listed(`si | s' | même si | à condition que | pourvu que | en supposant que`),
      notAfter: ['même'],
    },
  ],
  negators: [
    {
      say: listed(`
      ne | n' | pas | jamais | ni | sans | aucun | aucune | nul | personne | non | guère | cesse de`),
      notBefore: ['que'],
    },
  ],
  clauseBreaks: [
    {
      say: listed(`
      ; | : | – | mais | tandis que | tandis qu' | alors que | alors qu' | cependant | pourtant | car | parce
      que | parce qu' | bien que | bien qu' | toutefois`),
    },
  ],
  pronouns: [
    {
      say: listed(`
      il | elle | ils | elles | son | sa | ses | leur | lui | le candidat | la candidate | le parti | la liste
      | le gouverneur | la gouverneure`),
    },
  ],
  objectMarkers: [
    {
      say: [
        ...withArticles(
          listed(`
          à | pour | sur | contre | avec | par | face à | depuis | entre | et | ou | ni | devant | derrière |
          devance | devancent | dépasse | dépassent | bat | domine | distance | que | qu' | chez`),
        ),
        ...listed(`au | aux`),
      ],
    },
    { say: withArticles(['de', "d'"]), notAfter: ['suivie', 'suivi', 'suivis'] },
    { say: ['du', 'des'], notAfter: ['suivie', 'suivi', 'suivis'] },
  ],
  backs: [
    { say: ['à', 'à la', 'au', "à l'"], after: ['%', 'cent', ','] },
    { say: ['pour', 'pour la', 'pour le', "pour l'"] },
    {
      say: listed(`
      soutient | soutiennent | soutenir | préfère | préfèrent | choisit | choisissent | vote | votent |
      voterait | voteraient | approuve | approuvent | désapprouve | désapprouvent | rejette | rejettent | dit |
      disent | penche | penchent | se prononcent | veut | veulent | en faveur de | en faveur d' | favorables à`),
    },
  ],
};
