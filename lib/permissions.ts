/** THE table of who may do what: pages, actions, API and tests all ask here. */
import type { Role } from '@/db/schema';
import { KEY_SCOPES, type KeyScope } from '@/openapi/contract';
import type { Actor } from './actor';
import { AppError } from './errors';

/**
 * What can be permitted. `account`: one's own name, address, password, sessions and data. `workspace`: members, roles,
 * keys, usage, audit, deletion of the workspace.
 */
export const ACTS = [
  'account',
  'workspace',
  'studies:write',
  'publish',
  'exercises',
  'studies:read',
  'attempts',
  'compute',
] as const;
export type Act = (typeof ACTS)[number];

/** The roles that may do each act; students read what is shared with them, which the services of studies see to. */
export const PERMISSIONS: Readonly<Record<Act, readonly Role[]>> = {
  account: ['owner', 'coach', 'writer', 'student'],
  workspace: ['owner'],
  'studies:write': ['owner', 'coach', 'writer'],
  publish: ['owner', 'coach', 'writer'],
  exercises: ['owner', 'coach'],
  'studies:read': ['owner', 'coach', 'writer', 'student'],
  attempts: ['owner', 'coach', 'writer', 'student'],
  compute: ['owner', 'coach', 'writer', 'student'],
};

/** Whether the actor may do the act in their workspace. Without a name one may compute, within an allowance. */
export function may(actor: Actor, act: Act): boolean {
  switch (actor.kind) {
    case 'visitor':
      return act === 'compute';
    case 'person':
      return PERMISSIONS[act].includes(actor.role);
    case 'key':
      return isKeyScope(act) && actor.scopes.includes(act);
  }
}

function isKeyScope(act: Act): act is Act & KeyScope {
  return (KEY_SCOPES as readonly string[]).includes(act);
}

/** A member of a workspace, or a key of one, as services need to know them. */
export interface Member {
  readonly workspaceId: string;
  /** Null where a key asks. */
  readonly userId: string | null;
  readonly keyId: string | null;
  readonly role: Role | 'key';
}

/** The actor as a member who may do the act. Throws `not-signed-in` for visitors and `not-allowed` for those who may not. */
export function memberFor(actor: Actor, act: Act): Member {
  if (actor.kind === 'visitor') throw new AppError('not-signed-in', 'Nobody is signed in, and no key was sent.');
  if (!may(actor, act)) throw notAllowed(actor, act);
  const { workspaceId } = actor;
  return actor.kind === 'key'
    ? { workspaceId, userId: null, keyId: actor.keyId, role: 'key' }
    : { workspaceId, userId: actor.userId, keyId: null, role: actor.role };
}

/** The person who is signed in, who may do the act; a key is refused. */
export function personFor(actor: Actor, act: Act): Extract<Actor, { readonly kind: 'person' }> {
  if (actor.kind === 'visitor') throw new AppError('not-signed-in', 'Nobody is signed in.');
  if (actor.kind === 'key' || !may(actor, act)) throw notAllowed(actor, act);
  return actor;
}

function notAllowed(actor: Exclude<Actor, { readonly kind: 'visitor' }>, act: Act): AppError {
  const who = actor.kind === 'key' ? 'The key’s scopes do' : `The role of a ${actor.role} does`;
  return new AppError('not-allowed', `${who} not allow this (${act}).`);
}
