import type { WithdrawalInput } from './embed-input';
import { embedStyle } from './embed-style';
import { ENGLISH_EMBED_WORDS, type EmbedWords } from './embed-words';
import { escapeMarkup } from './escape';
import { htmlDocument } from './html-document';

/** What stands where a chart was: that it was withdrawn and when. No figure of it. */
export function withdrawalDocument(
  { lang, theme, withdrawn, note }: WithdrawalInput,
  words: EmbedWords = ENGLISH_EMBED_WORDS,
): string {
  const time = `<time datetime="${escapeMarkup(withdrawn.iso)}">${escapeMarkup(withdrawn.text)}</time>`;
  const body = [
    `<h1>${escapeMarkup(words.withdrawnTitle)}</h1>`,
    `<p class="sub">${escapeMarkup(words.withdrawnOn)} ${time}. ${escapeMarkup(words.withdrawnAdvice)}</p>`,
    note ? `<p class="cav">${escapeMarkup(note)}</p>` : '',
  ].join('');
  return htmlDocument({ lang, title: words.withdrawnTitle, style: embedStyle(theme), body });
}

const NOT_FOUND = htmlDocument({
  lang: 'en',
  title: 'No chart here',
  style: embedStyle('auto'),
  body: '<h1>No chart here</h1><p class="sub">There is no public chart at this address.</p>',
});

/** The same bytes whatever was asked for. */
export function notFoundDocument(): string {
  return NOT_FOUND;
}
