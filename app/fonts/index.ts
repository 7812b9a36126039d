import localFont from 'next/font/local';

/**
 * Source Sans 3 in three files, each loaded only when a page needs its letters. The Latin file has
 * no ≤, ≥ or → and the Greek file brings Ω and μ, so text says "at most" and "at least" in words.
 * The Greek and extended stacks come first: their unicode ranges keep them from answering for
 * anything else, while the Latin stack ends in a size-matched fallback that would.
 */
const latin = localFont({
  variable: '--font-latin',
  display: 'swap',
  src: [
    { path: './source-sans-3-latin-400-normal.woff2', weight: '400' },
    { path: './source-sans-3-latin-600-normal.woff2', weight: '600' },
    { path: './source-sans-3-latin-700-normal.woff2', weight: '700' },
  ],
});

const latinExt = localFont({
  variable: '--font-latin-ext',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0100-0130, U+0132-0151, U+0154-02BA, U+02BD-02C5, U+02C7-02CC, U+02CE-02D7, U+1E00-1E9F, U+1EF2-1EFF, U+2113',
    },
  ],
  src: [
    { path: './source-sans-3-latin-ext-400-normal.woff2', weight: '400' },
    { path: './source-sans-3-latin-ext-600-normal.woff2', weight: '600' },
    { path: './source-sans-3-latin-ext-700-normal.woff2', weight: '700' },
  ],
});

const greek = localFont({
  variable: '--font-greek',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0370-03FF' }],
  src: [
    { path: './source-sans-3-greek-400-normal.woff2', weight: '400' },
    { path: './source-sans-3-greek-600-normal.woff2', weight: '600' },
    { path: './source-sans-3-greek-700-normal.woff2', weight: '700' },
  ],
});

/** Classes for <html>; globals.css joins the three stacks into `--font-sans`. */
export const fontVariables = `${latin.variable} ${latinExt.variable} ${greek.variable}`;
