import { describe, expect, it } from 'vitest';
import { soundingSpecOf } from '@/lib/charts/sounding-spec-of';
import { soundingLegend } from '@/lib/charts/sounding-legend';
import { check } from '@/lib/findings/check';
import type { CheckDocument } from '@/lib/findings/check-types';
import { documents, pictures, specOf, words } from './examples';

describe('the sounding of a finding', () => {
  it('of a lead runs from the second option to the first, with the shore at 0', () => {
    expect(specOf(documents.fragile, 'lead')).toMatchObject({
      quantity: 'lead',
      verdict: 'fragile',
      label: 'Alder minus Brook',
      name: 'Alder',
      estimatePp: 8,
      shorePp: 0,
      land: 'left',
      sides: { left: 'Brook ahead', right: 'Alder ahead' },
      untestedNote: null,
    });
  });

  it('of a threshold is read in percent of the base, with the land beyond it', () => {
    expect(specOf(documents.threshold, 'threshold')).toMatchObject({
      label: 'Brook against 50%',
      estimatePp: 41,
      shorePp: 50,
      land: 'right',
      sides: { left: 'Below 50%', right: 'Above 50%' },
    });
  });

  it('of a fall has the land on the right', () => {
    expect(specOf(documents.change, 'change', 1)).toMatchObject({ estimatePp: -2, land: 'right', name: '' });
  });

  it('of a level pair names nobody', () => {
    expect(specOf(documents.level, 'lead')).toMatchObject({ estimatePp: 0, name: '' });
  });

  it('of a share claims nothing', () => {
    expect(specOf(documents.fragile, 'share')).toMatchObject({ verdict: null, shorePp: null, sides: null });
  });

  it('without a margin has no water and says why', () => {
    expect(specOf(documents.cannotBeTested, 'lead')).toMatchObject({
      bands: [],
      far: null,
      untestedNote: 'No margin of sampling error',
    });
    expect(specOf(documents.tooSmall, 'lead')).toMatchObject({ bands: [], untestedNote: 'Not tested' });
    expect(specOf(documents.cannotBeTested, 'share').untestedNote).toBe('No margin of sampling error');
  });

  it('is nothing where no share is disclosed', () => {
    const document: CheckDocument = {
      release: {
        ...documents.fragile.release,
        shares: [
          { option: 'Alder', pct: null },
          { option: 'Brook', pct: 41 },
        ],
      },
      pairs: [['Alder', 'Brook']],
    };
    const specs = check(document).findings.map((finding) => soundingSpecOf(finding, document, words));
    expect(specs.map((spec) => spec?.label ?? null)).toEqual([null, 'Brook', null]);
  });

  it('is plain data', () => {
    for (const spec of Object.values(pictures)) expect(JSON.parse(JSON.stringify(spec))).toEqual(spec);
  });
});

describe('the legend', () => {
  it('explains the marks of the picture and no others', () => {
    expect(soundingLegend(pictures['lead-fragile']!, words)).toEqual([
      'Darker: more likely range (95, 80, 50%).',
      'Tinted side: Brook ahead.',
      'Dashed: heavier weighting.',
      'Half-filled weight: the poll cannot settle it.',
    ]);
    expect(soundingLegend(pictures['change-down-not-shown']!, words)).toEqual([
      'Darker: more likely range (95, 80, 50%).',
      'Tinted side: Up.',
      'Hatched: the range reaches the tinted side.',
      'Dashed: heavier weighting.',
      'Hollow weight: not shown by this poll.',
    ]);
    expect(soundingLegend(pictures['lead-cannot-be-tested']!, words)).toEqual([
      'Dashed weight: it cannot be tested.',
    ]);
    expect(soundingLegend(pictures.share!, words)).toEqual([
      'Darker: more likely range (95, 80, 50%).',
      'Dashed: heavier weighting.',
    ]);
  });
});
