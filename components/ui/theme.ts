/** The theme a person chose is kept in a cookie, so that the server already draws it. */
export const THEME_COOKIE = 'theme';

export const THEMES = ['paper', 'night'] as const;
export type Theme = (typeof THEMES)[number];

/** What the cookie says; null follows the system. */
export const themeFromCookie = (value: string | undefined): Theme | null =>
  THEMES.find((theme) => theme === value) ?? null;

/** `--margin` of globals.css, for the few places that take a colour and not a variable. */
export const MARGIN_COLOR: Record<Theme, string> = { paper: '#f4f0e5', night: '#111816' };
