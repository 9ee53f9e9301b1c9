import type { Metadata, Viewport } from 'next';
import { headers } from 'next/headers';
import type { ReactNode } from 'react';
import { Providers } from '@/components/providers';
import { fontVariables } from './fonts';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Raglan', template: '%s · Raglan' },
  description:
    'One kit plan for a whole league: rosters checked as they are entered, and everything the decorator needs.',
};

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  viewportFit: 'cover',
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#fbfaf6' },
    { media: '(prefers-color-scheme: dark)', color: '#171512' },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  // Reading the headers also makes every page render per request, which a nonce needs.
  const nonce = (await headers()).get('x-nonce') ?? undefined;
  return (
    <html lang="en-GB" className={fontVariables}>
      <body>
        <Providers nonce={nonce}>{children}</Providers>
      </body>
    </html>
  );
}
