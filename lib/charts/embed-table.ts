import { formatPoints } from '@/lib/format/number';
import { formatLevel, formatValue } from './chart-words';
import type { EmbedRow } from './embed-input';
import type { EmbedWords } from './embed-words';
import { escapeMarkup } from './escape';
import { sceneToInlineSvg } from './scene-to-svg';
import { sharedDomain } from './sounding-scale';
import { soundingScene } from './sounding-scene';

const ROW_PX = 220;

/** Every answer with its share and range, its picture beside it on one common axis; non-answers quietly below. */
export function embedTable(rows: readonly EmbedRow[], words: EmbedWords): string {
  const drawn = rows.flatMap(({ isAnswer, share }) => (isAnswer && share ? [share] : []));
  const domainPp = sharedDomain(drawn);
  const level = drawn.find(({ bands }) => bands.length > 0)?.bands[0]?.level ?? null;
  const levelText = level === null ? null : formatLevel(level, words);
  const ordered = [...rows.filter((row) => row.isAnswer), ...rows.filter((row) => !row.isAnswer)];
  const heads = [
    `<th scope="col">${escapeMarkup(words.answer)}</th>`,
    `<th scope="col">${escapeMarkup(words.share)}</th>`,
    ...(levelText ? [`<th scope="col">${escapeMarkup(words.rangeHead(levelText))}</th>`] : []),
  ];
  return [
    `<table><caption>${escapeMarkup(words.tableCaption(levelText))}</caption>`,
    `<thead><tr>${heads.join('')}</tr></thead><tbody>`,
    ...ordered.map((row, at) => tableRow(row, { at, domainPp, hasRange: levelText !== null }, words)),
    '</tbody></table>',
  ].join('');
}

type Column = { at: number; domainPp: [number, number]; hasRange: boolean };

function tableRow(row: EmbedRow, { at, domainPp, hasRange }: Column, words: EmbedWords): string {
  const { option, isAnswer, share } = row;
  const name = `<bdi>${escapeMarkup(option)}</bdi>`;
  const picture =
    isAnswer && share
      ? sceneToInlineSvg(soundingScene(share, { widthPx: ROW_PX, kind: 'row', domainPp }, words), {
          idPrefix: `row${at}`,
          isDecorative: true,
        })
      : '';
  const value = share ? formatValue(share.estimatePp, share.decimals, 'share', words) : words.notDisclosed;
  return [
    `<tr${isAnswer ? '' : ' class="rest"'}>`,
    `<th scope="row"><div class="opt">${name}${picture}</div></th>`,
    `<td>${escapeMarkup(value)}</td>`,
    hasRange ? `<td>${escapeMarkup(rangeText(row, words))}</td>` : '',
    '</tr>',
  ].join('');
}

function rangeText({ isAnswer, share }: EmbedRow, words: EmbedWords): string {
  const outer = share?.bands[0];
  if (!isAnswer || !outer) return '';
  const [low, high] = [outer.lowPp, outer.highPp].map((pct) => formatPoints(pct, 1, words.locale));
  return words.rangeCell(low ?? '', high ?? '');
}
