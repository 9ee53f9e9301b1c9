'use client';

import { PageFailure } from '@/components/status/page-failure';

export default function RootError({ error, retry }: { error: unknown; retry: () => void }) {
  return (
    <main id="content">
      <PageFailure error={error} retry={retry} />
    </main>
  );
}
