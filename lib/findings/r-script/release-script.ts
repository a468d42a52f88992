import { resolvePolicy } from '../policy';
import type { ReleaseDocument, ReleaseFinding, ReleaseJudgement, ReleaseTestable } from '../judge-types';
import { findingScript } from './finding-script';
import type { InputsInR, Labels } from './inputs';
import { labelsOf } from './r-literal';
import { groupInputs, releaseInputs } from './release-inputs';
import { askReleaseInR, subgroupsOf } from './release-questions';
import { shareScript } from './share-script';

type Testable = Extract<ReleaseFinding, ReleaseTestable>;

/**
 * A script in R that computes one finding of a whole release again from the printed figures alone, as rScript does
 * for a check: blocs, net scores, re-based shares, tracking averages with waves in common and gaps between
 * subgroups too.
 *
 * Differences between releases, people asked twice and what a rule counts are no figures: the script states them
 * as reasons.
 *
 * @param document the document as parsed
 * @param judgement judgeRelease(document)
 * @param findingIndex which finding of the judgement, from 0
 * @returns the text of the script; the same for the same document
 * @throws RangeError `releaseScript requires the index of a finding of the judgement`
 */
export function releaseScript(
  document: ReleaseDocument,
  judgement: ReleaseJudgement,
  findingIndex: number,
): string {
  const finding = judgement.findings[findingIndex];
  if (!finding) throw new RangeError('releaseScript requires the index of a finding of the judgement');
  const labels = labelsOf(namesOf(document));
  if (finding.kind === 'share') {
    const inputs = releaseInputs(
      document,
      resolvePolicy(document.policy),
      labels,
      new Set([finding.option]),
      false,
    );
    return shareScript(finding.option, inputs, labels);
  }
  const family = judgement.findings.flatMap((one) => (isOfFamily(one, finding) ? [one] : []));
  const asking = { document, labels };
  return findingScript({
    kind: finding.kind,
    asked: askReleaseInR(finding, asking),
    family: family.map((one) => askReleaseInR(one, asking)),
    place: family.indexOf(finding),
    isTested: finding.verdict !== 'cannot-be-tested',
    inputs: inputsOf(document, finding, family, labels),
  });
}

function inputsOf(
  document: ReleaseDocument,
  finding: Testable,
  family: readonly Testable[],
  labels: Labels,
): InputsInR {
  const policy = resolvePolicy(document.policy);
  if (finding.kind === 'gap') {
    return groupInputs(subgroupsOf(document, finding.question), policy, labels, [
      'show_base("group", finding$bases[[1]])',
      ...(finding.groups[1] === '' ? [] : ['show_base("against", finding$bases[[2]])']),
    ]);
  }
  const asked = finding.verdict === 'cannot-be-tested' ? [finding] : family;
  const names = new Set(asked.flatMap((one) => ('pair' in one ? one.pair : [one.option])));
  return releaseInputs(document, policy, labels, names, familyOf(finding) === 'changes');
}

/** Leads with net scores, all changes, thresholds, and the gaps of one question are each a family. */
function familyOf(finding: Testable): string {
  switch (finding.kind) {
    case 'lead':
    case 'net-score':
      return 'leads';
    case 'change':
    case 'lead-change':
    case 'net-score-change':
      return 'changes';
    case 'threshold':
      return 'thresholds';
    case 'gap':
      return `gaps of ${finding.question}`;
  }
}

function isOfFamily(one: ReleaseFinding, finding: Testable): one is Testable {
  return one.kind !== 'share' && familyOf(one) === familyOf(finding);
}

function namesOf({ release, comparison, blocs = [], subgroups = [] }: ReleaseDocument): string[] {
  const bases = [
    release,
    ...(comparison ? [comparison.base] : []),
    ...subgroups.flatMap(({ total, groups }) => [
      ...(total ? [total.base] : []),
      ...groups.map(({ base }) => base),
    ]),
  ];
  return [
    ...bases.flatMap(({ shares }) => shares.map(({ option }) => option)),
    ...blocs.map(({ name }) => name),
    ...subgroups.flatMap(({ groups }) => groups.map(({ name }) => name)),
  ];
}
