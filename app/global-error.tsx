'use client';

import { ErrorBody } from '@/components/ui/ErrorBody';
import { lookCss } from '@/lib/look/css';
import { shell } from '@/lib/text/en/pages';
import './globals.css';

/** Stands in for the whole page when the root layout itself breaks. */
export default function GlobalError({ error, retry }: { readonly error: unknown; readonly retry: () => void }) {
  return (
    <html lang="en">
      <head>
        <title>{shell.product}</title>
        <style>{lookCss()}</style>
      </head>
      <body>
        <ErrorBody error={error} retry={retry} />
      </body>
    </html>
  );
}
