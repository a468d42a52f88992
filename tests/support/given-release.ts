/** A release as it comes with a request or in a file: invented, and complete. */
export function givenRelease(n: number | string = 1012, more: Record<string, unknown> = {}) {
  return {
    names: {
      race: 'Averil Coast governor',
      pollster: 'Kelmouth Research',
      sponsor: 'The Averil Courier',
      population: 'likely-voters',
      mode: 'live-telephone',
    },
    dates: { fieldStartOn: '2026-09-10', fieldEndOn: '2026-09-13', publishedOn: '2026-09-16' },
    release: {
      sampleSource: 'probability',
      n,
      design: 'weighted',
      statedMargin: { pp: 3.7, unit: 0.1, level: 0.95 },
      decimals: 0,
      shares: [
        { option: 'Alder', pct: 47 },
        { option: 'Brook', pct: 41 },
        { option: 'Someone else', pct: 4 },
        { option: 'Don’t know', pct: 8, answer: false },
      ],
    },
    ...more,
  };
}
