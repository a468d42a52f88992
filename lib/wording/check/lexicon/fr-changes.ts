import type { Cue } from '../phrases';
import { FR_COUNTS } from './fr-counts';
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

const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));
const THE_LEAD = listed(`l'écart | son avance | l'avance | la différence | la distance | le fossé`);
const ARTICLES = listed(`le | la | les | l' | un | une | son | sa | ses | leur | en | des | du`);

/** French: moving, standing still, and how high or low ever. */
export const FR_CHANGES: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  up: [
    {
      say: listed(`monte | montent | montait | montée | grimpe | grimpent | grimpé`),
      notBefore: [...ARTICLES, 'à', 'sur', 'au créneau', 'dans'],
    },
    { say: ['monte à', 'grimpe à', 'grimpé à', 'monté à'], before: FR_COUNTS },
    {
      say: listed(`
      progresse | progressent | progressé | progressait | progression | augmente | augmentent | augmenté |
      augmentation | croît | croissent | s'améliore | s'améliorent | rebondit | remonte | remontent |
      remonté | remontée | se redresse | redécolle | décolle`),
      notBefore: ARTICLES,
    },
    {
      say: ['en hausse', 'la hausse', 'une hausse', 'hausse', 'à la hausse', 'en progression', 'en progrès'],
      notBefore: ['des prix', 'du', 'des'],
    },
    { say: ['gagne', 'gagnent', 'gagné', 'gagnait', 'reprend', 'reprennent', 'regagne'], before: FR_COUNTS },
    { say: ['gagne un', 'gagné un'], before: ['point'] },
    {
      say: each(
        listed(`gagne | gagnent | gagné | regagne`),
        listed(`du terrain | des points | en popularité | des voix | des soutiens`),
      ),
    },
    { say: ['plus populaire'], notBefore: ['que', "qu'"], notAfter: ['le', 'la'] },
  ],
  down: [
    {
      say: listed(`
      baisse | baissent | baissé | en baisse | la baisse | une baisse | à la baisse | recule | reculent |
      reculé | recul | en recul | chute | chutent | chuté | chutait | tombe | tombent | tombé | tombée |
      diminue | diminuent | diminué | décline | déclinent | déclin | s'érode | s'effrite | fléchit |
      fléchissent | régresse | dégringole | glisse | glissent | décroche | décrochent | s'affaiblit`),
      notBefore: [...ARTICLES.filter((word) => word !== 'en'), 'sous', 'dans', 'bien', 'des'],
      notAfter: ['plus'],
    },
    { say: ['perd', 'perdent', 'perdu', 'perdait', 'cède', 'cèdent', 'cédé', 'lâche'], before: FR_COUNTS },
    { say: ['perd un', 'perdu un', 'cède un', 'perd près'], before: ['point', 'de'] },
    {
      say: each(
        listed(`perd | perdent | perdu | cède`),
        listed(`du terrain | des points | des voix | des soutiens | en popularité`),
      ),
    },
    { say: ['moins populaire'], notBefore: ['que', "qu'"] },
  ],
  dramatic: [
    {
      say: listed(`
      s'envole | s'envolent | s'est envolé | s'est envolée | bondit | bondissent | bondi | explose | fulgurant |
      fulgurante | envolée | percée | raz de marée | cartonne | flambe | spectaculaire`),
    },
    {
      say: listed(`
      s'effondre | s'effondrent | s'est effondré | s'est effondrée | effondrement | dévisse | dévissent |
      plonge | plongent | plongeon | dégringolade | débâcle | débandade | chute libre | s'écroule |
      s'écroulent`),
    },
  ],
  momentum: [
    {
      say: listed(
        `dynamique | élan | vent en poupe | vague | momentum | bascule | renversement de tendance | a le vent`,
      ),
      notBefore: ['de chaleur', 'équipe'],
    },
  ],
  leadUp: [
    {
      say: each(
        listed(
          `creuse | creusent | creusé | accroît | accroissent | augmente | augmenté | élargit | élargissent | double | conforte`,
        ),
        THE_LEAD,
      ),
    },
    {
      say: listed(
        `s'échappe | se détache | prend le large | l'écart se creuse | écart se creuse | se creuse`,
      ),
    },
  ],
  leadDown: [
    {
      say: each(
        listed(
          `réduit | réduisent | comble | comblent | comblé | resserre | resserrent | resserré | grignote`,
        ),
        [...THE_LEAD, 'son retard'],
      ),
    },
    {
      say: listed(
        `se rapproche | se rapprochent | revient sur | talonne | se resserre | se réduit | fond sur`,
      ),
    },
  ],
  gap: [{ say: listed(`écart | avance | différence | distance | course | avantage`) }],
  steady: [
    {
      say: listed(`
      stable | stables | inchangé | inchangée | inchangés | sans changement | stagne | stagnent | stagnation
      | n'a pas bougé | n'ont pas bougé | ne bouge pas | ne bougent pas | ne change pas | n'a pas changé |
      ne varie pas | n'a pas varié | immobile | statu quo | aucun changement | fait du surplace | se maintient |
      se maintiennent | reste le même | reste au même niveau | reste inchangé | plafonne | figé | figée`),
      notBefore: ['en tête', 'devant', 'emploi'],
    },
  ],
  littleChanged: [
    {
      say: listed(`
      ne varie guère | ne bouge guère | ne change guère | varie peu | bouge peu | change peu | peu de
      changement | presque inchangé | presque inchangée | quasi inchangé | quasi stable | quasiment stable |
      à peu près stable | presque stable | pratiquement inchangé | peu varié | guère bougé | guère varié |
      guère changé`),
    },
  ],
  raceWords: [{ say: listed(`course | écart | rapport de forces | avance | situation | duel`) }],
  recordWords: [
    {
      say: listed(`
      record | records | plus haut niveau historique | plus haut historique | plus bas historique | plus bas
      niveau historique | plus haut niveau | plus bas niveau | pour la première fois | première fois | sans
      précédent | jamais vu | hausse historique | chute historique | meilleur score de la série | pire score
      de la série | du jamais vu`),
      notBefore: ["d'affluence", 'que', "qu'"],
    },
  ],
  recordHigh: [
    { say: listed(`plus haut | plus élevé | meilleur | plus fort | plus grand`) },
    { say: listed(`plus haut niveau historique | plus haut historique | plus haut niveau | record`) },
  ],
  recordLow: [
    { say: listed(`plus bas | plus faible | pire`) },
    { say: listed(`plus bas historique | plus bas niveau historique | plus bas niveau`) },
  ],
};
