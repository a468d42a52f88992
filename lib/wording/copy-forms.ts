import type { LineText } from '@/lib/domain/sheet';

const paragraphs = (lines: readonly LineText[]) =>
  lines.flatMap(({ text }) => text.split(/\n\s*\n/)).map((text) => text.trim());

/**
 * Cleared lines as plain text, a blank line between paragraphs.
 *
 * @example
 * asPlain([{ kind: 'body', text: 'One.' }, { kind: 'caveat', text: 'Two.' }]); // => 'One.\n\nTwo.'
 */
export function asPlain(lines: readonly LineText[]): string {
  return paragraphs(lines).join('\n\n');
}

/**
 * The same as HTML paragraphs, without markup that could hide anything.
 *
 * @example
 * asHtml([{ kind: 'body', text: 'A < B' }]); // => '<p>A &lt; B</p>'
 */
export function asHtml(lines: readonly LineText[]): string {
  return paragraphs(lines)
    .map((text) => `<p>${escapeHtml(text).replace(/\n/g, '<br>')}</p>`)
    .join('');
}

/**
 * The same as Markdown, every character that Markdown would read escaped.
 *
 * @example
 * asMarkdown([{ kind: 'body', text: '*47%*' }]); // => '\\*47%\\*'
 */
export function asMarkdown(lines: readonly LineText[]): string {
  return paragraphs(lines)
    .map((text) =>
      text
        .replace(/[\\`*_[\]<>|~]/g, '\\$&')
        .replace(/^(\s*)([#+-]|\d+(?=[.)]))/gm, '$1\\$2')
        .replace(/\n/g, '  \n'),
    )
    .join('\n\n');
}

const ESCAPES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };

function escapeHtml(text: string): string {
  return text.replace(/[&<>"]/g, (character) => ESCAPES[character]!);
}
