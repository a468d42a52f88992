/** A Markdown table with a heading row. */
export function markdownTable(
  head: readonly string[],
  rows: readonly (readonly (string | number)[])[],
): string {
  const line = (cells: readonly (string | number)[]) => `| ${cells.join(' | ')} |`;
  return [line(head), line(head.map(() => '---')), ...rows.map(line)].join('\n');
}

export function percent(rate: number): string {
  return (100 * rate).toFixed(2);
}
