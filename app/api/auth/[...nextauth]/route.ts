import NextAuth from 'next-auth';
import { nothing } from '@/lib/api/others';
import { authOptions } from '@/lib/auth/options';

/** What Next hands to a route beside the request. */
interface Segments {
  readonly params: Promise<{ readonly nextauth: string[] }>;
}

async function handler(request: Request, segments: Segments): Promise<Response> {
  return (await NextAuth(request as never, segments as never, authOptions(request))) as Response;
}

export { handler as GET, handler as POST };

export const { HEAD, OPTIONS, PUT, PATCH, DELETE } = nothing;
