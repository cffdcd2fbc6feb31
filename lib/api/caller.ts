/**
 * Who makes a request: a key, a person by the session's cookie, or a visitor; and what their allowance says.
 *
 * A computing call without a key is a visitor's whoever is signed in: it is answered without a look at cookie or database.
 */
import { countCall, keyOfHash } from '@/db/queries/keys';
import { type Actor, VISITOR } from '@/lib/actor';
import { addressOf, isLoopback } from '@/lib/address';
import { sessionActor } from '@/lib/auth/session-actor';
import { openDb } from '@/lib/database';
import { AppError } from '@/lib/errors';
import { keyHash, secretIn } from '@/lib/key-secret';
import { memberFor, personFor } from '@/lib/permissions';
import { type Contract, isOpen, KEY_SCOPES, type KeyScope } from '@/openapi/contract';
import { type LimitKind, spend } from './limits';

export interface Caller {
  readonly actor: Actor;
  /** The headers that tell of the allowance. */
  readonly headers: Readonly<Record<string, string>>;
}

/** The caller of a contract, who may call it. Throws the refusals of identity, permission and allowance. */
export async function callerOf(request: Request, contract: Contract): Promise<Caller> {
  if (contract.scope === 'open') return { actor: VISITOR, headers: {} };
  const authorization = request.headers.get('authorization');
  const actor = await actorOf(request, authorization, contract);
  checkPermission(actor, contract);
  const headers = await spendFor(actor, request, contract);
  if (actor.kind === 'key') await countCall(openDb(), { keyId: actor.keyId, call: contract.id, at: new Date() });
  return { actor, headers };
}

async function actorOf(request: Request, authorization: string | null, contract: Contract): Promise<Actor> {
  if (authorization !== null) return keyActor(authorization);
  if (isOpen(contract)) return VISITOR;
  if (contract.method !== 'GET') refuseForeignPage(request);
  return sessionActor(request.headers);
}

/** Of a key that never was, one that is ended and one that is expired the same is said. */
async function keyActor(authorization: string): Promise<Actor> {
  const secret = secretIn(authorization);
  const row = secret === undefined ? undefined : await keyOfHash(openDb(), keyHash(secret));
  if (!row || row.revokedAt !== null || (row.expiresAt !== null && row.expiresAt.getTime() <= Date.now())) {
    throw new AppError('not-signed-in', 'There is no such key, or it is ended or expired.', {
      headers: { 'WWW-Authenticate': 'Bearer error="invalid_token"' },
    });
  }
  const scopes = KEY_SCOPES.filter((scope): scope is KeyScope => row.scopes.includes(scope));
  return { kind: 'key', keyId: row.id, workspaceId: row.workspaceId, scopes };
}

/**
 * A browser sends cookies along with requests that another site's page made: those may read nothing (no CORS) and change
 * nothing (this). Browsers say where a request comes from in Sec-Fetch-Site, older ones in Origin.
 */
function refuseForeignPage(request: Request): void {
  const site = request.headers.get('sec-fetch-site');
  if (site === 'same-origin' || site === 'none') return;
  const origin = request.headers.get('origin');
  const own = request.headers.get('host') ?? new URL(request.url).host;
  if (site === null && (origin === null || URL.parse?.(origin)?.host === own)) return;
  throw new AppError('not-allowed', 'This request comes from a page of another site.');
}

function checkPermission(actor: Actor, { scope }: Contract): void {
  if (scope === 'open' || (scope === 'compute' && actor.kind === 'visitor')) return;
  if (scope === 'person' || scope === 'workspace') personFor(actor, scope === 'workspace' ? 'workspace' : 'compute');
  else memberFor(actor, scope);
}

/** Points for each so many positions of a batch. */
const POSITIONS_A_POINT = 10;

async function spendFor(actor: Actor, request: Request, { id }: Contract): Promise<Readonly<Record<string, string>>> {
  const [kind, who] = payerOf(actor, request);
  if (who === null) return {};
  // What a batch holds is known only when it is read; its length bounds it.
  const length = id === 'createReadings' ? Number(request.headers.get('content-length') ?? 0) : 0;
  return spend(kind, who, 1 + Math.floor(length / (FEN_BYTES * POSITIONS_A_POINT)));
}

/** About so many bytes has a FEN in a batch. */
const FEN_BYTES = 60;

/** Whose allowance pays; nobody's on this machine itself, or where no server says the address. */
function payerOf(actor: Actor, request: Request): readonly [LimitKind, string | null] {
  if (actor.kind === 'key') return ['key', actor.keyId];
  if (actor.kind === 'person') return ['person', actor.userId];
  const address = addressOf(request);
  return ['address', address === undefined || isLoopback(address) ? null : address];
}
