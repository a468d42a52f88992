import { useId } from 'react';
import { ENGLISH_CHART_WORDS, type ChartWords } from '@/lib/charts/chart-words';
import { soundingScene } from '@/lib/charts/sounding-scene';
import type { SoundingSpec } from '@/lib/charts/sounding-spec';
import { SceneView } from './scene-view';

/** Widths at which the labels are laid out anew; the stylesheet shows the one that fits its column. */
const WIDTHS_PX = [300, 440, 680] as const;

/** The uncertainty chart of one finding, as wide as its column. */
export function Sounding({ spec, words = ENGLISH_CHART_WORDS }: { spec: SoundingSpec; words?: ChartWords }) {
  const id = useId();
  return (
    <div className="sounding-sizes">
      {WIDTHS_PX.map((widthPx) => (
        <SceneView
          key={widthPx}
          scene={soundingScene(spec, { widthPx, kind: 'full' }, words)}
          idPrefix={`${id}-${widthPx}`}
          className={`sounding-${widthPx}`}
        />
      ))}
    </div>
  );
}

/** The chart at the height of a table row, without words; say the figures in the row. */
export function SoundingRow({
  spec,
  domainPp,
  widthPx = 180,
  words = ENGLISH_CHART_WORDS,
}: {
  spec: SoundingSpec;
  domainPp?: readonly [number, number];
  widthPx?: number;
  words?: ChartWords;
}) {
  const id = useId();
  const scene = soundingScene(spec, { widthPx, kind: 'row', ...(domainPp ? { domainPp } : {}) }, words);
  return <SceneView scene={scene} idPrefix={id} isDecorative />;
}
