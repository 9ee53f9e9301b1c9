'use client';

import { useState } from 'react';
import { BatchStateTag } from '@/components/status/batch-state-tag';
import { Card } from '@/components/ui/card';
import { EmptyState } from '@/components/ui/empty-state';
import { FilterChips } from '@/components/ui/filter-chips';
import { foldForSearch, holdsEveryWord } from '@/components/ui/fold-for-search';
import { PageHeader } from '@/components/ui/page-header';
import { SearchInput } from '@/components/ui/search-input';
import { Table, Tbody, Td, Th, Thead, Tr } from '@/components/ui/table';
import { TextLink } from '@/components/ui/text-link';
import { formatDay, formatInstant } from '@/lib/domain/dates/format';
import { countOf } from '@/lib/domain/text/count-of';
import type { ShopBatch } from '@/lib/use-cases/batches/list-shop-batches';
import { paths } from '@/lib/web/paths';

type Chip = 'all' | 'new' | 'under way' | 'done';

const chipOf = (batch: ShopBatch): Chip =>
  batch.state === 'released'
    ? 'new'
    : batch.state === 'on press' || batch.state === 'packed'
      ? 'under way'
      : 'done';

const sayBundle = (batch: ShopBatch): string => {
  if (batch.bundleState === 'ready') return 'ready';
  if (batch.bundleState === 'failed') return 'failed';
  return batch.bundleState === 'building' ? `${batch.done ?? 0} of ${batch.total ?? 0}` : 'waiting';
};

/** Every batch released to the shops this person works for, over all leagues. */
export function ShopBatches({ batches }: { batches: ShopBatch[] }) {
  const [chip, setChip] = useState<Chip>('all');
  const [find, setFind] = useState('');
  const count = (id: Chip) => batches.filter((batch) => id === 'all' || chipOf(batch) === id).length;
  const shown = batches.filter(
    (batch) =>
      (chip === 'all' || chipOf(batch) === chip) &&
      holdsEveryWord(foldForSearch(`${batch.code} ${batch.leagueName} ${batch.shop}`), find),
  );
  const leagues = new Set(batches.map((batch) => batch.leagueSlug)).size;
  return (
    <>
      <PageHeader
        title="Batches for your shop"
        subtitle={`${countOf(batches.length, 'released batch', 'released batches')} of ${countOf(leagues, 'league')}.`}
      />
      <Card flush>
        {batches.length === 0 ? (
          <EmptyState title="Nothing has been released to your shop yet">
            When a league releases a batch, it stands here with its bundle, and you get an e-mail.
          </EmptyState>
        ) : (
          <>
            <div className="flex flex-wrap items-center justify-between gap-3 px-4 py-3">
              <FilterChips
                label="Which batches"
                chosen={chip}
                onChoose={setChip}
                chips={[
                  { id: 'all', label: 'All', count: count('all') },
                  { id: 'new', label: 'New', count: count('new') },
                  { id: 'under way', label: 'Under way', count: count('under way') },
                  { id: 'done', label: 'Shipped', count: count('done') },
                ]}
              />
              <SearchInput
                label="Find a batch or league"
                value={find}
                onChange={(event) => setFind(event.target.value)}
              />
            </div>
            {shown.length === 0 ? (
              <EmptyState title="No batch matches">
                Choose another filter, or clear what you typed.
              </EmptyState>
            ) : (
              <Table caption="Released batches" cards>
                <Thead>
                  <Th>Batch</Th>
                  <Th>League</Th>
                  <Th>State</Th>
                  <Th end>Teams</Th>
                  <Th>Promised for</Th>
                  <Th>Released</Th>
                  <Th>Bundle</Th>
                </Thead>
                <Tbody>
                  {shown.map((batch) => (
                    <Tr key={batch.id}>
                      <Td rowHead>
                        <TextLink href={paths.shopBatch(batch.leagueSlug, batch.code)}>{batch.code}</TextLink>
                      </Td>
                      <Td label="League">{batch.leagueName}</Td>
                      <Td label="State">
                        <BatchStateTag state={batch.state} />
                      </Td>
                      <Td label="Teams" end>
                        {batch.teams}
                      </Td>
                      <Td label="Promised for">
                        {batch.promisedOn === null ? '–' : formatDay(batch.promisedOn)}
                      </Td>
                      <Td label="Released">
                        {batch.releasedAt === null ? '–' : formatInstant(batch.releasedAt, batch.timeZone)}
                      </Td>
                      <Td label="Bundle">{sayBundle(batch)}</Td>
                    </Tr>
                  ))}
                </Tbody>
              </Table>
            )}
          </>
        )}
      </Card>
    </>
  );
}
