import { blocsOf, nameOf, othersAbove, printFigure } from './claim-slots';
import { sayAll, type Draft } from './draft';
import { figureOf, isOfTwoReleases, type BlocTold } from './draft-input';
import { isolated } from './names';
import { printCount } from './print';
import { say, type Slots } from './say';

/** What a reader has to know of what is compared: others in the race, what a bloc counts, shared waves, sizes of groups. */
export function contextSentences(draft: Draft): string {
  const { input, pack } = draft;
  const { context } = pack as { context?: typeof pack.context };
  if (!context) return '';
  const others = othersAbove(input);
  const sentences = [
    others.length > 0 ? sayAll([context.others], draft, { others: figuresOf(others, draft) }) : '',
    ...blocsOf(input).map((bloc) => sayAll([context.bloc], draft, blocSlots(bloc, draft))),
    sharesWaves(draft) ? sayAll([context['shared-waves']], draft, waveSlots(draft)) : '',
    input.finding.kind === 'gap' ? sayAll([context.groups], draft) : '',
  ];
  return sentences.filter((sentence) => sentence !== '').join(' ');
}

export function blocSlots({ name, options, source }: BlocTold, draft: Draft): Slots {
  const members = options.map((option) => isolated(option));
  return { bloc: isolated(name), members: listOf(members, draft), source };
}

/** Whom re-based shares are shares of; an empty text where they are of everyone asked. */
export function rebasedSentence(draft: Draft): string {
  const rebasedN = draft.input.beside?.rebasedN;
  if (typeof rebasedN !== 'number') return '';
  return sayAll([draft.pack.methodNote.rebased], draft, { rebasedN: printCount(rebasedN, draft.voice) });
}

/** Whether some waves, though not all, stand in both averages. */
export function sharesWaves({ input }: Draft): boolean {
  const overlap = input.beside?.overlap;
  return isOfTwoReleases(input.finding.kind) && overlap != null && overlap.shared < overlap.window;
}

export function waveSlots({ input, voice }: Draft): Slots {
  const overlap = input.beside?.overlap;
  if (!overlap) return {};
  return {
    window: printCount(overlap.window, voice),
    shared: printCount(overlap.shared, voice),
    equal: overlap.assumesEqualWaves ? 'yes' : 'no',
    pooled: overlap.usesPooledShare ? 'yes' : 'no',
  };
}

function figuresOf(names: readonly string[], draft: Draft): string {
  const { input, pack, voice } = draft;
  const figures = names.map((name) =>
    say(
      pack.terms.figure,
      { name: nameOf(name, input, voice), share: printFigure(figureOf(name, input, 'now'), voice) },
      voice.locale,
    ),
  );
  return listOf(figures, draft);
}

/** Items in a row, joined as the language joins them. */
export function listOf(items: readonly string[], { voice }: Draft): string {
  return new Intl.ListFormat(voice.locale, { type: 'conjunction' }).format(items);
}
