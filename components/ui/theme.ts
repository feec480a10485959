/** The theme a person chose; `device` follows the machine and is the absence of a choice. */
export type Theme = 'paper' | 'night' | 'device';

export const themeCookie = 'halfmark_theme';

/** Reads the cookie's value; anything else than the two themes means no choice. */
export function readTheme(value: string | undefined): Theme {
  return value === 'paper' || value === 'night' ? value : 'device';
}

const year = 365 * 24 * 3600;

/** In the browser: sets the theme of the page at once and keeps it in a cookie for a year; `device` forgets it. */
export function applyTheme(theme: Theme): void {
  if (theme === 'device') delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
  const life = theme === 'device' ? 0 : year;
  document.cookie = `${themeCookie}=${theme}; path=/; max-age=${life}; samesite=lax`;
}
