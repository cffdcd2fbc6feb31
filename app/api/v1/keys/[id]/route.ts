import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { revokeKey } from '@/lib/services/keys/revoke-key';
import { contracts } from '@/openapi/contracts';

export const DELETE = route(contracts.revokeKey, ({ ctx, params }) => revokeKey(ctx, params));

export const { GET, HEAD, OPTIONS, POST, PUT, PATCH } = others({ DELETE });
