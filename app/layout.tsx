import type { Metadata, Viewport } from 'next';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { isTheme, THEME_COOKIE } from '@/lib/theme';
import { figureFont, headingFont, textFont } from './fonts';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Marlwick', template: '%s · Marlwick' },
  description: 'The daily log, dose plan and check of a drinking-water plant.',
};

export const viewport: Viewport = { width: 'device-width', initialScale: 1 };

export default async function RootLayout({ children }: { children: ReactNode }) {
  const chosen = (await cookies()).get(THEME_COOKIE)?.value;
  return (
    <html
      lang="en-GB"
      data-theme={isTheme(chosen) ? chosen : undefined}
      className={`${textFont.variable} ${figureFont.variable} ${headingFont.variable}`}
    >
      <body>{children}</body>
    </html>
  );
}
