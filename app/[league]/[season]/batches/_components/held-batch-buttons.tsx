'use client';

import { useRouter } from 'next/navigation';
import { Button } from '@/components/ui/button';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { useToast } from '@/components/ui/toast';
import { countOf } from '@/lib/domain/text/count-of';
import type { LeagueAction } from '@/lib/web/action-result';

type Act = LeagueAction<{ batchId: string }, { code: string }>;

/** Discard and release for a held batch; both ask once and say what they do. */
export function HeldBatchButtons({
  league,
  batch,
  teams,
  listPath,
  onRelease,
  onDiscard,
}: {
  league: string;
  batch: { id: string; code: string; shop: string };
  teams: string[];
  listPath: string;
  onRelease: Act;
  onDiscard: Act;
}) {
  const router = useRouter();
  const showToast = useToast();
  const count = countOf(teams.length, 'team');

  const release = async () => {
    const answer = await onRelease(league, { batchId: batch.id });
    if (!answer.ok) return answer.error.message;
    showToast({ tone: 'set', title: `Batch ${batch.code} is released to ${batch.shop}` });
    router.refresh();
  };
  const discard = async () => {
    const answer = await onDiscard(league, { batchId: batch.id });
    if (!answer.ok) return answer.error.message;
    showToast({ tone: 'set', title: `Batch ${batch.code} is discarded; ${count} can go into another one` });
    router.push(listPath);
  };

  return (
    <>
      <ConfirmDialog
        title={`Discard batch ${batch.code}?`}
        confirm={`Discard ${batch.code}`}
        onConfirm={discard}
        trigger={<Button look="quiet">Discard</Button>}
      >
        <p>The list of {count} and the promised day are lost. The rosters stay as they are.</p>
      </ConfirmDialog>
      <ConfirmDialog
        title={`Release ${count} to ${batch.shop}?`}
        confirm={`Release ${count}`}
        cancel="Not yet"
        onConfirm={release}
        trigger={
          <Button look="primary" unavailable={teams.length === 0 ? 'Add a team first.' : undefined}>
            Release {count}
          </Button>
        }
      >
        <p>
          {teams.slice(0, 12).join(', ')}
          {teams.length > 12 && ` and ${teams.length - 12} more`}.
        </p>
        <p className="mt-2">
          The rosters are frozen and the batch never changes again: the shop orders and presses from it.
        </p>
      </ConfirmDialog>
    </>
  );
}
