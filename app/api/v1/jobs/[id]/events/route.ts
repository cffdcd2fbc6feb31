import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { watchJob } from '@/lib/services/jobs/read-jobs';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.watchJob, ({ ctx, params }) => watchJob(ctx, params));

export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
