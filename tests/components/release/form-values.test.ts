import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { comparisonQuery } from '@/components/forms/release/comparison-query';
import {
  blankShare,
  emptyReleaseForm,
  looksLikeNonAnswer,
  marginUnit,
  pruned,
  reviveReleaseForm,
} from '@/components/forms/release/form-values';
import { mergedShares } from '@/components/forms/release/merge-shares';
import { newSubmissionKey } from '@/components/forms/release/submission-key';
import { releaseInput } from '@/lib/domain/release-input';
import { GOVERNOR, typed, withheld } from '@/tests/support/release';
import { blankForm, row, typedForm } from './values';

describe('a draft that comes back', () => {
  it('is the form as it was left, whole or half typed', () => {
    for (const form of [typedForm(), typedForm({ race: GOVERNOR }), blankForm({ pollster: 'Kel' })])
      expect(reviveReleaseForm(JSON.parse(JSON.stringify(form)))).toEqual(form);
  });

  it('keeps what fits and leaves out what a form of today does not know', () => {
    const kept = {
      pollster: 'Kelmouth',
      n: { value: 7, notDisclosed: 'yes' },
      design: 'odd',
      extra: 1,
      shares: [3],
    };
    expect(reviveReleaseForm(kept)).toEqual({
      ...emptyReleaseForm(),
      pollster: 'Kelmouth',
      shares: [blankShare()],
    });
  });

  it('is a form whatever was kept', () => {
    fc.assert(
      fc.property(fc.jsonValue(), (kept) => {
        expect(Object.keys(reviveReleaseForm(kept)).sort()).toEqual(Object.keys(emptyReleaseForm()).sort());
      }),
    );
  });
});

describe('the form that is sent', () => {
  it('has no empty rows and lines', () => {
    const race = { name: 'Race', kind: 'issue' as const, options: [' Yes ', '', 'No'], thresholds: [] };
    const threshold = { option: '', pct: '', base: 'answers' as const };
    const sent = pruned(
      typedForm({
        race: { kind: 'new', race: { ...race, thresholds: [threshold] } },
        shares: [row('', ''), row('Yes', '47'), row('', ''), row('', '', { notDisclosed: true })],
      }),
    );
    expect(sent.race).toEqual({ kind: 'new', race: { ...race, options: ['Yes', 'No'], thresholds: [] } });
    expect(sent.shares.map(({ option }) => option)).toEqual(['Yes', '']);
  });

  it('keeps one row to point at where all are empty', () => {
    expect(pruned(blankForm()).shares).toHaveLength(1);
  });

  it('is what the service accepts', () => {
    expect(releaseInput.safeParse(pruned(typedForm())).success).toBe(true);
    expect(newSubmissionKey()).toMatch(/^[\w-]{16,64}$/);
    expect(newSubmissionKey()).not.toBe(newSubmissionKey());
  });

  it('has dates in the wrong order told together with other faults', () => {
    const faulty = typedForm({
      n: { value: 'a thousand', notDisclosed: false },
      fieldStartOn: '2026-09-20',
      fieldEndOn: '2026-09-10',
    });
    const paths = releaseInput.safeParse(pruned(faulty)).error?.issues.map(({ path }) => path.join('.'));
    expect(paths).toEqual(['n.value', 'fieldEndOn']);
  });
});

describe('the unit of a printed margin', () => {
  it.each([
    ['3.7', '0.1'],
    ['±3.7', '0.1'],
    ['3,75', '0.01'],
    ['3.5', '0.5'],
    ['3.0', '0.5'],
    ['4', '1'],
    ['3.', null],
    ['about 3', null],
  ])('of %s is %s', (printed, unit) => {
    expect(marginUnit(printed)).toBe(unit);
  });
});

describe('an option', () => {
  it.each(['Don’t know', "don't know", 'Undecided', 'Refused', 'Would not vote', 'DK', 'No opinion'])(
    '“%s” reads like no answer',
    (option) => expect(looksLikeNonAnswer(option)).toBe(true),
  );
  it.each(['Alder', 'Someone else', 'Dkarsson', 'No', 'Refuge Party'])(
    '“%s” reads like an answer',
    (option) => expect(looksLikeNonAnswer(option)).toBe(false),
  );
});

describe('shares pasted into the grid', () => {
  it('fill names that stand there, then empty rows, then new ones', () => {
    const rows = [row('Alder', ''), row('', ''), row('Someone else', '4')];
    const pasted = [
      { option: 'Brook', printed: '41' },
      { option: 'alder', printed: '47' },
      { option: "Don't know", printed: '8' },
    ];
    expect(mergedShares(rows, pasted)).toEqual([
      row('Alder', '47'),
      row('Brook', '41'),
      row('Someone else', '4'),
      row("Don't know", '8', { isAnswer: false }),
    ]);
  });

  it('never exceed what a release may have', () => {
    const pasted = Array.from({ length: 40 }, (_, at) => ({ option: `Option ${at}`, printed: '1' }));
    expect(mergedShares([], pasted)).toHaveLength(30);
  });
});

describe('the question which release to compare with', () => {
  it('is not asked without a race on file and a pollster', () => {
    expect(comparisonQuery(blankForm(), '')).toBeNull();
    expect(comparisonQuery(typedForm({ race: GOVERNOR }), '')).toBeNull();
    expect(comparisonQuery(typedForm({ pollster: '  ' }), '')).toBeNull();
  });

  it('takes what is withheld, empty or half typed as not known', () => {
    const query = comparisonQuery(
      typedForm({ wording: withheld, mode: typed(''), population: withheld, fieldStartOn: '', design: '' }),
      'release-1',
    );
    expect(query).toMatchObject({
      releaseId: 'release-1',
      wording: null,
      mode: null,
      population: null,
      fieldStartOn: null,
      fieldEndOn: '2026-09-13',
      design: 'unknown',
      answerOptions: ['Alder', 'Brook', 'Someone else'],
      hasNonAnswers: true,
    });
  });
});
