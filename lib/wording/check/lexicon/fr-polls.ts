import type { Cue } from '../phrases';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'forecast'
  | 'proof'
  | 'shows'
  | 'subgroup'
  | 'amongst'
  | 'wholeSample'
  | 'everybody'
  | 'people'
  | 'voters'
  | 'likelyVoters'
  | 'registeredVoters'
  | 'adults';

const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));
const GROUPS = listed(`
  femmes | hommes | jeunes | seniors | retraités | étudiants | ouvriers | cadres | employés | chômeurs |
  agriculteurs | ruraux | urbains | diplômés | locataires | propriétaires | moins de | plus de | jeunes
  électeurs | électeurs ruraux | électeurs urbains | jeunes adultes`);

/** French: what polls are said to do, and who was asked. */
export const FR_POLLS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  forecast: [
    {
      say: [
        ...each(
          listed(
            `va | vont | allons | vais | devrait | devraient | est en passe de | en passe de | s'apprête à | est assuré de | est assurée de | est sûr de | promis à | est bien parti pour | bien partie pour`,
          ),
          listed(
            `gagner | perdre | l'emporter | triompher | gouverner | être élu | être élue | s'imposer | être battu | devenir gouverneur`,
          ),
        ),
        ...listed(`
        gagnera | gagneront | gagnerons | gagnerai | l'emportera | l'emporteront | triomphera | perdra |
        perdront | gouvernera | s'imposera | vaincra | gagnerait | gagneraient | l'emporterait |
        l'emporteraient | perdrait | triompherait | gouvernerait`),
        ...each(
          listed(`sera | seront | serons | serait`),
          listed(
            `élu | élue | élus | réélu | réélue | battu | battue | le prochain | la prochaine | le nouveau | la nouvelle | gouverneur | vainqueur | le vainqueur`,
          ),
        ),
        ...each(
          listed(`en route vers | se dirige vers | vole vers | file vers | marche vers | promis à`),
          listed(`la victoire | une victoire | la défaite | la réélection | un triomphe`),
        ),
        ...listed(`
        victoire assurée | victoire certaine | a course gagnée | futur gouverneur | prédit | prédisent |
        pronostique | pronostiquent | prévoit la victoire | annonce la victoire | présage | augure`),
      ],
    },
  ],
  proof: [
    {
      say: listed(`
      prouve | prouvent | prouvé | démontre | démontrent | démontré | confirme | confirment | confirmé |
      atteste | attestent | établit | établissent | ne laisse aucun doute | sans aucun doute | met fin au
      doute`),
    },
    { say: ['preuve'], notAfter: listed(`la | sans | aucune | pas une | une | de`) },
  ],
  shows: [{ say: listed(`montre | montrent | montré | révèle | révèlent | révélé | fait apparaître`) }],
  subgroup: [
    {
      say: [
        ...each(listed(`chez les | parmi les | auprès des | les`), GROUPS),
        ...listed(`femmes | jeunes électeurs | retraités | étudiants | ouvriers | seniors`),
      ],
      notBefore: ['la moitié'],
    },
  ],
  amongst: [{ say: ['chez les', 'parmi les', 'auprès des'] }],
  wholeSample: [
    {
      say: listed(`
      électeurs | adultes | personnes | sondés | interrogés | inscrits | deux | trois | candidats | partis |
      sondages | plus | citoyens | répondants | exprimés | décidés | mêmes | autres | chiffres | réponses |
      options | participants | suffrages | principaux`),
    },
  ],
  everybody: [
    {
      say: listed(
        `la population | les citoyens | le pays | tout le pays | l'électorat | les habitants | toute la province`,
      ),
      notBefore: ['de référence', 'interrogée', 'étudiée', 'cible'],
    },
  ],
  people: [
    {
      say: listed(`des gens | de la population | des habitants`),
      after: listed(`% | cent | moitié | majorité | plupart`),
      notBefore: listed(`interrogés | sondés | qui`),
    },
  ],
  voters: [
    {
      say: ['électeurs', 'électeur', 'électrices', 'votants'],
      notBefore: listed(`probables | probable | inscrits | indécis | décidés`),
      notAfter: ['probables'],
    },
  ],
  likelyVoters: [
    {
      say: listed(
        `électeurs probables | électeur probable | personnes susceptibles de voter | probables électeurs | personnes certaines d'aller voter`,
      ),
    },
  ],
  registeredVoters: [
    {
      say: listed(
        `électeurs inscrits | électeur inscrit | inscrits sur les listes électorales | inscrites sur les listes électorales | personnes inscrites sur les listes électorales | inscrits sur les listes`,
      ),
    },
  ],
  adults: [{ say: listed(`adultes | adulte | personnes adultes | majeurs`), notBefore: ['handicapés'] }],
};
