import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { cancelJob } from '@/lib/services/jobs/end-jobs';
import { readJob } from '@/lib/services/jobs/read-jobs';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.getJob, ({ ctx, params }) => readJob(ctx, params));

export const DELETE = route(contracts.cancelJob, ({ ctx, params }) => cancelJob(ctx, params));

export const { HEAD, OPTIONS, POST, PUT, PATCH } = others({ GET, DELETE });
