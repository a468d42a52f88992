import 'server-only';
import type { Verdict } from '@/lib/findings/check-types';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { leavesOf } from './leaves';
import { placeOfSentence, slotsFor } from './sentence-rules';
import type { StyleBody } from './style-body';

export type SentenceView = {
  path: string;
  language: string;
  part: string;
  claim: string | null;
  verdict: Verdict | null;
  text: string;
  shipped: string;
  /** Key of its list of slots. */
  slots: string;
};

export type SlotView = { name: string; choices: string[] };

/** Every sentence of a body with what the product ships in its place, and the slots that each may name. */
export function describeSentences({ style }: StyleBody): {
  sentences: SentenceView[];
  slots: Record<string, SlotView[]>;
} {
  const shipped = { style: DEFAULT_HOUSE_STYLE };
  const ours = leavesOf(shipped);
  const slots: Record<string, SlotView[]> = {};
  const sentences = [...leavesOf({ style: { messages: style.messages } })].flatMap(
    ([path, text]): SentenceView[] => {
      const place = placeOfSentence(path);
      const original = ours.get(path);
      if (!place || typeof text !== 'string' || typeof original !== 'string') return [];
      const key = place.claim ? `${place.language}.${place.claim}` : path;
      const locale =
        Object.entries(style.locales).find(([language]) => language === place.language)?.[1] ?? 'en-GB';
      slots[key] ??= [...slotsFor(path, shipped, locale)].map(([name, choices]) => ({ name, choices }));
      const { language, part, claim, verdict } = place;
      return [{ path, language, part, claim, verdict, text, shipped: original, slots: key }];
    },
  );
  return { sentences, slots };
}
