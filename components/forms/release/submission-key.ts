/** A key made once per form, so that the same form sent twice makes one release. */
export function newSubmissionKey(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(24));
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
}
