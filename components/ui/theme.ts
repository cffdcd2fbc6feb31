/** Light or dark: what the reader chose, or else what their system says. */

export type Theme = 'light' | 'dark';

/** Where the choice is kept; nothing is kept while it is the system's own. */
export const THEME_KEY = 'theme';

/** Runs before the first paint, so that a chosen theme never flashes in late. Storage may be forbidden: then the system decides. */
export const THEME_SCRIPT = `try{const t=localStorage.getItem('${THEME_KEY}');if(t==='light'||t==='dark')document.documentElement.dataset.theme=t}catch{}`;

/** The theme to go to from what is chosen (if anything) and what the system says. */
export function otherTheme(chosen: string | undefined, system: Theme): Theme {
  const shown = chosen === 'light' || chosen === 'dark' ? chosen : system;
  return shown === 'light' ? 'dark' : 'light';
}
