import type { Metadata, Viewport } from 'next';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { MARGIN_COLOR, THEME_COOKIE, themeFromCookie, type Theme } from '@/components/ui/theme';
import { fontVariables } from './fonts';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Stillground', template: '%s · Stillground' },
  description:
    'Plans, checks and prints the temporary ground systems that a flammable-liquid transfer needs.',
};

async function chosenTheme(): Promise<Theme | null> {
  return themeFromCookie((await cookies()).get(THEME_COOKIE)?.value);
}

/** The browser's own bars take the margin's colour of the theme that is shown. */
export async function generateViewport(): Promise<Viewport> {
  const theme = await chosenTheme();
  return {
    themeColor: theme
      ? MARGIN_COLOR[theme]
      : [
          { media: '(prefers-color-scheme: light)', color: MARGIN_COLOR.paper },
          { media: '(prefers-color-scheme: dark)', color: MARGIN_COLOR.night },
        ],
  };
}

export default async function RootLayout({ children }: { children: ReactNode }) {
  const theme = await chosenTheme();
  return (
    <html lang="en" className={fontVariables} data-theme={theme ?? undefined}>
      <body>{children}</body>
    </html>
  );
}
