'use server';

import { deskAction } from '@/lib/auth/desk-action';
import { cancelJob, retryJob } from '@/lib/services/jobs/manage-jobs';

export async function cancelJobAction(input: unknown) {
  return deskAction((actor, ctx) => cancelJob(actor, input, ctx));
}

export async function retryJobAction(input: unknown) {
  return deskAction((actor, ctx) => retryJob(actor, input, ctx));
}
