'use client';

import { PageFailure } from '@/components/status/page-failure';
import { fontVariables } from './fonts';
import './globals.css';

/** Stands in for the whole document when the root layout itself fails. */
export default function GlobalError({ error, retry }: { error: unknown; retry: () => void }) {
  return (
    <html lang="en-GB" className={fontVariables}>
      <body>
        <title>Raglan</title>
        <main id="content">
          <PageFailure error={error} retry={retry} title="Raglan could not start this page" />
        </main>
      </body>
    </html>
  );
}
