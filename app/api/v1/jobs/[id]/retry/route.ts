import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { retryJob } from '@/lib/services/jobs/end-jobs';
import { contracts } from '@/openapi/contracts';

export const POST = route(contracts.retryJob, ({ ctx, params }) => retryJob(ctx, params));

export const { GET, HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ POST });
