import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { getBatch } from '@/lib/use-cases/batches/get-batch';
import { getBatchOptions } from '@/lib/use-cases/batches/list-batches';
import { paths } from '@/lib/web/paths';
import { showNotFound } from '@/lib/web/show-not-found';
import { requireLeague } from '@/lib/web/session';
import { BatchForm } from '../../_components/batch-form';
import { changeBatchAction } from '../../actions';

export const metadata: Metadata = { title: 'Change a batch' };

type Props = { params: Promise<{ league: string; season: string; batch: string }> };

export default async function EditBatchPage({ params }: Props) {
  const { league, season, batch: code } = await params;
  const { ctx } = await requireLeague(league, `${paths.batch(league, season, code)}/edit`);
  const { batch, heldTeams } = await showNotFound(getBatch(ctx, { code }));
  // A link to this page that is older than the release leads to what the batch is now.
  if (batch.state !== 'held') redirect(paths.batch(league, season, code));
  const options = await showNotFound(getBatchOptions(ctx, { season, batchId: batch.id }));
  return (
    <>
      <PageHeader
        title={`Change batch ${batch.code}`}
        subtitle="Teams, shop and promised day can change until the batch is released."
        back={<BackLink href={paths.batch(league, season, code)}>Batch {batch.code}</BackLink>}
      />
      <BatchForm
        league={league}
        season={season}
        options={options}
        start={{
          teamIds: heldTeams.map((team) => team.id),
          shopId: batch.shop.id,
          promisedOn: batch.promisedOn ?? '',
        }}
        held={{ batchId: batch.id, code: batch.code, rowVersion: batch.rowVersion }}
        onHold={null}
        onChange={changeBatchAction}
      />
    </>
  );
}
