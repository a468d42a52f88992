import type { Scene, SceneNode } from './scene';

/** One element of the picture: what both renderers write. */
export type SceneElement = {
  name: string;
  attributes: Record<string, string | number>;
  children: (SceneElement | string)[];
};

export type SceneOptions = {
  /** Prefix of the ids inside, unique on the page. */
  idPrefix: string;
  /** Hidden from readers by ear, where a table or text beside it says the same. */
  isDecorative?: boolean;
  className?: string;
};

/**
 * The SVG tree of a scene.
 *
 * @param scene what is drawn
 * @param options ids unique on the page
 */
export function sceneElements(
  scene: Scene,
  { idPrefix, isDecorative, className }: SceneOptions,
): SceneElement {
  const hatchId = `${idPrefix}-hatch`;
  const hasHatch = scene.nodes.some((node) => node.role === 'hatch');
  const named: SceneElement[] = [
    { name: 'title', attributes: { id: `${idPrefix}-title` }, children: [scene.title] },
    { name: 'desc', attributes: { id: `${idPrefix}-desc` }, children: [scene.description] },
  ];
  return {
    name: 'svg',
    attributes: {
      class: className ? `sounding ${className}` : 'sounding',
      viewBox: `0 0 ${scene.widthPx} ${scene.heightPx}`,
      width: scene.widthPx,
      height: scene.heightPx,
      ...(isDecorative
        ? { 'aria-hidden': 'true' }
        : { role: 'img', 'aria-labelledby': `${idPrefix}-title ${idPrefix}-desc` }),
    },
    children: [
      ...(isDecorative ? [] : named),
      ...(hasHatch ? [hatchPattern(hatchId)] : []),
      ...scene.nodes.map((node) => nodeElement(node, hatchId)),
    ],
  };
}

function hatchPattern(id: string): SceneElement {
  const strokes = { name: 'path', attributes: { class: 's-hatch-line', d: 'M0 0V6' }, children: [] };
  const pattern = {
    name: 'pattern',
    attributes: { id, width: 6, height: 6, patternUnits: 'userSpaceOnUse', patternTransform: 'rotate(45)' },
    children: [strokes],
  };
  return { name: 'defs', attributes: {}, children: [pattern] };
}

function nodeElement(node: SceneNode, hatchId: string): SceneElement {
  const common = { class: `s-${node.role}` };
  switch (node.kind) {
    case 'rect': {
      const { x, y, width, height } = node;
      const attributes: SceneElement['attributes'] = { ...common, x, y, width, height };
      if (node.role === 'hatch') attributes.fill = `url(#${hatchId})`;
      return { name: 'rect', attributes, children: [] };
    }
    case 'line': {
      const { x1, y1, x2, y2 } = node;
      return { name: 'path', attributes: { ...common, d: `M${x1} ${y1}L${x2} ${y2}` }, children: [] };
    }
    case 'path':
      return { name: 'path', attributes: { ...common, d: node.d }, children: [] };
    case 'text': {
      const attributes = { ...common, x: node.x, y: node.y, 'text-anchor': node.anchor };
      return { name: 'text', attributes, children: [node.text] };
    }
  }
}
