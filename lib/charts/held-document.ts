import type { Dated } from './embed-input';
import { embedStyle } from './embed-style';
import { escapeMarkup } from './escape';
import { htmlDocument } from './html-document';
import type { ThemeChoice } from './tokens';

/** What stands where a chart was while a law bars it: that, and until when. No figure of it. */
export function heldDocument({
  theme,
  until,
  says,
}: {
  theme: ThemeChoice;
  until: Dated;
  says: string;
}): string {
  const time = `<time datetime="${escapeMarkup(until.iso)}">${escapeMarkup(until.text)}</time>`;
  const title = 'This chart is not shown now';
  const body = `<h1>${title}</h1><p class="sub">${escapeMarkup(says)} until ${time}. It can be shown again after that.</p>`;
  return htmlDocument({ lang: 'en', title, style: embedStyle(theme), body });
}
