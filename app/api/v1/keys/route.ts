import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { createKey } from '@/lib/services/keys/create-key';
import { listKeys } from '@/lib/services/keys/list-keys';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.listKeys, ({ ctx }) => listKeys(ctx));

export const POST = route(contracts.createKey, ({ ctx, body }) => createKey(ctx, body));

export const { HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ GET, POST });
