import 'server-only';
import type { Tx } from '@/db/client';
import { findNamed, insertNamed } from '@/db/queries/race';
import { insertReleaseVersion, type ReleaseVersionRow, type VersionRows } from '@/db/queries/release';
import { type Disclosed, valueOf } from '@/lib/domain/disclosed';
import { unitsAt } from '@/lib/domain/printed-number';
import type { StatedMargin } from '@/lib/domain/release-facts';
import type { ReleaseInput } from '@/lib/domain/release-input';
import { newId } from '@/lib/security/ids';

type Who = {
  releaseId: number;
  number: number;
  personId: number;
  now: number;
  /** False for a version that waits for its correction to be applied. */
  isCurrent?: boolean;
};

/** Writes one version of a release with its base, question and shares. */
export function storeVersion(tx: Tx, input: ReleaseInput, who: Who): ReleaseVersionRow {
  const decimals = Math.max(0, ...input.shares.map((share) => share.printed?.decimals ?? 0));
  const sponsor = valueOf(input.sponsor);
  const rows: VersionRows = {
    version: {
      publicId: newId(),
      releaseId: who.releaseId,
      number: who.number,
      sponsorStatus: input.sponsor.status,
      sponsorId: sponsor === null ? null : namedId(tx, 'sponsors', sponsor, who.now),
      modeStatus: input.mode.status,
      mode: valueOf(input.mode),
      sampleSource: input.sampleSource,
      fieldStartOn: input.fieldStartOn,
      fieldEndOn: input.fieldEndOn,
      publishedOn: input.publishedOn,
      sourceUrlStatus: input.sourceUrl.status,
      sourceUrl: valueOf(input.sourceUrl),
      methodNote: input.methodNote.trim() === '' ? null : input.methodNote,
      createdBy: who.personId,
      createdAt: who.now,
    },
    base: {
      populationStatus: input.population.status,
      population: valueOf(input.population),
      nStatus: input.n.status,
      n: valueOf(input.n),
      design: input.design,
      deffSource: input.deff?.source ?? null,
      deff: input.deff?.value ?? null,
      deffDf: input.deff?.df ?? null,
      statedMarginStatus: input.statedMargin.status,
      ...marginColumns(input.statedMargin),
      modelledPp: text(input.modelledInterval?.pp),
      modelledUnit: text(input.modelledInterval?.unit),
      modelledLevel: text(input.modelledInterval?.level),
    },
    question: {
      wordingStatus: input.wording.status,
      wording: valueOf(input.wording),
      sameQuestion: input.sameQuestion,
      decimals,
    },
    shares: input.shares.map((share) => ({
      option: share.option,
      status: share.printed ? ('given' as const) : ('not-disclosed' as const),
      units: share.printed && unitsAt(share.printed, decimals),
      isAnswer: share.isAnswer,
      enteredBy: who.personId,
    })),
  };
  return insertReleaseVersion(tx, rows, { isCurrent: who.isCurrent });
}

function marginColumns(margin: Disclosed<StatedMargin>) {
  const value = valueOf(margin);
  return {
    statedMarginPp: text(value?.pp),
    statedMarginUnit: text(value?.unit),
    statedMarginLevel: text(value?.level),
  };
}

const text = (value: number | undefined) => (value === undefined ? null : String(value));

/** The pollster or sponsor of this name, made where it is new. */
export function namedId(tx: Tx, table: 'pollsters' | 'sponsors', name: string, now: number): number {
  const found = findNamed(tx, table, name);
  return (found ?? insertNamed(tx, table, { publicId: newId(), name, createdAt: now })).id;
}
