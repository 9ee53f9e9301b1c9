import type { Metadata } from 'next';
import { BatchDetailView } from '@/components/batch/batch-detail';
import { ButtonLink } from '@/components/ui/button';
import { BackLink } from '@/components/ui/text-link';
import { getBatch } from '@/lib/use-cases/batches/get-batch';
import { paths } from '@/lib/web/paths';
import { showNotFound } from '@/lib/web/show-not-found';
import { requireLeague } from '@/lib/web/session';
import { HeldBatchButtons } from '../_components/held-batch-buttons';
import { discardBatchAction, markBatchAction, rebuildBundleAction, releaseBatchAction } from '../actions';

type Props = { params: Promise<{ league: string; season: string; batch: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: `Batch ${(await params).batch.toUpperCase()}` };
}

export default async function BatchPage({ params }: Props) {
  const { league, season, batch: code } = await params;
  const { ctx } = await requireLeague(league, paths.batch(league, season, code));
  const detail = await showNotFound(getBatch(ctx, { code }));
  const { batch, heldTeams, may } = detail;
  return (
    <BatchDetailView
      detail={detail}
      league={ctx.league}
      back={<BackLink href={paths.batches(league, season)}>Batches</BackLink>}
      onMark={markBatchAction.bind(null, league)}
      onRebuild={rebuildBundleAction.bind(null, league)}
      heldActions={
        batch.state === 'held' && may.change ? (
          <>
            <ButtonLink href={`${paths.batch(league, season, code)}/edit`}>Change teams</ButtonLink>
            <HeldBatchButtons
              league={league}
              batch={{ id: batch.id, code: batch.code, shop: batch.shop.name }}
              teams={heldTeams.map((team) => team.name)}
              listPath={paths.batches(league, season)}
              onRelease={releaseBatchAction}
              onDiscard={discardBatchAction}
            />
          </>
        ) : null
      }
    />
  );
}
