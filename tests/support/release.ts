import type { Db } from '@/db/client';
import type { ReleaseFormValues } from '@/lib/domain/release-input';
import type { Actor } from '@/lib/domain/roles';
import { newId } from '@/lib/security/ids';
import { createRelease } from '@/lib/services/release/create-release';
import { NOW } from './database';

export const typed = (value: string) => ({ notDisclosed: false, value });
export const withheld = { notDisclosed: true, value: '' };

export const GOVERNOR: ReleaseFormValues['race'] = {
  kind: 'new',
  race: {
    name: 'Averil Coast governor',
    kind: 'candidate',
    options: ['Alder', 'Brook', 'Someone else'],
    thresholds: [],
  },
};

type Shares = [option: string, printed: string, isAnswer?: false][];

export function sharesOf(shares: Shares): ReleaseFormValues['shares'] {
  return shares.map(([option, printed, isAnswer = true]) => ({
    option,
    printed,
    notDisclosed: false,
    isAnswer,
  }));
}

/** A release as the form would send it: invented, and complete unless a test takes something away. */
export function releaseForm(change: Partial<ReleaseFormValues> = {}): ReleaseFormValues {
  return {
    race: GOVERNOR,
    pollster: 'Kelmouth Research',
    sponsor: typed('The Averil Courier'),
    population: typed('likely-voters'),
    sampleSource: 'probability',
    mode: typed('live-telephone'),
    design: 'weighted',
    fieldStartOn: '2026-09-10',
    fieldEndOn: '2026-09-13',
    publishedOn: '2026-09-16',
    embargo: null,
    n: typed('1,012'),
    deff: { source: '', value: '', df: '' },
    statedMargin: { notDisclosed: false, pp: '3.7', unit: '0.1', level: '95' },
    modelledInterval: { pp: '', unit: '0.1', level: '95' },
    wording: typed('If the election for governor were held today, whom would you vote for?'),
    sameQuestion: false,
    shares: sharesOf([
      ['Alder', '47'],
      ['Brook', '41'],
      ['Someone else', '4'],
      ['Don’t know', '8', false],
    ]),
    sourceUrl: typed('https://polls.example/kelmouth'),
    methodNote: '',
    ...change,
  };
}

/** Logs a release through the service, `later` milliseconds after NOW. */
export function logRelease(db: Db, actor: Actor, change: Partial<ReleaseFormValues> = {}, later = 0): string {
  const input = { submissionKey: newId(), release: releaseForm(change) };
  return createRelease(actor, input, { db, now: NOW + later }).id;
}
