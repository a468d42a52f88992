import { CRITICAL_VALUE, DESIGN_EFFECT, IS_BELOW, SHARES, SHOW, WITH_DESIGN_EFFECT } from './base-functions';
import {
  CHANGE,
  LEAD,
  LEAD_CHANGE,
  LEAD_ERROR,
  QUESTION,
  REASONS_UNTESTED,
  ROUNDING_UNITS,
  SHARE_ERROR,
  THRESHOLD,
} from './question-functions';
import {
  GAP,
  PEOPLE_LEFT,
  PRESENTATION,
  PRINTED_BLOC,
  RELEASE_REASONS,
  REST,
  SHOW_PRESENTATION,
  STATED_REASONS,
  SUMMED_BLOC,
  TRACKING,
  WITH_SHARE,
} from './release-functions';
import {
  BINOMIAL_TEST,
  FISHER,
  HOLM,
  NEWCOMBE,
  ROUNDING,
  SHARE_INTERVAL,
  SIGN_TEST,
  TWO_SIDED_P,
  WILSON,
} from './test-functions';

/** Every R function a script can need, those that others build on first. */
const FUNCTIONS = {
  isBelow: { code: IS_BELOW, needs: [] },
  criticalValue: { code: CRITICAL_VALUE, needs: [] },
  shares: { code: SHARES, needs: [] },
  designEffect: { code: DESIGN_EFFECT, needs: ['isBelow'] },
  withDesignEffect: { code: WITH_DESIGN_EFFECT, needs: ['designEffect', 'criticalValue', 'shares'] },
  wilson: { code: WILSON, needs: [] },
  shareInterval: { code: SHARE_INTERVAL, needs: ['wilson', 'isBelow', 'criticalValue'] },
  roundingUnits: { code: ROUNDING_UNITS, needs: [] },
  question: { code: QUESTION, needs: ['shares', 'roundingUnits'] },
  shareError: { code: SHARE_ERROR, needs: ['question'] },
  leadError: { code: LEAD_ERROR, needs: ['question'] },
  lead: { code: LEAD, needs: ['leadError'] },
  change: { code: CHANGE, needs: ['shareError'] },
  leadChange: { code: LEAD_CHANGE, needs: ['leadError'] },
  threshold: { code: THRESHOLD, needs: ['shareError'] },
  peopleLeft: { code: PEOPLE_LEFT, needs: [] },
  withShare: { code: WITH_SHARE, needs: [] },
  summedBloc: { code: SUMMED_BLOC, needs: ['withShare', 'roundingUnits'] },
  printedBloc: { code: PRINTED_BLOC, needs: ['withShare'] },
  rest: { code: REST, needs: ['peopleLeft', 'question', 'isBelow'] },
  tracking: { code: TRACKING, needs: ['question'] },
  presentation: { code: PRESENTATION, needs: ['criticalValue', 'isBelow'] },
  gap: { code: GAP, needs: ['change', 'presentation', 'showPresentation'] },
  reasonsUntested: { code: REASONS_UNTESTED, needs: ['isBelow'] },
  statedReasons: { code: STATED_REASONS, needs: [] },
  releaseReasons: { code: RELEASE_REASONS, needs: ['reasonsUntested'] },
  twoSidedP: { code: TWO_SIDED_P, needs: [] },
  holm: { code: HOLM, needs: ['isBelow'] },
  rounding: { code: ROUNDING, needs: [] },
  exactSign: { code: SIGN_TEST, needs: [] },
  newcombe: { code: NEWCOMBE, needs: ['wilson'] },
  fisher: { code: FISHER, needs: ['isBelow'] },
  exactBinomial: { code: BINOMIAL_TEST, needs: [] },
  show: { code: SHOW, needs: [] },
  showPresentation: { code: SHOW_PRESENTATION, needs: ['show'] },
} as const satisfies Record<string, { code: string; needs: readonly string[] }>;

export type FunctionName = keyof typeof FUNCTIONS;

const ORDER = Object.keys(FUNCTIONS) as FunctionName[];

/** The R code of the named functions and of all that they build on. */
export function functionsFor(names: readonly FunctionName[]): string {
  const wanted = new Set<FunctionName>();
  const want = (name: FunctionName): void => {
    if (wanted.has(name)) return;
    wanted.add(name);
    FUNCTIONS[name].needs.forEach(want);
  };
  names.forEach(want);
  return ORDER.filter((name) => wanted.has(name))
    .map((name) => FUNCTIONS[name].code.trim())
    .join('\n\n');
}
