'use client';

import { useQuery } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useEffect, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { BundleProgress } from '@/lib/domain/batch/bundle-progress';

/**
 * How far a bundle is, asked for every second while it is being made; the page is read again when it is ready. It may
 * be left: the worker goes on. Props: `stateUrl`, the `initial` progress, `onRetry` when a failed build may be tried
 * again (answers with a sentence when that failed).
 */
export function BundlePanel({
  stateUrl,
  initial,
  onRetry,
}: {
  stateUrl: string;
  initial: BundleProgress;
  onRetry: () => Promise<string | undefined>;
}) {
  const router = useRouter();
  const [retrying, setRetrying] = useState(false);
  const [failure, setFailure] = useState<string>();
  const { data, isError, refetch } = useQuery({
    queryKey: ['bundle', stateUrl],
    queryFn: async ({ signal }): Promise<BundleProgress> => {
      const response = await fetch(stateUrl, { signal });
      if (!response.ok) throw new Error(String(response.status));
      return (await response.json()) as BundleProgress;
    },
    initialData: initial,
    refetchInterval: (query) => (['ready', 'failed'].includes(query.state.data?.state ?? '') ? false : 1000),
  });

  const wasReady = useRef(initial.state === 'ready');
  useEffect(() => {
    if (data.state !== 'ready' || wasReady.current) return;
    wasReady.current = true;
    router.refresh();
  }, [data.state, router]);

  if (data.state === 'ready') return null;
  if (data.state === 'failed') {
    const retry = async () => {
      setRetrying(true);
      setFailure(await onRetry());
      setRetrying(false);
      await refetch();
    };
    return (
      <Notice
        tone="stop"
        title="The bundle is not made"
        live="polite"
        action={
          <Button size="sm" pending={retrying} onClick={() => void retry()}>
            Try again
          </Button>
        }
      >
        {failure ?? data.failure}
      </Notice>
    );
  }
  const says =
    data.state === 'queued'
      ? 'Waiting for a worker to take it.'
      : `${data.doing}: ${data.done} of ${data.total} steps`;
  return (
    <div className="px-4 py-4">
      <p className="font-[600]">The bundle is being made</p>
      <p className="text-dusk type-small mt-0.5">{says}</p>
      <progress
        className="bundle-progress mt-3 block w-full"
        max={Math.max(data.total, 1)}
        value={data.done}
        aria-label="Bundle"
      >
        {data.done} of {data.total}
      </progress>
      <p className="type-fine text-dusk mt-2" role="status">
        {isError
          ? 'The connection is lost; asking again.'
          : 'You can leave this page; it goes on without you.'}
      </p>
    </div>
  );
}
