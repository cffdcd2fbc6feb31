import { describe, expect, it } from 'vitest';
import { contentPolicy } from '@/lib/content-policy';

/** The sources of one directive. */
function directive(policy: string, name: string): readonly string[] {
  const found = policy.split('; ').find((each) => each.startsWith(`${name} `));
  return found?.split(' ').slice(1) ?? [];
}

describe('contentPolicy', () => {
  it('lets scripts run by nonce and never because they stand in the page', () => {
    const scripts = directive(contentPolicy('abc', { development: false }), 'script-src');
    expect(scripts).toContain("'nonce-abc'");
    expect(scripts).not.toContain("'unsafe-inline'");
    expect(scripts).not.toContain("'unsafe-eval'");
  });

  it.each(['default-src', 'img-src', 'font-src', 'connect-src', 'worker-src', 'style-src', 'form-action'])(
    'fetches nothing from another site by %s',
    (name) => {
      const sources = directive(contentPolicy('abc', { development: false }), name);
      expect(sources).toContain("'self'");
      expect(sources.filter((source) => !["'self'", "'unsafe-inline'", 'data:', 'blob:'].includes(source))).toEqual([]);
    },
  );

  it('lets nobody frame a page', () => {
    expect(directive(contentPolicy('abc', { development: false }), 'frame-ancestors')).toEqual(["'none'"]);
  });
});
