import { CheckRefused } from './check-refused';
import type { Pair } from './check-types';
import type { ReleaseDocument } from './judge-types';
import { refuseFaultyPairs, refuseRepeated, UNKNOWN_OPTION } from './refuse-questions';

/**
 * Refuses pairs, net scores, changes and thresholds that name what is not there, ask twice, or hold a bloc against a
 * part of itself.
 *
 * @throws CheckRefused with the path of the entry or of the name in it
 */
export function refuseFaultyAsked(document: ReleaseDocument): void {
  const { release, comparison, blocs = [], pairs = [], netScores = [] } = document;
  const names = new Set([...release.shares.map(({ option }) => option), ...blocs.map(({ name }) => name)]);
  refuseFaultyPairs(pairs, names);
  const partsOf = (name: string) => blocs.find((bloc) => bloc.name === name)?.options ?? [name];
  const refuseParts = ([first, second]: Pair, path: string) => {
    const parts = new Set(partsOf(first));
    if (partsOf(second).some((part) => parts.has(part))) {
      throw new CheckRefused(path, 'These two have an option in common.');
    }
  };
  pairs.forEach((pair, index) => refuseParts(pair, `pairs[${index}]`));
  const asked = new Set(pairs.map((pair) => JSON.stringify([...pair].sort())));
  netScores.forEach(({ approve, disapprove }, index) => {
    const path = `netScores[${index}]`;
    if (!names.has(approve)) throw new CheckRefused(`${path}.approve`, UNKNOWN_OPTION);
    if (!names.has(disapprove)) throw new CheckRefused(`${path}.disapprove`, UNKNOWN_OPTION);
    refuseParts([approve, disapprove], path);
    refuseRepeated(asked, JSON.stringify([approve, disapprove].sort()), path);
  });
  const changes = document.changes ?? [];
  if (changes.length > 0 && !comparison) {
    throw new CheckRefused('changes', 'A change needs the release it is compared with.');
  }
  const changed = new Set<string>();
  changes.forEach((name, index) => {
    if (!names.has(name)) throw new CheckRefused(`changes[${index}]`, UNKNOWN_OPTION);
    refuseRepeated(changed, name, `changes[${index}]`);
  });
  const held = new Set<string>();
  (document.thresholds ?? []).forEach(({ option, pct }, index) => {
    if (!names.has(option)) throw new CheckRefused(`thresholds[${index}].option`, UNKNOWN_OPTION);
    refuseRepeated(held, JSON.stringify([option, pct]), `thresholds[${index}]`);
  });
}
