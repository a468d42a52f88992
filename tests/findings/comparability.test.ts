import { describe, expect, test } from 'vitest';
import { chooseComparison } from '@/lib/findings/choose-comparison';
import { compareReleases, plainText, type ComparableFacts } from '@/lib/findings/comparability';

const facts: ComparableFacts = {
  id: 'now',
  pollster: 'kelmouth',
  race: 'governor',
  questionWording: 'If the vote were held today, whom would you choose?',
  sameQuestion: false,
  answerOptions: ['Alder', 'Brook'],
  population: 'likely-voters',
  likelyVoterMethod: 'screen-3',
  modeFamily: 'online',
  sampleSource: 'probability',
  sampleSupplier: 'quillon',
  weightingScheme: 'raking-5',
  sponsorKind: 'newsroom',
  isRebased: false,
  questionOrder: 'first',
  fieldStartOn: '2031-05-10',
  fieldEndOn: '2031-05-13',
};
const earlier: ComparableFacts = {
  ...facts,
  id: 'before',
  fieldStartOn: '2031-04-10',
  fieldEndOn: '2031-04-13',
};
const itemsOf = (change: Partial<ComparableFacts>, current: Partial<ComparableFacts> = {}) =>
  compareReleases({ ...facts, ...current }, { ...earlier, ...change }).differences.map(({ item }) => item);

describe('compareReleases', () => {
  test('finds two waves of one series comparable', () => {
    expect(compareReleases(facts, earlier)).toEqual({ comparable: true, differences: [], unknowns: [] });
  });

  const changes: [item: string, change: Partial<ComparableFacts>][] = [
    ['pollster', { pollster: 'norwater' }],
    ['race', { race: 'toll' }],
    ['question-wording', { questionWording: 'Whom do you like?' }],
    ['answer-options', { answerOptions: ['Alder', 'Brook', 'Crane'] }],
    ['population', { population: 'adults' }],
    ['likely-voter-method', { likelyVoterMethod: 'screen-4' }],
    ['mode', { modeFamily: 'live-telephone' }],
    ['sample-source', { sampleSource: 'opt-in' }],
    ['sample-supplier', { sampleSupplier: 'own' }],
    ['weighting-scheme', { weightingScheme: 'raking-6' }],
    ['sponsor-kind', { sponsorKind: 'campaign' }],
    ['re-basing', { isRebased: true }],
    ['question-order', { questionOrder: 'after approval' }],
    ['field-dates', { fieldEndOn: '2031-05-10' }],
  ];
  test.each(changes)('lists a different %s with both values', (item, change) => {
    const { comparable, differences } = compareReleases(facts, { ...earlier, ...change });
    expect(comparable).toBe(false);
    expect(differences.map((one) => one.item)).toEqual([item]);
    expect(differences[0]?.current).not.toBe(differences[0]?.earlier);
  });

  test('leaves no room for an override with another race or shared days', () => {
    const { differences } = compareReleases(facts, {
      ...earlier,
      race: 'toll',
      pollster: 'x',
      fieldEndOn: '2031-05-11',
    });
    expect(differences.map(({ item, isOverridable }) => [item, isOverridable])).toEqual([
      ['pollster', true],
      ['race', false],
      ['field-dates', false],
    ]);
  });

  test('does not count case, spaces, punctuation or the order of options', () => {
    expect(
      itemsOf({
        questionWording: ' if the vote were held today – whom would you  choose',
        answerOptions: ['brook', 'ALDER'],
      }),
    ).toEqual([]);
    expect(plainText('Bridge-toll: Yes/No?')).toBe(plainText('bridge toll yes no'));
    expect(plainText('5 %')).not.toBe(plainText('6 %'));
  });

  test("takes a reporter's mark for the same question, whatever the words", () => {
    expect(itemsOf({ questionWording: 'Whom do you like?' }, { sameQuestion: true })).toEqual([]);
  });

  test('lists what is not known and compares all the same', () => {
    const unknown = {
      pollster: null,
      modeFamily: null,
      answerOptions: null,
      isRebased: null,
      fieldStartOn: null,
    };
    expect(compareReleases(facts, { ...earlier, ...unknown })).toEqual({
      comparable: true,
      differences: [],
      unknowns: ['pollster', 'answer-options', 'mode', 're-basing', 'field-dates'],
    });
  });

  test('asks for a likely-voter method only where likely voters may be concerned', () => {
    const adults = { population: 'adults', likelyVoterMethod: null };
    expect(compareReleases({ ...facts, ...adults }, { ...earlier, ...adults }).unknowns).toEqual([]);
    expect(compareReleases({ ...facts, likelyVoterMethod: null }, earlier).unknowns).toEqual([
      'likely-voter-method',
    ]);
  });
});

describe('chooseComparison', () => {
  const wave = (id: string, from: string, to: string, change: Partial<ComparableFacts> = {}) => ({
    ...earlier,
    ...change,
    id,
    fieldStartOn: from,
    fieldEndOn: to,
  });
  const april = wave('april', '2031-04-10', '2031-04-13');
  const march = wave('march', '2031-03-10', '2031-03-13');
  const june = wave('june', '2031-06-10', '2031-06-13');

  test('takes the latest with earlier field dates, in whatever order they come', () => {
    const choice = chooseComparison(facts, [march, june, april, facts]);
    expect([choice.chosen?.id, choice.reason, choice.passedOver]).toEqual(['april', 'latest', []]);
  });

  test('passes over a later one that is not comparable, and says why', () => {
    const other = { ...april, modeFamily: 'post' };
    const choice = chooseComparison(facts, [other, march]);
    expect([choice.chosen?.id, choice.reason]).toEqual(['march', 'latest-comparable']);
    expect(
      choice.passedOver.map(({ release, comparability }) => [release.id, comparability.differences[0]?.item]),
    ).toEqual([['april', 'mode']]);
  });

  test('passes over one whose interviews overlap', () => {
    const choice = chooseComparison(facts, [wave('overlap', '2031-05-08', '2031-05-11'), march]);
    expect([choice.chosen?.id, choice.passedOver[0]?.comparability.differences[0]?.item]).toEqual([
      'march',
      'field-dates',
    ]);
  });

  test('says that none is comparable, or none is earlier, or that the dates are not known', () => {
    expect(chooseComparison(facts, [{ ...march, race: 'toll' }])).toMatchObject({
      chosen: null,
      reason: 'none-comparable',
    });
    expect(chooseComparison(facts, [june])).toMatchObject({
      chosen: null,
      reason: 'none-earlier',
      passedOver: [],
    });
    expect(chooseComparison(facts, [])).toMatchObject({ chosen: null, reason: 'none-earlier' });
    expect(chooseComparison({ ...facts, fieldEndOn: null }, [march])).toMatchObject({
      chosen: null,
      reason: 'dates-unknown',
    });
  });

  test('keeps what is not known of the chosen one', () => {
    const choice = chooseComparison(facts, [{ ...march, weightingScheme: null }]);
    expect(choice.comparability?.unknowns).toEqual(['weighting-scheme']);
  });

  test('of two that ended on one day takes the one that began later', () => {
    const shorter = wave('shorter', '2031-04-12', '2031-04-13');
    expect(chooseComparison(facts, [april, shorter]).chosen?.id).toBe('shorter');
  });
});
