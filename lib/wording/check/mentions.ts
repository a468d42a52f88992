import type { CompiledLexicon } from './lexicon/compiled';
import type { Lexicon } from './lexicon/types';
import { fold } from './fold';
import { tokenise, type Token } from './tokens';
import type { CheckedRelease } from './types';

export type Named = { kind: 'option' | 'pollster' | 'sponsor' | 'race'; name: string };
/** A name where it stands: token places, `to` past it. */
export type Mention = Named & { from: number; to: number };

type Entry = Named & { words: readonly string[]; isCommon: boolean; isAcronym: boolean };

/** Every name of the releases in the tokens: the longest at each place, in any case, with or without accents. */
export function mentionsOf(
  tokens: readonly Token[],
  isCapital: (at: number) => boolean,
  releases: readonly CheckedRelease[],
  lexicon: CompiledLexicon,
): Mention[] {
  const entries = knownEntries(releases, lexicon);
  const afterCommon = new Set(lexicon.words.afterCommonName);
  const fits = (entry: Entry, at: number) => {
    if (entry.words.some((word, index) => tokens[at + index]?.text !== word)) return false;
    if (entry.isAcronym) return isCapital(at);
    if (!entry.isCommon) return true;
    const next = tokens[at + entry.words.length];
    return isCapital(at) && (!next || next.kind !== 'word' || afterCommon.has(next.text));
  };
  const mentions: Mention[] = [];
  for (let at = 0; at < tokens.length; at += 1) {
    const entry = entries.get(tokens[at]?.text ?? '')?.find((one) => fits(one, at));
    if (!entry) continue;
    mentions.push({ kind: entry.kind, name: entry.name, from: at, to: at + entry.words.length });
    at += entry.words.length - 1;
  }
  return mentions;
}

const known = new WeakMap<
  readonly CheckedRelease[],
  { lexicon: CompiledLexicon; entries: Map<string, Entry[]> }
>();

/** The names of a list of releases, kept while the list lives: a line editor asks again at every key. */
function knownEntries(releases: readonly CheckedRelease[], lexicon: CompiledLexicon): Map<string, Entry[]> {
  const kept = known.get(releases);
  if (kept?.lexicon === lexicon) return kept.entries;
  const entries = entriesOf(releases, lexicon);
  known.set(releases, { lexicon, entries });
  return entries;
}

function entriesOf(releases: readonly CheckedRelease[], { words }: CompiledLexicon): Map<string, Entry[]> {
  const wordsOf = (name: string) => wordsIn(name, words);
  const common = new Set(words.commonNames.map((name) => wordsOf(name).join(' ')));
  const named = new Map<string, Entry>();
  const add = (entry: Entry) => {
    const key = entry.words.join(' ');
    if (entry.words.length > 0 && !named.has(key)) named.set(key, entry);
  };
  const all = releases.flatMap(namesIn);
  for (const one of all) {
    for (const noun of one.kind === 'option' ? (words.nameNouns[fold(one.name).text] ?? []) : []) {
      add({ ...one, words: wordsOf(noun), isCommon: false, isAcronym: false });
    }
  }
  for (const one of all) {
    const parts = wordsOf(one.name);
    add({ ...one, words: parts, isCommon: common.has(parts.join(' ')), isAcronym: false });
  }
  const options = [...new Set(all.filter(({ kind }) => kind === 'option').map(({ name }) => name))].map(
    (name) => ({
      name,
      words: wordsOf(name),
    }),
  );
  const generic = new Set(words.genericNameWords);
  for (const one of all) {
    for (const alias of aliasesOf(one, options, { generic, common, wordsOf })) {
      add({ ...one, words: alias, isCommon: common.has(alias.join(' ')), isAcronym: false });
    }
    const initials = wordsOf(one.name).map((word) => word.charAt(0));
    if (initials.length > 1) add({ ...one, words: [initials.join('')], isCommon: false, isAcronym: true });
  }
  for (const entry of [...named.values()].filter(({ isAcronym }) => !isAcronym)) {
    for (const ending of words.nameEndings ?? []) {
      const last = entry.words.at(-1) ?? '';
      if (!last.endsWith(ending)) add({ ...entry, words: [...entry.words.slice(0, -1), last + ending] });
    }
  }
  return byFirstWord([...named.values()]);
}

function byFirstWord(entries: readonly Entry[]): Map<string, Entry[]> {
  const byFirst = new Map<string, Entry[]>();
  for (const entry of entries) {
    const [first = ''] = entry.words;
    byFirst.set(first, [...(byFirst.get(first) ?? []), entry]);
  }
  for (const list of byFirst.values()) list.sort((a, b) => b.words.length - a.words.length);
  return byFirst;
}

function namesIn({ facts, previous }: CheckedRelease): Named[] {
  return [facts, ...(previous ? [previous] : [])].flatMap(({ shares, pollster, sponsor, race }): Named[] => [
    ...shares.map(({ option }): Named => ({ kind: 'option', name: option })),
    { kind: 'pollster', name: pollster.name },
    ...(sponsor.status === 'given' ? [{ kind: 'sponsor' as const, name: sponsor.value.name }] : []),
    { kind: 'race', name: race.name },
  ]);
}

type Known = {
  generic: ReadonlySet<string>;
  common: ReadonlySet<string>;
  wordsOf: (name: string) => string[];
};

/** Surnames, and names without their generic word, where no other option could be meant. */
function aliasesOf(
  { kind, name }: Named,
  options: readonly { name: string; words: readonly string[] }[],
  { generic, common, wordsOf }: Known,
): string[][] {
  const parts = wordsOf(name);
  const specific = parts.filter((part) => !generic.has(part));
  if (kind === 'race' || parts.length < 2 || specific.length === 0 || common.has(parts.join(' '))) return [];
  if (kind === 'sponsor') return [specific.length < parts.length ? specific : []];
  if (kind === 'pollster') return [specific, specific.slice(0, 1)];
  const others = options.filter((other) => other.name !== name).flatMap((other) => wordsOf(other.name));
  const isOwn = (words: readonly string[]) =>
    words.every((word) => word.length > 2 && !others.includes(word));
  const last = specific.slice(-1);
  return [specific, last].filter((alias) => alias.length < parts.length && isOwn(alias));
}

const wordsIn = (name: string, { elisions }: Lexicon) =>
  tokenise(fold(name).text, elisions)
    .filter(({ kind }) => kind !== 'break')
    .map(({ text }) => text);
