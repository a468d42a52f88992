export type Section = { title: string; code: string };

export type ScriptParts = {
  /** The finding in words, safe inside a comment. */
  words: string;
  engine: string;
  functions: string;
  sections: readonly Section[];
  /** The lines that print. */
  output: string;
};

const WIDTH = 100;

/** Puts a script together: what it is and how to run it, figures first, then functions, then the steps. */
export function assemble({ words, engine, functions, sections, output }: ScriptParts): string {
  const [policy, figures, ...steps] = sections;
  const parts: Section[] = [
    ...(policy ? [policy] : []),
    ...(figures ? [figures] : []),
    { title: 'Functions', code: functions },
    ...steps,
    { title: 'Results', code: output },
  ];
  return [
    `# Finding: ${words}`,
    `# Engine:  ${engine}`,
    '#',
    '# Computes the finding again from the printed figures. Base R, no packages: Rscript FILE',
    '# Change any figure in sections 1 and 2 and run it again. Results are printed as name = value.',
    '# Percent: 0 to 100, names in Pct; points: names in Pp; everything else is a proportion.',
    '',
    ...parts.map(({ title, code }, index) => `${heading(`${index + 1}. ${title}`)}\n\n${code.trim()}\n`),
  ].join('\n');
}

function heading(title: string): string {
  return `# ${title} `.padEnd(WIDTH, '-');
}
