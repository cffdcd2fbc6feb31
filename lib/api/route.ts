/** A contract and a handler to a route: parse, run, check the reply, answer problems. */
import type { z } from 'zod';
import type { Actor } from '@/lib/actor';
import { type Context, contextOf } from '@/lib/context';
import { env } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { log } from '@/lib/log';
import {
  type Contract,
  type JsonReply,
  type LinesReply,
  type NoReply,
  type Reply,
  type ReplyValue,
} from '@/openapi/contract';
import { Answer } from './answer';
import { readBody } from './body';
import { isUnchanged } from './etag';
import { callerOf } from './caller';
import { eventStream } from './events';
import { commonHeaders, requestIdOf } from './headers';
import { idempotencyKeyOf, once } from './idempotency';
import { versionIn } from './if-match';
import { lineStream } from './lines';
import { problemResponse } from './problem';
import { readParams, readQuery } from './query';
import { replyText, Written } from './reply';

/** What a handler is given: the parsed request and the outside world. */
export interface Call<P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType> {
  readonly ctx: Context;
  readonly params: z.output<P>;
  readonly query: z.output<Q>;
  readonly body: z.output<B>;
  /** The version that If-Match names, for calls that are guarded by it; 0 for the others. */
  readonly version: number;
}

/** The value of a reply; JSON may be written already. */
type Value<R extends Reply> =
  | ReplyValue<R>
  | (R extends JsonReply ? Written : R extends LinesReply ? AsyncIterable<Written> : never);

type Given<R extends Reply> = Value<R> | Answer<Value<R>>;

/** What Next hands to a route beside the request. */
interface Segments {
  readonly params: Promise<unknown>;
}

/** A route that Next can serve; it carries its contract, so that tests can hold the two together. */
export interface Route {
  (request: Request, segments?: Segments): Promise<Response>;
  readonly contract: Contract;
}

/** Joins a contract and its service. The route never throws: whatever happens is answered. */
export function route<P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType, R extends Reply>(
  contract: Contract<P, Q, B, R>,
  handler: (call: Call<P, Q, B>) => Given<R> | Promise<Given<R>>,
): Route {
  const write = bodyWriter(contract.reply);
  const faultsIn = contract.body ? 'body' : 'query';
  const status = contract.status ?? 200;

  async function answer(request: Request, requestId: string, segments?: Segments): Promise<Response> {
    const { actor, headers: limits } = await callerOf(request, contract);
    const ctx = contextOf(actor, requestId, request.signal);
    const call: Call<P, Q, B> = {
      ctx,
      params: (contract.params && readParams(await segments?.params, contract.params)) as z.output<P>,
      query: (contract.query && readQuery(new URL(request.url).searchParams, contract.query)) as z.output<Q>,
      body: (contract.body && (await readBody(request, contract.body))) as z.output<B>,
      version: contract.guarded ? versionIn(request) : 0,
    };
    const common = { ...commonHeaders(requestId, contract), ...limits };
    const key = contract.stores ? idempotencyKeyOf(request) : undefined;
    if (key !== undefined) {
      const { pathname } = new URL(request.url);
      const asked = JSON.stringify([pathname, call.body]);
      const kept = await once({ ctx, owner: ownerOf(actor), call: contract.id, key, request: asked }, async () => {
        const { value, headers, etag } = await given(call);
        const made = JSON.parse(write(await value()) as string) as unknown;
        return { status, reply: made, headers: { ...(etag && { ETag: etag }), ...headers } };
      });
      return new Response(JSON.stringify(kept.reply), {
        status: kept.status,
        headers: { 'Content-Type': 'application/json', ...common, ...kept.headers },
      });
    }
    const { value, etag, headers } = await given(call);
    const allHeaders = { ...common, ...(etag && { ETag: etag }), ...headers };
    if (etag && contract.method === 'GET' && isUnchanged(request.headers.get('if-none-match'), etag))
      return new Response(null, { status: 304, headers: allHeaders });
    if (contract.reply.form === 'none') {
      await value();
      return new Response(null, { status, headers: allHeaders });
    }
    return new Response(write(await value()), {
      status,
      headers: { 'Content-Type': mediaOf(contract.reply), ...allHeaders },
    });
  }

  async function given(call: Call<P, Q, B>): Promise<Answer<Value<R>>> {
    const made = await handler(call);
    return made instanceof Answer ? made : new Answer<Value<R>>({ value: () => made });
  }

  async function served(request: Request, segments?: Segments): Promise<Response> {
    const requestId = requestIdOf(request);
    const begun = performance.now();
    let response: Response;
    try {
      response = await answer(request, requestId, segments);
    } catch (error) {
      if (!(error instanceof AppError)) log.error({ err: error, requestId, call: contract.id }, 'our own mistake');
      response = problemResponse(error, { request, requestId, faultsIn, call: contract });
    }
    log.info(
      { requestId, call: contract.id, status: response.status, ms: Math.round((performance.now() - begun) * 10) / 10 },
      'answered',
    );
    return response;
  }

  return Object.assign(served, { contract: contract as Contract });
}

/** Whose idempotency key it is. */
function ownerOf(actor: Actor): string {
  return actor.kind === 'key' ? actor.keyId : actor.kind === 'person' ? actor.userId : 'visitor';
}

/** How a reply's value becomes a body, checked on the way. Made once a route. */
function bodyWriter(reply: Reply): (value: unknown) => BodyInit {
  if (!('schema' in reply)) return (value) => value as BodyInit;
  const text = replyText(reply, env.isProduction);
  if (reply.form === 'events') return (value) => eventStream(value as AsyncIterable<unknown>, text);
  if (reply.form === 'lines') return (value) => lineStream(value as AsyncIterable<unknown>, text);
  return (value) => (value instanceof Written ? (value.bytes as BodyInit) : text(value));
}

/** Text types say their encoding; JSON has only one (RFC 8259, 8.1). */
function mediaOf(reply: Exclude<Reply, NoReply>): string {
  return reply.form === 'text' ? `${reply.media}; charset=utf-8` : reply.media;
}
