import { describedBy } from '@/lib/api/described';
import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { openApiDocument } from '@/lib/services/about/describe-api';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.getDocument, () => describedBy(openApiDocument()));
export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
