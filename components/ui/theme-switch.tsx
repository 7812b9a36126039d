'use client';

import { themeFromCookie } from './theme';
import { chooseTheme, useChosenTheme } from './use-theme';

/** Paper, night or as the system; a plain choice that works before anything else has loaded. */
export function ThemeSwitch() {
  const chosen = useChosenTheme();
  return (
    <label className="inline-flex min-h-11 items-center gap-1.5 whitespace-nowrap">
      <span className="text-ink-soft max-sm:sr-only">Theme</span>
      <select
        className="min-h-11 cursor-pointer bg-transparent pr-1 text-ink"
        value={chosen ?? ''}
        onChange={(event) => chooseTheme(themeFromCookie(event.target.value))}
      >
        <option value="">system</option>
        <option value="paper">paper</option>
        <option value="night">night</option>
      </select>
    </label>
  );
}
