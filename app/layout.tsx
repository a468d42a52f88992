import type { Metadata, Viewport } from 'next';
import localFont from 'next/font/local';
import { headers } from 'next/headers';
import type { ReactNode } from 'react';
import './globals.css';

const publicSans = localFont({
  src: '../node_modules/@fontsource-variable/public-sans/files/public-sans-latin-wght-normal.woff2',
  variable: '--font-public-sans',
  weight: '100 900',
  display: 'swap',
});

const newsreader = localFont({
  src: [
    {
      path: '../node_modules/@fontsource-variable/newsreader/files/newsreader-latin-wght-normal.woff2',
      style: 'normal',
      weight: '200 800',
    },
    {
      path: '../node_modules/@fontsource-variable/newsreader/files/newsreader-latin-wght-italic.woff2',
      style: 'italic',
      weight: '200 800',
    },
  ],
  variable: '--font-newsreader',
  display: 'swap',
});

export const metadata: Metadata = {
  title: { default: 'Leadline', template: '%s · Leadline' },
  description:
    'How much of a poll’s printed lead is really there, and what sentence may be printed about it.',
  robots: { index: false, follow: false },
  icons: { icon: '/favicon.svg' },
};

export const viewport: Viewport = {
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#fbf8f1' },
    { media: '(prefers-color-scheme: dark)', color: '#0f1c24' },
  ],
};

/** Bare: embeds carry no chrome. Reading the headers makes every page dynamic, so that its scripts get a nonce. */
export default async function RootLayout({ children }: { children: ReactNode }) {
  await headers();
  return (
    <html lang="en" className={`${publicSans.variable} ${newsreader.variable}`}>
      <body>{children}</body>
    </html>
  );
}
