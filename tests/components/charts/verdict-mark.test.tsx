import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { Sounding, SoundingRow } from '@/components/charts/sounding';
import { VERDICT_NAMES, VerdictMark } from '@/components/charts/verdict-mark';
import type { Verdict } from '@/lib/findings/check-types';
import { pictures } from '../../charts/examples';
import { elementsOf, parseMarkup, textOf } from '../../support/markup';

const verdicts = Object.keys(VERDICT_NAMES) as Verdict[];
const markOf = (verdict: Verdict) => parseMarkup(renderToStaticMarkup(<VerdictMark verdict={verdict} />));

describe('the mark of a verdict', () => {
  it('says its word', () => {
    expect(verdicts.map((verdict) => textOf(markOf(verdict)))).toEqual([
      'Holds',
      'Fragile',
      'Not shown',
      'Cannot be tested',
    ]);
  });

  it('has a shape of its own, whatever the colours', () => {
    const shapes = verdicts.map((verdict) => JSON.stringify(elementsOf(markOf(verdict), 'svg')[0]?.children));
    expect(new Set(shapes).size).toBe(4);
  });
});

describe('the chart of a finding', () => {
  const page = parseMarkup(renderToStaticMarkup(<Sounding spec={pictures['lead-fragile']!} />));

  it('is laid out for three widths, of which the stylesheet shows one', () => {
    const classes = elementsOf(page, 'svg').map((svg) => svg.attributes.class);
    expect(classes).toEqual(['sounding sounding-300', 'sounding sounding-440', 'sounding sounding-680']);
  });

  it('has no id twice', () => {
    const ids = JSON.stringify(page).match(/"id":"[^"]+"/g) ?? [];
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('in a table row is for the eye alone', () => {
    const row = parseMarkup(renderToStaticMarkup(<SoundingRow spec={pictures['lead-fragile']!} />));
    expect(elementsOf(row, 'svg')[0]?.attributes['aria-hidden']).toBe('true');
  });
});
