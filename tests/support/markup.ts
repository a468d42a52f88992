/** A strict reader of the markup we write: every tag closed in order, no attribute twice, nothing unescaped. */
export type MarkupNode = {
  name: string;
  attributes: Record<string, string>;
  children: (MarkupNode | string)[];
};

const VOID = new Set(['meta', 'link', 'br', 'hr', 'img', 'input']);
const TOKEN = /<(\/?)([a-zA-Z][\w-]*)((?:\s+[\w:-]+="[^"<]*")*)\s*(\/?)>|<!doctype html>|([^<]+)/gy;

export function parseMarkup(text: string): MarkupNode {
  const root: MarkupNode = { name: '#root', attributes: {}, children: [] };
  const open: MarkupNode[] = [root];
  let end = 0;
  for (const match of text.matchAll(TOKEN)) {
    end = match.index + match[0].length;
    const [, closing, name, attributes, selfClosing, words] = match;
    const parent = open.at(-1) ?? root;
    if (words !== undefined) parent.children.push(unescaped(words));
    else if (!name) continue;
    else if (closing) close(open, name);
    else {
      const node = { name, attributes: attributesOf(attributes ?? ''), children: [] };
      parent.children.push(node);
      if (!selfClosing && !VOID.has(name)) open.push(node);
    }
  }
  if (end !== text.length) throw new Error(`markup is broken at: ${text.slice(end, end + 60)}`);
  if (open.length > 1) throw new Error(`<${open.at(-1)?.name}> is never closed`);
  return root;
}

/** Every element with that name, in document order. */
export function elementsOf(node: MarkupNode, name: string): MarkupNode[] {
  return node.children.flatMap((child) =>
    typeof child === 'string' ? [] : [...(child.name === name ? [child] : []), ...elementsOf(child, name)],
  );
}

export function textOf(node: MarkupNode): string {
  return node.children.map((child) => (typeof child === 'string' ? child : textOf(child))).join('');
}

function close(open: MarkupNode[], name: string) {
  const last = open.pop();
  if (last?.name !== name) throw new Error(`</${name}> closes <${last?.name}>`);
}

function attributesOf(text: string): Record<string, string> {
  const found: Record<string, string> = {};
  for (const [, key = '', value = ''] of text.matchAll(/([\w:-]+)="([^"]*)"/g)) {
    if (key in found) throw new Error(`attribute ${key} stands twice`);
    found[key] = unescaped(value);
  }
  return found;
}

const ENTITIES: Record<string, string> = {
  '&amp;': '&',
  '&lt;': '<',
  '&gt;': '>',
  '&quot;': '"',
  '&#39;': "'",
  '&#x27;': "'",
};

function unescaped(text: string): string {
  return text.replace(/&[^;\s]*;?/g, (entity) => {
    const char = ENTITIES[entity];
    if (char === undefined) throw new Error(`${entity} is not escaped`);
    return char;
  });
}
