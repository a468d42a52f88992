import type { LanguagePack } from '../language-pack';
import { DE_ALT_TEXT } from './de-alt-text';
import { DE_BODY } from './de-body';
import { DE_CAVEAT } from './de-caveat';
import { DE_CHART_TITLE } from './de-chart-title';
import { DE_HEADLINE } from './de-headline';
import { DE_LIMITS } from './de-limits';
import { DE_METHOD_NOTE } from './de-method-note';
import {
  DE_CAVEAT_SHORT,
  DE_CORRECTION,
  DE_FRAGILE_SHORT,
  DE_NEWSLETTER,
  DE_ONE_BREATH,
  DE_SPOKEN,
} from './de-short';
import { DE_TERMS } from './de-terms';
import { DE_TOLD } from './de-told';

/** German as the product ships it: not to be printed until a native editor of the desk has signed it. */
export const DE: LanguagePack = {
  headline: DE_HEADLINE,
  body: DE_BODY,
  chartTitle: DE_CHART_TITLE,
  told: DE_TOLD,
  ...DE_LIMITS,
  fragileShort: DE_FRAGILE_SHORT,
  context: {
    others: 'Außerdem in dieser Umfrage: {others}.',
    bloc: '{bloc} umfasst {members}.',
    'shared-waves':
      'Die beiden Umfragen haben {shared} ihrer {window} Wellen gemeinsam; nur die übrigen machen den Unterschied zwischen ihnen aus.',
    groups:
      'Die Werte beruhen auf {gSized, select, yes {{gN} Interviews} other {einer nicht veröffentlichten Zahl von Interviews}} unter {g} und {hSized, select, yes {{hN}} other {einer nicht veröffentlichten Zahl}} unter {h}.',
  },
  caveat: DE_CAVEAT,
  caveatShort: DE_CAVEAT_SHORT,
  oneBreath: DE_ONE_BREATH,
  methodNote: DE_METHOD_NOTE,
  comparison: {
    latest: 'Es ist die jüngste Umfrage dieser Reihe mit früheren Befragungstagen.',
    'latest-comparable':
      '{count, plural, one {Es ist die jüngste frühere Umfrage, die sich vergleichen lässt; eine spätere unterscheidet sich hierin: {items}.} other {Es ist die jüngste frühere Umfrage, die sich vergleichen lässt; # spätere unterscheiden sich hierin: {items}.}}',
    unknown: 'Nicht bekannt und nicht als verschieden gewertet: {items}.',
    override:
      '{differing, select, yes {Die beiden Umfragen unterscheiden sich hierin: {items}; die Redaktion vergleicht sie dennoch: {reason}} other {Die Redaktion hat die Vergleichsumfrage ausgewählt: {reason}}}',
  },
  altText: DE_ALT_TEXT,
  spoken: DE_SPOKEN,
  newsletter: DE_NEWSLETTER,
  correction: DE_CORRECTION,
  terms: DE_TERMS,
};
