/** Reads R source far enough to tell strings, comments and code apart. */

export type Piece = { kind: 'code' | 'string' | 'comment'; text: string };

/** Pieces of a script in order; throws where a string does not end. */
export function piecesOf(script: string): Piece[] {
  const pieces: Piece[] = [];
  let rest = script;
  while (rest !== '') {
    const [comment] = /^#[^\n]*/.exec(rest) ?? [];
    const [string] = /^"(?:[^"\\]|\\[\s\S])*"/.exec(rest) ?? [];
    const [code] = /^[^"#]+/.exec(rest) ?? [];
    const text = comment ?? string ?? code;
    if (text === undefined) throw new Error(`a string does not end: ${rest.slice(0, 60)}`);
    pieces.push({ kind: comment !== undefined ? 'comment' : string !== undefined ? 'string' : 'code', text });
    rest = rest.slice(text.length);
  }
  return pieces;
}

const ESCAPE = /\\(["\\n]|u[0-9a-f]{4}|U[0-9a-f]{8})|\\/g;

/** The text that a double-quoted literal of R stands for; throws on an escape that this project does not write. */
export function readString(literal: string): string {
  return literal.slice(1, -1).replace(ESCAPE, (whole, escaped: string | undefined) => {
    if (escaped === undefined) throw new Error(`unknown escape in ${literal}`);
    if (/^["\\]$/.test(escaped)) return escaped;
    if (escaped === 'n') return '\n';
    return String.fromCodePoint(Number.parseInt(escaped.slice(1), 16));
  });
}

/** The script with every string replaced by one letter: what is left is the same whatever the names are. */
export function structureOf(script: string): string {
  const blank = (text: string) => text.replace(/"(?:[^"\\\n]|\\.)*"/g, 'S');
  return piecesOf(script)
    .map(({ kind, text }) => (kind === 'string' ? 'S' : kind === 'comment' ? blank(text) : text))
    .join('');
}

/** Names that are called as functions, and names that the script gives to something. */
export function namesIn(script: string): { called: Set<string>; given: Set<string> } {
  const code = piecesOf(script)
    .map(({ kind, text }) => (kind === 'code' ? text : ' '))
    .join('');
  const called = [...code.matchAll(/(?<![\w.$])([A-Za-z][\w.]*)\(/g)].map(([, name = '']) => name);
  const given = [...code.matchAll(/(?<![\w.$])([A-Za-z][\w.]*) <- /g)].map(([, name = '']) => name);
  return { called: new Set(called), given: new Set(given) };
}
