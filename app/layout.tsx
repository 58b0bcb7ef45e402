import '@fontsource/atkinson-hyperlegible/latin-ext-400.css';
import '@fontsource/atkinson-hyperlegible/latin-ext-700.css';
import './globals.css';
import type { Metadata, Viewport } from 'next';
import localFont from 'next/font/local';
import type { ReactNode } from 'react';

// Asked for with the page, and its stand-in measured to it: lines do not jump when it comes.
const atkinson = localFont({
  src: [
    {
      path: '../node_modules/@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-400-normal.woff2',
      weight: '400',
    },
    {
      path: '../node_modules/@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-700-normal.woff2',
      weight: '700',
    },
  ],
  variable: '--font-atkinson',
});

export const metadata: Metadata = {
  title: { default: 'Ruckle', template: '%s · Ruckle' },
  description:
    'A fitting journal: sew a muslin, read what the cloth says, change a little, see whether it worked.',
  robots: { index: false, follow: false },
};

// Each page carries a nonce of its own for its scripts, so none is made ahead of time.
export const dynamic = 'force-dynamic';

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#f2ede1' },
    { media: '(prefers-color-scheme: dark)', color: '#151a23' },
  ],
};

export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en" className={atkinson.variable}>
      <body>{children}</body>
    </html>
  );
}
