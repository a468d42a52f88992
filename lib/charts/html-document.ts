import { escapeMarkup } from './escape';

/** A page of its own around a body; title and language are escaped, body and style are markup already. */
export function htmlDocument(page: { lang: string; title: string; style: string; body: string }): string {
  return [
    `<!doctype html><html lang="${escapeMarkup(page.lang)}"><head><meta charset="utf-8">`,
    '<meta name="viewport" content="width=device-width, initial-scale=1">',
    `<title>${escapeMarkup(page.title)}</title><style>${page.style}</style></head>`,
    `<body><main>${page.body}</main></body></html>\n`,
  ].join('');
}
