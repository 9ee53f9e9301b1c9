import type { Metadata } from 'next';
import { BatchDetailView } from '@/components/batch/batch-detail';
import { BackLink } from '@/components/ui/text-link';
import { getBatch } from '@/lib/use-cases/batches/get-batch';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { markShopBatchAction, rebuildShopBundleAction } from '../../actions';

type Props = { params: Promise<{ league: string; batch: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: `Batch ${(await params).batch.toUpperCase()}` };
}

export default async function ShopBatchPage({ params }: Props) {
  const { league, batch: code } = await params;
  const { ctx } = await requireLeague(league, paths.shopBatch(league, code));
  const detail = await showNotFound(getBatch(ctx, { code }));
  return (
    <BatchDetailView
      detail={detail}
      league={ctx.league}
      back={<BackLink href={paths.shop()}>All batches</BackLink>}
      onMark={markShopBatchAction.bind(null, league)}
      onRebuild={rebuildShopBundleAction.bind(null, league)}
      heldActions={null}
    />
  );
}
