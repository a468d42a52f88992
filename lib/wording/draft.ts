import type { DraftInput } from './draft-input';
import type { LanguagePack } from './language-pack';

import { say, type Slots } from './say';
import type { Voice } from './voice';
import type { WordingState } from './wording-state';

/** A sheet being drafted: the input, how far its words may go, and every slot a message may name. */
export type Draft = {
  input: DraftInput;
  voice: Voice;
  pack: LanguagePack;
  state: WordingState;
  slots: Slots;
};

/** Whole sentences one after the other; a pack from before a sentence was added leaves it out. */
export function sayAll(
  messages: readonly (string | null | undefined)[],
  draft: Draft,
  extra: Slots = {},
): string {
  return messages
    .filter((message) => message !== null && message !== undefined)
    .map((message) => say(message, { ...draft.slots, ...extra }, draft.voice.locale))
    .join(' ');
}

/** Whether the finding was tested and has a range worth printing. */
export function hasRange({ finding }: DraftInput): boolean {
  return finding.verdict !== 'cannot-be-tested' && finding.intervalPp[0] < finding.intervalPp[1];
}
