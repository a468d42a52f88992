import type { Base, CheckAnswer, CheckDocument, Finding, Policy, ShareFinding } from '../check-types';
import { ENGINE_VERSION } from '../engine-version';
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
import { functionsFor, type FunctionName } from './functions';
import { rName, writeBase, writePolicy, type Labels } from './inputs';
import { labelsOf } from './r-literal';
import { assemble, type Section } from './assemble';

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
  if (finding.kind === 'share') return shareScript(document.release, finding, policy, labels);
  const previous = isChange(finding) ? (document.previous ?? null) : null;
  const family = answer.findings.flatMap((one) => (isOfFamily(one, finding) ? [one] : []));
  return findingScript({
    kind: finding.kind,
    asked: askInR(finding, labels),
    family: family.map((one) => askInR(one, labels)),
    place: family.indexOf(finding),
    isTested: finding.verdict !== 'cannot-be-tested',
    inputs: inputSections(document.release, previous, policy, labels),
    needs: ['withDesignEffect'],
    output: ['show_base("base", release)', ...(previous ? ['show_base("previousBase", previous)'] : [])],
  });
}

function shareScript(release: Base, { option }: ShareFinding, policy: Policy, labels: Labels): string {
  const name = rName(option, labels);
  const needs: FunctionName[] = ['withDesignEffect', 'shareInterval', 'show'];
  return assemble({
    words: `share of ${name}`,
    engine: ENGINE_VERSION,
    functions: functionsFor(needs),
    sections: [
      ...inputSections(release, null, policy, labels),
      {
        title: 'Share and interval, unadjusted',
        code: `p <- proportion(release, ${name})
has_interval <- !is.na(p) && release$basis != "none"
interval <- if (has_interval) share_interval(p, release, policy$level)
method <- if (has_interval) share_method(p, release$n_eff)`,
      },
    ],
    output: `show("kind", "share")
show_base("base", release)
show("estimatePct", 100 * p)
show("intervalPct", if (has_interval) 100 * interval)
show("method", method)`,
  });
}

function inputSections(release: Base, previous: Base | null, policy: Policy, labels: Labels): Section[] {
  return [
    { title: 'Policy of the desk', code: writePolicy(policy) },
    {
      title: 'Printed figures, shares in percent; NULL and NA: not disclosed',
      code: [
        writeBase('release', release, labels),
        ...(previous ? [writeBase('previous', previous, labels)] : []),
      ].join('\n\n'),
    },
    {
      title: 'Design effect, effective size, maximum margin',
      code: [
        'release <- with_design_effect(release, policy)',
        ...(previous ? ['previous <- with_design_effect(previous, policy)'] : []),
      ].join('\n'),
    },
  ];
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
