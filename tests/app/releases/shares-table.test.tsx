// @vitest-environment happy-dom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { SharesTable } from '@/app/(desk)/releases/[id]/_components/shares-table';
import { given, NOT_ENTERED } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { check } from '@/lib/findings/check';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import { resolvePolicy } from '@/lib/findings/policy';

afterEach(cleanup);

const FACTS: ReleaseFacts = {
  releaseId: 'r',
  versionId: 'v',
  version: 1,
  race: { id: 'g', name: 'Averil Coast governor', kind: 'candidate', thresholds: [] },
  pollster: { id: 'k', name: 'Kelmouth Research' },
  sponsor: given({ id: 's', name: 'The Averil Courier' }),
  population: given('likely-voters'),
  sampleSource: 'probability',
  mode: given('live-telephone'),
  design: 'weighted',
  fieldStartOn: '2026-09-14',
  fieldEndOn: '2026-09-17',
  publishedOn: '2026-09-18',
  n: given(1012),
  deff: null,
  statedMargin: NOT_ENTERED,
  modelledInterval: null,
  questionWording: NOT_ENTERED,
  decimals: 1,
  shares: [
    { option: 'Brook', units: 410, isAnswer: true },
    { option: 'Don’t know', units: 60, isAnswer: false },
    { option: 'Alder', units: 490, isAnswer: true },
    { option: 'Someone else', units: null, isAnswer: true },
  ],
  sourceUrl: NOT_ENTERED,
};

function show(facts: ReleaseFacts) {
  const document = checkDocumentOf(facts, null, resolvePolicy({}));
  const answer = check(document);
  render(
    <SharesTable view={{ facts, previous: null, document, answer, enteredBy: { Brook: 'Rhea Quill' } }} />,
  );
}

describe('the shares of a release', () => {
  it('stand above their ranges where the sample is random', () => {
    show(FACTS);
    expect(screen.getByText(/Beneath each share: its range, from sampling error alone\.$/)).toBeTruthy();
    expect(screen.getByText('Working of the ranges')).toBeTruthy();
  });

  it('promise no range where the sample is not random', () => {
    show({ ...FACTS, sampleSource: 'opt-in' });
    expect(screen.queryByText(/Beneath each share/)).toBeNull();
    expect(screen.getByText('Typed by Rhea Quill.')).toBeTruthy();
    expect(screen.getByText('Why no share has a range')).toBeTruthy();
  });
});
