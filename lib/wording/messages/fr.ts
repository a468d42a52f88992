import type { LanguagePack } from '../language-pack';
import { FR_ALT_TEXT } from './fr-alt-text';
import { FR_BODY } from './fr-body';
import { FR_CAVEAT } from './fr-caveat';
import { FR_CHART_TITLE } from './fr-chart-title';
import { FR_HEADLINE } from './fr-headline';
import { FR_LIMITS } from './fr-limits';
import { FR_METHOD_NOTE } from './fr-method-note';
import {
  FR_CAVEAT_SHORT,
  FR_CORRECTION,
  FR_FRAGILE_SHORT,
  FR_NEWSLETTER,
  FR_ONE_BREATH,
  FR_SPOKEN,
} from './fr-short';
import { FR_TERMS } from './fr-terms';
import { FR_TOLD } from './fr-told';
import { typesetFrench } from './fr-typeset';

const MESSAGES: LanguagePack = {
  headline: FR_HEADLINE,
  body: FR_BODY,
  chartTitle: FR_CHART_TITLE,
  told: FR_TOLD,
  ...FR_LIMITS,
  fragileShort: FR_FRAGILE_SHORT,
  context: {
    others: 'Aussi dans ce sondage : {others}.',
    bloc: '{bloc} réunit {members}.',
    'shared-waves':
      'Les deux sondages ont en commun {shared} de leurs {window} vagues ; seules les autres font la différence entre eux.',
    groups:
      'Les chiffres reposent sur {gSized, select, yes {{gN} entretiens} other {un nombre non communiqué d’entretiens}} parmi {g} et {hSized, select, yes {{hN}} other {un nombre non communiqué}} parmi {h}.',
  },
  caveat: FR_CAVEAT,
  caveatShort: FR_CAVEAT_SHORT,
  oneBreath: FR_ONE_BREATH,
  methodNote: FR_METHOD_NOTE,
  comparison: {
    latest: 'C’est le dernier sondage de cette série aux dates antérieures.',
    'latest-comparable':
      '{count, plural, one {C’est le dernier sondage antérieur qui peut être comparé ; un autre, plus récent, en diffère sur ces points : {items}.} other {C’est le dernier sondage antérieur qui peut être comparé ; # autres, plus récents, en diffèrent sur ces points : {items}.}}',
    unknown: 'On l’ignore, sans le tenir pour différent : {items}.',
    override:
      '{differing, select, yes {Les deux sondages diffèrent sur ces points : {items} ; la rédaction les compare malgré tout : {reason}} other {La rédaction a choisi le sondage de comparaison : {reason}}}',
  },
  altText: FR_ALT_TEXT,
  spoken: FR_SPOKEN,
  newsletter: FR_NEWSLETTER,
  correction: FR_CORRECTION,
  terms: FR_TERMS,
};

/** French as the product ships it: not to be printed until a native editor of the desk has signed it. */
export const FR: LanguagePack = typesetFrench(MESSAGES);
