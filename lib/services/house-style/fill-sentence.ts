import 'server-only';
import { z } from 'zod';
import { listReleases } from '@/db/queries/release';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import type { Claim } from '@/lib/domain/sheet';
import type { Finding, TestableFinding } from '@/lib/findings/check-types';
import { comparisonNote } from '@/lib/wording/comparison-words';
import type { DraftInput } from '@/lib/wording/draft-input';
import type { HouseStyle } from '@/lib/wording/house-style';
import { authorize, type Ctx, parse } from '../context';
import { computeFindings } from '../release/compute-findings';
import { faultsAsWritten } from './check-sentences';
import { filledSentences } from './draft-sentences';
import { exampleInputs, PLAIN_NAMES } from './example-inputs';
import { bodyOf, EDITORS_ONLY, openStyle } from './open-version';
import { placeOfSentence } from './sentence-rules';

const schema = z.strictObject({
  id: z.string().min(1).max(64),
  path: z.string().min(1).max(200),
  text: z.string().max(6000),
});

export type Filled = { text: string; pollster: string; fieldEndOn: string; isExample: boolean };

const LOOKED_AT = 12;
const SHOWN = 3;

/** A sentence as three releases would print it: the desk's latest ones that it is for, then invented ones. */
export function fillSentence(actor: Actor, input: unknown, ctx: Ctx): Filled[] {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  const { id, path, text } = parse(schema, input);
  const { style } = bodyOf(openStyle(ctx.db, actor, id));
  if (faultsAsWritten(path, text, style).length > 0) return [];
  const language = placeOfSentence(path)!.language as DraftInput['language'];
  const fill = (inputs: readonly DraftInput[]) =>
    filledSentences(
      path,
      text,
      style,
      inputs.map((one) => ({ ...one, language })),
    );
  const own = perRelease(fill(deskInputs(actor, style, language, ctx)), false);
  const rest = own.length < SHOWN ? apart(fill(exampleInputs(PLAIN_NAMES))) : [];
  return [...own, ...rest].slice(0, SHOWN);
}

type FilledInput = ReturnType<typeof filledSentences>[number];

function viewOf({ input, text }: FilledInput, isExample: boolean): Filled {
  const { pollster, fieldEndOn } = input.release;
  return { text, pollster: pollster.name, fieldEndOn, isExample };
}

/** One of each release. */
function perRelease(filled: readonly FilledInput[], isExample: boolean): Filled[] {
  const seen = new Set<string>();
  return filled.flatMap((one) => {
    if (seen.has(one.input.release.releaseId)) return [];
    seen.add(one.input.release.releaseId);
    return [viewOf(one, isExample)];
  });
}

/** Examples that read differently. */
function apart(filled: readonly FilledInput[]): Filled[] {
  return filled
    .filter((one, at) => filled.findIndex(({ text }) => text === one.text) === at)
    .map((one) => viewOf(one, true));
}

function deskInputs(
  actor: Actor,
  houseStyle: HouseStyle,
  language: DraftInput['language'],
  ctx: Ctx,
): DraftInput[] {
  const open = listReleases(ctx.db, actor, ctx.now, LOOKED_AT).filter(
    ({ release }) =>
      release.embargoAt === null || release.embargoLiftedAt !== null || release.embargoAt <= ctx.now,
  );
  return open.flatMap(({ version }) => {
    const { facts, previous, comparison, settings, answer } = computeFindings(ctx.db, version.id, ctx.now);
    const common = {
      answer,
      release: facts,
      previous,
      comparison: { note: comparisonNote({ ...comparison, override: null }, houseStyle, language) },
      houseStyle: { ...houseStyle, comparisonRule: settings.houseStyle.body.comparisonRule },
      policy: settings.policy.body,
      language,
    };
    return answer.findings
      .filter((finding): finding is TestableFinding => finding.kind !== 'share')
      .map((finding): DraftInput => ({ ...common, finding, claim: claimOf(finding) }));
  });
}

function claimOf(finding: Exclude<Finding, { kind: 'share' }>): Claim {
  switch (finding.kind) {
    case 'lead':
    case 'lead-change':
      return { kind: finding.kind, pair: [finding.pair[0], finding.pair[1]] };
    case 'change':
      return { kind: 'change', option: finding.option };
    case 'threshold':
      return { kind: 'threshold', option: finding.option, pct: finding.thresholdPct };
  }
}
