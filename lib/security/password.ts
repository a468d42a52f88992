import 'server-only';
import { hash, verify } from '@node-rs/argon2';

/** OWASP's first choice for Argon2id (Password Storage Cheat Sheet): 19 MiB, two passes, one lane. */
const OPTIONS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export function hashPassword(password: string): Promise<string> {
  return hash(password.normalize('NFC'), OPTIONS);
}

let decoy: Promise<string> | null = null;

/** Checks a password; where there is no account the same work is done, so that time tells nothing. */
export async function passwordMatches(stored: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword('no account has this one');
  const matches = await verify(stored ?? (await decoy), password.normalize('NFC'));
  return stored !== null && matches;
}
