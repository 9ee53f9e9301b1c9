'use client';

import { PageFailure } from '@/components/status/page-failure';

export default function LeagueError({ error, retry }: { error: unknown; retry: () => void }) {
  return <PageFailure error={error} retry={retry} />;
}
