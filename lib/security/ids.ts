import 'server-only';
import { createHash, randomBytes } from 'node:crypto';

/** A public id: 16 random bytes, base64url. Counts nothing and cannot be guessed. */
export function newId(): string {
  return randomBytes(16).toString('base64url');
}

/** A secret that is shown once and kept only as its hash: 32 random bytes, base64url. */
export function newSecret(): string {
  return randomBytes(32).toString('base64url');
}

const CODE_LETTERS = 'ABCDEFGHJKMNPQRSTVWXYZ23456789';

/** A one-time code that can be read out: 20 letters in groups of five, about 98 bits. */
export function newCode(): string {
  let code = '';
  while (code.length < 20) {
    const byte = randomBytes(1)[0]!;
    if (byte < 240) code += CODE_LETTERS[byte % CODE_LETTERS.length];
  }
  return code.match(/.{5}/g)!.join('-');
}

/** Codes are compared without case, spaces or dashes. */
export function normalizeCode(code: string): string {
  return code.toUpperCase().replace(/[^A-Z0-9]/g, '');
}

export function sha256(data: string | Buffer): string {
  return createHash('sha256').update(data).digest('hex');
}
