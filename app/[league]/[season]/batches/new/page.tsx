import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { getBatchOptions } from '@/lib/use-cases/batches/list-batches';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { BatchForm } from '../_components/batch-form';
import { holdBatchAction } from '../actions';

export const metadata: Metadata = { title: 'Make a batch' };

type Props = { params: Promise<{ league: string; season: string }> };

export default async function NewBatchPage({ params }: Props) {
  const { league, season } = await params;
  const { ctx } = await requireLeague(league, paths.newBatch(league, season));
  const options = await showNotFound(getBatchOptions(ctx, { season, batchId: null }));
  return (
    <>
      <PageHeader
        title="Make a batch"
        subtitle="The batch is held until you release it; teams can still be added and taken out."
        back={<BackLink href={paths.batches(league, season)}>Batches</BackLink>}
      />
      <BatchForm
        league={league}
        season={season}
        options={options}
        start={{
          teamIds: options.teams.map((team) => team.id),
          shopId: options.shops.length === 1 ? (options.shops[0]?.id ?? '') : '',
          promisedOn: '',
        }}
        held={null}
        onHold={holdBatchAction}
        onChange={null}
      />
    </>
  );
}
