/** A browser that has signed in, for tests. */
import { insertSignIn } from '@/db/queries/sessions';
import type { UserRow } from '@/db/queries/users';
import type { Db } from '@/db/client';
import { sealSession, SESSION_COOKIE, WORKSPACE_COOKIE } from '@/lib/auth/session-actor';

/** The headers of a request that a page of ours makes for this person in this workspace. */
export async function sessionHeaders(db: Db, user: UserRow, workspaceId: string): Promise<Record<string, string>> {
  const signInId = await insertSignIn(db, { userId: user.id, agent: 'a test', at: new Date() });
  const sealed = await sealSession({ userId: user.id, signInId, tokenVersion: user.tokenVersion });
  return {
    cookie: `${SESSION_COOKIE}=${sealed}; ${WORKSPACE_COOKIE}=${workspaceId}`,
    'sec-fetch-site': 'same-origin',
  };
}
