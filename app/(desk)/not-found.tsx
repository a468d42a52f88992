import type { Metadata } from 'next';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { PageTitle } from '@/components/ui/page-title';

export const metadata: Metadata = { title: 'Not found' };

/** Also the answer for what exists but may not be seen yet. */
export default function NotFound() {
  return (
    <>
      <PageTitle title="There is nothing at this address" />
      <EmptyState
        title="Nothing here, or nothing you can see now"
        action={
          <LinkButton href="/" tone="primary">
            To your first page
          </LinkButton>
        }
      >
        <p>
          The address may be mistyped, or what it named may not be open to you. What was filed is never
          deleted.
        </p>
      </EmptyState>
    </>
  );
}
