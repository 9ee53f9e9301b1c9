'use client';

import { useQuery } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useEffect, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { Progress } from '@/components/ui/progress';
import type { BundleProgress } from '@/lib/domain/batch/bundle-progress';

/**
 * How far a bundle is, asked for every second while it is being made; the page is read again when it is ready. It may
 * be left: the worker goes on. Props: `stateUrl`, the `initial` progress, `batchId` and `onRetry` to try a
 * failed build again.
 */
export function BundlePanel({
  stateUrl,
  batchId,
  initial,
  onRetry,
}: {
  stateUrl: string;
  initial: BundleProgress;
  batchId: string;
  onRetry: (input: { batchId: string }) => Promise<{ ok: true } | { ok: false; error: { message: string } }>;
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
      try {
        const answer = await onRetry({ batchId });
        setFailure(answer.ok ? undefined : answer.error.message);
        await refetch();
      } catch {
        setFailure('That did not reach the server. Check the connection and try again.');
      } finally {
        setRetrying(false);
      }
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
  return (
    <div className="p-4">
      <Progress
        label={
          // Read aloud when the work itself changes, not with every count.
          <span role="status">
            {data.state === 'queued' ? 'The bundle waits for a worker' : `Making: ${data.doing}`}
          </span>
        }
        done={data.done}
        total={data.total === 0 ? null : data.total}
        unit="steps"
        hint={
          isError
            ? 'The connection is lost; asking again.'
            : 'You can leave this page; it goes on without you.'
        }
      />
    </div>
  );
}
