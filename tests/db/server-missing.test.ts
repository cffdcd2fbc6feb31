/** Where there is no PostgreSQL, the tests that need one say so; they never pass by testing one database only. */
import { mkdtempSync, rmdirSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it, vi } from 'vitest';
import { findPostgres } from '@/lib/cli/house/postgres.mjs';
import { startPostgres } from '@/tests/support/postgres';

describe('a PostgreSQL server', () => {
  const empty = mkdtempSync(join(tmpdir(), 'waypost-no-server-'));

  it('is found among the system’s packages, without a word in the environment', () => {
    expect(findPostgres({})).toMatch(/bin$/);
  });

  it('is not looked for elsewhere when the environment says where it is', () => {
    expect(findPostgres({ POSTGRES_BIN: empty, PATH: process.env.PATH })).toBeUndefined();
  });

  it('that is missing fails the tests and says what to install', async () => {
    vi.stubEnv('POSTGRES_BIN', empty);
    await expect(startPostgres()).rejects.toThrow('apt-get install postgresql');
    vi.unstubAllEnvs();
    rmdirSync(empty);
  });
});
