/** Lists by cursor, and the small values that stored things share. */
import { z } from 'zod';

/** Most items of a page. */
export const PAGE_MAX = 100;

export const uuidSchema = z.uuid().meta({ id: 'Id', description: 'An id of something stored.' });
export const momentSchema = z.iso.datetime().meta({ id: 'Moment', description: 'A moment in UTC (RFC 3339).' });
export const versionSchema = z.int().min(1).describe('One more with each change; the ETag names it.');

const CURSOR_LENGTH_MAX = 400;

/** The query of every list. */
export const pageQuery = {
  limit: z.coerce.number().int().min(1).max(PAGE_MAX).default(50).describe('Most items of the page.'),
  cursor: z.string().max(CURSOR_LENGTH_MAX).optional().describe('The "next" of the page before.'),
};

/** A page of a list. */
export function pageSchema<S extends z.ZodType>(item: S, id: string) {
  return z
    .object({
      items: z.array(item),
      next: z.string().nullable().describe('The cursor of the next page; null at the end.'),
    })
    .meta({ id, description: 'A page of a list.' });
}

export const idParams = z.strictObject({ id: uuidSchema });
