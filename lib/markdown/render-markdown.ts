import { marked } from 'marked';
import sanitizeHtml from 'sanitize-html';

const ALLOWED: sanitizeHtml.IOptions = {
  allowedTags: [
    ...['p', 'br', 'strong', 'em', 'del', 'code', 'pre', 'blockquote', 'ul', 'ol', 'li', 'hr'],
    ...['h3', 'h4', 'h5', 'h6', 'a', 'table', 'thead', 'tbody', 'tr', 'th', 'td'],
  ],
  allowedAttributes: { a: ['href', 'rel'] },
  allowedSchemes: ['http', 'https', 'mailto'],
  allowProtocolRelative: false,
  transformTags: {
    h1: 'h3',
    h2: 'h3',
    a: sanitizeHtml.simpleTransform('a', { rel: 'noopener noreferrer nofollow' }),
  },
};

/** A person's Markdown as safe HTML: no script, style, picture, frame or foreign scheme comes through. */
export function renderMarkdown(markdown: string): string {
  return sanitizeHtml(marked.parse(markdown, { async: false, gfm: true }), ALLOWED);
}
