import 'server-only';
import type { Conn } from '@/db/client';
import { findWholeVersion, type StandIn } from '@/db/queries/release';
import type { DisclosureStatus } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { AppError } from '@/lib/errors';
import { check } from '@/lib/findings/check';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import type { CheckAnswer, CheckDocument } from '@/lib/findings/check-types';
import { type DisclosureItem, missingDisclosure, type MissingDisclosure } from '@/lib/findings/disclosure';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { withNamesOf } from '@/lib/findings/same-names';
import { type DeskSettings, readDeskSettings } from '../setup/desk-settings';
import { type Comparison, comparisonOf } from './comparison';
import { factsOf } from './facts';

export type Computed = {
  facts: ReleaseFacts;
  previous: ReleaseFacts | null;
  comparison: Comparison;
  settings: DeskSettings;
  document: CheckDocument;
  answer: CheckAnswer;
  missing: MissingDisclosure[];
};

/** Everything that a stored version supports now: under the policy in force, beside what is out of embargo. */
export function computeFindings(
  conn: Conn,
  versionId: number,
  now: number,
  standIn: StandIn | null = null,
): Computed {
  const whole = findWholeVersion(conn, versionId);
  if (!whole) throw new AppError('not-found', 'There is no such release.');
  const facts = factsOf(conn, versionId);
  const comparison = comparisonOf(conn, whole, now, standIn);
  const previous =
    comparison.versionId === null ? null : withNamesOf(factsOf(conn, comparison.versionId), facts);
  const settings = readDeskSettings(conn, sourcesOf(facts, previous));
  const document = parseCheckDocument(checkDocumentOf(facts, previous, settings.policy.body));
  const missing = missingDisclosure(disclosureOf(facts));
  return { facts, previous, comparison, settings, document, answer: check(document), missing };
}

function sourcesOf(...releases: readonly (ReleaseFacts | null)[]) {
  return releases.flatMap((release) => (release ? [release.sampleSource] : []));
}

/** How each item of the disclosure list stands in a release. */
export function disclosureOf(facts: ReleaseFacts): Record<DisclosureItem, DisclosureStatus> {
  const isRandom = facts.sampleSource === 'probability';
  const hasInterval = facts.modelledInterval !== null || facts.statedMargin.status === 'given';
  return {
    pollster: 'given',
    sponsor: facts.sponsor.status,
    population: facts.population.status,
    'sample-source': facts.sampleSource === 'unknown' ? 'not-disclosed' : 'given',
    mode: facts.mode.status,
    'field-dates': 'given',
    'sample-size': facts.n.status,
    'question-wording': facts.questionWording.status,
    shares: facts.shares.some((share) => share.units === null) ? 'not-disclosed' : 'given',
    margin: hasInterval ? 'given' : isRandom ? facts.statedMargin.status : 'not-applicable',
    weighting: facts.design === 'unknown' ? 'not-disclosed' : 'given',
    'source-link': facts.sourceUrl.status,
  };
}
