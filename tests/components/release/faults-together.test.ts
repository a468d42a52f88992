import { describe, expect, it } from 'vitest';
import { engineFaults } from '@/components/forms/release/engine-faults';
import type { ReleaseForm } from '@/components/forms/release/form-values';
import { releaseInput } from '@/lib/domain/release-input';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import { GOVERNOR, typed } from '@/tests/support/release';
import { row, typedForm } from './values';

const refused = (form: ReleaseForm) => engineFaults(form, DEFAULT_POLICY).map(({ field }) => field);
const faultPaths = (form: unknown) =>
  (releaseInput.safeParse(form).error?.issues ?? []).map((issue) => issue.path.join('.'));
const margin = (pp: string, unit = '0.5') => ({ notDisclosed: false, pp, unit, level: '95' });

describe('what the engine refuses in a form', () => {
  it('is nothing in a form that holds together, or where no share reads', () => {
    expect(refused(typedForm())).toEqual([]);
    expect(refused(typedForm({ shares: [row('Alder', '')] }))).toEqual([]);
  });

  it('is told whole: the sum, the unit of the margin and of a modelled interval', () => {
    const shares = [row('', ''), row('Alder', '90'), row('Brook', '41')];
    const modelledInterval = { pp: '3.7', unit: '0.5', level: '95' };
    const form = typedForm({ shares, statedMargin: margin('3.7'), modelledInterval, sampleSource: 'opt-in' });
    expect(refused(form)).toEqual(['shares', 'statedMargin.pp', 'modelledInterval.pp']);
  });

  it('is told beside what cannot be read', () => {
    const form = typedForm({ n: typed('a thousand'), statedMargin: margin('3.7') });
    expect(refused(form)).toEqual(['statedMargin.pp']);
    expect(faultPaths(form)).toEqual(['n.value']);
  });

  it('is no margin too wide while the design effect cannot be read', () => {
    const wide = { statedMargin: margin('30', '1') };
    expect(refused(typedForm(wide))).toEqual(['statedMargin.pp']);
    const deff = { source: 'design' as const, value: 'big', df: '' };
    expect(refused(typedForm({ ...wide, deff }))).toEqual([]);
  });

  it('is at the row of the form, and still sums', () => {
    const shares = [row('Alder', ''), row('Brook', '60'), row('Brook', '60')];
    expect(refused(typedForm({ shares }))).toEqual(['shares.2.option', 'shares']);
  });
});

describe('an option that stands there twice', () => {
  it('is told with faults of the same row and elsewhere', () => {
    const shares = [row('Alder', '47'), row('alder', 'x'), row('', '3'), row('', '4')];
    expect(faultPaths(typedForm({ pollster: '', shares }))).toEqual([
      'pollster',
      'shares.1.printed',
      'shares.2.option',
      'shares.3.option',
      'shares.1.option',
    ]);
  });

  it('is told in a race that has no name yet, with a threshold on nobody', () => {
    if (GOVERNOR.kind !== 'new') throw new TypeError('the test requires a new race');
    const thresholds = [{ option: 'Nobody', pct: '0', base: 'answers' as const }];
    const race = { ...GOVERNOR.race, name: '', options: ['Yes', 'yes'], thresholds };
    expect(faultPaths(typedForm({ race: { kind: 'new', race } }))).toEqual([
      'race.race.name',
      'race.race.thresholds.0.pct',
      'race.race.options.1',
      'race.race.thresholds.0.option',
    ]);
  });

  it('is refused without a crash where the body is no form at all', () => {
    for (const body of [null, [], {}, { shares: 3 }, { ...typedForm(), shares: [null, 'x'] }])
      expect(releaseInput.safeParse(body).success).toBe(false);
  });
});
