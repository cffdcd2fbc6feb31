import { describedBy } from '@/lib/api/described';
import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { holdSheet } from '@/lib/services/structures/hold-sheet';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.getSheet, ({ query }) => describedBy(holdSheet(query)));

export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
