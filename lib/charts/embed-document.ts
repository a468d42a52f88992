import { formatValue } from './chart-words';
import { figuresSentence } from './describe-sounding';
import type { EmbedInput } from './embed-input';
import { embedStyle } from './embed-style';
import { embedTable } from './embed-table';
import { ENGLISH_EMBED_WORDS, type EmbedWords } from './embed-words';
import { escapeMarkup } from './escape';
import { htmlDocument } from './html-document';
import { sceneToInlineSvg } from './scene-to-svg';
import { soundingLegend } from './sounding-legend';
import { soundingScene } from './sounding-scene';

/**
 * The whole public page of one chart: no script, nothing fetched. By ear it runs finding, range, who, when, the
 * picture, every answer in a table, the caveat.
 *
 * @param input cleared words and figures
 * @param words the language around them
 */
export function embedDocument(input: EmbedInput, words: EmbedWords = ENGLISH_EMBED_WORDS): string {
  const body = [
    `<h1>${escapeMarkup(input.chartTitle)}</h1>`,
    `<p>${escapeMarkup(figuresSentence(input.sounding, words))}</p>`,
    `<p class="sub">${escapeMarkup(input.particulars)}</p>`,
    figure(input, words),
    embedTable(input.rows, words),
    ...input.caveat
      .split(/\n\s*\n/)
      .filter((paragraph) => paragraph.trim() !== '')
      .map((paragraph) => `<p class="cav">${escapeMarkup(paragraph.trim())}</p>`),
    foot(input, words),
  ].join('');
  return htmlDocument({
    lang: input.lang,
    title: input.chartTitle,
    style: embedStyle(input.theme),
    body,
  });
}

const WIDTHS = [
  { name: 'wide', widthPx: 640 },
  { name: 'narrow', widthPx: 300 },
] as const;

/** The picture at two widths, so that its words stay legible; only one is shown and read. */
function figure({ sounding, altText }: EmbedInput, words: EmbedWords): string {
  const value = formatValue(sounding.estimatePp, sounding.decimals, sounding.quantity, words);
  const pictures = WIDTHS.map(({ name, widthPx }) => {
    const scene = soundingScene(sounding, { widthPx, kind: 'full', hasMargin: false }, words);
    const named = { ...scene, title: `${sounding.label}: ${value}`, description: altText };
    return sceneToInlineSvg(named, { idPrefix: name, className: name });
  });
  const legend = soundingLegend(sounding, words).join(' ');
  return `<figure>${pictures.join('')}<figcaption>${escapeMarkup(legend)}</figcaption></figure>`;
}

function foot({ version, updated, source }: EmbedInput, words: EmbedWords): string {
  const time = `<time datetime="${escapeMarkup(updated.iso)}">${escapeMarkup(updated.text)}</time>`;
  const made = `<span>${escapeMarkup(words.version(String(version)))}, ${time}</span>`;
  return `<div class="foot">${source ? `<span>${sourceLink(source, words)}</span>` : ''}${made}</div>`;
}

/** Only addresses of the web become links; anything else stays words. */
function sourceLink({ text, url }: { text: string; url: string | null }, words: EmbedWords): string {
  const label = escapeMarkup(text);
  const isWeb = url !== null && /^https?:\/\//i.test(url);
  const link = isWeb
    ? `<a href="${escapeMarkup(url)}" target="_blank" rel="noopener noreferrer">${label}</a>`
    : label;
  return `${escapeMarkup(words.source)} ${link}`;
}
