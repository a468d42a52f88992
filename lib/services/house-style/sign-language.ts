import 'server-only';
import { z } from 'zod';
import type { Conn } from '@/db/client';
import { findLatestHouseStyle } from '@/db/queries/desk';
import { findSignature, insertSignature } from '@/db/queries/house-style';
import { type Actor, canActAsEditor, canReadCopyDesk } from '@/lib/domain/roles';
import { type Language, LANGUAGES } from '@/lib/domain/vocabulary';
import { AppError } from '@/lib/errors';
import { hashOf } from '@/lib/security/canonical';
import { PACK_STATUS } from '@/lib/wording/pack-status';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { EDITORS_ONLY, refuseUnless } from './open-version';
import { readStyle } from './style-body';

export const DECLARATION = 'I read this language as a native and have read its sentences in this version.';

export type LanguageState = {
  language: Language;
  /** Of its sentences as they are in force. */
  packHash: string;
  isReviewed: boolean;
  signature: { by: string; at: number } | null;
  isClearable: boolean;
};

export function listLanguages(actor: Actor, ctx: Pick<Ctx, 'db'>): LanguageState[] {
  authorize(canReadCopyDesk(actor), 'House style is read by the staff of this desk.');
  return LANGUAGES.map((language) => stateOf(ctx.db, language));
}

function stateOf(conn: Conn, language: Language): LanguageState {
  const packHash = packHashOf(conn, language);
  const found = findSignature(conn, language, packHash);
  const signature = found?.signature.act === 'signed' ? { by: found.person, at: found.signature.at } : null;
  const isReviewed = PACK_STATUS[language].status === 'reviewed-here';
  return { language, packHash, isReviewed, signature, isClearable: isReviewed || signature !== null };
}

function packHashOf(conn: Conn, language: Language): string {
  const stored = findLatestHouseStyle(conn);
  if (!stored) throw new Error('the desk has no settings: ensureDeskSettings was not run');
  return hashOf(readStyle(stored.body).messages[language]);
}

/** @throws AppError `conflict` where no native editor has signed the language's sentences as they are in force */
export function refuseUnsigned(conn: Conn, language: string): void {
  const known = LANGUAGES.find((one) => one === language);
  refuseUnless(
    known !== undefined && stateOf(conn, known).isClearable,
    `No native editor of this desk has signed the sentences of this language (${language}) as they are in force. It can be drafted and filed; it is cleared once House style shows a signature.`,
  );
}

const schema = z.strictObject({
  language: z.enum(LANGUAGES),
  /** Of the sentences that were on the screen. */
  packHash: z.string().regex(/^[0-9a-f]{64}$/, 'Reload the page and look again.'),
  isNative: z.literal(true, 'Declare that you read this language as a native.'),
});

/** A named editor vouches for a language's sentences. A changed sentence needs a new signature. */
export function signLanguage(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  const { language, packHash } = parse(schema, input);
  actOnLanguage(actor, { language, packHash, act: 'signed' }, ctx);
}

/** Takes a signature back: the language is drafted, and not cleared, from now on. */
export function withdrawSignature(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  const { language, packHash } = parse(schema.omit({ isNative: true }), input);
  actOnLanguage(actor, { language, packHash, act: 'withdrawn' }, ctx);
}

type Act = { language: Language; packHash: string; act: 'signed' | 'withdrawn' };

function actOnLanguage(actor: Actor, { language, packHash, act }: Act, ctx: Ctx): void {
  transact(ctx, (tx) => {
    const acting = actingNow(tx, actor);
    authorize(canActAsEditor(acting), EDITORS_ONLY);
    const state = stateOf(tx, language);
    if (state.isReviewed) throw new AppError('conflict', 'This language needs no signature.');
    refuseUnless(
      state.packHash === packHash,
      'The sentences of this language changed meanwhile. Reload the page and read them again.',
    );
    const isSigned = state.signature !== null;
    refuseUnless(
      isSigned === (act === 'withdrawn'),
      isSigned ? 'It is signed already.' : 'It is not signed.',
    );
    insertSignature(tx, {
      language,
      packHash,
      houseStyleId: findLatestHouseStyle(tx)!.id,
      act,
      personId: acting.personId,
      roles: JSON.stringify(acting.roles),
      declaration: act === 'signed' ? DECLARATION : '',
      at: ctx.now,
    });
    const action = act === 'signed' ? 'signed language' : 'withdrew signature of language';
    const entry = { personId: acting.personId, action, entity: 'language', entityId: language };
    appendRecord(tx, { ...entry, after: { packHash, act } }, ctx.now);
  });
}
