/** Keys of a workspace and what they have used. */
import { z } from 'zod';
import { KEY_SCOPES } from '../contract';
import { momentSchema, uuidSchema } from './page';

const NAME_LENGTH_MAX = 80;
/** The longest life of a key, in days. */
export const KEY_DAYS_MAX = 366;

export const keyScopeSchema = z.enum(KEY_SCOPES).meta({ id: 'KeyScope', description: 'What a key may do.' });

export const keyRequestSchema = z
  .strictObject({
    name: z.string().trim().min(1).max(NAME_LENGTH_MAX).describe('By which its owners know what it is for.'),
    scopes: z.array(keyScopeSchema).min(1).max(KEY_SCOPES.length),
    days: z.int().min(1).max(KEY_DAYS_MAX).default(90).describe('For how many days it is good.'),
  })
  .meta({ id: 'KeyRequest', description: 'A key to be made.' });
export type KeyRequest = z.infer<typeof keyRequestSchema>;

export const keySchema = z
  .object({
    id: uuidSchema,
    name: z.string(),
    prefix: z.string().describe('The beginning of the key, by which it can be recognised.'),
    scopes: z.array(keyScopeSchema),
    createdAt: momentSchema,
    expiresAt: momentSchema.nullable(),
    revokedAt: momentSchema.nullable(),
    usedAt: momentSchema.nullable(),
  })
  .meta({ id: 'Key', description: 'A key, without the secret: that is shown once, when it is made.' });
export type KeyAnswer = z.infer<typeof keySchema>;

export const newKeySchema = z
  .object({ key: keySchema, secret: z.string().describe('The key itself. It is shown this once and never stored.') })
  .meta({ id: 'NewKey', description: 'A key that was just made.' });

export const keyListSchema = z.object({ items: z.array(keySchema) }).meta({ id: 'KeyList', description: 'All keys.' });

export const usageQuerySchema = z.strictObject({
  days: z.coerce.number().int().min(1).max(KEY_DAYS_MAX).default(30).describe('How many days back.'),
});

export const usageSchema = z
  .object({
    since: z.iso.date(),
    items: z.array(
      z.object({ key: uuidSchema, name: z.string(), day: z.iso.date(), call: z.string(), count: z.int().min(0) }),
    ),
  })
  .meta({ id: 'Usage', description: 'How often each key made each call, day by day (UTC).' });
export type Usage = z.infer<typeof usageSchema>;
