import 'server-only';
import * as z from 'zod';
import type { Db } from '@/db/client';
import { findBan } from '@/db/queries/bans';
import { countEmbeds, type EmbedsOf, listEmbedAddresses } from '@/db/queries/job-subjects';
import type { JobPayload } from '@/lib/domain/jobs';
import { ELECTION_KINDS } from '@/lib/domain/vocabulary';
import { readEnv } from '@/lib/env';
import { embedAddresses } from '../../embed/embed-addresses';
import { FINISHED, type Handler } from '../handler';

const EMBEDS_A_POST = 20;
const PATIENCE_MS = 10_000;
const cursorSchema = z.strictObject({ after: z.number().int() }).nullable();

/**
 * Has a cache forget embeds. What was sent is sent again after a crash, under the same key, so that the receiver can
 * tell it from a new request; the addresses are those of now, since newer versions have jobs of their own.
 */
export const purgeEmbeds: Handler<'purge-embeds'> = async (job, ctx) => {
  const which = whichOf(ctx.db, job.payload);
  if (!which) return () => FINISHED;
  const after = cursorSchema.parse(job.cursor)?.after ?? 0;
  const embeds = listEmbedAddresses(ctx.db, which, after, EMBEDS_A_POST);
  const { LEADLINE_ORIGIN } = readEnv();
  const urls = embeds.flatMap(({ publicId, versions }) =>
    embedAddresses(LEADLINE_ORIGIN, publicId, versions),
  );
  if (urls.length > 0) await post(`${job.id}:${after}`, urls);
  const done = job.done + embeds.length;
  const last = embeds.at(-1);
  return (tx) => ({
    cursor: last === undefined || embeds.length < EMBEDS_A_POST ? null : { after: last.id },
    progress: { done, total: Math.max(done, countEmbeds(tx, which)), note: null },
  });
};

function whichOf(db: Db, payload: JobPayload<'purge-embeds'>): EmbedsOf | null {
  if (payload.of !== 'ban') return { of: payload.of, publicId: payload.id };
  const ban = findBan(db, payload.id);
  return ban && { of: 'races', raceId: ban.raceId, kinds: ELECTION_KINDS };
}

async function post(key: string, urls: string[]): Promise<void> {
  const { LEADLINE_PURGE_URL: url, LEADLINE_PURGE_TOKEN: token } = readEnv();
  if (url === undefined) throw new Error('LEADLINE_PURGE_URL is not set any more');
  const response = await fetch(url, {
    method: 'POST',
    redirect: 'error',
    signal: AbortSignal.timeout(PATIENCE_MS),
    headers: {
      'Content-Type': 'application/json',
      'Idempotency-Key': key,
      ...(token === undefined ? {} : { Authorization: `Bearer ${token}` }),
    },
    body: JSON.stringify({ urls }),
  }).catch((cause: unknown) => {
    throw new Error(`the cache did not answer: ${reasonOf(cause)}`, { cause });
  });
  await response.body?.cancel();
  if (!response.ok) throw new Error(`the cache answered ${response.status}`);
}

function reasonOf(cause: unknown): string {
  if (!(cause instanceof Error)) return String(cause);
  if (cause.name === 'TimeoutError') return `nothing came within ${PATIENCE_MS / 1000} seconds`;
  return cause.cause instanceof Error ? cause.cause.message : cause.message;
}
