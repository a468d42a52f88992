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

/** Functions and words of base R and its stats that the scripts call. */
const BASE_R =
  `abs all any anyNA c cat character cumprod cumsum data.frame dhyper floor for function if ifelse
  invisible is.character is.logical is.na is.null is.numeric isTRUE lapply length list logical mapply match max mean
  min names na.omit numeric order p.adjust paste paste0 pbeta pmax pnorm pt qbeta qnorm qt rep_len return round
  seq_len sprintf sqrt stopifnot sum switch tolower uniroot unique unlist vapply new.env rep seq_along tabulate which`.split(
    /\s+/,
  );

/** Parameters of the scripts' own functions that are called as functions. */
const PARAMETERS = ['at', 'test', 'se', 'excess'];

/** Functions that a script calls and that neither it nor base R has. */
export function unknownCalls(script: string): string[] {
  const code = piecesOf(script)
    .map(({ kind, text }) => (kind === 'code' ? text : ' '))
    .join('');
  const named = (pattern: RegExp) => [...code.matchAll(pattern)].map(([, name = '']) => name);
  const known = new Set([...named(/(?<![\w.$])([A-Za-z][\w.]*) <- /g), ...BASE_R, ...PARAMETERS]);
  return named(/(?<![\w.$])([A-Za-z][\w.]*)\(/g).filter((name) => !known.has(name));
}

/** Functions that a script defines and does not use. */
export function idleFunctions(script: string): string[] {
  const defined = [...script.matchAll(/^(\w+) <- function\(/gm)].map(([, name = '']) => name);
  const uses = (name: string) => script.match(new RegExp(`\\b${name}\\b`, 'g'))?.length ?? 0;
  return defined.filter((name) => uses(name) < 2);
}

/** Every number that stands in a script. */
export function numbersWritten(script: string): Set<number> {
  return new Set([...script.matchAll(/(?<![\w.])\d[\d.]*(e[+-]?\d+)?/g)].map(([text]) => Number(text)));
}
