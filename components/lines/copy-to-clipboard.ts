export type Fetched = { plain: string; html: string | null };
export type CopyForm = 'plain' | 'rich' | 'markdown';

/** The words are on the clipboard, or they are handed back to be copied by hand. */
export type Outcome = { kind: 'copied' } | { kind: 'by-hand'; text: string };

/**
 * Puts words on the clipboard that are fetched now. The clipboard gets a promise, since a browser that waited for
 * the answer would no longer count the click. What the fetch refuses is thrown on.
 */
export async function copyToClipboard(form: CopyForm, fetchWords: () => Promise<Fetched>): Promise<Outcome> {
  const words = fetchWords();
  const blob = (type: string, pick: (fetched: Fetched) => string) =>
    words.then((fetched) => new Blob([pick(fetched)], { type }));
  try {
    const item = new ClipboardItem({
      'text/plain': blob('text/plain', ({ plain }) => plain),
      ...(form === 'rich' ? { 'text/html': blob('text/html', ({ html, plain }) => html ?? plain) } : {}),
    });
    await navigator.clipboard.write([item]);
    await words;
    return { kind: 'copied' };
  } catch {
    return { kind: 'by-hand', text: (await words).plain };
  }
}
