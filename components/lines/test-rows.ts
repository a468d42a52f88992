import type {
  BaseAnswer,
  CheckAnswer,
  Range,
  SecondTest,
  TestableFinding,
  TestedReason,
  UntestedReason,
} from '@/lib/findings/check-types';
import { formatP, formatPoints, formatTrimmed } from '@/lib/format/number';
import { deffSourceText } from '@/lib/wording/base-words';
import { EN } from '@/lib/wording/messages/en';
import { familySize, isPlausibleBreaking } from '@/lib/wording/test-facts';
import { VERDICT_NAMES } from '../charts/verdict-mark';

const LOCALE = 'en-GB';

type Tested = Exclude<TestableFinding, { verdict: 'cannot-be-tested' }>;
export type TestRow = { term: string; value: string };

const KIND: Record<TestableFinding['kind'], string> = {
  lead: 'Test of the lead',
  change: 'Test of the change',
  'lead-change': 'Test of the change in the lead',
  threshold: 'Test against the threshold',
};

const REASONS: Record<TestedReason | UntestedReason, string> = {
  family: 'tested together with others',
  'would-hold-at-lower-deff': 'would pass at the low end of the design effect',
  rounding: 'rounding',
  'design-effect': 'design effect',
  'second-test': 'a second test disagrees',
  together: 'rounding and design effect together',
  modelled: 'rests on the pollster’s model',
  comparison: 'the sample is not random',
  'no-sample-size': 'no sample size',
  'no-sampling-basis': 'the sample is not random',
  'too-small': 'too few interviews',
  'few-clusters': 'too few clusters',
  'not-comparable': 'the two samples do not compare',
  'not-disclosed': 'a share is not disclosed',
};

/** What a second reader checks a claim against, one figure a row; the verdict comes last. */
export function testRows(finding: TestableFinding, answer: CheckAnswer): TestRow[] {
  const verdict = { term: 'Verdict', value: verdictText(finding) };
  if (finding.verdict === 'cannot-be-tested') return [verdict];
  return [
    { term: KIND[finding.kind], value: `${zText(finding)}${formatP(finding.p, LOCALE)}` },
    { term: 'Range', value: rangeText(finding.intervalPp) },
    ...familyRow(finding, answer),
    { term: 'Rounding', value: roundingText(finding) },
    ...deffRows(finding, answer),
    ...finding.secondTests.map(secondTestRow),
    ...reachRows(finding),
    verdict,
  ];
}

function verdictText({ verdict, reasons }: TestableFinding): string {
  const why = reasons.map((reason) => REASONS[reason]);
  return why.length === 0 ? VERDICT_NAMES[verdict] : `${VERDICT_NAMES[verdict]}: ${why.join('; ')}`;
}

function zText({ z }: Tested): string {
  return z === null ? 'no variance, ' : `z = ${formatPoints(z, 2, LOCALE)}, `;
}

function rangeText([low, high]: Range): string {
  return `${formatPoints(low, 1, LOCALE)} to ${formatPoints(high, 1, LOCALE)} points`;
}

function familyRow(finding: Tested, answer: CheckAnswer): TestRow[] {
  const size = familySize(finding, answer);
  if (size < 2) return [];
  return [{ term: `Adjusted for ${size} tests`, value: formatP(finding.pAdjusted, LOCALE) }];
}

function roundingText({ roundingPp, reasons, verdict }: Tested): string {
  const size = `± ${formatPoints(roundingPp, 1, LOCALE)} points`;
  if (verdict === 'does-not-hold') return size;
  if (reasons.includes('rounding')) return `${size}: undoes it`;
  return reasons.includes('together') ? `${size}: undoes it with the design effect` : `${size}: still passes`;
}

function deffRows(finding: Tested, answer: CheckAnswer): TestRow[] {
  const earlier = 'breakingFactor' in finding ? deffText(answer.previousBase) : null;
  const current = deffText(answer.base);
  const rows =
    earlier === null || earlier === current
      ? [{ term: 'Design effect', value: current }]
      : [
          { term: 'Design effect', value: current },
          { term: 'Design effect, earlier', value: earlier },
        ];
  const turns = isPlausibleBreaking(finding, answer) ? turningText(finding) : null;
  return [
    ...rows.flatMap(({ term, value }) => (value === null ? [] : [{ term, value }])),
    ...(turns === null ? [] : [{ term: 'The result turns', value: turns }]),
  ];
}

function deffText(base: BaseAnswer | null): string | null {
  if (!base?.deff || !base.deffSource || !base.deffRange) return null;
  const [low, high] = base.deffRange.map((end) => formatTrimmed(end, 2, LOCALE));
  const range = low === high ? '' : ` (${low}–${high})`;
  return `${formatTrimmed(base.deff, 2, LOCALE)} ${deffSourceText(base.deffSource)}${range}`;
}

function turningText(finding: Tested): string | null {
  if ('breakingDeff' in finding) {
    const { breakingDeff } = finding;
    return breakingDeff === null ? null : `at a design effect of ${formatTrimmed(breakingDeff, 2, LOCALE)}`;
  }
  const { breakingFactor } = finding;
  return breakingFactor === null ? null : `at ${formatTrimmed(breakingFactor, 2, LOCALE)} times both`;
}

function secondTestRow(test: SecondTest): TestRow {
  const agrees = test.significant ? 'passes' : 'does not pass';
  const figure = test.name === 'newcombe' ? rangeText(test.intervalPp) : formatP(test.p, LOCALE);
  return { term: capital(EN.terms.secondTest[test.name]), value: `${figure}: ${agrees}` };
}

function capital(name: string): string {
  return name.charAt(0).toUpperCase() + name.slice(1);
}

function reachRows({ detectable80Pp, survivesTwiceError }: Tested): TestRow[] {
  if (detectable80Pp !== null) {
    const points = formatPoints(detectable80Pp, 1, LOCALE);
    return [{ term: 'Found four times in five', value: `a true ${points} points` }];
  }
  if (survivesTwiceError === null) return [];
  return [
    { term: 'At twice the sampling error', value: survivesTwiceError ? 'would stand' : 'would not stand' },
  ];
}
