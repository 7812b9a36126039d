'use client';

import { useSyncExternalStore } from 'react';
import { THEME_COOKIE, themeFromCookie, type Theme } from './theme';

const DARK = '(prefers-color-scheme: dark)';
const A_YEAR_S = 31_536_000;

/** The theme now shown, for what cannot read CSS variables (the canvas). Paper on the server. */
export function useTheme(): Theme {
  return useSyncExternalStore(subscribe, shownTheme, () => 'paper');
}

/** What was chosen, null for "as the system". */
export function useChosenTheme(): Theme | null {
  return useSyncExternalStore(subscribe, chosenTheme, () => null);
}

/** Shows the theme at once and keeps it for later visits; null returns to the system's. */
export function chooseTheme(theme: Theme | null): void {
  const root = document.documentElement;
  if (theme) root.dataset.theme = theme;
  else delete root.dataset.theme;
  const age = theme ? A_YEAR_S : 0;
  document.cookie = `${THEME_COOKIE}=${theme ?? ''}; path=/; max-age=${age}; samesite=lax`;
}

const chosenTheme = (): Theme | null => themeFromCookie(document.documentElement.dataset.theme);

const shownTheme = (): Theme =>
  chosenTheme() ?? (window.matchMedia(DARK).matches ? 'night' : 'paper');

function subscribe(changed: () => void): () => void {
  const system = window.matchMedia(DARK);
  const attribute = new MutationObserver(changed);
  attribute.observe(document.documentElement, { attributeFilter: ['data-theme'] });
  system.addEventListener('change', changed);
  return () => {
    attribute.disconnect();
    system.removeEventListener('change', changed);
  };
}
