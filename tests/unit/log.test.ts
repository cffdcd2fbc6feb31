/** What the log says of an error: enough to mend it, nothing that people sent. */
import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { loggedError } from '@/lib/log';
import { freshWorld, type World } from '@/tests/support/world';

const ADDRESS = 'ada.reed@waypost.test';

describe('an error in the log', () => {
  let world: World;
  beforeAll(async () => {
    world = await freshWorld();
  });
  afterAll(() => world.close());

  it('of the database tells the query and the place, not the values', async () => {
    const error = await world.db
      .execute(sql`select ${ADDRESS}::int, ${'line one\nline two'}::text`)
      .catch((thrown: unknown) => thrown);
    const kept = JSON.stringify(loggedError(error));
    expect(String(error)).toContain(ADDRESS);
    expect(kept).toContain('select $1::int');
    expect(kept).toContain('log.test.ts');
    for (const sent of ['line one', 'line two', 'params:']) expect(kept).not.toContain(sent);
  });

  it('keeps code and cause, and no other field', () => {
    const cause = Object.assign(new Error('refused'), { code: 'EENVELOPE', rejected: [ADDRESS] });
    const kept = loggedError(new Error('the message was not sent', { cause }));
    expect(kept).toMatchObject({ type: 'Error', message: 'the message was not sent', cause: { code: 'EENVELOPE' } });
    expect(JSON.stringify(kept)).not.toContain(ADDRESS);
  });

  it('of what is no error tells its type', () => {
    expect(loggedError('ada.reed@waypost.test')).toEqual({ message: 'string' });
  });
});
