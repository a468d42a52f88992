import type { Cue } from '../phrases';
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
const ASSEMBLY = listed(
  `l'assemblée | au parlement | le parlement | à la chambre | la chambre | l'hémicycle`,
);
const FIFTY = listed(`50 % | 50 pour cent | cinquante pour cent`);

/** French: halves, thresholds, margins, sizes and significance. */
export const FR_FIGURES: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  majority: [
    {
      say: listed(`
      majorité | majorités | majorité absolue | large majorité | nette majorité | majoritaire | majoritaires |
      majoritairement`),
      notBefore: listed(`relative | simple | silencieuse | parlementaire | sortante | municipale`),
    },
  ],
  most: [{ say: ['la plupart'], before: ['des', "d'"] }],
  overHalf: [
    {
      say: listed(`
      plus de la moitié | un peu plus de la moitié | au-dessus de la moitié | dépasse la moitié | dépassent la
      moitié | barre de la moitié | passe la moitié | franchit la moitié`),
    },
    {
      say: [
        ...each(
          listed(
            `plus de | au-dessus de | au-dessus des | au-dessus de la barre des | dépasse | dépasse les | franchit les | passe les`,
          ),
          FIFTY,
        ),
      ],
    },
  ],
  underHalf: [
    {
      say: listed(
        `moins de la moitié | en dessous de la moitié | sous la moitié | n'atteint pas la moitié | un peu moins de la moitié`,
      ),
    },
    {
      say: each(
        listed(
          `moins de | en dessous de | au-dessous de la barre des | au-dessous des | sous les | n'atteint pas les`,
        ),
        FIFTY,
      ),
    },
  ],
  minority: [
    {
      say: ['minorité', 'minoritaire', 'minoritaires'],
      notBefore: ['ethnique', 'linguistique', 'parlementaire'],
    },
  ],
  aboveThreshold: [
    {
      say: listed(`
      franchit | franchissent | franchirait | franchissant | au-dessus de | au-dessus du | au-dessus des |
      dépasse | dépasserait | passe | passerait | atteint | atteindrait | plus de | supérieur à`),
    },
  ],
  belowThreshold: [
    {
      say: listed(`
      sous | au-dessous de | au-dessous du | en dessous de | en dessous du | au-dessous des | en dessous des |
      n'atteint pas | n'atteindrait pas | ne franchit pas | ne passe pas | ne dépasse pas | moins de | loin de
      | loin du | rate`),
    },
  ],
  thresholdNoun: [{ say: listed(`seuil | barre | minimum`) }],
  intoAssembly: [
    {
      say: each(
        listed(
          `entre à | entrent à | entrerait à | entreraient à | entre au | entrerait au | siège à | siégerait à | accède à | une place à | reste à`,
        ),
        listed(`l'assemblée | parlement | la chambre`),
      ),
    },
    {
      say: listed(
        `obtient des sièges | obtiendrait des sièges | aurait des élus | décroche des sièges | décrocherait des sièges | aurait des sièges`,
      ),
    },
  ],
  outOfAssembly: [
    { say: each(listed(`hors de | quitte | quitterait | absent de | sort de`), ASSEMBLY) },
    {
      say: listed(
        `sans élu | aucun siège | sans siège | n'aurait aucun élu | hors du parlement | éliminé | éliminée | perdrait tous ses sièges | exclu de l'assemblée`,
      ),
    },
  ],
  marginNoun: [
    {
      say: listed(
        `marge d'erreur | marges d'erreur | marge d'erreur d'échantillonnage | erreur d'échantillonnage | marge d'incertitude`,
      ),
    },
  ],
  plusMinus: [{ say: listed(`± | plus ou moins | +/- | + / - | + ou -`) }],
  withinMargin: [
    {
      say: listed(
        `dans la marge | dans sa marge | dans les marges | à l'intérieur de la marge | inférieur à la marge | inférieure à la marge`,
      ),
    },
  ],
  outsideMargin: [
    {
      say: listed(
        `hors de la marge | hors marge | supérieur à la marge | supérieure à la marge | dépasse la marge | au-delà de la marge | excède la marge`,
      ),
    },
  ],
  noMargin: [
    {
      say: listed(`
      sans marge d'erreur | pas de marge d'erreur | pas de marge | aucune marge d'erreur | aucune marge | n'a
      pas de marge | sans marge | ni marge d'erreur | n'indique pas de marge | pas de marge d'erreur
      d'échantillonnage | aucune marge d'erreur d'échantillonnage`),
    },
  ],
  statSignificant: [
    {
      say: listed(
        `statistiquement significatif | statistiquement significative | statistiquement significatifs | statistiquement significatives | significativité statistique | statistiquement fiable | statistiquement établi`,
      ),
    },
  ],
  significant: [
    {
      say: listed(
        `significatif | significative | significatifs | significatives | significativement | ne doit rien au hasard | n'est pas dû au hasard | pas le fruit du hasard`,
      ),
    },
  ],
  clear: [
    {
      say: listed(
        `nette hausse | nette baisse | net recul | nette progression | décisif | décisive | incontestable | incontesté | sans appel | indiscutable`,
      ),
    },
  ],
  sampleMarkers: [
    {
      say: listed(
        `échantillon de | échantillon est de | échantillon était de | n = | n= | auprès de | portant sur`,
      ),
    },
  ],
  interviewed: [
    {
      say: listed(
        `interrogé | interrogés | interroge | sondé | sondés | questionné | consulté | entretiens avec | auprès de | interviewé`,
      ),
    },
  ],
  approximately: [
    {
      say: listed(
        `environ | quelque | près de | plus de | moins de | autour de | à peu près | presque | au moins`,
      ),
    },
  ],
  almost: [
    {
      say: listed(
        `près de | presque | environ | à peine | un peu plus d' | un peu plus de | un peu moins de | un peu moins d' | plus de | moins de | autour de | quasiment | plus d' | moins d'`,
      ),
    },
  ],
  decided: [
    {
      say: listed(
        `hors indécis | sans les indécis | électeurs décidés | parmi les décidés | suffrages exprimés | exprimés | hors sans opinion`,
      ),
    },
  ],
  percentWords: [{ say: listed(`% | pour cent | pct`) }],
  pointWords: [
    {
      say: listed(
        `points de pourcentage | point de pourcentage | points de pour cent | points | point | pts | pt`,
      ),
      notBefore: ['de vue', 'de départ', 'commun'],
    },
  ],
  sizeMarkers: [
    {
      say: listed(
        `de | d' | par | de près de | de plus de | d'environ | de quelque | de moins de | seulement | encore`,
      ),
    },
    { say: ['encore', 'près de'] },
  ],
  notShare: [
    {
      say: listed(
        `de confiance | confiance | de participation | participation | intervalle | de probabilité | de remise | de chances | de dépouillés | dépouillés | de réponse | nécessaires`,
      ),
    },
  ],
};
