import { beforeFigure } from '@/lib/domain/reading-order';
import type { CheckDocument, Finding } from './check-types';
import { decimalPlaces } from './decimal';
import type { ReleaseShare, ReleaseTestable } from './judge-types';

const NO_FIGURE = 'no figure';

/**
 * The neutral heading of a finding: a quantity, never a claim that could be printed.
 *
 * @param finding any finding of an answer or of a judgement
 * @param document the document it answers, for the decimals that its bases print
 * @param between the two releases of a change, such as "August to September"
 * @returns with U+2212 for a minus and a plus before what is above 0
 * @example
 * headingOf(
 *   { kind: 'lead', pair: ['Alder', 'Brook'], estimatePp: 8 },
 *   { release: { decimals: 0 } },
 * ); // => 'Alder minus Brook: +8'
 * headingOf(
 *   { kind: 'threshold', option: 'Brook', thresholdPct: 50, estimatePp: -9 },
 *   { release: { decimals: 1 } },
 * ); // => 'Brook against 50%: −9.0'
 */
export function headingOf(finding: Titled, document: Decimals, between = 'earlier to this'): string {
  if (finding.kind === 'share') {
    const { estimatePct } = finding;
    const shown = estimatePct === null ? NO_FIGURE : `${estimatePct.toFixed(document.release.decimals)}%`;
    return `${subjectOf(finding)}: ${shown}`;
  }
  const { estimatePp } = finding;
  const shown = estimatePp === null ? NO_FIGURE : signed(estimatePp, printedDecimals(finding, document));
  return `${subjectOf(finding, between)}: ${shown}`;
}

/** Findings of a check document and of the judgement of a whole release. */
type Titled = Finding | ReleaseShare | ReleaseTestable;

type Decimals = {
  release: Pick<CheckDocument['release'], 'decimals'>;
  previous?: Pick<CheckDocument['release'], 'decimals'> | null;
};

/** The decimals that an estimate is printed with: those of the finest figure in it. */
export function printedDecimals(finding: Titled, { release, previous }: Decimals): number {
  const ofThreshold = finding.kind === 'threshold' ? decimalPlaces(finding.thresholdPct) : 0;
  const isChange = ['change', 'lead-change', 'net-score-change'].includes(finding.kind);
  return Math.max(release.decimals, ofThreshold, isChange ? (previous?.decimals ?? 0) : 0);
}

/**
 * What a finding is about, without its figure.
 *
 * @param finding any finding of an answer or of a judgement
 * @param between the two releases of a change, such as "August to September"
 * @returns names as the release prints them
 * @example
 * subjectOf({ kind: 'lead', pair: ['Alder', 'Brook'] }); // => 'Alder minus Brook'
 */
export function subjectOf(finding: Titled, between = 'earlier to this'): string {
  switch (finding.kind) {
    case 'share':
      return beforeFigure(finding.option);
    case 'lead':
      return pairOf(finding.pair);
    case 'net-score':
      return `Net score, ${pairOf(finding.pair)}`;
    case 'net-score-change':
      return `Net score, ${pairOf(finding.pair)}, ${between}`;
    case 'gap': {
      const [first, second] = finding.groups.map((name) =>
        name === '' ? 'everyone else' : beforeFigure(name),
      );
      return `${beforeFigure(finding.option)}, ${first} minus ${second}`;
    }
    case 'change':
      return `${beforeFigure(finding.option)}, ${between}`;
    case 'lead-change':
      return `${pairOf(finding.pair)}, ${between}`;
    case 'threshold':
      return `${beforeFigure(finding.option)} against ${finding.thresholdPct}%`;
  }
}

function pairOf([first, second]: readonly [string, string]): string {
  return `${beforeFigure(first)} minus ${beforeFigure(second)}`;
}

function signed(value: number, decimals: number): string {
  const digits = Math.abs(value).toFixed(decimals);
  if (Number(digits) === 0) return digits;
  return value > 0 ? `+${digits}` : `−${digits}`;
}
