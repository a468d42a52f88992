import 'server-only';
import canonicalize from 'canonicalize';
import { sha256 } from './ids';

/** RFC 8785 text of a value: the same value gives the same bytes. Throws TypeError where JSON cannot hold it. */
export function canonicalJson(value: unknown): string {
  const text = canonicalize(value);
  if (text === undefined) throw new TypeError('canonicalJson requires a value that JSON can hold');
  return text;
}

/** SHA-256 of the canonical text of a value. */
export function hashOf(value: unknown): string {
  return sha256(canonicalJson(value));
}
