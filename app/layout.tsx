import type { Metadata, Viewport } from 'next';
import { headers } from 'next/headers';
import { connection } from 'next/server';
import type { ReactNode } from 'react';
import { SiteFooter } from '@/components/site/site-footer';
import { SiteHeader } from '@/components/site/site-header';
import { themeScript } from '@/lib/client/theme';
import { mono, sans, serif, serifGreek } from './fonts';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Smirr: nonlinear systems under noise', template: '%s · Smirr' },
  description:
    'What a noise level does to a nonlinear system: density, spectrum, exit times, each number with its error bar.',
};

export const viewport: Viewport = {
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#fbfaf6' },
    { media: '(prefers-color-scheme: dark)', color: '#12181e' },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  // The content security policy has a nonce per request, so no page is rendered ahead of its request.
  await connection();
  const nonce = (await headers()).get('x-nonce') ?? undefined;
  const faces = `${serif.variable} ${serifGreek.variable} ${sans.variable} ${mono.variable}`;
  return (
    <html lang="en" className={faces} suppressHydrationWarning>
      <head>
        {/* biome-ignore lint/security/noDangerouslySetInnerHtml: a constant of ours; it must run before the first paint */}
        <script nonce={nonce} suppressHydrationWarning dangerouslySetInnerHTML={{ __html: themeScript }} />
      </head>
      <body>
        <a href="#main" className="sr-only focus:not-sr-only focus:absolute focus:z-10 focus:bg-paper focus:p-3">
          Skip to the content
        </a>
        <SiteHeader />
        <main id="main" className="mx-auto min-h-dvh w-full max-w-[1400px] grow px-4 sm:px-7">
          {children}
        </main>
        <SiteFooter />
      </body>
    </html>
  );
}
