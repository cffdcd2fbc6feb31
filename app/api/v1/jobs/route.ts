import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { listed } from '@/lib/api/versioned';
import { createJob } from '@/lib/services/jobs/create-job';
import { listJobs } from '@/lib/services/jobs/read-jobs';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.listJobs, async ({ ctx, query }) =>
  listed(await listJobs(ctx, query), { path: '/api/v1/jobs', query }),
);

export const POST = route(contracts.createJob, ({ ctx, body }) => createJob(ctx, body));

export const { HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ GET, POST });
