/** Cursors of lists: where a page ended, in a form that callers do not take apart. */
import { AppError } from '@/lib/errors';

/** The last row of a page: its moment or order, and its id. */
export interface Cursor {
  readonly after: string;
  readonly id: string;
}

const UUID = /^[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

/** A cursor as text for an address. */
export function cursorText({ after, id }: Cursor): string {
  return Buffer.from(JSON.stringify([after, id])).toString('base64url');
}

/** A cursor from its text. Throws `invalid-request` on a text that no page gave. */
export function readCursor(text: string): Cursor {
  try {
    const [after, id] = JSON.parse(Buffer.from(text, 'base64url').toString()) as unknown[];
    if (typeof after === 'string' && typeof id === 'string' && UUID.test(id)) return { after, id };
  } catch {
    // Told apart below from what was never a cursor: neither is one.
  }
  const message = 'This is no cursor that a page of this list gave.';
  throw new AppError('invalid-request', message, { faults: [{ path: '/cursor', code: 'no-cursor', message }] });
}

/** A page of a list from one row more than the page takes. */
export function pageOf<R>(
  rows: readonly R[],
  most: number,
  cursorOf: (row: R) => Cursor,
): { readonly items: readonly R[]; readonly next: string | null } {
  const items = rows.slice(0, most);
  const last = items[items.length - 1];
  return { items, next: rows.length > most && last !== undefined ? cursorText(cursorOf(last)) : null };
}
