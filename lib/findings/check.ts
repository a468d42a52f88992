import { askChange, askLead, askLeadChange, askThreshold } from './ask';
import { askedChanges, askedLeadChanges, askedPairs } from './asked';
import { baseAnswer, readBase, unitsOf, type BaseFigures } from './base-figures';
import type { CheckAnswer, CheckDocument, Finding, Pair, Policy, Threshold } from './check-types';
import { ENGINE_VERSION } from './engine-version';
import type { Judged } from './judge-family';
import { littleChanged } from './little-changed';
import { resolvePolicy } from './policy';
import { settle, type Settled } from './settle';
import { findShare } from './share-interval';

/**
 * What the numbers of a release support: every share with its interval, every lead, change and threshold asked
 * about with its test and verdict.
 *
 * @param document a check document that parseCheckDocument has accepted
 * @returns shares in the order given, then leads, changes, lead changes and thresholds
 * @example
 * check({
 *   release: {
 *     sampleSource: 'probability', n: 1012, design: 'weighted', decimals: 0,
 *     statedMargin: { pp: 3.7, unit: 0.1, level: 0.95 },
 *     shares: [{ option: 'Alder', pct: 47 }, { option: 'Brook', pct: 41 }],
 *   },
 * }).findings[2].verdict; // => 'does-not-hold'
 */
export function check(document: CheckDocument): CheckAnswer {
  const policy = resolvePolicy(document.policy);
  const release = readBase(document.release, policy);
  const previous = document.previous ? readBase(document.previous, policy) : null;
  const pairs = askedPairs(document, release);
  return {
    engine: ENGINE_VERSION,
    base: baseAnswer(release, policy),
    previousBase: previous && baseAnswer(previous, policy),
    findings: [
      ...document.release.shares.map(({ option }) => findShare(release, option, policy.level)),
      ...findLeads(release, pairs, policy),
      ...(previous ? findChanges(document, { release, previous, pairs }, policy) : []),
      ...findThresholds(release, document.thresholds ?? [], policy),
    ],
  };
}

function findLeads(release: BaseFigures, pairs: readonly Pair[], policy: Policy): Finding[] {
  const questions = pairs.map((pair) => askLead(release, pair, policy));
  return zip(pairs, settle(questions, policy)).map(([pair, outcome]) => ({
    kind: 'lead',
    pair,
    ...onOneBase(outcome),
  }));
}

type TwoBases = { release: BaseFigures; previous: BaseFigures; pairs: readonly Pair[] };

/** Changes and lead changes: one family. */
function findChanges(
  document: CheckDocument,
  { release, previous, pairs }: TwoBases,
  policy: Policy,
): Finding[] {
  const options = askedChanges(document, pairs, release, previous);
  const leads = askedLeadChanges(pairs, previous);
  const outcomes = settle(
    [
      ...options.map((option) => askChange(previous, release, option, policy)),
      ...leads.map((pair) => askLeadChange(previous, release, pair, policy)),
    ],
    policy,
  );
  const changes = zip(options, outcomes).map(([option, outcome]): Finding => {
    if ('untested' in outcome) return { kind: 'change', option, ...outcome.untested };
    const earlierPct = unitsOf(previous, option) / 10 ** previous.decimals;
    const isSmall = littleChanged(outcome.measured, outcome.tested.fields, earlierPct, policy);
    return { kind: 'change', option, ...onTwoBases(outcome.tested), littleChanged: isSmall };
  });
  const leadChanges = zip(leads, outcomes.slice(options.length)).map(([pair, outcome]): Finding => {
    if ('untested' in outcome) return { kind: 'lead-change', pair, ...outcome.untested };
    return { kind: 'lead-change', pair, ...onTwoBases(outcome.tested) };
  });
  return [...changes, ...leadChanges];
}

function findThresholds(release: BaseFigures, thresholds: readonly Threshold[], policy: Policy): Finding[] {
  const questions = thresholds.map((threshold) => askThreshold(release, threshold, policy));
  return zip(thresholds, settle(questions, policy)).map(([{ option, pct }, outcome]) => ({
    kind: 'threshold',
    option,
    thresholdPct: pct,
    ...onOneBase(outcome),
  }));
}

function onOneBase(outcome: Settled) {
  if ('untested' in outcome) return outcome.untested;
  const { tested, measured } = outcome;
  const deff = measured.bases[0]?.deff.value ?? 1;
  return { ...tested.fields, breakingDeff: tested.breaking === null ? null : deff * tested.breaking };
}

function onTwoBases({ fields, breaking }: Judged) {
  return { ...fields, breakingFactor: breaking };
}

function zip<A, B>(first: readonly A[], second: readonly B[]): [A, B][] {
  const both: [A, B][] = [];
  first.forEach((one, index) => {
    const other = second[index];
    if (other !== undefined) both.push([one, other]);
  });
  return both;
}
