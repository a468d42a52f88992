import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { sceneRulesWithVariables } from '@/lib/charts/scene-css';
import { ROLE_STYLES } from '@/lib/charts/scene-styles';

/** Formatting aside: zeros before a point, spaces, last semicolons. */
const squeezed = (css: string) =>
  css
    .replace(/\/\*.*?\*\//gs, '')
    .replace(/\b0\./g, '.')
    .replace(/\s+/g, '')
    .replace(/;}/g, '}')
    .toLowerCase();

describe('the stylesheet of the pictures', () => {
  it('is in the app as lib/charts writes it', () => {
    const app = squeezed(readFileSync('components/charts/scene.css', 'utf8'));
    expect(app).toContain(squeezed(sceneRulesWithVariables()));
  });

  it('has a rule for every role', () => {
    const css = sceneRulesWithVariables();
    const without = Object.keys(ROLE_STYLES).filter((role) => !css.includes(`.s-${role}{`));
    expect(without).toEqual(['hatch']);
    expect(css).toContain('.s-hatch-line{stroke:var(--caution)}');
  });
});
