import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Scene, SceneRole } from '@/lib/charts/scene';
import { soundingScene } from '@/lib/charts/sounding-scene';
import { soundingSpecOf } from '@/lib/charts/sounding-spec-of';
import { check } from '@/lib/findings/check';
import type { CheckDocument, TestableFinding } from '@/lib/findings/check-types';
import cases from '../reference/findings/cases.json';
import { documents, words } from './examples';

type Drawn = { id: string; finding: TestableFinding; scenes: Scene[] };

/** Every tested quantity of a document with its picture in full, narrow, and as a row. */
function drawnOf(id: string, document: CheckDocument): Drawn[] {
  return check(document).findings.flatMap((finding) => {
    if (finding.kind === 'share') return [];
    const spec = soundingSpecOf(finding, document, words);
    if (!spec) return [];
    const scenes = [
      soundingScene(spec, { widthPx: 680, kind: 'full' }, words),
      soundingScene(spec, { widthPx: 280, kind: 'full' }, words),
      soundingScene(spec, { widthPx: 120, kind: 'row' }, words),
    ];
    return [{ id: `${id} ${spec.label}`, finding, scenes }];
  });
}

const has = (scene: Scene, ...roles: SceneRole[]) => scene.nodes.some((node) => roles.includes(node.role));

const WATER: SceneRole[] = [
  'water-1',
  'water-2',
  'water-3',
  'edge',
  'inner-edge',
  'land',
  'whisker',
  'calm-whisker',
];

/** What a picture may show beside its verdict; null where it is in order. */
function fault({ finding }: Drawn, scene: Scene): string | null {
  switch (finding.verdict) {
    case 'holds':
      if (has(scene, 'hatch', 'whisker')) return 'holds, yet doubted';
      return has(scene, 'weight') ? null : 'holds, yet without a full weight';
    case 'fragile':
      if (has(scene, 'weight')) return 'fragile, yet with a full weight';
      return has(scene, 'weight-half') && has(scene, 'weight-half-fill') ? null : 'fragile, yet undoubted';
    case 'does-not-hold':
      if (has(scene, 'weight', 'weight-half')) return 'not shown, yet with a filled weight';
      return has(scene, 'weight-hollow') ? null : 'not shown, yet undoubted';
    case 'cannot-be-tested':
      if (has(scene, ...WATER, 'hatch', 'weight', 'weight-half', 'weight-hollow'))
        return 'untested, yet with water';
      return has(scene, 'weight-dashed') ? null : 'untested, yet undoubted';
  }
}

/** Where the interval at the far end of the design effect or the interval itself reaches the shore. */
function reach({ finding, scenes }: Drawn): string | null {
  if (finding.verdict !== 'does-not-hold' && finding.verdict !== 'fragile') return null;
  const [low, high] = finding.intervalPp;
  const isOver = finding.estimatePp < 0 ? high > 0.2 : low < -0.2;
  return isOver && scenes.some((scene) => !has(scene, 'hatch'))
    ? 'reaches over the shore without hatching'
    : null;
}

const faultsOf = (drawn: Drawn[]) =>
  drawn.flatMap((one) =>
    [...one.scenes.map((scene) => fault(one, scene)), reach(one)].flatMap((text) =>
      text ? [`${one.id}: ${text}`] : [],
    ),
  );

describe('no picture looks more certain than its verdict', () => {
  const corpus = cases.flatMap(({ id, input }) => drawnOf(id, input as unknown as CheckDocument));

  it('over every finding of the reference cases', () => {
    expect(new Set(corpus.map(({ finding }) => finding.verdict)).size).toBe(4);
    expect(faultsOf(corpus)).toEqual([]);
  });

  it('over the examples', () => {
    const drawn = Object.entries(documents).flatMap(([id, document]) => drawnOf(id, document));
    expect(faultsOf(drawn)).toEqual([]);
  });

  it('over releases made at random', () => {
    const release = fc.record({
      first: fc.integer({ min: 0, max: 60 }),
      second: fc.integer({ min: 0, max: 40 }),
      earlier: fc.integer({ min: 0, max: 60 }),
      n: fc.integer({ min: 90, max: 4000 }),
      decimals: fc.constant(0),
      sampleSource: fc.constantFrom('probability' as const, 'probability' as const, 'opt-in' as const),
    });
    fc.assert(
      fc.property(release, ({ first, second, earlier, n, decimals, sampleSource }) => {
        const base = (pct: number) => ({
          sampleSource,
          n,
          design: 'weighted' as const,
          decimals,
          shares: [
            { option: 'Alder', pct },
            { option: 'Brook', pct: second },
          ],
        });
        const document: CheckDocument = {
          release: base(first),
          previous: base(earlier),
          thresholds: [{ option: 'Alder', pct: 50 }],
        };
        expect(faultsOf(drawnOf('random', document))).toEqual([]);
      }),
      { numRuns: 150 },
    );
  });

  it('draws the whisker over the shore where only the design effect undoes the claim', () => {
    const undone = corpus.filter(
      ({ finding }) => finding.verdict === 'fragile' && finding.reasons.join() === 'design-effect',
    );
    expect(undone.length).toBeGreaterThan(0);
    expect(undone.filter(({ scenes }) => scenes.some((scene) => !has(scene, 'whisker')))).toEqual([]);
  });
});
