import { comparisonCourse } from '../comparison-status';
import type { AskedGap, ReleaseDocument, ReleaseTestable, SubgroupQuestion } from '../judge-types';
import {
  changeInR,
  leadChangeInR,
  leadInR,
  littleChangedInR,
  SYMMETRIC,
  thresholdInR,
  type AskedInR,
  type TwoVariables,
} from './asked-in-r';
import { rName, type Labels } from './inputs';
import { rNumber, rStrings } from './r-literal';

/** What a question of a release is asked with. */
export type Asking = { document: ReleaseDocument; labels: Labels };

/** The question behind a finding of a release, in R. */
export function askReleaseInR(finding: ReleaseTestable, asking: Asking): AskedInR {
  const { document, labels } = asking;
  switch (finding.kind) {
    case 'lead':
      return onRelease(leadInR(finding.pair, labels));
    case 'net-score':
      return onRelease(leadInR(finding.pair, labels, 'net score'));
    case 'threshold': {
      const isOther = finding.verdict === 'cannot-be-tested' && finding.reasons.includes('other-base');
      return stated(
        onRelease(thresholdInR(finding.option, finding.thresholdPct, labels)),
        isOther ? ['other-base'] : [],
      );
    }
    case 'change':
      return comparedInR([finding.option], finding, asking);
    case 'lead-change':
    case 'net-score-change':
      return comparedInR(finding.pair, finding, asking);
    case 'gap':
      return gapInR(finding, subgroupsOf(document, finding.question), labels);
  }
}

/** The subgroups that a gap is asked of. */
export function subgroupsOf(document: ReleaseDocument, question: string): SubgroupQuestion {
  const found = document.subgroups?.find((one) => one.question === question);
  if (!found) throw new TypeError('subgroupsOf requires a question of the document');
  return found;
}

/** The variable that a group's figures stand in. */
function groupVariable({ groups }: SubgroupQuestion, name: string): string {
  return `group_${groups.findIndex((group) => group.name === name) + 1}`;
}

/** Only questions of a release have reasons beyond their figures. */
function onRelease(asked: AskedInR): AskedInR {
  return { ...asked, needs: [...asked.needs, 'releaseReasons'] };
}

function stated(asked: AskedInR, reasons: readonly string[]): AskedInR {
  if (reasons.length === 0) return asked;
  return {
    ...asked,
    call: `with_stated(${asked.call}, ${rStrings(reasons)})`,
    needs: [...asked.needs, 'statedReasons'],
  };
}

type Compared = Extract<ReleaseTestable, { kind: 'change' | 'lead-change' | 'net-score-change' }>;

function comparedInR(names: readonly string[], finding: Compared, { document, labels }: Asking): AskedInR {
  const course = comparisonCourse(document.comparison ?? {});
  const plain = plainInR(finding, labels);
  const overlap = document.comparison?.overlap;
  const overlaps = overlap !== undefined && overlap.shared > 0 && overlap.shared < overlap.window;
  const options = names.map((name) => rName(name, labels)).join(', ');
  const asked: AskedInR = overlaps
    ? {
        ...plain,
        words: `${plain.words} with waves in common`,
        call: `tracking_change(previous, release, c(${options}), overlap)`,
        secondTests: '',
        needs: ['tracking'],
        secondNeeds: [],
      }
    : plain;
  const isSamePeople = course.reasons.includes('same-people');
  return stated(
    {
      ...onRelease(asked),
      ...(isSamePeople ? { further: independentMargin(plain) } : {}),
      needs: [...asked.needs, 'releaseReasons', ...(isSamePeople ? plain.needs : [])],
    },
    course.reasons,
  );
}

function plainInR(finding: Compared, labels: Labels): AskedInR {
  if (finding.kind === 'change') {
    return {
      ...changeInR(finding.option, { later: 'release', earlier: 'previous' }, labels),
      littleChanged: littleChangedInR(finding.option, labels),
    };
  }
  return leadChangeInR(finding.pair, labels, finding.kind === 'lead-change' ? 'lead' : 'net score');
}

function independentMargin({ call }: AskedInR): NonNullable<AskedInR['further']> {
  return {
    untested: `# The margin that two independent samples of these sizes would have; it is not that of this change.
independent <- ${call}
has_margin <- release$basis != "none" && previous$basis != "none" && !is.na(independent$estimate_pp)
independent_margin_pp <- if (has_margin) {
  100 * critical_value(1 - policy$level, independent$df) * independent$se("chosen")
}`,
    untestedOutput: 'show("independentMarginPp", independent_margin_pp)',
  };
}

type Gap = Extract<ReleaseTestable, { kind: 'gap' }>;

function gapInR({ option, groups }: Gap, one: SubgroupQuestion, labels: Labels): AskedInR {
  const asked = one.gaps.find(
    (gap) =>
      gap.option === option &&
      gap.group === groups[0] &&
      (typeof gap.against === 'string' ? gap.against : '') === groups[1],
  );
  if (!asked) throw new TypeError('gapInR requires a gap of the document');
  const name = rName(option, labels);
  const bases: TwoVariables = { later: 'finding$bases[[1]]', earlier: 'finding$bases[[2]]' };
  return {
    ...changeInR(option, bases, labels),
    words: `gap of ${name} between ${rName(groups[0], labels)} and ${
      groups[1] === '' ? 'the rest of the sample' : rName(groups[1], labels)
    }`,
    call: gapCall(asked, one, name),
    interval: SYMMETRIC,
    needs: ['gap', 'releaseReasons', ...(typeof asked.against === 'string' ? [] : ['rest' as const])],
    further: {
      output: `show_presentation("presentation.group", finding$presentations[[1]])
show_presentation("presentation.against", finding$presentations[[2]])`,
    },
  };
}

function gapCall({ group, against }: AskedGap, one: SubgroupQuestion, name: string): string {
  const own = groupVariable(one, group);
  if (typeof against === 'string') return `gap(${own}, ${groupVariable(one, against)}, ${name})`;
  const weight = rNumber(against.restOfWeightPct);
  return `gap(with_stretched_rounding(${own}, ${name}, ${weight}),
      rest_of_sample(total, ${own}, ${name}, ${weight}), ${name})`;
}
