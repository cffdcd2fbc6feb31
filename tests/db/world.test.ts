/** The world that other tests stand on. */
import { afterAll, describe, expect, it } from 'vitest';
import { membersOf, roleIn } from '@/db/queries/workspaces';
import { openDb } from '@/lib/database';
import { freshWorld } from '@/tests/support/world';

describe('a fresh world', async () => {
  const world = await freshWorld();
  afterAll(() => world.close());

  it('is the database of the process', () => {
    expect(openDb()).toBe(world.db);
  });

  it('has people in their roles, and nobody else', async () => {
    const coach = await world.person('Ada Brook');
    const stranger = await world.person('Ada Brook');
    const workspace = await world.workspace('Club of the Long Diagonal', { coach });
    expect(await roleIn(world.db, workspace.id, coach.id)).toBe('coach');
    expect(await roleIn(world.db, workspace.id, stranger.id)).toBeUndefined();
    expect((await membersOf(world.db, workspace.id)).map(({ userId, role }) => [userId, role])).toEqual([
      [coach.id, 'coach'],
    ]);
  });
});
