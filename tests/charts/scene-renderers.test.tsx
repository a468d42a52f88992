import fc from 'fast-check';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { SceneView } from '@/components/charts/scene-view';
import type { Scene } from '@/lib/charts/scene';
import { sceneToInlineSvg, sceneToSvg } from '@/lib/charts/scene-to-svg';
import { soundingScene } from '@/lib/charts/sounding-scene';
import { elementsOf, parseMarkup, textOf, type MarkupNode } from '../support/markup';
import { pictures, words } from './examples';
import { randomSpec } from './random-spec';

/** The tree without what only a picture of its own has: namespace, stylesheet and paper. */
function bare(node: MarkupNode): MarkupNode {
  const attributes = { ...node.attributes };
  delete attributes.xmlns;
  const children = node.children
    .filter((child) => typeof child === 'string' || !isOfItsOwn(child))
    .map((child) => (typeof child === 'string' ? child : bare(child)));
  return { ...node, attributes, children };
}

const isOfItsOwn = ({ name, attributes }: MarkupNode) => name === 'style' || attributes.class === 's-paper';

const scenesOf = (spec: Parameters<typeof soundingScene>[0]): Scene[] => [
  soundingScene(spec, { widthPx: 640, kind: 'full' }, words),
  soundingScene(spec, { widthPx: 160, kind: 'row' }, words),
];

function expectAgreement(scene: Scene) {
  const inPage = parseMarkup(renderToStaticMarkup(<SceneView scene={scene} idPrefix="one" />));
  const alone = parseMarkup(sceneToSvg(scene, { theme: 'auto', idPrefix: 'one' }));
  expect(bare(alone)).toEqual(inPage);
}

describe('the two renderers', () => {
  it.each(Object.entries(pictures))('make the same tree of %s', (_, spec) => {
    for (const scene of scenesOf(spec)) expectAgreement(scene);
  });

  it('agree whatever the names of the options are', () => {
    fc.assert(
      fc.property(randomSpec, (spec) => {
        const [scene] = scenesOf({
          ...spec,
          name: spec.name.replace(/\p{Cc}|[\ud800-\udfff\ufffe\uffff]/gu, ''),
        });
        if (scene) expectAgreement(clean(scene));
      }),
      { numRuns: 60 },
    );
  });
});

/** React writes control characters as they are; ours drops them: compared without. */
function clean(scene: Scene): Scene {
  return JSON.parse(JSON.stringify(scene).replace(/\\u[0-9a-f]{4}|\\[bfnrt]|\p{Cc}/gu, '')) as Scene;
}

describe('the text renderer', () => {
  const scene = soundingScene(pictures['change-not-shown']!, { widthPx: 640, kind: 'full' }, words);

  it('escapes names, so that no option can write markup', () => {
    const spec = { ...pictures['lead-fragile']!, name: '<script>alert("1")</script>&\u0000' };
    const svg = sceneToSvg(soundingScene(spec, { widthPx: 640, kind: 'full' }, words), {
      theme: 'light',
      idPrefix: 'x',
    });
    expect(svg).not.toContain('<script');
    expect(textOf(parseMarkup(svg))).toContain('<script>');
    expect(svg).not.toContain('\u0000');
  });

  it('names the picture by its title and description, with ids of its own', () => {
    const [svg] = elementsOf(parseMarkup(sceneToInlineSvg(scene, { idPrefix: 'lead' })), 'svg');
    expect(svg?.attributes).toMatchObject({ role: 'img', 'aria-labelledby': 'lead-title lead-desc' });
    expect(elementsOf(svg!, 'title')[0]?.attributes.id).toBe('lead-title');
    expect(elementsOf(svg!, 'rect').some((rect) => rect.attributes.fill === 'url(#lead-hatch)')).toBe(true);
    expect(elementsOf(svg!, 'pattern')[0]?.attributes.id).toBe('lead-hatch');
  });

  it('hides a picture whose figures stand beside it', () => {
    const svg = sceneToInlineSvg(scene, { idPrefix: 'row', isDecorative: true });
    expect(svg).toContain('aria-hidden="true"');
    expect(svg).not.toContain('<title');
  });

  it('carries the colours of the theme asked for, and both where the reader chooses', () => {
    const svg = (theme: 'light' | 'night' | 'auto') => sceneToSvg(scene, { theme, idPrefix: 'x' });
    expect(svg('light')).toContain('.s-land{fill:#ecdfbe}');
    expect(svg('light')).not.toContain('#3a3524');
    expect(svg('night')).toContain('.s-land{fill:#3a3524}');
    expect(svg('auto')).toContain('prefers-color-scheme:dark');
    expect(svg('auto')).toContain('#ecdfbe');
    expect(svg('auto')).toContain('#3a3524');
  });
});
