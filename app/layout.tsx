import type { Metadata, Viewport } from 'next';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { readTheme, themeCookie } from '@/components/ui/theme';
import { ThemeSwitch } from '@/components/ui/theme-switch';
import { ToastProvider } from '@/components/ui/toast';
import { latinFace } from './typefaces';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Halfmark', template: '%s · Halfmark' },
  description: 'Checks and marks spin-½ homework.',
  icons: { icon: '/icon.svg' },
  robots: { index: false },
  referrer: 'same-origin',
};

export const viewport: Viewport = {
  colorScheme: 'light dark',
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#fbf8f1' },
    { media: '(prefers-color-scheme: dark)', color: '#1b2220' },
  ],
};

/**
 * Around every page: language, theme from the cookie (so that nothing flashes), skip link, toasts, foot. Reading the
 * cookie also makes every page dynamic, without which its scripts could not bear the request's nonce.
 */
export default async function RootLayout({ children }: { children: ReactNode }) {
  const theme = readTheme((await cookies()).get(themeCookie)?.value);
  return (
    <html
      lang="en"
      className={latinFace.variable}
      data-theme={theme === 'device' ? undefined : theme}
      suppressHydrationWarning
    >
      <body>
        <a
          href="#main"
          className="sr-only focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-20 focus:bg-field focus:px-4 focus:py-2"
        >
          Skip to the page
        </a>
        <ToastProvider>
          {children}
          <footer className="page-foot mx-auto flex w-full max-w-page flex-wrap items-baseline justify-between gap-x-8 gap-y-1 border-t border-hairline px-(--gutter) py-4 text-note text-grey">
            <p>Automatic verdicts are advice until a policy or a person makes them marks.</p>
            <ThemeSwitch initial={theme} />
          </footer>
        </ToastProvider>
      </body>
    </html>
  );
}
