import { gzipSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';
import { embedDocument } from '@/lib/charts/embed-document';
import type { EmbedInput } from '@/lib/charts/embed-input';
import { ENGLISH_EMBED_WORDS } from '@/lib/charts/embed-words';
import { soundingSpecOf } from '@/lib/charts/sounding-spec-of';
import { THEME_CHOICES } from '@/lib/charts/tokens';
import { notFoundDocument, withdrawalDocument } from '@/lib/charts/withdrawal-document';
import { check } from '@/lib/findings/check';
import type { CheckDocument } from '@/lib/findings/check-types';
import { elementsOf, parseMarkup, textOf } from '../support/markup';
import { documents, specOf, words } from './examples';

function inputOf(document: CheckDocument, more: Partial<EmbedInput> = {}): EmbedInput {
  const { findings } = check(document);
  return {
    lang: 'en',
    theme: 'auto',
    chartTitle: 'Alder is ahead, 49% to 41%, though not by enough to rule out chance',
    particulars: 'Governor of Averil Coast, 1,012 likely voters, 14–17 September.',
    altText: 'Alder is 8 points ahead of Brook; the 95% range runs from 1.1 to 14.9 points.',
    sounding: specOf(document, 'lead'),
    rows: document.release.shares.map(({ option, answer }, at) => {
      const finding = findings[at];
      return {
        option,
        isAnswer: answer !== false,
        share: finding ? soundingSpecOf(finding, document, words) : null,
      };
    }),
    caveat: 'Kelmouth Research interviewed 1,012 likely voters.\n\nMargins cover sampling error only.',
    version: 2,
    updated: { iso: '2026-09-18T09:42:00Z', text: '18 September 2026, 09:42' },
    source: { text: 'Kelmouth Research', url: 'https://kelmouth.example/releases/7' },
    ...more,
  };
}

const page = (more: Partial<EmbedInput> = {}) => embedDocument(inputOf(documents.fragile, more));
const tree = (html: string) => parseMarkup(html);

describe('the public page of a chart', () => {
  it.each(THEME_CHOICES)('is well-formed and fetches and runs nothing, theme %s', (theme) => {
    const html = page({ theme });
    const document = tree(html);
    for (const name of ['script', 'link', 'img', 'iframe', 'object', 'image', 'use', 'form']) {
      expect(elementsOf(document, name)).toEqual([]);
    }
    expect(html).not.toMatch(/@import|url\((?!#)|@font-face|\son\w+=|javascript:/);
    expect(elementsOf(document, 'style')).toHaveLength(1);
  });

  it('has its language, its title, one heading and unique ids', () => {
    const document = tree(page());
    expect(elementsOf(document, 'html')[0]?.attributes.lang).toBe('en');
    expect(elementsOf(document, 'h1').map(textOf)).toEqual([inputOf(documents.fragile).chartTitle]);
    expect(textOf(elementsOf(elementsOf(document, 'head')[0]!, 'title')[0]!)).toContain('Alder is ahead');
    const ids = [...page().matchAll(/ id="([^"]+)"/g)].map(([, id]) => id);
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('says finding, range, who and when, picture, table, caveat in this order', () => {
    const text = textOf(elementsOf(tree(page()), 'body')[0]!);
    const order = [
      'Alder is ahead',
      '95% range from +1.1 to +14.9',
      '1,012 likely voters, 14–17 September',
      'Alder is 8 points ahead of Brook',
      'All answers, in percent',
      'Kelmouth Research interviewed',
      'Version 2',
    ].map((part) => text.indexOf(part));
    expect(order.every((at) => at >= 0)).toBe(true);
    expect(order).toEqual(order.toSorted((a, b) => a - b));
  });

  it('gives every picture that is read aloud the cleared alt text', () => {
    const pictures = elementsOf(tree(page()), 'svg').filter((svg) => svg.attributes.role === 'img');
    expect(pictures).toHaveLength(2);
    for (const picture of pictures) {
      expect(textOf(elementsOf(picture, 'desc')[0]!)).toBe(inputOf(documents.fragile).altText);
    }
  });

  it('shows the same whisker and hatching as the screen of the desk', () => {
    expect(page()).toContain('class="s-whisker"');
    const notShown = embedDocument(inputOf(documents.notShown));
    expect(notShown).toContain('class="s-hatch"');
    expect(notShown).toContain('class="s-weight-hollow"');
  });

  it('puts every answer with share and range into a table with caption and heads', () => {
    const [table] = elementsOf(tree(page()), 'table');
    const cells = elementsOf(table!, 'tr').map((row) =>
      row.children.map((cell) => (typeof cell === 'string' ? cell : textOf(cell))),
    );
    expect(cells).toEqual([
      ['Answer', 'Share', '95% range'],
      ['Alder', '49%', '45.4 to 52.6'],
      ['Brook', '41%', '37.5 to 44.6'],
      ['Someone else', '4%', '2.8 to 5.7'],
      ['Don’t know', '6%', ''],
    ]);
    expect(elementsOf(table!, 'caption').map(textOf)).toEqual([
      'All answers, in percent, with their 95% range',
    ]);
    expect(
      elementsOf(table!, 'th').every((head) => ['col', 'row'].includes(head.attributes.scope ?? '')),
    ).toBe(true);
  });

  it('sets every answer apart, so that a name written from right to left moves no figure', () => {
    const rows = inputOf(documents.fragile).rows.map((row, at) =>
      at === 0 ? { ...row, option: 'אלון 2' } : row,
    );
    const [table] = elementsOf(tree(page({ rows })), 'table');
    const heads = elementsOf(table!, 'th').filter(({ attributes }) => attributes.scope === 'row');
    expect(heads.map((head) => elementsOf(head, 'bdi').map(textOf))).toEqual([
      ['אלון 2'],
      ['Brook'],
      ['Someone else'],
      ['Don’t know'],
    ]);
  });

  it('lists non-answers last, quietly and without a picture', () => {
    const rows = elementsOf(elementsOf(tree(page()), 'tbody')[0]!, 'tr');
    expect(rows.at(-1)?.attributes.class).toBe('rest');
    expect(rows.map((row) => elementsOf(row, 'svg').length)).toEqual([1, 1, 1, 0]);
  });

  it('names no range where the sample has no margin, and says that it has none', () => {
    const html = embedDocument(inputOf(documents.cannotBeTested, { altText: 'Alder 47%, Brook 41%.' }));
    expect(html).toContain('No margin of sampling error');
    expect(html).not.toContain('range');
    expect(html).not.toMatch(/class="s-(water|hatch"|whisker)/);
  });

  it('says which share was not disclosed', () => {
    const rows = [{ option: 'Brook', isAnswer: true, share: null }];
    expect(page({ rows })).toContain('<td>not disclosed</td>');
  });

  it('escapes every word it is given', () => {
    const nasty = '</style><script>alert(1)</script>"\'&\u0000';
    const html = page({
      lang: 'en"><script>',
      chartTitle: nasty,
      particulars: nasty,
      altText: nasty,
      caveat: nasty,
      rows: [
        { option: nasty, isAnswer: true, share: { ...specOf(documents.fragile, 'share'), name: nasty } },
      ],
      updated: { iso: nasty, text: nasty },
      source: { text: nasty, url: nasty },
      sounding: { ...specOf(documents.fragile, 'lead'), name: nasty, label: nasty },
    });
    expect(html).not.toContain('<script');
    expect(elementsOf(tree(html), 'script')).toEqual([]);
  });

  it('links to addresses of the web only', () => {
    const anchors = (url: string) => elementsOf(tree(page({ source: { text: 'Kelmouth', url } })), 'a');
    expect(anchors('https://kelmouth.example/7')[0]?.attributes).toMatchObject({
      href: 'https://kelmouth.example/7',
      rel: 'noopener noreferrer',
    });
    expect(anchors('javascript:alert(1)')).toEqual([]);
    expect(anchors('data:text/html,x')).toEqual([]);
  });

  it('follows the reader’s theme unless one was chosen, and is light on paper', () => {
    expect(page({ theme: 'auto' })).toContain('@media screen and (prefers-color-scheme:dark)');
    expect(page({ theme: 'light' })).not.toContain('#0f1c24');
    expect(page({ theme: 'night' })).toMatch(
      /:root\{color-scheme:dark;--paper:#0f1c24.*@media print\{:root\{color-scheme:light/,
    );
  });

  it('stays within 12 KB compressed with a dozen answers', () => {
    const shares = Array.from({ length: 12 }, (_, at) => ({ option: `List number ${at + 1}`, pct: 8 }));
    const document = { release: { ...documents.fragile.release, shares } };
    expect(gzipSync(embedDocument(inputOf(document))).length).toBeLessThan(12 * 1024);
  });

  it('is the same bytes for the same input', () => {
    expect(page()).toBe(page());
  });
});

describe('what stands where no chart is', () => {
  it('a withdrawal note is dated and holds no figure', () => {
    const html = withdrawalDocument({
      lang: 'en',
      theme: 'auto',
      withdrawn: { iso: '2026-09-18T09:42:00Z', text: '18 September 2026, 09:42' },
      note: 'The pollster <corrected> its release.',
    });
    const document = tree(html);
    expect(textOf(elementsOf(document, 'h1')[0]!)).toBe(ENGLISH_EMBED_WORDS.withdrawnTitle);
    expect(elementsOf(document, 'time')[0]?.attributes.datetime).toBe('2026-09-18T09:42:00Z');
    expect(textOf(elementsOf(document, 'main')[0]!)).toContain('The pollster <corrected> its release.');
    expect(elementsOf(document, 'svg')).toEqual([]);
    expect(elementsOf(document, 'table')).toEqual([]);
  });

  it('an address without a chart answers one constant page', () => {
    expect(notFoundDocument()).toBe(notFoundDocument());
    expect(textOf(elementsOf(tree(notFoundDocument()), 'h1')[0]!)).toBe('No chart here');
  });
});
