/** The entries of a list that is written as one text, parted by bars. */
export function listed(text: string): string[] {
  return text
    .split('|')
    .map((entry) => entry.trim().replace(/\s+/g, ' '))
    .filter((entry) => entry !== '');
}
