import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { listed, versioned } from '@/lib/api/versioned';
import { createStudy } from '@/lib/services/studies/create-study';
import { listStudies } from '@/lib/services/studies/list-studies';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.listStudies, async ({ ctx, query }) =>
  listed(await listStudies(ctx, { ...query, trash: query.trash === 'true' }), { path: '/api/v1/studies', query }),
);

export const POST = route(contracts.createStudy, async ({ ctx, body }) => {
  const study = await createStudy(ctx, body);
  return versioned(study, `/api/v1/studies/${study.id}`);
});

export const { HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ GET, POST });
