import type { Metadata } from 'next';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { PageTitle } from '@/components/ui/page-title';
import { SectionHeading } from '@/components/ui/section-heading';
import { deskPage } from '@/lib/auth/desk-page';
import { compareStyles } from '@/lib/services/house-style/get-style';
import { listStyles } from '@/lib/services/house-style/list-styles';
import { ChangeList } from '../_components/change-list';
import { ChooseVersions } from '../_components/choose-versions';

export const metadata: Metadata = { title: 'Two versions of house style' };

type Search = Partial<Record<'from' | 'to', string | string[]>>;

/** What two chosen versions decide differently. */
export default async function CompareStylesPage({ searchParams }: { searchParams: Promise<Search> }) {
  const { from: askedFrom, to: askedTo } = await searchParams;
  const { versions, from, to, compared } = await deskPage((actor, ctx) => {
    const list = listStyles(actor, ctx).versions.map(({ id, number }) => ({ id, number }));
    const known = (asked: unknown, otherwise: string | undefined) =>
      list.some(({ id }) => id === asked) ? String(asked as string) : otherwise;
    const [newer, older] = [known(askedTo, list[0]?.id), known(askedFrom, list[1]?.id)];
    return {
      versions: list,
      from: older,
      to: newer,
      compared: older && newer ? compareStyles(actor, { from: older, to: newer }, ctx) : null,
    };
  });
  return (
    <>
      <PageTitle crumbs={[{ label: 'House style', href: '/house-style' }]} title="Compare two versions" />
      {compared && from && to ? (
        <>
          <ChooseVersions versions={versions} from={from} to={to} />
          <SectionHeading>
            {`Version ${compared.from} against version ${compared.to}: ${countOf(compared.changes.length)}`}
          </SectionHeading>
          <ChangeList changes={compared.changes} />
        </>
      ) : (
        <EmptyState
          title="There is one version so far"
          action={<LinkButton href="/house-style">To house style</LinkButton>}
        >
          <p>Two can be compared once another is in force.</p>
        </EmptyState>
      )}
    </>
  );
}

function countOf(count: number): string {
  if (count === 0) return 'nothing differs';
  return count === 1 ? 'one decision differs' : `${count} decisions differ`;
}
