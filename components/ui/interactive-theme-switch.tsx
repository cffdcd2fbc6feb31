'use client';

import { otherTheme, THEME_KEY } from './theme';

/** Goes to the other theme and keeps the choice, unless the system says the same anyway. */
function switchTheme(): void {
  const root = document.documentElement;
  const system = matchMedia('(prefers-color-scheme: dark)').matches ? 'dark' : 'light';
  const theme = otherTheme(root.dataset.theme, system);
  if (theme === system) delete root.dataset.theme;
  else root.dataset.theme = theme;
  try {
    if (theme === system) localStorage.removeItem(THEME_KEY);
    else localStorage.setItem(THEME_KEY, theme);
  } catch {
    // Storage is forbidden: the choice holds for this page only.
  }
}

/** Names the theme that it leads to. Both names are drawn and CSS shows one, so the server need not know which. */
export function InteractiveThemeSwitch() {
  return (
    <button
      type="button"
      onClick={switchTheme}
      className="needs-scripts min-h-11 min-w-11 cursor-pointer px-1 hover:underline"
    >
      <span className="dark:hidden">
        Dark<span className="sr-only"> theme</span>
      </span>
      <span className="hidden dark:inline">
        Light<span className="sr-only"> theme</span>
      </span>
    </button>
  );
}
