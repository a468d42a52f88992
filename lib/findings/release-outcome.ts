import type { TestFields } from './check-types';
import { keyOf } from './claim-key';
import type { FindingTrace, ReleaseUntestedFields } from './judge-types';
import type { TestedEntry, UntestedEntry } from './release-entry';
import { testedWorking, untestedWorking } from './release-working';
import type { Policy } from './check-types';
import type { WorkingStep } from './working-step';

type Tested = TestFields & { trace: FindingTrace };

/** The fields of a finding on one base. */
export function onOneBase(
  outcome: TestedEntry | UntestedEntry,
): (Tested & { breakingDeff: number | null }) | ReleaseUntestedFields {
  if ('untested' in outcome) return outcome.untested;
  const { fields, breaking, measured, trace } = outcome;
  const deff = measured.bases[0]?.deff.value ?? 1;
  return { ...fields, breakingDeff: breaking === null ? null : deff * breaking, trace };
}

/** The fields of a finding on two bases. */
export function onTwoBases(
  outcome: TestedEntry | UntestedEntry,
): (Tested & { breakingFactor: number | null }) | ReleaseUntestedFields {
  if ('untested' in outcome) return outcome.untested;
  return { ...outcome.fields, breakingFactor: outcome.breaking, trace: outcome.trace };
}

/** A finding with its key, and its working made when it is first read. */
export function carry<Finding extends { kind: string }>(
  finding: Finding,
  names: readonly string[],
  make: () => WorkingStep[],
): Finding & { key: string; working: WorkingStep[] } {
  let steps: WorkingStep[] | null = null;
  return {
    ...finding,
    key: keyOf(finding.kind, names),
    get working() {
      steps ??= make();
      return steps;
    },
  };
}

/** The working of an outcome, whichever it is. */
export function workingOf(outcome: TestedEntry | UntestedEntry, policy: Policy): WorkingStep[] {
  return 'untested' in outcome ? untestedWorking(outcome, policy) : testedWorking(outcome, policy);
}
