import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { PageTitle } from '@/components/ui/page-title';

/** What somebody reads whose roles do not open a page. */
export function NoPermission({ roles, home }: { roles: string; home: string }) {
  return (
    <>
      <PageTitle title="This page is not open to you" />
      <EmptyState
        title={`You are signed in as: ${roles}`}
        action={
          <LinkButton href={home} tone="primary">
            To your first page
          </LinkButton>
        }
      >
        <p>
          What it shows belongs to other roles, or is still under embargo. An administrator gives out roles;
          an editor opens one embargoed release to named people.
        </p>
      </EmptyState>
    </>
  );
}
