import { describe, expect, it } from 'vitest';
import { type LiveAround, liveDocument } from '@/components/forms/release/live-document';
import { liveFindings } from '@/components/forms/release/live-findings';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import { typed, withheld } from '@/tests/support/release';
import { blankForm, row, typedForm } from './values';

const around: LiveAround = { policy: DEFAULT_POLICY, previous: null, thresholds: [] };

describe('the check document of a form being typed', () => {
  it('is none before a share is typed', () => {
    expect(liveDocument(blankForm(), around)).toBeNull();
    expect(liveDocument(blankForm({ shares: [row('Alder', '')] }), around)).toBeNull();
    expect(
      liveDocument(blankForm({ shares: [row('Alder', '', { notDisclosed: true })] }), around),
    ).toBeNull();
  });

  it('is whole for a whole form, with nothing left out', () => {
    const live = liveDocument(typedForm(), around);
    expect(live?.leftOut).toEqual([]);
    expect(live?.document.release).toEqual({
      sampleSource: 'probability',
      n: 1012,
      design: 'weighted',
      deff: null,
      statedMargin: { pp: 3.7, unit: 0.1, level: 0.95 },
      modelledInterval: null,
      decimals: 0,
      shares: [
        { option: 'Alder', pct: 47, answer: true },
        { option: 'Brook', pct: 41, answer: true },
        { option: 'Someone else', pct: 4, answer: true },
        { option: 'Don’t know', pct: 8, answer: false },
      ],
    });
  });

  it('takes the finest decimals that are typed for every share', () => {
    const live = liveDocument(typedForm({ shares: [row('Alder', '47'), row('Brook', '41,50 %')] }), around);
    expect(live?.document.release).toMatchObject({
      decimals: 2,
      shares: [{ pct: 47 }, { pct: 41.5 }],
    });
  });

  it('leaves out what cannot be read yet, and says so in plain words', () => {
    const live = liveDocument(
      typedForm({
        n: typed('a thousand'),
        deff: { source: 'design', value: 'big', df: '' },
        statedMargin: { notDisclosed: false, pp: '3.', unit: '0.1', level: '95' },
        shares: [row('Alder', '47'), row('Brook', '4i'), row('', '3'), row('Someone else', '')],
      }),
      around,
    );
    expect(live?.document.release).toMatchObject({ n: null, deff: null, statedMargin: null });
    expect(live?.document.release.shares.map(({ option }) => option)).toEqual(['Alder']);
    expect(live?.rows).toEqual([0]);
    expect(live?.leftOut).toEqual([
      'Brook: “4i” is no share from 0 to 100, so it is left out.',
      'Row 3 has no name yet, so it is left out.',
      'The sample size cannot be read yet.',
      'The design effect cannot be read yet, so it is left out.',
      'The stated margin cannot be read yet, so it is left out.',
    ]);
  });

  it('takes not disclosed for an answer, not for a gap', () => {
    const shares = [row('Alder', '47'), row('Brook', '41', { notDisclosed: true })];
    const live = liveDocument(typedForm({ n: withheld, shares }), around);
    expect(live?.document.release.n).toBeNull();
    expect(live?.document.release.shares[1]).toEqual({ option: 'Brook', pct: null, answer: true });
    expect(live?.leftOut).toEqual([]);
  });

  it('counts a form without a sample source as not random and face to face as clustered', () => {
    const live = liveDocument(
      typedForm({ sampleSource: '', design: '', mode: typed('face-to-face') }),
      around,
    );
    expect(live?.document.release).toMatchObject({ sampleSource: 'unknown', design: 'clustered' });
    expect(live?.leftOut).toEqual(['How people came into the sample is not chosen yet.']);
  });

  it('keeps a modelled interval for samples that are not random only', () => {
    const modelledInterval = { pp: '3.8', unit: '0.1', level: '95' };
    const read = (sampleSource: 'probability' | 'opt-in') =>
      liveDocument(typedForm({ sampleSource, modelledInterval }), around)?.document.release.modelledInterval;
    expect(read('opt-in')).toEqual({ pp: 3.8, unit: 0.1, level: 0.95 });
    expect(read('probability')).toBeNull();
  });

  it('holds shares against the thresholds of the race where they count what the rule counts', () => {
    const thresholds: LiveAround['thresholds'] = [
      { option: 'Alder', pct: 50, base: 'answers' },
      { option: 'Brook', pct: 50, base: 'valid-votes' },
      { option: 'Nobody', pct: 50, base: 'answers' },
    ];
    const live = liveDocument(typedForm(), { ...around, thresholds });
    expect(live?.document.thresholds).toEqual([{ option: 'Alder', pct: 50 }]);
    expect(live?.leftOut).toEqual([
      'Brook is not tested against 50%: the rule counts a different base from these shares.',
    ]);
  });

  it('reads thresholds of a race that is being added, once they are numbers', () => {
    const thresholds = [
      { option: 'Alder', pct: '50', base: 'answers' as const },
      { option: 'Brook', pct: 'half', base: 'answers' as const },
    ];
    const race = { name: '', kind: 'candidate' as const, options: ['Alder', 'Brook'], thresholds };
    const live = liveDocument(typedForm({ race: { kind: 'new', race } }), around);
    expect(live?.document.thresholds).toEqual([{ option: 'Alder', pct: 50 }]);
  });

  it('is one that the engine accepts', () => {
    const live = liveDocument(typedForm(), around);
    expect(() => parseCheckDocument(live?.document)).not.toThrow();
  });
});

describe('live findings', () => {
  it('say nothing before there is a share', () => {
    expect(liveFindings(blankForm(), around)).toEqual({ kind: 'nothing' });
  });

  it('are those that the service computes of the same figures', () => {
    const live = liveFindings(typedForm(), around);
    if (live.kind !== 'answer') throw new Error(live.kind);
    expect(live.answer.base.deff).toBeCloseTo(1.4426, 4);
    const lead = live.answer.findings.find((finding) => finding.kind === 'lead');
    expect(lead).toMatchObject({ estimatePp: 6, verdict: 'does-not-hold' });
  });

  it('tell an impossible figure at the row of the form it stands in', () => {
    const shares = [row('', ''), row('Alder', '47'), row('Someone else', ''), row('Alder', '41')];
    expect(liveFindings(typedForm({ shares }), around)).toMatchObject({
      kind: 'refused',
      field: 'shares.3.option',
    });
  });

  it('tell a sum above what rounding allows at the shares', () => {
    const shares = [row('Alder', '70'), row('Brook', '41')];
    expect(liveFindings(typedForm({ shares }), around)).toMatchObject({ kind: 'refused', field: 'shares' });
  });

  it('tell a margin that is no multiple of its unit at the margin', () => {
    const statedMargin = { notDisclosed: false, pp: '3.7', unit: '0.5', level: '95' };
    expect(liveFindings(typedForm({ statedMargin }), around)).toMatchObject({
      kind: 'refused',
      field: 'statedMargin.pp',
    });
  });
});
