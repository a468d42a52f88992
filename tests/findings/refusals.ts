import { expect, test } from 'vitest';
import { parseReleaseDocument } from '@/lib/findings/parse-release';
import { sample } from './release-documents';

export const release = sample(1000, { A: 31, B: 27, C: 14, D: 9 });

export type Refusal = [title: string, document: object, path: string, message: string];
export type Acceptance = [title: string, document: object];

/** Each document is refused at its path, in these words; each of the others is no fault. */
export function testRefusals(refused: readonly Refusal[], accepted: readonly Acceptance[]): void {
  test.each(refused)('%s', (_title, document, path, message) => {
    expect(() => parseReleaseDocument(document)).toThrow(
      expect.objectContaining({ name: 'CheckRefused', path, message: expect.stringContaining(message) }),
    );
  });

  test.each(accepted)('%s is no fault', (_title, document) => {
    expect(parseReleaseDocument(document)).toMatchObject({ release: expect.anything() });
  });
}
