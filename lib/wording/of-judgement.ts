import type { ReleaseClaim } from '@/lib/domain/sheet';
import { baseAnswer, readBase, toUnits } from '@/lib/findings/base-figures';
import type { Base, CheckAnswer, Policy } from '@/lib/findings/check-types';
import type {
  GapFinding,
  PrintedBloc,
  ReleaseDocument,
  ReleaseFinding,
  ReleaseJudgement,
  ReleaseTestable,
  SubgroupQuestion,
} from '@/lib/findings/judge-types';
import { resolvePolicy } from '@/lib/findings/policy';
import { groupAndRest } from '@/lib/findings/rest-of-sample';
import type { Beside, BlocTold, DraftInput, Figure, GroupTold } from './draft-input';

export type Judged = Omit<DraftInput, 'claim' | 'finding' | 'answer' | 'policy' | 'beside'> & {
  document: ReleaseDocument;
  judgement: ReleaseJudgement;
  /** Of the finding, as the judgement names it. */
  key: string;
};

/**
 * What lines about one finding of a whole release are drafted from.
 *
 * Use it for what judgeRelease answers; findings of a check document need no such step.
 *
 * @param judged the document with its judgement, the facts of both releases, style and language
 * @returns the input of draftSheet and draftLine
 * @throws RangeError `draftInputOf requires the key of a finding that can be claimed`
 */
export function draftInputOf({ document, judgement, key, ...rest }: Judged): DraftInput {
  const finding = judgement.findings.find(
    (one): one is Extract<ReleaseFinding, ReleaseTestable> => one.key === key && one.kind !== 'share',
  );
  if (!finding) throw new RangeError('draftInputOf requires the key of a finding that can be claimed');
  const policy = resolvePolicy(document.policy);
  const groups = finding.kind === 'gap' ? groupsOf(finding, document, policy) : null;
  return {
    ...rest,
    claim: claimOf(finding),
    finding,
    answer: answerOf(judgement, groups),
    policy,
    beside: {
      blocs: blocsTold(document),
      overlap: judgement.comparison?.overlap ?? null,
      ...(judgement.rebasedN === undefined ? {} : { rebasedN: judgement.rebasedN }),
      groups,
    },
  };
}

function claimOf(finding: ReleaseTestable): ReleaseClaim {
  switch (finding.kind) {
    case 'change':
      return { kind: 'change', option: finding.option };
    case 'threshold':
      return { kind: 'threshold', option: finding.option, pct: finding.thresholdPct };
    case 'gap': {
      const { kind, question, option, groups } = finding;
      return { kind, question, option, groups: [groups[0], groups[1]] };
    }
    default:
      return { kind: finding.kind, pair: [finding.pair[0], finding.pair[1]] };
  }
}

/** The parts of a check answer that words rest on; of a gap the bases are those of its two sides. */
function answerOf({ engine, base, comparison }: ReleaseJudgement, groups: Beside['groups']): CheckAnswer {
  return {
    engine,
    base: groups?.[0].base ?? base,
    previousBase: groups?.[1].base ?? comparison?.base ?? null,
    findings: [],
  };
}

function blocsTold({ blocs = [], release, comparison }: ReleaseDocument): BlocTold[] {
  return blocs.map(({ name, options, printed }) => {
    const earlier = comparison?.blocs?.find((one) => one.name === name);
    return {
      name,
      options,
      source: printed ? 'printed' : 'summed',
      now: blocFigure(release, options, printed),
      then: comparison ? blocFigure(comparison.base, options, earlier) : null,
    };
  });
}

function blocFigure(base: Base, options: readonly string[], printed?: PrintedBloc): Figure | null {
  if (printed) return { units: toUnits(printed.pct, printed.decimals), decimals: printed.decimals };
  const shares = options.map((option) => base.shares.find((share) => share.option === option));
  if (shares.includes(undefined)) return null;
  const units = shares.map((share) => (share?.pct == null ? null : toUnits(share.pct, base.decimals)));
  const sum = units.includes(null) ? null : units.reduce<number>((total, one) => total + (one ?? 0), 0);
  return { units: sum, decimals: base.decimals };
}

function groupsOf(finding: GapFinding, document: ReleaseDocument, policy: Policy): [GroupTold, GroupTold] {
  const { option, groups, presentation } = finding;
  const asked = document.subgroups?.find(({ question }) => question === finding.question);
  if (!asked) throw new RangeError('draftInputOf requires the document of its judgement');
  const isSuppressed = presentation.map((one) => one?.outcome === 'suppress');
  const told = ([first, second]: readonly [string, string]): [GroupTold, GroupTold] => [
    groupTold(asked, first, option, policy),
    second === '' ? restTold(asked, first, option, policy) : groupTold(asked, second, option, policy),
  ];
  const [one, other] = told(groups);
  return [hidden(one, isSuppressed[0] ?? false), hidden(other, isSuppressed[1] ?? false)];
}

function hidden(group: GroupTold, isSuppressed: boolean): GroupTold {
  return isSuppressed ? { ...group, figure: null, isSuppressed } : group;
}

function groupTold(asked: SubgroupQuestion, name: string, option: string, policy: Policy): GroupTold {
  const base = baseNamed(asked, name);
  return {
    name,
    n: base.n,
    figure: blocFigure(base, [option]),
    isSuppressed: false,
    base: baseAnswer(readBase(base, policy), policy),
  };
}

/** Everyone in the sample but the group. */
function restTold(asked: SubgroupQuestion, name: string, option: string, policy: Policy): GroupTold {
  const group = baseNamed(asked, name);
  const gap = asked.gaps.find((one) => one.group === name && typeof one.against !== 'string');
  if (!asked.total || !gap || typeof gap.against === 'string') {
    throw new RangeError('draftInputOf requires the document of its judgement');
  }
  const total = asked.total.base;
  const n = total.n === null || group.n === null ? null : total.n - group.n;
  const read = [total, group].map((base) => readBase(base, policy));
  const { rest } = groupAndRest(read[0]!, read[1]!, option, gap.against.restOfWeightPct, n);
  const units = rest.units.get(option) ?? null;
  return {
    name: '',
    n,
    figure: { units: units === null ? null : Math.round(units), decimals: total.decimals },
    isSuppressed: false,
    base: baseAnswer(rest, policy),
  };
}

function baseNamed({ groups }: SubgroupQuestion, name: string): Base {
  const group = groups.find((one) => one.name === name);
  if (!group) throw new RangeError('draftInputOf requires the document of its judgement');
  return group.base;
}
