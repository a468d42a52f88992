// @vitest-environment happy-dom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { SharesTable } from '@/app/(desk)/releases/[id]/_components/shares-table';

import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { check } from '@/lib/findings/check';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import { resolvePolicy } from '@/lib/findings/policy';
import { FACTS } from './example-facts';

afterEach(cleanup);

function show(facts: ReleaseFacts) {
  const document = checkDocumentOf(facts, null, resolvePolicy({}));
  const answer = check(document);
  render(
    <SharesTable view={{ facts, previous: null, document, answer, enteredBy: { Brook: 'Rhea Quill' } }} />,
  );
}

describe('the shares of a release', () => {
  it('stand above their ranges where the sample is random', () => {
    show(FACTS);
    expect(screen.getByText(/Beneath each share: its range, from sampling error alone\.$/)).toBeTruthy();
    expect(screen.getByText('Working of the ranges')).toBeTruthy();
  });

  it('promise no range where the sample is not random', () => {
    show({ ...FACTS, sampleSource: 'opt-in' });
    expect(screen.queryByText(/Beneath each share/)).toBeNull();
    expect(screen.getByText('Typed by Rhea Quill.')).toBeTruthy();
    expect(screen.getByText('Why no share has a range')).toBeTruthy();
  });
});
