/** Who asks: a visitor without a name, a person in a workspace, or a key of one. */
import type { Role } from '@/db/schema';
import type { KeyScope } from '@/openapi/contract';

/** Nobody who has signed in. */
export interface Visitor {
  readonly kind: 'visitor';
}

/** A person who is signed in, in the workspace that they have chosen. */
export interface Person {
  readonly kind: 'person';
  readonly userId: string;
  readonly name: string | null;
  readonly workspaceId: string;
  readonly role: Role;
  /** The session, which can be ended. */
  readonly signInId: string;
}

/** A program with a key of a workspace. */
export interface KeyHolder {
  readonly kind: 'key';
  readonly keyId: string;
  readonly workspaceId: string;
  readonly scopes: readonly KeyScope[];
}

export type Actor = Visitor | Person | KeyHolder;

export const VISITOR: Visitor = { kind: 'visitor' };
