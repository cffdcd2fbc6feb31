/** Where links may lead, and who sees the mailbox. */
import { describe, expect, it } from 'vitest';
import { hasMailbox, ownPath } from '@/lib/site-address';

describe('a page to go on to', () => {
  it.each(['/studies', '/invitation/abc-DEF_1', '/studies?cursor=a%20b&trash=1'])('%s is ours', (path) => {
    expect(ownPath(path, '/')).toBe(path);
  });

  it.each([
    'https://other.example',
    '//other.example',
    '/\\other.example',
    '/\t/other.example',
    'javascript:alert(1)',
    'studies',
    '',
    undefined,
  ])('%s is not', (path) => {
    expect(ownPath(path, '/studies')).toBe('/studies');
  });
});

describe('the mailbox', () => {
  const local = { host: 'localhost:3000', 'x-waypost-address': '127.0.0.1' };

  it('is seen on this machine', () => {
    expect(hasMailbox(new Headers(local))).toBe(true);
    expect(hasMailbox(new Headers({ ...local, 'x-forwarded-for': '::1' }))).toBe(true);
  });

  it.each([
    ['from another machine', { ...local, 'x-waypost-address': '192.0.2.7' }],
    ['through a proxy on this machine', { ...local, 'x-forwarded-for': '192.0.2.7, 127.0.0.1' }],
    ['under a name of the site', { ...local, host: 'waypost.example' }],
    ['from nowhere', { host: 'localhost:3000' }],
  ])('is not seen %s', (_, headers) => {
    expect(hasMailbox(new Headers(headers))).toBe(false);
  });
});
