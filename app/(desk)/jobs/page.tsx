import type { Metadata } from 'next';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { readEnv } from '@/lib/env';
import { listJobs } from '@/lib/services/jobs/list-jobs';
import { JobsDesk } from './_components/jobs-desk';
import { cancelJobAction, retryJobAction } from './actions';

export const metadata: Metadata = { title: 'Jobs' };

export default async function JobsPage() {
  const { initial, person } = await deskPage((actor, ctx) => ({
    initial: listJobs(actor, ctx),
    person: actor.publicId,
  }));
  return (
    <>
      <PageTitle
        title="Jobs"
        sub="Work that follows from what people did, done by a process of its own behind the screens."
      />
      <JobsDesk
        initial={initial}
        person={person}
        zone={readEnv().LEADLINE_ZONE}
        acts={{ cancel: cancelJobAction, retry: retryJobAction }}
      />
    </>
  );
}
