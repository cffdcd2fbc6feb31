/** The same address in other dress is the same person; what only looks like another's is refused. */
import { describe, expect, it } from 'vitest';
import { emailKeyOf } from '@/lib/email-address';

describe('an address', () => {
  it.each([
    ['in odd case', 'Maren@Lantern-Quay.EXAMPLE'],
    ['with spaces around it', '  maren@lantern-quay.example '],
    ['in full-width letters', 'ｍａｒｅｎ＠ｌａｎｔｅｒｎ－ｑｕａｙ．ｅｘａｍｐｌｅ'],
    ['with a letter of mathematics', '𝐦aren@lantern-quay.example'],
  ])('%s is the same', (_, text) => {
    expect(emailKeyOf(text)).toBe('maren@lantern-quay.example');
  });

  it.each([
    ['with a Cyrillic a', 'mаren@lantern-quay.example'],
    ['with a Greek nu', 'mareν@lantern-quay.example'],
    ['with a Cyrillic letter in the domain', 'maren@lаntern-quay.example'],
    ['with a dotless i', 'marın@lantern-quay.example'],
    ['with a letter that is not seen', 'ma\u200bren@lantern-quay.example'],
    ['with an accent', 'marén@lantern-quay.example'],
    ['with a line break', 'maren@lantern-quay.example\nbcc: other@lantern-quay.example'],
    ['of two', 'maren@lantern-quay.example, other@lantern-quay.example'],
    ['without a domain', 'maren'],
    ['without a name', '@lantern-quay.example'],
    ['of nothing', ''],
    [
      'that is too long',
      `${'a'.repeat(60)}@${'b'.repeat(60)}.${'c'.repeat(60)}.${'d'.repeat(60)}.${'e'.repeat(60)}.example`,
    ],
  ])('%s is refused at its field', (_, text) => {
    expect(() => emailKeyOf(text)).toThrow(expect.objectContaining({ code: 'invalid-request' }));
  });
});
