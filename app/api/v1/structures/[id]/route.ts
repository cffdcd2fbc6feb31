import { describedBy } from '@/lib/api/described';
import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { structureSheet } from '@/lib/services/structures/sheets';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.getStructure, ({ params }) => describedBy(structureSheet(params.id)));

export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
