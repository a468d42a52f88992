// @vitest-environment happy-dom
import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { betweenReleases } from '@/components/findings/between';
import { FindingCard } from '@/components/findings/finding-card';
import { FindingList } from '@/components/findings/finding-list';
import { verdictSummary } from '@/components/findings/verdict-summary';
import { WorkingSteps } from '@/components/findings/working-steps';
import { check } from '@/lib/findings/check';
import { claimKey } from '@/lib/findings/claim-key';
import type { CheckDocument } from '@/lib/findings/check-types';
import { working } from '@/lib/findings/working';

afterEach(cleanup);

const base = (alder: number, brook: number): CheckDocument['release'] => ({
  sampleSource: 'probability',
  n: 1012,
  design: 'weighted',
  decimals: 0,
  shares: [
    { option: 'Alder', pct: alder },
    { option: 'Brook', pct: brook },
  ],
});
const document: CheckDocument = { release: base(49, 41), previous: base(44, 43) };
const answer = check(document);

describe('the list of findings', () => {
  it('has a neutral heading, a verdict, a picture and sentences for each', () => {
    render(<FindingList idPrefix="x" document={document} answer={answer} between="August to September" />);
    const headings = screen.getAllByRole('heading').map((heading) => heading.textContent);
    expect(headings).toEqual([
      'Alder minus Brook: +8',
      'Alder, August to September: +5',
      'Brook, August to September: −2',
      'Alder minus Brook, August to September: +7',
    ]);
    const lead = screen.getByRole('article', { name: 'Alder minus Brook: +8' });
    expect(within(lead).getByText('Fragile')).toBeTruthy();
    expect(within(lead).getAllByRole('img').length).toBeGreaterThan(0);
    expect(
      within(lead).getByText(/^Larger than sampling error at the assumed design effect of 1.4/),
    ).toBeTruthy();
  });

  it('never words a heading as a claim', () => {
    render(<FindingList idPrefix="x" document={document} answer={answer} />);
    for (const heading of screen.getAllByRole('heading'))
      expect(heading.textContent).not.toMatch(/lead|ahead|up|down|win|gain|lose/i);
  });

  it('offers what can be done with each, and its working', () => {
    render(
      <FindingList
        idPrefix="x"
        document={document}
        answer={answer}
        workingOf={(finding) => (
          <WorkingSteps steps={working(document, answer, answer.findings.indexOf(finding))} />
        )}
        actionOf={(finding) => <a href={claimKey(finding)}>Draft a sheet</a>}
      />,
    );
    const hrefs = screen.getAllByRole('link').map((link) => link.getAttribute('href'));
    expect(hrefs[0]).toBe('lead:Alder|Brook');
    const lead = screen.getByRole('article', { name: 'Alder minus Brook: +8' });
    expect(within(lead).getByText('8 points')).toBeTruthy();
  });
});

describe('a finding without a figure', () => {
  it('has no picture and still says why', () => {
    render(
      <FindingCard
        id="none"
        heading="Alder minus Brook: no figure"
        verdict="cannot-be-tested"
        spec={null}
        why={['A share that this needs is not disclosed.']}
      />,
    );
    expect(screen.queryByRole('img')).toBeNull();
    expect(screen.getByText('Cannot be tested')).toBeTruthy();
    expect(screen.getByText('A share that this needs is not disclosed.')).toBeTruthy();
  });
});

describe('the summary of verdicts', () => {
  it.each([
    [
      ['holds', 'fragile', 'does-not-hold'],
      'One finding holds, one is fragile, one is not shown by the numbers.',
    ],
    [['does-not-hold', 'holds', 'holds'], 'Two findings hold, one is not shown by the numbers.'],
    [['cannot-be-tested', 'cannot-be-tested'], 'Two findings cannot be tested.'],
    [Array.from({ length: 12 }, () => 'fragile' as const), '12 findings are fragile.'],
    [[], 'Nothing here is tested.'],
  ] as const)('of %j is “%s”', (verdicts, words) => {
    expect(verdictSummary([...verdicts])).toBe(words);
  });
});

describe('two releases named for a heading', () => {
  it.each([
    ['2026-08-13', '2026-09-17', 'August to September'],
    ['2026-09-03', '2026-09-17', '3 September to 17 September'],
    ['2025-09-17', '2026-09-17', 'September 2025 to September 2026'],
    ['2026-09-17', '', 'earlier to this'],
  ])('%s and %s are “%s”', (earlier, later, words) => {
    expect(betweenReleases(earlier, later)).toBe(words);
  });
});
