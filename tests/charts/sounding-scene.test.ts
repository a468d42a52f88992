import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Scene, SceneNode, SceneRole } from '@/lib/charts/scene';
import { soundingScene } from '@/lib/charts/sounding-scene';
import { textWidthPx } from '@/lib/charts/text-width';
import { documents, pictures, specOf, words } from './examples';
import { randomSpec } from './random-spec';

const FONT_PX: Partial<Record<SceneRole, number>> = { tick: 12, side: 13, estimate: 15.9, untested: 13 };
type Box = { x: number; y: number; width: number; height: number };

function boxOf(node: SceneNode): Box | null {
  if (node.kind === 'rect') return node;
  if (node.kind !== 'text') return null;
  const fontPx = FONT_PX[node.role] ?? 0;
  const width = textWidthPx(node.text, fontPx);
  const shift = node.anchor === 'middle' ? width / 2 : node.anchor === 'end' ? width : 0;
  return { x: node.x - shift, y: node.y - fontPx * 0.8, width, height: fontPx };
}

const textBoxes = (scene: Scene) =>
  scene.nodes.flatMap((node) => {
    const box = node.kind === 'text' ? boxOf(node) : null;
    return box ? [box] : [];
  });

const overlap = (a: Box, b: Box) =>
  a.x < b.x + b.width - 0.01 &&
  b.x < a.x + a.width - 0.01 &&
  a.y < b.y + b.height - 0.01 &&
  b.y < a.y + a.height - 0.01;

const nodesOf = (scene: Scene, ...roles: SceneRole[]) =>
  scene.nodes.filter((node) => roles.includes(node.role));
const full = (spec = pictures['lead-fragile']!, widthPx = 640) =>
  soundingScene(spec, { widthPx, kind: 'full' }, words);

describe('a sounding of any quantity at any width', () => {
  const anyWidth = fc.integer({ min: 280, max: 1200 });

  it('keeps every label inside the picture and off every other', () => {
    fc.assert(
      fc.property(randomSpec, anyWidth, (spec, widthPx) => {
        const scene = full(spec, widthPx);
        const boxes = textBoxes(scene);
        for (const [at, box] of boxes.entries()) {
          expect(box.x).toBeGreaterThanOrEqual(-0.01);
          expect(box.x + box.width).toBeLessThanOrEqual(widthPx + 0.01);
          expect(box.y).toBeGreaterThanOrEqual(0);
          expect(box.y + box.height).toBeLessThanOrEqual(scene.heightPx);
          expect(boxes.slice(at + 1).filter((other) => overlap(box, other))).toEqual([]);
        }
      }),
      { numRuns: 300 },
    );
  });

  it('keeps every label off the shore and off the line to the estimate', () => {
    fc.assert(
      fc.property(randomSpec, anyWidth, (spec, widthPx) => {
        const scene = full(spec, widthPx);
        const strokes = nodesOf(scene, 'shore', 'lead-line').flatMap((node) =>
          node.kind === 'line'
            ? [{ x: node.x1 - 0.8, y: node.y1, width: 1.6, height: node.y2 - node.y1 }]
            : [],
        );
        for (const box of textBoxes(scene))
          expect(strokes.filter((stroke) => overlap(box, stroke))).toEqual([]);
      }),
      { numRuns: 300 },
    );
  });

  it('says in whole words why there is no water, at the narrowest too', () => {
    const untested = randomSpec.filter(({ untestedNote }) => untestedNote !== null);
    fc.assert(
      fc.property(untested, anyWidth, (spec, widthPx) => {
        const said = nodesOf(full(spec, widthPx), 'untested').map((node) =>
          node.kind === 'text' ? node.text : '',
        );
        expect(said.join(' ')).toBe(spec.untestedNote);
      }),
      { numRuns: 150 },
    );
  });

  it('draws only finite numbers of three decimals, inside the picture', () => {
    fc.assert(
      fc.property(randomSpec, anyWidth, (spec, widthPx) => {
        for (const node of full(spec, widthPx).nodes) {
          for (const value of Object.values(node)) {
            if (typeof value === 'number') expect(Math.round(value * 1000) / 1000).toBe(value);
            else expect(value).not.toMatch(/NaN|Infinity/);
          }
          const box = boxOf(node);
          if (box) expect(box.x + box.width).toBeLessThanOrEqual(widthPx + 0.01);
        }
      }),
      { numRuns: 150 },
    );
  });

  it('covers the plot with a graduated bar that alternates and never leaves a gap', () => {
    fc.assert(
      fc.property(randomSpec, anyWidth, (spec, widthPx) => {
        const bar = nodesOf(full(spec, widthPx), 'bar-filled', 'bar-hollow').flatMap((node) =>
          node.kind === 'rect' ? [node] : [],
        );
        for (const [at, part] of bar.entries()) {
          const before = bar[at - 1];
          if (!before) continue;
          expect(part.x).toBeCloseTo(before.x + before.width, 2);
          expect(part.role).not.toBe(before.role);
        }
        const point = nodesOf(full(spec, widthPx), 'lead-line')[0];
        const [first, last] = [bar[0], bar.at(-1)];
        if (point?.kind !== 'line' || !first || !last) throw new Error('no bar or line');
        expect(point.x1).toBeGreaterThanOrEqual(first.x - 0.01);
        expect(point.x1).toBeLessThanOrEqual(last.x + last.width + 0.01);
      }),
      { numRuns: 150 },
    );
  });

  it('never says a number as a machine would', () => {
    fc.assert(
      fc.property(randomSpec, anyWidth, (spec, widthPx) => {
        const scene = full({ ...spec, name: '' }, widthPx);
        const figures = nodesOf(scene, 'tick', 'estimate').map((node) =>
          node.kind === 'text' ? node.text : '',
        );
        for (const figure of figures) expect(figure).toMatch(/^[+−]?[\d,]+(\.\d+)?%?( ± \d+\.\d)?$/u);
      }),
      { numRuns: 100 },
    );
  });
});

