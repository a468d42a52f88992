import { CheckRefused } from './check-refused';
import type { Base, Policy } from './check-types';
import type { AskedGap, SubgroupQuestion } from './judge-types';
import { refuseFaultyBase } from './refuse-base';
import { refuseRepeated } from './refuse-questions';
import { restShare } from './rest-of-sample';

/**
 * Refuses subgroups that do not fit their sample, and gaps between people who are partly the same: a subgroup against
 * the total that it is part of, or groups of two characteristics.
 *
 * @throws CheckRefused with the path of the field
 */
export function refuseFaultySubgroups(questions: readonly SubgroupQuestion[], policy: Policy): void {
  const asked = new Set<string>();
  questions.forEach((one, index) => {
    const path = `subgroups[${index}]`;
    refuseRepeated(asked, one.question, `${path}.question`);
    refuseFaultyGroups(one, path, policy);
    const gaps = new Set<string>();
    one.gaps.forEach((gap, place) => refuseFaultyGap(one, gap, `${path}.gaps[${place}]`, gaps));
  });
}

function refuseFaultyGroups({ total, groups }: SubgroupQuestion, path: string, policy: Policy): void {
  if (total) refuseFaultyBase(total.base, `${path}.total.base`, policy);
  const names = new Set<string>(total ? [total.name] : []);
  const people = new Map<string, number>();
  groups.forEach(({ name, by, base }, index) => {
    const at = `${path}.groups[${index}]`;
    if (names.has(name)) throw new CheckRefused(`${at}.name`, 'This name is in the list already.');
    names.add(name);
    refuseFaultyBase(base, `${at}.base`, policy);
    people.set(by, (people.get(by) ?? 0) + (base.n ?? 0));
    if (total && total.base.n !== null && (people.get(by) ?? 0) > total.base.n) {
      throw new CheckRefused(`${at}.base.n`, 'The groups have more people than the whole sample.');
    }
  });
}

function refuseFaultyGap(one: SubgroupQuestion, gap: AskedGap, path: string, asked: Set<string>): void {
  const group = groupNamed(one, gap.group, `${path}.group`);
  refuseUnknown(group.base, gap.option, path);
  if (typeof gap.against === 'string') {
    const against = groupNamed(one, gap.against, `${path}.against`);
    if (against === group) throw new CheckRefused(path, 'A gap is between two different groups.');
    if (against.by !== group.by) {
      throw new CheckRefused(path, 'Groups of two characteristics have people in common.');
    }
    refuseUnknown(against.base, gap.option, path);
    refuseRepeated(asked, JSON.stringify([gap.option, ...[gap.group, gap.against].sort()]), path);
    return;
  }
  refuseFaultyRest(one, gap, gap.against.restOfWeightPct, path);
  refuseRepeated(asked, JSON.stringify([gap.option, gap.group]), path);
}

function groupNamed({ total, groups }: SubgroupQuestion, name: string, path: string) {
  if (name === total?.name) {
    throw new CheckRefused(
      path,
      'A subgroup is part of the whole sample: compare it with the rest, given as a group or by restOfWeightPct.',
    );
  }
  const group = groups.find((one) => one.name === name);
  if (!group) throw new CheckRefused(path, 'This group is not in the list.');
  return group;
}

function refuseUnknown(base: Base, option: string, path: string): void {
  if (!base.shares.some((share) => share.option === option)) {
    throw new CheckRefused(`${path}.option`, 'A group of this gap does not have the option.');
  }
}

function refuseFaultyRest(one: SubgroupQuestion, gap: AskedGap, weightPct: number, path: string): void {
  const { total } = one;
  if (!total) throw new CheckRefused(`${path}.against`, 'The rest of a sample needs the whole sample.');
  refuseUnknown(total.base, gap.option, path);
  const group = groupNamed(one, gap.group, `${path}.group`);
  if (total.base.n !== null && group.base.n !== null && group.base.n >= total.base.n) {
    throw new CheckRefused(`${path}.against`, 'Nobody is left in the rest of the sample.');
  }
  const [whole, part] = [total.base, group.base].map(
    ({ shares }) => shares.find(({ option }) => option === gap.option)?.pct ?? null,
  );
  if (typeof whole !== 'number' || typeof part !== 'number') return;
  const rest = restShare(whole / 100, part / 100, weightPct / 100);
  if (rest < 0 || rest > 1) {
    throw new CheckRefused(
      `${path}.against.restOfWeightPct`,
      'Group, whole and weight do not fit: the rest would lie outside 0 to 100 percent.',
    );
  }
}
