'use client';

import { useRouter } from 'next/navigation';
import { Button } from '@/components/ui/button';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { useToast } from '@/components/ui/toast';
import type { ActionResult } from '@/lib/web/action-result';

type Answer = Promise<ActionResult<{ version: number }>>;

/** Discard a draft, or put it in force; both ask once. */
export function DraftButtons({
  league,
  ruleSetId,
  draft,
  inForce,
  onDiscard,
  onPutInForce,
}: {
  league: string;
  ruleSetId: string;
  draft: { version: number; rowVersion: number };
  inForce: number | null;
  onDiscard: ((league: string, input: { ruleSetId: string }) => Answer) | null;
  onPutInForce: (league: string, input: { ruleSetId: string; rowVersion: number }) => Answer;
}) {
  const router = useRouter();
  const showToast = useToast();
  const finish = async (answer: Awaited<Answer>, title: string) => {
    if (!answer.ok) return answer.error.message;
    showToast({ tone: 'set', title });
    router.refresh();
  };
  return (
    <>
      {onDiscard && (
        <ConfirmDialog
          title={`Discard draft ${draft.version}?`}
          confirm="Discard the draft"
          onConfirm={async () =>
            finish(await onDiscard(league, { ruleSetId }), `Draft ${draft.version} is discarded`)
          }
          trigger={<Button look="quiet">Discard the draft</Button>}
        >
          What you changed since version {inForce ?? draft.version - 1} is lost. The version in force stays.
        </ConfirmDialog>
      )}
      <ConfirmDialog
        title={`Put version ${draft.version} in force?`}
        confirm={`Put version ${draft.version} in force`}
        cancel="Not yet"
        onConfirm={async () =>
          finish(
            await onPutInForce(league, { ruleSetId, rowVersion: draft.rowVersion }),
            `Version ${draft.version} is in force`,
          )
        }
        trigger={<Button look="primary">Put version {draft.version} in force</Button>}
      >
        From now on every roster of its divisions is checked against it
        {inForce === null ? '' : `, and version ${inForce} is superseded`}. A version in force never changes;
        a later change is a new version. Rosters that are signed off stay signed off.
      </ConfirmDialog>
    </>
  );
}
