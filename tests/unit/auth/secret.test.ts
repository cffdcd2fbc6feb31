/** The secret that sessions are sealed with. */
import { mkdtempSync, readFileSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';

let folder: string;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'waypost-secret-'));
  vi.stubEnv('WAYPOST_DATA', folder);
  vi.resetModules();
});
afterEach(() => {
  vi.unstubAllEnvs();
  rmSync(folder, { recursive: true, force: true });
});

/** The secret as a process finds it that has just begun. */
async function secret(): Promise<string> {
  vi.resetModules();
  return (await import('@/lib/auth/secret')).sessionSecret();
}

describe('the secret', () => {
  it('is made once, of chance, for this user’s eyes only', async () => {
    vi.stubEnv('WAYPOST_SECRET', '');
    const first = await secret();
    expect(await secret()).toBe(first);
    expect(first).toHaveLength(64);
    expect(readFileSync(join(folder, 'secret'), 'utf8')).toBe(first);
    expect(statSync(join(folder, 'secret')).mode & 0o777).toBe(0o600);
  });

  it('of the settings goes before it', async () => {
    vi.stubEnv('WAYPOST_SECRET', 'zq8fK2mWx7Rb4Tn9Vc1Yh6Lp3Jd5Gs0a');
    expect(await secret()).toBe('zq8fK2mWx7Rb4Tn9Vc1Yh6Lp3Jd5Gs0a');
  });

  it.each(['secret', 'x'.repeat(64), 'abababababababababababababababababab'])(
    'is refused where it is weak: %s',
    async (weak) => {
      vi.stubEnv('WAYPOST_SECRET', weak);
      await expect(secret()).rejects.toThrow('too weak');
    },
  );
});
