import { describe, expect, it } from 'vitest';
import { exampleInputs, HOSTILE_NAMES, PLAIN_NAMES } from '@/lib/services/house-style/example-inputs';
import { faultsAsWritten, faultsOfSentence } from '@/lib/services/house-style/check-sentences';
import { leavesOf } from '@/lib/services/house-style/leaves';
import { decide } from '@/lib/services/house-style/save-draft';
import { DEFAULT_DESK_POLICY } from '@/lib/services/house-style/style-body';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { VERDICT_OF_STATE, wordingState } from '@/lib/wording/wording-state';

const BODY = { style: DEFAULT_HOUSE_STYLE, policy: DEFAULT_DESK_POLICY };
const HEADLINE = 'style.messages.en.headline';
const FRAGILE = `${HEADLINE}.lead.fragile`;
const A = '{among, select, several {Of the two, {a}} other {{a}}}';
const TAIL = ' in poll by {pollster}, {aShare} to {bShare}, but the poll cannot settle it';

const messages = (path: string, text: string) =>
  faultsOfSentence(path, text, DEFAULT_HOUSE_STYLE).map(({ message }) => message);

/** A claim sentence with words put before it that only a finding that holds supports. */
const OVERCLAIMS = [
  { words: 'Clear majority: ', phrase: 'majority' },
  { words: 'Landslide ahead: ', phrase: 'Landslide' },
];

const CLAIMS = ['headline', 'body', 'chartTitle'].flatMap((part) =>
  Object.entries(DEFAULT_HOUSE_STYLE.messages.en[part as 'headline']).flatMap(([claim, states]) =>
    Object.entries(states).map(
      ([state, text]) =>
        [`style.messages.en.${part}.${claim}.${state}`, text, VERDICT_OF_STATE[state as 'holds']] as const,
    ),
  ),
);

describe('a sentence of house style', () => {
  it.each(CLAIMS)(
    '%s passes as the product ships it, and with a majority only where it holds',
    (path, text, verdict) => {
      expect(faultsAsWritten(path, text, DEFAULT_HOUSE_STYLE)).toEqual([]);
      for (const { words, phrase } of OVERCLAIMS) {
        const faults = faultsAsWritten(path, words + text, DEFAULT_HOUSE_STYLE);
        const isRefused = faults.some((fault) => fault.phrase === phrase);
        expect(isRefused, words).toBe(verdict !== 'holds' || phrase === 'Landslide');
      }
    },
  );

  it('that says a fragile lead "leads" is refused with the phrase, its place and the verdict', () => {
    const [fault] = faultsOfSentence(FRAGILE, `${A} leads {b}${TAIL}`, DEFAULT_HOUSE_STYLE);
    expect(fault).toEqual({
      message: '“leads” says more than the verdict Fragile supports.',
      phrase: 'leads',
      place: { start: A.length + 1, end: A.length + 6 },
    });
  });

  it('that drops what the verdict needs is refused', () => {
    expect(messages(FRAGILE, `${A} is ahead of {b} in poll by {pollster}, {aShare} to {bShare}`)).toEqual([
      'A fragile finding is left open: say that the poll cannot settle it.',
    ]);
    expect(
      messages(FRAGILE, `${A} is ahead of {b}, {aShare} to {bShare}, but the poll cannot settle it`),
    ).toEqual(['This sentence has to name {pollster}.']);
  });

  it('uses a verb of its rung', () => {
    const [message] = messages(FRAGILE, `${A} has an edge over {b}${TAIL}`);
    expect(message).toMatch(/^No verb of the rung Fragile in it: is ahead, /);
  });

  it.each([
    ['{nope} is ahead of {a} {b}', 'There is no slot {nope} here. Take one from the list.'],
    ['{a', 'A slot is opened by { and not closed by }.'],
    ['{} is ahead', 'A slot has no name between { and }.'],
    ['{setting, select, contest {x}}', 'The choice “other”, for everything else, is missing.'],
    [
      '{setting, select, race {x} other {y}}',
      '{setting} never has the choice “race”; it has contest, other.',
    ],
    ['{a} } {b}', 'There is a } too many.'],
  ])('with faulty braces or slots is refused: %s', (text, message) => {
    expect(messages(FRAGILE, text)[0]).toBe(message);
  });

  it('keeps the higher one before the lower one, and the earlier figure before the later', () => {
    expect(messages(FRAGILE, `{b} is ahead of ${A}${TAIL}`)).toEqual([
      '{a} is the one with the higher figure: name it before {b}.',
    ]);
    const path = `${HEADLINE}.change.not-shown`;
    const text =
      '{option} at {then}, against {now} on {prevDates}, by {pollster}: chance alone could produce it';
    expect(messages(path, text)[0]).toMatch(/the wrong way round/);
  });

  it('never says up for a fall, in any of its choices', () => {
    const text =
      '{direction, select, more {{option} up since {prevDates} in polls by {pollsters}} other {{option} up since {prevDates} in polls by {pollsters}}}';
    expect(messages(`${HEADLINE}.change.holds`, text)).toEqual([
      '“up” is the wrong way round for this choice.',
    ]);
  });

  it('with a phrase that the desk bans is refused, as a whole word', () => {
    const style = {
      ...DEFAULT_HOUSE_STYLE,
      banned: { ...DEFAULT_HOUSE_STYLE.banned, en: ['settle', 'head'] },
    };
    const text = DEFAULT_HOUSE_STYLE.messages.en.headline.lead.fragile;
    expect(faultsAsWritten(FRAGILE, text, style).map(({ phrase }) => phrase)).toEqual(['settle']);
  });

  it.each([
    ['es', 'Ventaja de {a} sobre {b} en el sondeo de {pollster}, {aShare} frente a {bShare}', 'Ventaja'],
    ['en', '{a} leads {b} in poll by {pollster}, {aShare} to {bShare}', 'leads'],
  ])('in %s is held to what that language may not say', (language, text, phrase) => {
    const path = `style.messages.${language}.headline.lead.fragile`;
    expect(faultsOfSentence(path, text, DEFAULT_HOUSE_STYLE).map((fault) => fault.phrase)).toContain(phrase);
  });

  it('that keeps to its verdict passes with other words', () => {
    expect(messages(FRAGILE, `${A} has the higher figure, {b} the lower one,${TAIL}`)).toEqual([]);
  });
});

