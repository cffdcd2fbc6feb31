import { runInNewContext } from 'node:vm';
import { describe, expect, it } from 'vitest';
import { otherTheme, THEME_KEY, THEME_SCRIPT } from '@/components/ui/theme';

describe('otherTheme', () => {
  it.each([
    [undefined, 'light', 'dark'],
    [undefined, 'dark', 'light'],
    ['light', 'dark', 'dark'],
    ['dark', 'light', 'light'],
    ['sepia', 'dark', 'light'],
  ] as const)('chosen %s on a %s system leads to %s', (chosen, system, expected) => {
    expect(otherTheme(chosen, system)).toBe(expected);
  });
});

describe('the script before the first paint', () => {
  /** What the script leaves in data-theme when storage gives `stored`, or is forbidden. */
  function themeAfter(stored: string | null | 'forbidden'): string | undefined {
    const document: { documentElement: { dataset: { theme?: string } } } = { documentElement: { dataset: {} } };
    const getItem = (key: string): string | null => {
      if (stored === 'forbidden') throw new Error('Storage is forbidden.');
      return key === THEME_KEY ? stored : null;
    };
    runInNewContext(THEME_SCRIPT, { document, localStorage: { getItem } });
    return document.documentElement.dataset.theme;
  }

  it.each([
    ['dark', 'dark'],
    ['light', 'light'],
    ['sepia', undefined],
    [null, undefined],
    ['forbidden', undefined],
  ])('makes of %s the theme %s', (stored, expected) => {
    expect(themeAfter(stored)).toBe(expected);
  });
});
