import { readBase, unitsOf, type BaseFigures } from './base-figures';
import type { CheckAnswer, CheckDocument, Finding, Policy, TestableFinding } from './check-types';
import { measureChange, type SampledBase } from './measure-change';
import { measureLead } from './measure-lead';
import { measureLeadChange } from './measure-lead-change';
import { measureThreshold } from './measure-threshold';
import type { Measured } from './measured';
import { resolvePolicy } from './policy';
import { baseSteps } from './working-base';
import { breakingSteps, littleSteps } from './working-beside';
import {
  writeChange,
  writeLead,
  writeLeadChange,
  writeThreshold,
  type EstimateWriting,
} from './working-error';
import { shareSteps } from './working-share';
import type { WorkingStep } from './working-step';
import { testSteps } from './working-test';
import { untestedSteps } from './working-untested';
import { verdictSteps } from './working-verdict';

export type { WorkingStep } from './working-step';

/**
 * The worked calculation behind one finding: inputs, formulas with the numbers in them, results, and the verdict
 * rule by rule. Numbers are the unrounded ones, written with at most six significant digits.
 *
 * @param document the document as parsed
 * @param answer check(document)
 * @param findingIndex which finding of the answer, from 0
 * @throws RangeError `working requires the index of a finding of the answer`
 */
export function working(document: CheckDocument, answer: CheckAnswer, findingIndex: number): WorkingStep[] {
  const finding = answer.findings[findingIndex];
  if (!finding) throw new RangeError('working requires the index of a finding of the answer');
  const policy = resolvePolicy(document.policy);
  const release = readBase(document.release, policy);
  const previous = document.previous ? readBase(document.previous, policy) : null;
  const bases = basesOf(document, answer, policy, finding);
  if (finding.kind === 'share') {
    const base = { n: document.release.n, df: release.sampled?.deff.df ?? null };
    return [...bases, ...shareSteps(finding, base, answer.base, policy)];
  }
  if (finding.verdict === 'cannot-be-tested') {
    const concerned =
      isChange(finding) && answer.previousBase ? [answer.base, answer.previousBase] : [answer.base];
    return [...bases, ...untestedSteps(finding, concerned, policy)];
  }
  const { measured, writing } = retrace(finding, release, previous, policy);
  return [
    ...bases,
    ...testSteps(measured, finding, writing, policy),
    ...verdictSteps(measured, finding, writing, policy),
    ...breakingSteps(finding, measured),
    ...(finding.kind === 'change' && previous
      ? littleSteps(finding, measured, unitsOf(previous, finding.option) / 10 ** previous.decimals, policy)
      : []),
  ];
}

function isChange(finding: Finding): boolean {
  return finding.kind === 'change' || finding.kind === 'lead-change';
}

function basesOf(
  document: CheckDocument,
  answer: CheckAnswer,
  policy: Policy,
  finding: Finding,
): WorkingStep[] {
  if (!isChange(finding) || !document.previous || !answer.previousBase) {
    return baseSteps(document.release, answer.base, policy, 'only');
  }
  return [
    ...baseSteps(document.release, answer.base, policy, 'this'),
    ...baseSteps(document.previous, answer.previousBase, policy, 'earlier'),
  ];
}

/** Measures the finding once more, as check did. */
function retrace(
  finding: TestableFinding,
  release: BaseFigures,
  previous: BaseFigures | null,
  policy: Policy,
): { measured: Measured; writing: EstimateWriting } {
  const later = sampledOf(release);
  switch (finding.kind) {
    case 'lead':
      return {
        measured: measureLead(release, later.sampled, finding.pair),
        writing: writeLead(finding, later),
      };
    case 'threshold': {
      const threshold = { option: finding.option, pct: finding.thresholdPct };
      return {
        measured: measureThreshold(release, later.sampled, threshold, policy.level),
        writing: writeThreshold(finding, later),
      };
    }
    case 'change': {
      const earlier = sampledOf(previous);
      return {
        measured: measureChange(earlier, later, finding.option),
        writing: writeChange(finding, later, earlier),
      };
    }
    case 'lead-change': {
      const earlier = sampledOf(previous);
      return {
        measured: measureLeadChange(earlier, later, finding.pair),
        writing: writeLeadChange(finding, later, earlier),
      };
    }
  }
}

function sampledOf(base: BaseFigures | null): SampledBase {
  if (!base?.sampled) throw new TypeError('working requires the document that the answer answers');
  return { base, sampled: base.sampled };
}
