import type { Metadata } from 'next';
import { LivePreview } from '@/components/forms/house-style/live-preview';
import { CautionNote } from '@/components/ui/caution-note';
import { PageTitle } from '@/components/ui/page-title';
import { SectionHeading } from '@/components/ui/section-heading';
import { deskPage } from '@/lib/auth/desk-page';
import { LANGUAGES } from '@/lib/domain/vocabulary';
import { AppError } from '@/lib/errors';
import { describeSentences } from '@/lib/services/house-style/describe-sentences';
import { getStyle } from '@/lib/services/house-style/get-style';
import { leavesOf } from '@/lib/services/house-style/leaves';
import { EditStyle } from '../../_components/edit-style';
import { proposeStyleAction } from '../../actions';

export const metadata: Metadata = { title: 'Change house style' };

export default async function EditStylePage({ params }: PageProps<'/house-style/[id]/edit'>) {
  const { id } = await params;
  const view = await deskPage((actor, ctx) => {
    const found = getStyle(actor, id, ctx);
    if (!found.may.write) throw new AppError('forbidden', 'Only its author changes this draft.');
    return found;
  });
  const { sentences, slots } = describeSentences(view.body);
  const values = [...leavesOf(view.body)].filter(([path]) => !path.startsWith('style.messages.'));
  const back = view.acts.find(({ act }) => act === 'sent-back');
  return (
    <>
      <PageTitle
        crumbs={[
          { label: 'House style', href: '/house-style' },
          { label: 'This draft', href: `/house-style/${id}` },
        ]}
        title="Change house style"
        sub={`Starts from version ${view.comparedWith?.number ?? 1}; nothing of it is in force before a second editor agrees.`}
      />
      {back ? (
        <CautionNote title={`Sent back by ${back.person}`}>
          <p>{back.comment}</p>
        </CautionNote>
      ) : null}
      <EditStyle
        draft={{
          id,
          version: view.version,
          note: view.note,
          values: Object.fromEntries(values),
          typed: view.typed,
          faults: view.faults,
          sentences,
          slots,
          languages: [...LANGUAGES],
        }}
        propose={proposeStyleAction}
      />
      <SectionHeading>What it would change in what is live</SectionHeading>
      <LivePreview id={id} />
    </>
  );
}
