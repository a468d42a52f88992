import { formatValue, type ChartWords } from './chart-words';
import { describeSounding } from './describe-sounding';
import type { Scene, SceneNode } from './scene';
import { axisNodes } from './sounding-axis';
import { soundingFrame } from './sounding-frame';
import { estimateLabel, labelNodes } from './sounding-labels';
import { leadNodes } from './sounding-lead';
import { soundingScale } from './sounding-scale';
import { shoreNodes } from './sounding-shore';
import type { SoundingSpec } from './sounding-spec';
import { landNodes, waterNodes } from './sounding-water';

export type SoundingSize = {
  widthPx: number;
  kind: 'full' | 'row';
  /** A fixed axis, so that rows can be compared; it must hold all of the picture. */
  domainPp?: readonly [low: number, high: number];
  /** The half-width beside the estimate; on unless a caveat nearby says it in other digits. */
  hasMargin?: boolean;
};

/**
 * The sounding: one quantity, its uncertainty, and the side on which the claim fails, as a picture in plain data.
 *
 * Land is where the claim fails, water deepens with likelihood, hatching marks water that reaches over the shore,
 * the dashed whisker how far it goes at the far end of the design effect's range. The weight is filled only where
 * the verdict holds: half-filled when fragile, hollow when not shown, dashed when it cannot be tested.
 *
 * @param spec what is drawn
 * @param size 280–1200 px wide in full, 80–1200 px and 24 px high as a row without words
 * @param words the language of labels and description
 * @throws RangeError `soundingScene requires a width from 280 to 1200 px, or from 80 as a row`
 */
export function soundingScene(spec: SoundingSpec, size: SoundingSize, words: ChartWords): Scene {
  const narrowest = size.kind === 'row' ? 80 : 280;
  if (!(size.widthPx >= narrowest && size.widthPx <= 1200)) {
    throw new RangeError('soundingScene requires a width from 280 to 1200 px, or from 80 as a row');
  }
  const frame = soundingFrame(size.kind, spec.sides !== null);
  const scale = soundingScale(
    spec,
    {
      widthPx: size.widthPx,
      minPadPx: frame.minPadPx,
      hasLabels: size.kind === 'full',
      ...(size.domainPp ? { domainPp: size.domainPp } : {}),
    },
    words,
  );
  const label = estimateLabel(spec, size, scale, words);
  const nodes: SceneNode[] = [
    ...landNodes(spec, scale, frame),
    ...waterNodes(spec, scale, frame),
    ...shoreNodes(spec, scale, frame, label),
    ...axisNodes(scale, frame),
    ...leadNodes(spec, scale, frame),
    ...labelNodes(spec, size, scale, frame, label),
  ];
  return {
    widthPx: size.widthPx,
    heightPx: frame.heightPx,
    title: `${spec.label}: ${formatValue(spec.estimatePp, spec.decimals, spec.quantity, words)}`,
    description: describeSounding(spec, words),
    nodes,
  };
}
