import { Answer } from '@/lib/api/answer';
import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { exportCsv } from '@/lib/services/studies/export-study';
import { contracts } from '@/openapi/contracts';

const headers = { 'Content-Disposition': 'attachment; filename="study.csv"' };

export const GET = route(contracts.exportStudyCsv, async ({ ctx, params }) => {
  const value = await exportCsv(ctx, params);
  return new Answer({ value: () => value, headers });
});

export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
