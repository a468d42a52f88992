import { formatLevel, type ChartWords } from './chart-words';
import { formatPoints } from '@/lib/format/number';
import type { SoundingSpec } from './sounding-spec';

/** What the marks of this picture mean, in plain words: only those that are in it. */
export function soundingLegend(spec: SoundingSpec, words: ChartWords): string[] {
  const { legend } = words;
  const hasWater = spec.bands.length > 0;
  return [
    ...(hasWater ? [legend.darker(levelList(spec, words))] : []),
    ...(hasWater && spec.sides && spec.land ? [legend.tinted(spec.sides[spec.land])] : []),
    ...(reachesOver(spec) ? [legend.hatched] : []),
    ...(spec.far ? [legend.dashed] : []),
    ...weightLegend(spec, words),
  ];
}

/** Whether the outermost water lies partly over the shore. */
export function reachesOver({ bands, shorePp, land }: SoundingSpec): boolean {
  const outer = bands[0];
  if (!outer || shorePp === null) return false;
  return land === 'left' ? outer.lowPp < shorePp : outer.highPp > shorePp;
}

function weightLegend({ verdict, bands }: SoundingSpec, { legend }: ChartWords): string[] {
  if (bands.length === 0) return [legend.dashedWeight];
  if (verdict === 'fragile') return [legend.halfWeight];
  return verdict === 'does-not-hold' ? [legend.hollowWeight] : [];
}

/** 95, 80, 50%. */
function levelList({ bands }: SoundingSpec, words: ChartWords): string {
  return bands
    .map(({ level }, at) => {
      const pct = Number((level * 100).toPrecision(12));
      const decimals = Math.min(6, (String(pct).split('.')[1] ?? '').length);
      return at === bands.length - 1 ? formatLevel(level, words) : formatPoints(pct, decimals, words.locale);
    })
    .join(', ');
}
