import type { Base, Policy } from '../check-types';
import type {
  Bloc,
  ComparisonInput,
  PrintedBloc,
  QuestionBase,
  ReleaseDocument,
  SubgroupQuestion,
} from '../judge-types';
import type { FunctionName } from './functions';
import { inputSections, rName, writeBase, type InputsInR, type Labels } from './inputs';
import { rNumber, rNumbers, rString } from './r-literal';

type Figures = { printed: string[]; made: string[]; output: string[]; needs: FunctionName[] };

/**
 * The release, and the release it is compared with, as a script reads them.
 *
 * @param document a parsed release document
 * @param policy the desk's policy, complete
 * @param labels the names that options and blocs go by
 * @param names options and blocs that the script asks about
 * @param isCompared whether the earlier release is needed
 */
export function releaseInputs(
  document: ReleaseDocument,
  policy: Policy,
  labels: Labels,
  names: ReadonlySet<string>,
  isCompared: boolean,
): InputsInR {
  const blocs = (document.blocs ?? []).filter(({ name }) => names.has(name));
  const comparison = isCompared ? (document.comparison ?? null) : null;
  const later = readInR('release', document.release, blocs, labels, 'base');
  const earlier = comparison
    ? readInR('previous', comparison.base, blocsThen(blocs, comparison), labels, 'comparison.base')
    : null;
  const parts = earlier ? [later, earlier] : [later];
  const overlap = comparison?.overlap ? [writeOverlap(comparison.overlap, labels)] : [];
  return {
    sections: inputSections(
      policy,
      [...parts.flatMap(({ printed }) => printed), ...overlap],
      parts.flatMap(({ made }) => made),
    ),
    needs: ['withDesignEffect', ...parts.flatMap(({ needs }) => needs)],
    output: parts.flatMap(({ output }) => output),
  };
}

/** The figures of the blocs as the earlier release's tables give them; else summed. */
function blocsThen(blocs: readonly Bloc[], { blocs: printed = [] }: ComparisonInput): Bloc[] {
  return blocs.map(({ name, options }) => {
    const then = printed.find((one) => one.name === name);
    return then ? { name, options, printed: then } : { name, options };
  });
}

function readInR(
  variable: string,
  { rebased, ...base }: QuestionBase,
  blocs: readonly Bloc[],
  labels: Labels,
  answerName: string,
): Figures {
  const isSizeOfRest = rebased !== undefined && rebased.n !== null && base.n === null;
  // A stated margin belongs to everyone asked, whose number is not known.
  const asked: Base = isSizeOfRest ? { ...base, n: rebased.n, statedMargin: null } : base;
  const leaves = rebased && !isSizeOfRest;
  const left = `${variable}_people_left`;
  return {
    printed: [
      writeBase(variable, asked, labels),
      ...(leaves ? [`${left} <- ${rebased.n === null ? 'NULL' : rNumber(rebased.n)}`] : []),
    ],
    made: [
      `${variable} <- with_design_effect(${variable}, policy)`,
      ...(leaves ? [`${variable} <- on_people_left(${variable}, ${left})`] : []),
      ...blocs.map((bloc) => `${variable} <- ${blocCall(variable, bloc, labels)}`),
    ],
    output: [`show_base("${answerName}", ${variable})`],
    needs: [
      ...(leaves ? ['peopleLeft' as const] : []),
      ...blocs.map(({ printed }) => (printed ? ('printedBloc' as const) : ('summedBloc' as const))),
    ],
  };
}

function blocCall(variable: string, { name, options, printed }: Bloc, labels: Labels): string {
  if (printed) return `with_printed_bloc(${variable}, ${rName(name, labels)}, ${printedFigure(printed)})`;
  const of = options.map((option) => rName(option, labels)).join(', ');
  return `with_summed_bloc(${variable}, ${rName(name, labels)}, c(${of}))`;
}

function printedFigure({ pct, decimals }: PrintedBloc): string {
  return `pct = ${rNumber(pct)}, decimals = ${rNumber(decimals)}`;
}

function writeOverlap(
  { window, shared, interviews, shares = [] }: NonNullable<ComparisonInput['overlap']>,
  labels: Labels,
): string {
  const names = shares.map(({ option }) => rName(option, labels));
  const pct = shares.map((share) => `    ${rNumbers(share.pct)}`);
  return [
    'overlap <- list(',
    `  window = ${rNumber(window)},`,
    `  shared = ${rNumber(shared)},`,
    `  interviews = ${interviews ? rNumbers(interviews) : 'NULL'},`,
    `  options = c(${names.join(', ')}),`,
    `  pct = list(${pct.length > 0 ? `\n${pct.join(',\n')}` : ''}))`,
  ].join('\n');
}

/** The groups that the gaps of a question are asked of, and the whole sample where the rest of it is. */
export function groupInputs(
  { total, groups, gaps }: SubgroupQuestion,
  policy: Policy,
  labels: Labels,
  output: readonly string[],
): InputsInR {
  const asked = new Set(gaps.flatMap(({ group, against }) => [group, against]));
  const used = groups.flatMap((group, index) =>
    asked.has(group.name) ? [{ ...group, variable: `group_${index + 1}` }] : [],
  );
  const bases = [
    ...(total && gaps.some(({ against }) => typeof against !== 'string')
      ? [{ ...total, variable: 'total' }]
      : []),
    ...used,
  ];
  return {
    sections: inputSections(
      policy,
      bases.map(({ name, base, variable }) => `# ${rString(name)}\n${writeBase(variable, base, labels)}`),
      bases.map(({ variable }) => `${variable} <- with_design_effect(${variable}, policy)`),
    ),
    needs: ['withDesignEffect'],
    output,
  };
}
