import { ENGLISH_CHART_WORDS, type ChartWords } from './chart-words';

/** The words around a public chart in one language. */
export type EmbedWords = ChartWords & {
  tableCaption: (level: string | null) => string;
  answer: string;
  share: string;
  rangeHead: (level: string) => string;
  rangeCell: (low: string, high: string) => string;
  notDisclosed: string;
  version: (number: string) => string;
  source: string;
  withdrawnTitle: string;
  withdrawnOn: string;
  withdrawnAdvice: string;
};

export const ENGLISH_EMBED_WORDS: EmbedWords = {
  ...ENGLISH_CHART_WORDS,
  tableCaption: (level) =>
    level ? `All answers, in percent, with their ${level} range` : 'All answers, in percent',
  answer: 'Answer',
  share: 'Share',
  rangeHead: (level) => `${level} range`,
  rangeCell: (low, high) => `${low} to ${high}`,
  notDisclosed: 'not disclosed',
  version: (number) => `Version ${number}`,
  source: 'Source:',
  withdrawnTitle: 'This chart has been withdrawn',
  withdrawnOn: 'Withdrawn',
  withdrawnAdvice: 'The figures it showed should no longer be quoted.',
};
