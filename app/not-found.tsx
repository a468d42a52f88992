import type { Metadata } from 'next';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { PageTitle } from '@/components/ui/page-title';
import DoorLayout from './(door)/layout';

export const metadata: Metadata = { title: 'Not found' };

export default function NotFound() {
  return (
    <DoorLayout>
      <PageTitle title="There is nothing at this address" />
      <EmptyState
        title="No page of Leadline lies here"
        action={
          <LinkButton href="/" tone="primary">
            To the first page
          </LinkButton>
        }
      >
        <p>The address may be mistyped, or come from another version of Leadline.</p>
      </EmptyState>
    </DoorLayout>
  );
}
