/** The theme a person chose; `device` follows the machine and is the absence of a choice. */
export type Theme = 'paper' | 'night' | 'device';

export const themeCookie = 'halfmark_theme';

/** Reads the cookie's value; anything else than the two themes means no choice. */
export function readTheme(value: string | undefined): Theme {
  return value === 'paper' || value === 'night' ? value : 'device';
}
