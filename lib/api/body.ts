/** A request's JSON body: its type, its bound while it is read, its encoding, its shape. */
import type { z } from 'zod';
import type { Body } from '@/openapi/contract';
import { AppError } from '@/lib/errors';
import { faultsOf } from './faults';

/** The parsed body, or the refusal that says what to mend. */
export async function readBody<S extends z.ZodType>(request: Request, body: Body<S>): Promise<z.output<S>> {
  if (!isJson(request.headers.get('content-type'))) {
    throw new AppError('unsupported-media-type', 'This call takes a body of the type application/json.', {
      headers: { 'Accept-Post': 'application/json' },
    });
  }
  const parsed = body.schema.safeParse(parseJson(await readBytes(request, body.bytesMax)));
  if (parsed.success) return parsed.data;
  const faults = faultsOf(parsed.error, 'body');
  const first = faults[0];
  throw new AppError(
    'invalid-request',
    first ? `At ${first.path || 'the top'}: ${first.message}` : 'The body is not as promised.',
    { faults },
  );
}

function isJson(contentType: string | null): boolean {
  return contentType !== null && /^application\/(?:[\w.-]+\+)?json\s*(?:;|$)/i.test(contentType.trim());
}

/** Counts while reading, so that no more than the bound is ever held, whatever Content-Length says. */
async function readBytes(request: Request, bytesMax: number): Promise<Uint8Array> {
  if (Number(request.headers.get('content-length') ?? 0) > bytesMax) throw tooLarge(bytesMax);
  const chunks: Uint8Array[] = [];
  let count = 0;
  const reader = request.body?.getReader();
  while (reader) {
    const { done, value } = await reader.read();
    if (done) break;
    count += value.byteLength;
    if (count > bytesMax) {
      await reader.cancel();
      throw tooLarge(bytesMax);
    }
    chunks.push(value);
  }
  return chunks.length === 1 && chunks[0] ? chunks[0] : Buffer.concat(chunks);
}

function tooLarge(bytesMax: number): AppError {
  return new AppError('body-too-large', `The body is larger than ${bytesMax} bytes.`, {
    bound: { name: 'bodyBytes', max: bytesMax },
  });
}

const utf8 = new TextDecoder('utf-8', { fatal: true });

function parseJson(bytes: Uint8Array): unknown {
  try {
    return JSON.parse(utf8.decode(bytes));
  } catch {
    throw new AppError(
      'not-json',
      bytes.byteLength === 0 ? 'The body is empty.' : 'The body could not be read as JSON in UTF-8.',
    );
  }
}
