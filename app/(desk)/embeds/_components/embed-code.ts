const ESCAPES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };

export const EMBED_HEIGHT_PX = 640;

/**
 * What goes into an article: a frame that asks for nothing until it is near, and tells no address on. Its title
 * names race and pollster and claims nothing, since it stays in the article when the chart is pulled.
 */
export function embedCode({ url, race, pollster }: { url: string; race: string; pollster: string }): string {
  const attributes = {
    src: url,
    title: `Chart: ${race}, ${pollster}`,
    width: '100%',
    height: String(EMBED_HEIGHT_PX),
    loading: 'lazy',
    referrerpolicy: 'no-referrer',
    style: 'border:0;max-width:680px',
  };
  const written = Object.entries(attributes).map(([name, value]) => `${name}="${escaped(value)}"`);
  return `<iframe ${written.join(' ')}></iframe>`;
}

function escaped(value: string): string {
  return value.replace(/[&<>"]/g, (character) => ESCAPES[character] ?? character);
}
