import { Answer } from '@/lib/api/answer';
import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { exportJson } from '@/lib/services/studies/export-study';
import { contracts } from '@/openapi/contracts';

const headers = { 'Content-Disposition': 'attachment; filename="study.json"' };

export const GET = route(contracts.exportStudyJson, async ({ ctx, params }) => {
  const value = await exportJson(ctx, params);
  return new Answer({ value: () => value, headers });
});

export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
