import { CRITICAL_VALUE, DESIGN_EFFECT, IS_BELOW, SHARES, SHOW, WITH_DESIGN_EFFECT } from './base-functions';
import {
  CHANGE,
  LEAD,
  LEAD_CHANGE,
  LEAD_ERROR,
  QUESTION,
  REASONS_UNTESTED,
  SHARE_ERROR,
  THRESHOLD,
} from './question-functions';
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
  question: { code: QUESTION, needs: ['shares'] },
  shareError: { code: SHARE_ERROR, needs: ['question'] },
  leadError: { code: LEAD_ERROR, needs: ['question'] },
  lead: { code: LEAD, needs: ['leadError'] },
  change: { code: CHANGE, needs: ['shareError'] },
  leadChange: { code: LEAD_CHANGE, needs: ['leadError'] },
  threshold: { code: THRESHOLD, needs: ['shareError'] },
  reasonsUntested: { code: REASONS_UNTESTED, needs: ['isBelow'] },
  twoSidedP: { code: TWO_SIDED_P, needs: [] },
  holm: { code: HOLM, needs: ['isBelow'] },
  rounding: { code: ROUNDING, needs: [] },
  exactSign: { code: SIGN_TEST, needs: [] },
  newcombe: { code: NEWCOMBE, needs: ['wilson'] },
  fisher: { code: FISHER, needs: ['isBelow'] },
  exactBinomial: { code: BINOMIAL_TEST, needs: [] },
  show: { code: SHOW, needs: [] },
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
