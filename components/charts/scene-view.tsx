import { createElement, type ReactNode } from 'react';
import type { Scene } from '@/lib/charts/scene';
import { sceneElements, type SceneElement, type SceneOptions } from '@/lib/charts/scene-elements';

/** A scene in the page; the app's stylesheet carries its colours. */
export function SceneView({ scene, ...options }: SceneOptions & { scene: Scene }) {
  return renderElement(sceneElements(scene, options), 'svg');
}

const PROP_NAMES: Record<string, string> = { class: 'className', 'text-anchor': 'textAnchor' };

function renderElement({ name, attributes, children }: SceneElement, key: string): ReactNode {
  const props = Object.fromEntries(
    Object.entries(attributes).map(([attribute, value]) => [PROP_NAMES[attribute] ?? attribute, value]),
  );
  const inside = children.map((child, at) =>
    typeof child === 'string' ? child : renderElement(child, `${child.name}-${at}`),
  );
  return createElement(name, { key, ...props }, ...inside);
}
