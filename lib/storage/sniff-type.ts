export const FILE_TYPES = [
  'application/pdf',
  'image/png',
  'image/jpeg',
  'image/webp',
  'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
  'text/plain',
] as const;
export type FileType = (typeof FILE_TYPES)[number];

const startsWith = (bytes: Buffer, text: string, at = 0) =>
  bytes.subarray(at, at + text.length).toString('latin1') === text;

/** What a file is by its own bytes, never by its name; null for what the desk does not keep. */
export function sniffType(given: Uint8Array): FileType | null {
  const bytes = Buffer.from(given.buffer, given.byteOffset, given.byteLength);
  if (startsWith(bytes, '%PDF-')) return 'application/pdf';
  if (startsWith(bytes, '\x89PNG\r\n\x1a\n')) return 'image/png';
  if (startsWith(bytes, '\xff\xd8\xff')) return 'image/jpeg';
  if (startsWith(bytes, 'RIFF') && startsWith(bytes, 'WEBP', 8)) return 'image/webp';
  if (startsWith(bytes, 'PK\x03\x04') && bytes.includes('xl/workbook.xml'))
    return 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';
  return isText(bytes) ? 'text/plain' : null;
}

function isText(bytes: Buffer): boolean {
  if (bytes.length === 0) return false;
  try {
    const text = new TextDecoder('utf-8', { fatal: true }).decode(bytes);
    // Tables and notes, not markup that a browser might run.
    return !/[\0-\x08\x0e-\x1f]/.test(text) && !/^\s*<(?:[!?a-z])/i.test(text);
  } catch {
    return false;
  }
}
