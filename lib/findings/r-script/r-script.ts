import type { Base, CheckAnswer, CheckDocument, Finding, Policy, ShareFinding } from '../check-types';
import { resolvePolicy } from '../policy';
import {
  changeInR,
  leadChangeInR,
  leadInR,
  littleChangedInR,
  thresholdInR,
  type AskedInR,
} from './asked-in-r';
import { findingScript } from './finding-script';
import { inputSections, writeBase, type InputsInR, type Labels } from './inputs';
import { labelsOf } from './r-literal';
import { shareScript } from './share-script';

type Testable = Exclude<Finding, ShareFinding>;

/**
 * A script in R that computes one finding again from the printed figures alone: its bases, estimate, test, family,
 * second tests and verdict. Base R suffices, no package is needed.
 *
 * The script shares no code and no result with the engine: it starts from sizes, shares and design facts as
 * printed, and takes its quantiles and tails from R. It prints one line for each figure, `name = value`, under
 * the names of the check answer, an interval as `.low` and `.high`. It is plain ASCII; names are written so that
 * none can end a string or a comment.
 *
 * @param document the document as parsed
 * @param answer check(document)
 * @param findingIndex which finding of the answer, from 0
 * @returns the text of the script; the same for the same document
 * @throws RangeError `rScript requires the index of a finding of the answer`
 */
export function rScript(document: CheckDocument, answer: CheckAnswer, findingIndex: number): string {
  const finding = answer.findings[findingIndex];
  if (!finding) throw new RangeError('rScript requires the index of a finding of the answer');
  const labels = labelsOf(optionsOf(document));
  const policy = resolvePolicy(document.policy);
  if (finding.kind === 'share') {
    return shareScript(finding.option, inputsOf(document.release, null, policy, labels), labels);
  }
  const previous = isChange(finding) ? (document.previous ?? null) : null;
  const family = answer.findings.flatMap((one) => (isOfFamily(one, finding) ? [one] : []));
  return findingScript({
    kind: finding.kind,
    asked: askInR(finding, labels),
    family: family.map((one) => askInR(one, labels)),
    place: family.indexOf(finding),
    isTested: finding.verdict !== 'cannot-be-tested',
    inputs: inputsOf(document.release, previous, policy, labels),
  });
}

function inputsOf(release: Base, previous: Base | null, policy: Policy, labels: Labels): InputsInR {
  const bases = [
    { variable: 'release', base: release, answerName: 'base' },
    ...(previous ? [{ variable: 'previous', base: previous, answerName: 'previousBase' }] : []),
  ];
  return {
    sections: inputSections(
      policy,
      bases.map(({ variable, base }) => writeBase(variable, base, labels)),
      bases.map(({ variable }) => `${variable} <- with_design_effect(${variable}, policy)`),
    ),
    needs: ['withDesignEffect'],
    output: bases.map(({ variable, answerName }) => `show_base("${answerName}", ${variable})`),
  };
}

/** The question behind a finding, in R. */
function askInR(finding: Testable, labels: Labels): AskedInR {
  switch (finding.kind) {
    case 'lead':
      return leadInR(finding.pair, labels);
    case 'change':
      return {
        ...changeInR(finding.option, { later: 'release', earlier: 'previous' }, labels),
        littleChanged: littleChangedInR(finding.option, labels),
      };
    case 'lead-change':
      return leadChangeInR(finding.pair, labels);
    case 'threshold':
      return thresholdInR(finding.option, finding.thresholdPct, labels);
  }
}

function isChange({ kind }: Finding): boolean {
  return kind === 'change' || kind === 'lead-change';
}

/** Changes and lead changes are one family; any other kind is its own. */
function isOfFamily(one: Finding, finding: Testable): one is Testable {
  if (one.kind === 'share') return false;
  return isChange(finding) ? isChange(one) : one.kind === finding.kind;
}

function optionsOf({ release, previous }: CheckDocument): string[] {
  return [...release.shares, ...(previous?.shares ?? [])].map(({ option }) => option);
}
