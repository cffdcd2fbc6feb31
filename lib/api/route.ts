/** A contract and a handler to a route: parse, run, check the reply, answer problems. */
import type { z } from 'zod';
import { anonymousContext, type Context } from '@/lib/context';
import { env } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { log } from '@/lib/log';
import type { Contract, JsonReply, LinesReply, Reply, ReplyValue } from '@/openapi/contract';
import { Answer } from './answer';
import { readBody } from './body';
import { isUnchanged } from './etag';
import { commonHeaders, requestIdOf } from './headers';
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

  async function answer(request: Request, requestId: string, segments?: Segments): Promise<Response> {
    const ctx = anonymousContext(requestId, request.signal);
    const call: Call<P, Q, B> = {
      ctx,
      params: (contract.params && readParams(await segments?.params, contract.params)) as z.output<P>,
      query: (contract.query && readQuery(new URL(request.url).searchParams, contract.query)) as z.output<Q>,
      body: (contract.body && (await readBody(request, contract.body))) as z.output<B>,
    };
    const given = await handler(call);
    const { value, etag, headers } = given instanceof Answer ? given : new Answer<Value<R>>({ value: () => given });
    const allHeaders = { ...commonHeaders(requestId), ...(etag && { ETag: etag }), ...headers };
    if (etag && isUnchanged(request.headers.get('if-none-match'), etag))
      return new Response(null, { status: 304, headers: allHeaders });
    return new Response(write(await value()), {
      status: 200,
      headers: { 'Content-Type': mediaOf(contract.reply), ...allHeaders },
    });
  }

  async function served(request: Request, segments?: Segments): Promise<Response> {
    const requestId = requestIdOf(request);
    const begun = performance.now();
    let response: Response;
    try {
      response = await answer(request, requestId, segments);
    } catch (error) {
      if (!(error instanceof AppError)) log.error({ err: error, requestId, call: contract.id }, 'our own mistake');
      response = problemResponse(error, { request, requestId, faultsIn });
    }
    log.info(
      { requestId, call: contract.id, status: response.status, ms: Math.round((performance.now() - begun) * 10) / 10 },
      'answered',
    );
    return response;
  }

  return Object.assign(served, { contract: contract as Contract });
}

/** How a reply's value becomes a body, checked on the way. Made once a route. */
function bodyWriter(reply: Reply): (value: unknown) => BodyInit {
  if (reply.form !== 'json' && reply.form !== 'lines') return (value) => value as BodyInit;
  const text = replyText(reply, env.isProduction);
  if (reply.form === 'lines') return (value) => lineStream(value as AsyncIterable<unknown>, text);
  return (value) => (value instanceof Written ? (value.bytes as BodyInit) : text(value));
}

/** Text types say their encoding; JSON has only one (RFC 8259, 8.1). */
function mediaOf(reply: Reply): string {
  return reply.form === 'text' ? `${reply.media}; charset=utf-8` : reply.media;
}
