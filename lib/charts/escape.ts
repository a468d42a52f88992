const ENTITIES: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Control characters, which XML forbids. */
const FORBIDDEN = /[^\P{Cc}\t\n\r]|[\ufffe\uffff]/gu;

/** Safe inside an element or a quoted attribute of HTML and SVG. */
export function escapeMarkup(text: string): string {
  return text.replace(FORBIDDEN, '').replace(/[&<>"']/g, (char) => ENTITIES[char] ?? '');
}
