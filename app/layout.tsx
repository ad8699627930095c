import type { Metadata, Viewport } from 'next';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { lookCss, lookFrom } from '@/lib/look/css';
import { dark, light } from '@/lib/look/tokens';
import { shell } from '@/lib/text/en/pages';
import './globals.css';

export const metadata: Metadata = {
  title: { default: shell.product, template: shell.titleTemplate },
  description: shell.description,
};

export const viewport: Viewport = {
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: light.board },
    { media: '(prefers-color-scheme: dark)', color: dark.board },
  ],
};

/** Reading the cookie makes every page dynamic, which the nonce of the content security policy needs. */
export default async function RootLayout({ children }: { readonly children: ReactNode }) {
  const look = lookFrom((await cookies()).get('look')?.value);
  return (
    <html lang="en" data-look={look}>
      <head>
        <link rel="preload" as="font" type="font/woff2" href="/fonts/archivo.woff2" crossOrigin="anonymous" />
        <style>{lookCss()}</style>
      </head>
      <body>{children}</body>
    </html>
  );
}
