import { given, NOT_ENTERED } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';

/** A release of the invented governor's race, with one share that is not disclosed; the largest is no answer. */
export const FACTS: ReleaseFacts = {
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
    { option: 'Don’t know', units: 600, isAnswer: false },
    { option: 'Alder', units: 490, isAnswer: true },
    { option: 'Someone else', units: null, isAnswer: true },
  ],
  sourceUrl: NOT_ENTERED,
};
