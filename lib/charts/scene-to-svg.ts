import { escapeMarkup } from './escape';
import type { Scene } from './scene';
import { sceneRules } from './scene-css';
import { sceneElements, type SceneElement, type SceneOptions } from './scene-elements';
import type { ThemeChoice } from './tokens';

const FONT =
  'font-family:system-ui,-apple-system,"Segoe UI",Roboto,sans-serif;font-variant-numeric:tabular-nums';

/**
 * A scene as a picture of its own: with its colours and its paper, so that it is legible on any page.
 *
 * @param scene what is drawn
 * @param options theme, and ids unique wherever the picture is put
 */
export function sceneToSvg(
  scene: Scene,
  { theme, ...options }: SceneOptions & { theme: ThemeChoice },
): string {
  const svg = sceneElements(scene, options);
  const isName = (child: SceneElement | string) =>
    typeof child !== 'string' && (child.name === 'title' || child.name === 'desc');
  const names = svg.children.filter(isName);
  const drawn = svg.children.filter((child) => !isName(child));
  const style: SceneElement = {
    name: 'style',
    attributes: {},
    children: [`.sounding{${FONT}}${sceneRules(theme)}`],
  };
  const paper: SceneElement = {
    name: 'rect',
    attributes: { class: 's-paper', width: scene.widthPx, height: scene.heightPx },
    children: [],
  };
  return writeElement({
    ...svg,
    attributes: { xmlns: 'http://www.w3.org/2000/svg', ...svg.attributes },
    children: [...names, style, paper, ...drawn],
  });
}

/** A scene inside a document whose own stylesheet carries the rules. */
export function sceneToInlineSvg(scene: Scene, options: SceneOptions): string {
  return writeElement(sceneElements(scene, options));
}

function writeElement({ name, attributes, children }: SceneElement): string {
  const open = Object.entries(attributes)
    .map(([key, value]) => ` ${key}="${escapeMarkup(String(value))}"`)
    .join('');
  if (children.length === 0) return `<${name}${open}/>`;
  const inside = children
    .map((child) => (typeof child === 'string' ? textOf(name, child) : writeElement(child)))
    .join('');
  return `<${name}${open}>${inside}</${name}>`;
}

/** Style rules are our own and hold no markup; inside HTML they must not be escaped. */
function textOf(parent: string, text: string): string {
  return parent === 'style' ? text : escapeMarkup(text);
}
