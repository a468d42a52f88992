import { readRoute } from '@/lib/auth/desk-route';
import { listJobs } from '@/lib/services/jobs/list-jobs';

export const GET = readRoute((actor, _params, ctx) => listJobs(actor, ctx));
