import { figure } from '@/lib/api/figure';
import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { drawPlateSvg, plateAsPng } from '@/lib/services/plates/draw-plate';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.getPlatePng, async ({ ctx, query }) => {
  const svg = await drawPlateSvg(ctx, query);
  return figure(svg, `waypost-${query.layer}.png`, () => plateAsPng(svg, query));
});
export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
