import { Answer } from '@/lib/api/answer';
import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { exportPgn } from '@/lib/services/studies/export-study';
import { contracts } from '@/openapi/contracts';

const headers = { 'Content-Disposition': 'attachment; filename="study.pgn"' };

export const GET = route(contracts.exportStudyPgn, async ({ ctx, params }) => {
  const value = await exportPgn(ctx, params);
  return new Answer({ value: () => value, headers });
});

export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
