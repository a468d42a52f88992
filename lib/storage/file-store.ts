/** A file in the store, as a listing tells it. */
export type StoredFile = { hash: string; changedAt: number };

/** Where files are kept, each under the SHA-256 of its bytes: nothing is ever overwritten by something else. */
export type FileStore = {
  /** On disk, or answered for by the bucket, once it resolves. What is there already counts as changed now. */
  put: (bytes: Uint8Array) => Promise<{ hash: string }>;
  /** The bytes as they lie there, or null. */
  get: (hash: string) => Promise<Buffer | null>;
  has: (hash: string) => Promise<boolean>;
  list: () => AsyncIterable<StoredFile>;
  remove: (hash: string) => Promise<void>;
};

const HASH = /^[0-9a-f]{64}$/;

export const isHash = (text: string) => HASH.test(text);

/** `ab/cd/abcd…`, so that no folder grows too large. @throws RangeError `pathOf requires a SHA-256 in hexadecimal` */
export function pathOf(hash: string): string {
  if (!isHash(hash)) throw new RangeError('pathOf requires a SHA-256 in hexadecimal');
  return `${hash.slice(0, 2)}/${hash.slice(2, 4)}/${hash}`;
}
