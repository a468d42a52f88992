import 'server-only';
/**
 * A version of house style as a flat list of decisions: every text, number or list with the path that leads to it,
 * such as `style.messages.en.headline.lead.fragile`. Lists are one decision each.
 */
export type Leaf = string | number | boolean | null | readonly unknown[];
export type Leaves = Map<string, Leaf>;

export function leavesOf(tree: unknown, path = ''): Leaves {
  if (!isBranch(tree)) return new Map([[path, tree as Leaf]]);
  return new Map(
    Object.entries(tree).flatMap(([key, value]) => [...leavesOf(value, path ? `${path}.${key}` : key)]),
  );
}

/** The same tree with one decision changed. A path that the tree does not have leaves it as it is. */
export function withLeaf<T>(tree: T, path: string, value: unknown): T {
  const [key = '', ...rest] = path.split('.');
  if (!isBranch(tree) || !Object.hasOwn(tree, key)) return tree;
  const child = tree[key];
  const changed = rest.length === 0 ? value : withLeaf(child, rest.join('.'), value);
  return { ...tree, [key]: changed };
}

export function leafAt(tree: unknown, path: string): Leaf | undefined {
  const found = path
    .split('.')
    .reduce<unknown>((at, key) => (isBranch(at) && Object.hasOwn(at, key) ? at[key] : undefined), tree);
  return isBranch(found) ? undefined : (found as Leaf | undefined);
}

/** What `tree` lacks of `whole`, taken from there; what `whole` does not know is left out. */
export function completed<T>(whole: T, tree: unknown): T {
  if (!isBranch(whole)) return (tree === undefined ? whole : tree) as T;
  const from = isBranch(tree) ? tree : {};
  return Object.fromEntries(
    Object.entries(whole).map(([key, value]) => [
      key,
      completed(value, Object.hasOwn(from, key) ? from[key] : undefined),
    ]),
  ) as T;
}

export type Change = { path: string; before: Leaf | undefined; after: Leaf | undefined };

/** The decisions in which two versions differ, in the order of the later one. */
export function changesBetween(before: unknown, after: unknown): Change[] {
  const [old, now] = [leavesOf(before), leavesOf(after)];
  const paths = new Set([...now.keys(), ...old.keys()]);
  return [...paths]
    .filter((path) => !isSame(old.get(path), now.get(path)))
    .map((path) => ({ path, before: old.get(path), after: now.get(path) }));
}

/**
 * What somebody made of `base` carried over to what `base` has become: their decisions stand, everything that they
 * left alone is as it is now.
 */
export function carriedOver<T>(base: unknown, mine: T, now: T): { body: T; contested: string[] } {
  const [old, current, own] = [leavesOf(base), leavesOf(now), leavesOf(mine)];
  const decided = [...own].filter(([path, value]) => old.has(path) && !isSame(old.get(path), value));
  const body = decided.reduce((tree, [path, value]) => withLeaf(tree, path, value), now);
  const contested = decided
    .filter(([path, value]) => !isSame(old.get(path), current.get(path)) && !isSame(current.get(path), value))
    .map(([path]) => path);
  return { body, contested };
}

const isSame = (one: unknown, other: unknown) => JSON.stringify(one) === JSON.stringify(other);

function isBranch(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
