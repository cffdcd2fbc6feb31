import { describedBy } from '@/lib/api/described';
import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { apiIndex } from '@/lib/services/about/describe-api';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.getIndex, () => describedBy(apiIndex()));
export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
