import '@fontsource-variable/archivo/wdth.css';
import '@fontsource/atkinson-hyperlegible-next/400.css';
import '@fontsource/atkinson-hyperlegible-next/400-italic.css';
import '@fontsource/atkinson-hyperlegible-next/700.css';
import '@fontsource/atkinson-hyperlegible-mono/400.css';
import '@fontsource/atkinson-hyperlegible-mono/700.css';
import './globals.css';
import type { Metadata, Viewport } from 'next';
import type { ReactNode } from 'react';
import { cookies } from 'next/headers';
import { palette } from '@/tailwind.config';
import { THEME_COOKIE, themeFrom } from '@/components/shell/theme';

/** A page rendered at build time has no nonce, and the content security policy would block its scripts. */
export const dynamic = 'force-dynamic';

export const metadata: Metadata = {
  title: { default: 'Carryover', template: '%s · Carryover' },
  description: 'Find out why a compressor passes oil or fails before anybody fits another one, and prove that the repair held.',
  robots: { index: false },
};

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: palette.light.paper },
    { media: '(prefers-color-scheme: dark)', color: palette.dark.paper },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  const theme = themeFrom((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <html lang="en" data-theme={theme === 'device' ? undefined : theme}>
      <body>{children}</body>
    </html>
  );
}
