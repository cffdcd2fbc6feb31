import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { health } from '@/lib/services/about/health';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.getHealth, ({ ctx }) => health(ctx));
export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
