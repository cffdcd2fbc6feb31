import { openContext } from '@/lib/pages/open-context';
import { exportAccount } from '@/lib/services/accounts/export-account';

/** One's own data as a file. Another site's page can have it fetched but cannot read it: no CORS, and cookies are same-site. */
export async function GET(request: Request): Promise<Response> {
  const ctx = await openContext();
  if (ctx.actor.kind !== 'person') return Response.redirect(new URL('/sign-in?next=/settings', request.url));
  return new Response(JSON.stringify(await exportAccount(ctx), null, 2), {
    headers: {
      'Content-Type': 'application/json; charset=utf-8',
      'Content-Disposition': 'attachment; filename="waypost-account.json"',
      'Cache-Control': 'private, no-store',
    },
  });
}
