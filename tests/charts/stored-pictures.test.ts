import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { sceneToSvg } from '@/lib/charts/scene-to-svg';
import { soundingScene } from '@/lib/charts/sounding-scene';
import { pictures, words } from './examples';

const FOLDER = 'tests/charts/output';

const drawn = Object.entries(pictures).flatMap(([name, spec]) => [
  { file: `${name}.svg`, scene: soundingScene(spec, { widthPx: 640, kind: 'full' }, words) },
  { file: `${name}-row.svg`, scene: soundingScene(spec, { widthPx: 200, kind: 'row' }, words) },
]);

/** A miss writes the new picture beside the stored one, as `…-changed.svg`, for the eye. */
describe('the stored pictures', () => {
  it.each(drawn)('agree with what is drawn now: $file', ({ file, scene }) => {
    const path = `${FOLDER}/${file}`;
    const changed = path.replace('.svg', '-changed.svg');
    const svg = `${sceneToSvg(scene, { theme: 'auto', idPrefix: 'x' })}\n`;
    const stored = existsSync(path) ? readFileSync(path, 'utf8') : '';
    if (stored !== svg) writeFileSync(changed, svg);
    else rmSync(changed, { force: true });
    expect(svg).toBe(stored);
  });

  it('are each still drawn by somebody', () => {
    const stored = readdirSync(FOLDER).filter(
      (file) => file.endsWith('.svg') && !file.endsWith('-changed.svg'),
    );
    expect(stored.toSorted()).toEqual(drawn.map(({ file }) => file).toSorted());
  });
});
