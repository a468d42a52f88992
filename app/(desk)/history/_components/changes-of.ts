export type Change = { what: string; before: string | null; after: string | null };

/**
 * What an entry changed, one line for each value: "roles" from "editor" to "editor, reporter". Values that
 * stayed as they were are left out where both sides are known.
 */
export function changesOf(before: unknown, after: unknown): Change[] {
  const [was, is] = [flatten(before), flatten(after)];
  const names = [...new Set([...was.keys(), ...is.keys()])];
  return names
    .map((what) => ({ what, before: was.get(what) ?? null, after: is.get(what) ?? null }))
    .filter((change) => change.before !== change.after);
}

function flatten(value: unknown, path = '', found = new Map<string, string>()): Map<string, string> {
  if (value === null || value === undefined) {
    if (path) found.set(path, 'none');
  } else if (Array.isArray(value) && value.every((item) => typeof item !== 'object')) {
    found.set(path || 'value', value.length > 0 ? value.map(print).join(', ') : 'none');
  } else if (typeof value === 'object') {
    for (const [key, inner] of Object.entries(value))
      flatten(inner, path ? `${path}, ${nameOf(key)}` : nameOf(key), found);
  } else {
    found.set(path || 'value', print(value));
  }
  return found;
}

function print(value: unknown): string {
  if (value === true) return 'yes';
  if (value === false) return 'no';
  return String(value);
}

/** `designEffect` → "design effect"; the third of a list → "3". */
function nameOf(key: string): string {
  if (/^\d+$/.test(key)) return String(Number(key) + 1);
  return key.replace(/([a-z0-9])([A-Z])/g, '$1 $2').toLowerCase();
}
