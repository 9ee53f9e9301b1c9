import type { Metadata } from 'next';
import { BatchStateTag } from '@/components/status/batch-state-tag';
import { ButtonLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHeader } from '@/components/ui/page-header';
import { Table, Tbody, Td, Th, Thead, Tr } from '@/components/ui/table';
import { TextLink } from '@/components/ui/text-link';
import { formatDay, formatInstant } from '@/lib/domain/dates/format';
import { countOf } from '@/lib/domain/text/count-of';
import { listBatches } from '@/lib/use-cases/batches/list-batches';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';

export const metadata: Metadata = { title: 'Batches' };

type Props = { params: Promise<{ league: string; season: string }> };

export default async function BatchesPage({ params }: Props) {
  const { league, season } = await params;
  const { ctx } = await requireLeague(league, paths.batches(league, season));
  const { batches, ready } = await showNotFound(listBatches(ctx, { season }));
  const action = (
    <ButtonLink look="primary" href={paths.newBatch(league, season)}>
      {ready === 0 ? 'Make a batch' : `Make a batch of ${countOf(ready, 'team')}`}
    </ButtonLink>
  );
  return (
    <>
      <PageHeader
        title="Batches"
        subtitle={`${countOf(batches.length, 'batch', 'batches')} this season. ${ready === 0 ? 'No team waits' : `${countOf(ready, 'signed-off team waits', 'signed-off teams wait')}`} for one.`}
        actions={batches.length > 0 && action}
      />
      <Card flush>
        {batches.length === 0 ? (
          <EmptyState title="No batches yet" action={action}>
            A batch is a set of signed-off rosters for one shop. Hold it while you choose, then release it:
            from then on it never changes.
          </EmptyState>
        ) : (
          <Table caption="Batches of this season" cards>
            <Thead>
              <Th>Batch</Th>
              <Th>State</Th>
              <Th>Shop</Th>
              <Th end>Teams</Th>
              <Th end>Players</Th>
              <Th>Promised for</Th>
              <Th>Released</Th>
            </Thead>
            <Tbody>
              {batches.map((batch) => (
                <Tr key={batch.id}>
                  <Td rowHead>
                    <TextLink href={paths.batch(league, season, batch.code)}>{batch.code}</TextLink>
                  </Td>
                  <Td label="State">
                    <BatchStateTag state={batch.state} />
                  </Td>
                  <Td label="Shop">{batch.shop.name}</Td>
                  <Td label="Teams" end>
                    {batch.teams}
                  </Td>
                  <Td label="Players" end>
                    {batch.players}
                  </Td>
                  <Td label="Promised for">
                    {batch.promisedOn === null ? '–' : formatDay(batch.promisedOn)}
                  </Td>
                  <Td label="Released">
                    {batch.releasedAt === null
                      ? 'held'
                      : formatInstant(batch.releasedAt, ctx.league.timeZone)}
                  </Td>
                </Tr>
              ))}
            </Tbody>
          </Table>
        )}
      </Card>
    </>
  );
}
