/** Calls the real handlers with Requests, as Next would, and holds each answer against the document. */
import { readdirSync } from 'node:fs';
import { join, relative } from 'node:path';
import { pathToFileURL } from 'node:url';
import Ajv2020 from 'ajv/dist/2020';
import addFormats from 'ajv-formats';
import { expect } from 'vitest';
import type { Route } from '@/lib/api/route';
import type { Contract } from '@/openapi/contract';
import { apiDocument, type Json } from '@/openapi/document';

export const ORIGIN = 'http://waypost.test';
export const METHODS = ['GET', 'HEAD', 'OPTIONS', 'POST', 'PUT', 'PATCH', 'DELETE'] as const;
export type AnyMethod = (typeof METHODS)[number];

type Handler = (request: Request, segments: { params: Promise<unknown> }) => Promise<Response>;
export type RouteModule = Readonly<Partial<Record<AnyMethod, Handler | Route>>>;

const ROOT = process.cwd();

/** The files under app/api that Next serves, from the repository's root. */
export function routeFiles(): string[] {
  return readdirSync(join(ROOT, 'app/api'), { recursive: true, encoding: 'utf8' })
    .filter((name) => /(^|\/)route\.ts$/.test(name))
    .map((name) => relative(ROOT, join(ROOT, 'app/api', name)))
    .sort();
}

/** Where the route file of a path has to stand. */
export function routeFileOf(path: string): string {
  return `app${path.replaceAll('{', '[').replaceAll('}', ']')}/route.ts`;
}

/** The handlers of a route file. */
export async function routeModule(file: string): Promise<RouteModule> {
  return (await import(/* @vite-ignore */ pathToFileURL(join(ROOT, file)).href)) as RouteModule;
}

export interface Wanted {
  readonly params?: Readonly<Record<string, string>>;
  readonly query?: Readonly<Record<string, string>> | string;
  /** A string is sent as it stands, anything else as JSON. */
  readonly body?: unknown;
  readonly headers?: Readonly<Record<string, string>>;
  readonly method?: AnyMethod;
  readonly signal?: AbortSignal;
}

/** Calls a contract's own route file. */
export async function call(contract: Contract, wanted: Wanted = {}): Promise<Response> {
  const { params = {}, query, body, headers = {}, method = contract.method, signal } = wanted;
  const path = contract.path.replace(/\{(\w+)\}/g, (_, name: string) => encodeURIComponent(params[name] ?? ''));
  const search = query === undefined ? '' : `?${typeof query === 'string' ? query : new URLSearchParams({ ...query })}`;
  const request = new Request(`${ORIGIN}${path}${search}`, {
    method,
    headers: { ...(body !== undefined && { 'content-type': 'application/json' }), ...headers },
    ...(body !== undefined && { body: typeof body === 'string' ? body : JSON.stringify(body) }),
    ...(signal && { signal }),
  });
  const handler = (await routeModule(routeFileOf(contract.path)))[method];
  if (!handler) throw new Error(`${contract.path} exports no ${method}`);
  return handler(request, { params: Promise.resolve(params) });
}

const document = JSON.parse(JSON.stringify(apiDocument())) as { [key: string]: Json };
const ajv = new Ajv2020({ strict: false, allErrors: false });
addFormats(ajv);
ajv.addSchema({ ...document, $id: 'waypost' });

/** Holds a value against what the document promises for a call, status and media type. */
export function expectPromised(contract: Contract, status: number, media: string, value: unknown): void {
  const steps = [
    'paths',
    contract.path,
    contract.method.toLowerCase(),
    'responses',
    String(status),
    'content',
    media,
    'schema',
  ];
  const pointer = steps
    .map((step) => `/${encodeURIComponent(step.replaceAll('~', '~0').replaceAll('/', '~1'))}`)
    .join('');
  const validate = ajv.getSchema(`waypost#${pointer}`);
  if (!validate) throw new Error(`The document promises nothing for ${contract.id} ${status} ${media}.`);
  expect(validate(value), `${contract.id} ${status}: ${JSON.stringify(validate.errors)}`).toBe(true);
}

/** The media type of an answer without its parameters. */
export function mediaOf(response: Response): string {
  return (response.headers.get('content-type') ?? '').split(';')[0] ?? '';
}

/** The JSON of an answer, after it has been held against the document. */
export async function promisedJson<T = { readonly [key: string]: unknown }>(
  contract: Contract,
  response: Response,
): Promise<T> {
  const value: unknown = await response.json();
  expectPromised(contract, response.status, mediaOf(response), value);
  return value as T;
}

/** The lines of an NDJSON answer, each held against the document. */
export async function promisedLines<T = { readonly [key: string]: unknown }>(
  contract: Contract,
  response: Response,
): Promise<T[]> {
  const text = await response.text();
  expect(text.endsWith('\n')).toBe(true);
  return text
    .slice(0, -1)
    .split('\n')
    .map((line) => {
      const value: unknown = JSON.parse(line);
      expectPromised(contract, response.status, mediaOf(response), value);
      return value as T;
    });
}
