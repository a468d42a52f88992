import 'server-only';
import { LRUCache } from 'lru-cache';
import { getDb } from '@/db/client';
import { findEvidence } from '@/db/queries/clearing';
import { findPublicEmbed } from '@/db/queries/embed';
import { notFoundDocument } from '@/lib/charts/withdrawal-document';
import type { ThemeChoice } from '@/lib/charts/tokens';
import { THEME_CHOICES } from '@/lib/charts/tokens';
import { sha256 } from '@/lib/security/ids';
import { barOn } from '../bans/hold';
import type { Ctx } from '../context';
import type { EvidenceBody } from '../sheet/evidence-body';
import { versionBefore } from './embed-hold';
import { encodeBody, type Encoding, encodingFor } from './encode-body';
import { heldOf } from './held-embed';
import { correctionNote } from './correction-note';
import { dataOf, pageOf, pictureOf, withdrawalOf } from './render-embed';

export type EmbedRequest = {
  path: string;
  query: URLSearchParams;
  headers: Record<string, string | undefined>;
};
export type EmbedAnswer = {
  status: number;
  headers: Record<string, string>;
  body: string | Uint8Array | null;
};

type Found = NonNullable<ReturnType<typeof findPublicEmbed>>;
type Part = 'page' | 'chart.svg' | 'data.json';
type Rendered = { body: Uint8Array; etag: string };

const PATH = /^\/embed\/([A-Za-z0-9_-]{22})(?:@([1-9]\d{0,5}))?(?:\/(chart\.svg|data\.json))?$/;
const TYPES: Record<Part, string> = {
  page: 'text/html; charset=utf-8',
  'chart.svg': 'image/svg+xml; charset=utf-8',
  'data.json': 'application/json; charset=utf-8',
};
const FRESH_SECONDS = 30;
const STALE_SECONDS = 30;
const STALE_IF_ERROR_SECONDS = 300;

const SAFE = {
  'X-Content-Type-Options': 'nosniff',
  'Referrer-Policy': 'no-referrer',
  'Permissions-Policy': 'camera=(), geolocation=(), microphone=()',
  'Cross-Origin-Resource-Policy': 'cross-origin',
  'Access-Control-Allow-Origin': '*',
  'Content-Security-Policy':
    "default-src 'none'; style-src 'unsafe-inline'; img-src data:; base-uri 'none'; form-action 'none'; frame-ancestors *",
};

const bodies = new LRUCache<string, Rendered>({
  maxSize: 64 * 1024 * 1024,
  sizeCalculation: (rendered) => rendered.body.byteLength + 200,
});

/** Answers a public address; each encoding of a body is made once and has its own ETag. Reads the state at every request; no cookie is ever looked at. */
export function answerEmbed(request: EmbedRequest, ctx: Ctx = { db: getDb(), now: Date.now() }): EmbedAnswer {
  const match = PATH.exec(request.path);
  if (!match) return notFound();
  const [, id, number, part = 'page'] = match as unknown as [string, string, string?, Part?];
  const found = findPublicEmbed(ctx.db, id, number ? Number(number) : null, ctx.now);
  if (!found?.isPublic || found.version.pulledUnseen) return notFound();
  const theme = THEME_CHOICES.find((choice) => choice === request.query.get('theme')) ?? 'auto';
  if (found.version.state === 'pulled') return withdrawn(found, part, theme, ctx);
  const bar = barOn(ctx.db, found.raceId, ctx.now);
  const shown =
    bar.sinceAt === null
      ? found
      : versionBefore(ctx.db, found, number ? Number(number) : null, bar.sinceAt, ctx.now);
  if (!shown) return notFound();
  if (bar.figures === 'all-figures') return held(bar.untilAt ?? 0, part, theme);
  return served(shown, part, theme, request, ctx, secondsLeft(bar.nextAt, ctx.now));
}

function served(
  found: Found,
  part: Part,
  theme: ThemeChoice,
  request: EmbedRequest,
  ctx: Ctx,
  secondsLeft: number,
): EmbedAnswer {
  const encoding = encodingFor(request.headers['accept-encoding']);
  const rendered = render(found, part, theme, encoding, ctx);
  const headers = {
    ...SAFE,
    'Content-Type': TYPES[part],
    'Cache-Control': lifetime(secondsLeft),
    ETag: rendered.etag,
    Vary: 'Accept-Encoding',
    ...(encoding === 'identity' ? {} : { 'Content-Encoding': encoding }),
    ...(found.version.state === 'superseded'
      ? { Link: `</embed/${found.embedId}>; rel="latest-version"` }
      : {}),
  };
  if (matches(request.headers['if-none-match'], rendered.etag)) return { status: 304, headers, body: null };
  return { status: 200, headers, body: rendered.body };
}

function render(found: Found, part: Part, theme: ThemeChoice, encoding: Encoding, ctx: Ctx): Rendered {
  const key = `${found.hash} ${found.embedId} ${found.version.number} ${part} ${theme} ${encoding}`;
  const kept = bodies.get(key);
  if (kept) return kept;
  const evidence = JSON.parse(findEvidence(ctx.db, found.evidenceId)!.bytes.toString('utf8')) as EvidenceBody;
  const subject = { evidence, id: found.embedId, version: found.version.number, at: found.version.createdAt };
  const text = { page: pageOf, 'chart.svg': pictureOf, 'data.json': dataOf }[part](subject, theme);
  const body = encodeBody(Buffer.from(text, 'utf8'), encoding);
  const rendered = { body, etag: `"${sha256(body).slice(0, 32)}"` };
  bodies.set(key, rendered);
  return rendered;
}

/** No cache keeps an answer, stale ones included, past the moment at which a ban begins. */
function lifetime(secondsLeft: number): string {
  const fresh = Math.min(FRESH_SECONDS, secondsLeft);
  const stale = Math.min(STALE_SECONDS, secondsLeft - fresh);
  const ifError = Math.min(STALE_IF_ERROR_SECONDS, secondsLeft - fresh);
  return `public, max-age=${fresh}, stale-while-revalidate=${stale}, stale-if-error=${ifError}`;
}

function secondsLeft(until: number | null, now: number): number {
  return until === null ? Number.POSITIVE_INFINITY : Math.max(0, Math.floor((until - now) / 1000));
}

/** 410 while a ban bars what was public too; what was not public before it is as unknown as ever. */
function held(untilAt: number, part: Part, theme: ThemeChoice): EmbedAnswer {
  return {
    status: 410,
    headers: { ...SAFE, 'Content-Type': TYPES[part], 'Cache-Control': 'no-store' },
    body: heldOf(part, untilAt, theme),
  };
}

/** 410: on purpose, with a dated note, and no figure but those of a cleared correction notice. */
function withdrawn(found: Found, part: Part, theme: ThemeChoice, ctx: Ctx): EmbedAnswer {
  return {
    status: 410,
    headers: { ...SAFE, 'Content-Type': TYPES[part], 'Cache-Control': 'no-store' },
    body: withdrawalOf(part, found.version.pulledAt ?? 0, theme, correctionNote(ctx.db, found.evidenceId)),
  };
}

/** One constant answer for everything that is not public: what never was, and what is not yet. */
function notFound(): EmbedAnswer {
  const headers = { ...SAFE, 'Content-Type': TYPES.page, 'Cache-Control': 'no-store' };
  return { status: 404, headers, body: notFoundDocument() };
}

function matches(header: string | undefined, etag: string): boolean {
  if (header === undefined) return false;
  return header.split(',').some((one) => one.trim() === '*' || one.trim().replace(/^W\//, '') === etag);
}