describe('the table that sentences are run over', () => {
  it('has every verdict of every kind of claim, with names that break what is careless', () => {
    for (const names of [PLAIN_NAMES, ...HOSTILE_NAMES]) {
      const seen = exampleInputs(names).map(({ finding }) => `${finding.kind} ${finding.verdict}`);
      const kinds = ['lead', 'change', 'lead-change', 'threshold'];
      const verdicts = ['holds', 'fragile', 'does-not-hold', 'cannot-be-tested'];
      const wanted = kinds.flatMap((kind) => verdicts.map((verdict) => `${kind} ${verdict}`));
      expect(new Set(seen)).toEqual(new Set(wanted));
    }
    const states = new Set(exampleInputs(PLAIN_NAMES).map(({ finding }) => wordingState(finding)));
    expect(states).toEqual(new Set(Object.keys(VERDICT_OF_STATE)));
  });
});

describe('a decision that is no sentence', () => {
  const first = (path: string, value: unknown) => decide(BODY, path, value).faults[0]?.message;

  it('is taken where it is in its limits', () => {
    const { body, faults } = decide(BODY, 'policy.comparisonBasis.quota', true);
    expect(faults).toEqual([]);
    expect(body.policy.comparisonBasis).toMatchObject({ quota: true, 'opt-in': false });
    expect(leavesOf(BODY).get('policy.comparisonBasis.quota')).toBe(false);
  });

  it.each([
    ['policy.level', 0.5, 'From 50 to 99.9.'],
    ['policy.assumed.weighted.range', [1.5, 2], 'The range starts at 0.5 or above and contains the value.'],
    ['policy.kishRange', [1.1, 1.3], 'The range contains 1.'],
    ['style.newsroom', ' ', 'Say how the desk calls itself.'],
    ['style.locales.en', 'de-DE', 'Of the same language.'],
    ['style.ladder.fragile', ['is ahead', 'leads'], '“leads” says more than this verdict supports.'],
    ['style.ladder.holds', [], 'Every verdict needs a verb.'],
    ['style.templateVersion', '9.9.9', 'This cannot be changed here.'],
    ['style.nothing', 'x', 'There is no such decision in a house style.'],
    ['style.__proto__.x', 'x', 'There is no such decision in a house style.'],
  ])('%s as %j is refused', (path, value, message) => {
    expect(first(path, value)).toBe(message);
  });
});