describe('the sounding', () => {
  it('signs leads with a plus or a real minus and gives shares their percent', () => {
    const ticks = (name: string) =>
      nodesOf(full(pictures[name]), 'tick').map((node) => (node.kind === 'text' ? node.text : ''));
    expect(ticks('lead-not-shown').slice(0, 4)).toEqual(['−2', '−1', '0', '+1']);
    expect(ticks('threshold-holds')).toContain('50%');
  });

  it('writes whose estimate it is, with the half-width unless told not to', () => {
    const label = (hasMargin?: boolean) =>
      nodesOf(
        soundingScene(pictures['lead-fragile']!, { widthPx: 640, kind: 'full', hasMargin }, words),
        'estimate',
      )[0];
    expect(label()).toMatchObject({ text: 'Alder +8 ± 6.9' });
    expect(label(false)).toMatchObject({ text: 'Alder +8' });
  });

  it('lays the land where the claim fails: left for a lead, right for a share below its threshold', () => {
    const land = (name: string) => nodesOf(full(pictures[name]), 'land')[0];
    const shore = (name: string) => nodesOf(full(pictures[name]), 'shore')[0];
    const leadLand = land('lead-holds');
    const thresholdLand = land('threshold-holds');
    const thresholdShore = shore('threshold-holds');
    if (leadLand?.kind !== 'rect' || thresholdLand?.kind !== 'rect' || thresholdShore?.kind !== 'line') {
      throw new Error('no land or shore');
    }
    expect(leadLand.x).toBeLessThan(30);
    expect(thresholdLand.x).toBe(thresholdShore.x1);
  });

  it('as a row is 24 px high and carries no words', () => {
    const row = soundingScene(pictures['lead-fragile']!, { widthPx: 180, kind: 'row' }, words);
    expect(row.heightPx).toBe(24);
    expect(row.nodes.filter((node) => node.kind === 'text')).toEqual([]);
    expect(nodesOf(row, 'weight-half', 'whisker').length).toBeGreaterThan(1);
  });

  it('keeps a fixed axis so that rows can be compared', () => {
    const lineAt = (at: number) => {
      const spec = specOf(documents.fragile, 'share', at);
      const row = soundingScene(spec, { widthPx: 200, kind: 'row', domainPp: [0, 60] }, words);
      const line = nodesOf(row, 'lead-line')[0];
      return line?.kind === 'line' ? line.x1 : Number.NaN;
    };
    expect(lineAt(0)).toBeCloseTo(4 + (192 * 49) / 60, 2);
    expect(lineAt(1)).toBeCloseTo(4 + (192 * 41) / 60, 2);
  });

  it('is named and described in figures', () => {
    const scene = full();
    expect(scene.title).toBe('Alder minus Brook: +8');
    expect(scene.description).toBe(
      'Alder minus Brook: +8 points, 95% range from +1.1 to +14.9, with heavier weighting from −0.2 to +16.2. The poll cannot settle it.',
    );
    expect(full(pictures['lead-cannot-be-tested']).description).toBe(
      'Alder minus Brook: +6 points. No margin of sampling error.',
    );
  });

  it.each([
    ['full', 279],
    ['full', 1201],
    ['row', 79],
    ['full', Number.NaN],
  ] as const)('refuses a %s picture %s px wide', (kind, widthPx) => {
    expect(() => soundingScene(pictures['lead-fragile']!, { widthPx, kind }, words)).toThrow(
      new RangeError('soundingScene requires a width from 280 to 1200 px, or from 80 as a row'),
    );
  });
});
