import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { versioned } from '@/lib/api/versioned';
import { restoreStudy } from '@/lib/services/studies/change-study';
import { contracts } from '@/openapi/contracts';

export const POST = route(contracts.restoreStudy, async ({ ctx, params }) =>
  versioned(await restoreStudy(ctx, params)),
);

export const { GET, HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ POST });
